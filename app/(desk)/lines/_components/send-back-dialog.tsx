'use client';

import { Details } from '@/components/ui/details';
import { TextInput } from '@/components/ui/text-input';
import { LINE_KIND_NAMES, type LineKind } from '@/lib/domain/sheet';
import type { ActionFailure } from '@/lib/errors';
import { ReasonDialog } from '../../../_components/reason-dialog';
import { RefusedNote } from './refused-note';

type Seen = { id: string; hash: string };

export function SendBackDialog({
  author,
  seen,
  back,
  kinds,
}: {
  author: string;
  /** Lines that the sheet keeps. */
  kinds: readonly LineKind[];
  seen: Seen;
  back: {
    act: (input: Seen & { comment: string; lines: { kind: string; reason: string }[] }) => Promise<boolean>;
    isPending: boolean;
    failure: ActionFailure | null;
  };
}) {
  const { failure } = back;
  return (
    <ReasonDialog
      id="back-comment"
      opener="Send back"
      title="Send this sheet back"
      label="What should change?"
      hint={`${author} reads this on top of the sheet.`}
      decide="Send back"
      pendingWord="Sending back…"
      maxLength={2000}
      error={failure?.fields.comment}
      refusal={<RefusedNote failure={failure?.code === 'invalid' ? null : failure} />}
      act={(comment, form) => back.act({ ...seen, comment, lines: reasonsIn(form, kinds) })}
      isPending={back.isPending}
    >
      <Details summary="Reasons for single lines" className="mb-3">
        {kinds.map((kind) => (
          <TextInput
            key={kind}
            id={`back-${kind}`}
            name={`line ${kind}`}
            label={LINE_KIND_NAMES[kind]}
            optional
            maxLength={500}
          />
        ))}
      </Details>
    </ReasonDialog>
  );
}

function reasonsIn(form: FormData, kinds: readonly LineKind[]) {
  return kinds.flatMap((kind) => {
    const reason = String(form.get(`line ${kind}`) ?? '').trim();
    return reason === '' ? [] : [{ kind, reason }];
  });
}
