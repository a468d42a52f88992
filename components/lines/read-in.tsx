import type { ReactNode } from 'react';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { DefinitionList } from '../ui/definition-list';
import { SourceLink } from './source-link';

/** Where the figures above were read, and whether a second person has read them there. */
export function ReadIn({
  release,
  action,
}: {
  release: ReleaseFacts;
  /** A way to the release itself. */
  action?: ReactNode;
}) {
  return (
    <DefinitionList
      className="particulars"
      items={[
        {
          term: 'Read in',
          value: (
            <>
              <SourceLink url={release.sourceUrl} />
              {action ? <> · {action}</> : null}
            </>
          ),
        },
        { term: 'Ticked', value: <span className="text-soft">no figure yet</span> },
      ]}
    />
  );
}
