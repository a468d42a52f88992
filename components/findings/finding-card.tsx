import type { ReactNode } from 'react';
import type { ChartWords } from '@/lib/charts/chart-words';
import type { SoundingSpec } from '@/lib/charts/sounding-spec';
import type { Verdict } from '@/lib/findings/check-types';
import { Sounding } from '../charts/sounding';
import { VerdictMark } from '../charts/verdict-mark';
import { Details } from '../ui/details';

/**
 * What the numbers support, for one finding: a neutral quantity in the interface face, its verdict, its picture,
 * why, and the working one step away.
 */
export function FindingCard({
  id,
  heading,
  verdict,
  spec,
  why,
  working,
  action,
  level = 3,
  words,
}: {
  /** Unique on the page; the heading takes it. */
  id: string;
  heading: string;
  /** null for a share, which claims nothing. */
  verdict: Verdict | null;
  /** null where there is no figure to draw. */
  spec: SoundingSpec | null;
  /** Sentences for staff, in order. */
  why: readonly string[];
  working?: ReactNode;
  /** What can be done with this finding, such as drafting a sheet. */
  action?: ReactNode;
  level?: 2 | 3 | 4;
  words?: ChartWords;
}) {
  const Heading = `h${level}` as const;
  return (
    <article aria-labelledby={id} className="finding-card keep-together">
      <div className="finding-head">
        <Heading id={id} className="finding-heading">
          {heading}
        </Heading>
        {verdict ? <VerdictMark verdict={verdict} /> : null}
      </div>
      {spec ? <Sounding spec={spec} words={words} /> : null}
      {why.length > 0 ? <p className="mt-2 max-w-prose text-soft">{why.join(' ')}</p> : null}
      {working || action ? (
        <div className="mt-2 flex flex-wrap items-start justify-between gap-x-6 gap-y-2">
          {working ? (
            <Details summary="Working" className="min-w-0 flex-1 basis-60">
              {working}
            </Details>
          ) : (
            <span />
          )}
          {action ? <div className="no-print">{action}</div> : null}
        </div>
      ) : null}
    </article>
  );
}
