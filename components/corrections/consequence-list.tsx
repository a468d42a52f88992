import Link from 'next/link';
import type { ReactNode } from 'react';
import { type Consequence, CORRECTION_EFFECT_NAMES } from '@/lib/domain/corrections';
import { LINE_KIND_NAMES, type LineText } from '@/lib/domain/sheet';
import { LANGUAGE_NAMES, type Language } from '@/lib/domain/vocabulary';
import { formatDayRange } from '@/lib/format/date';
import { Details } from '../ui/details';

/** Everything in print that a correction touches, worst first. */
export function ConsequenceList({
  consequences,
  actionOf,
}: {
  consequences: readonly Consequence[];
  /** Beside a sheet: what can be done about it. */
  actionOf?: (consequence: Consequence) => ReactNode;
}) {
  if (consequences.length === 0)
    return <p className="max-w-prose">Nothing in print rests on this release.</p>;
  const worstFirst = [...consequences].sort((a, b) => RANK[a.effect] - RANK[b.effect]);
  return (
    <ul className="border-t border-rule" aria-label="What it does to words in print">
      {worstFirst.map((one) => (
        <li key={one.sheetId} className="border-b border-rule py-3">
          <p>
            <strong>{CORRECTION_EFFECT_NAMES[one.effect]}</strong>
            <span className="text-soft"> · {aboutOf(one)}</span>
          </p>
          <p className="mt-1 max-w-prose font-serif text-18">
            <Link href={`/lines/${one.sheetId}`}>{titleOf(one.lines)}</Link>
          </p>
          <p className="mt-1 text-13 text-soft">
            {one.isComparison ? 'It compares its poll with this release. ' : null}
            {one.embedId ? `Its chart is embedded (${one.embedId}).` : 'No chart of it is embedded.'}
          </p>
          <Details summary={`Its ${one.lines.length} lines in print`}>
            <dl className="text-15">
              {one.lines.map(({ kind, text }) => (
                <div key={kind} className="py-1">
                  <dt className="text-13 text-soft">{LINE_KIND_NAMES[kind]}</dt>
                  <dd className="font-serif">{text}</dd>
                </div>
              ))}
            </dl>
          </Details>
          {actionOf ? <div className="mt-2">{actionOf(one)}</div> : null}
        </li>
      ))}
    </ul>
  );
}

const RANK: Record<Consequence['effect'], number> = { pulled: 0, replaced: 1, flagged: 2 };

function titleOf(lines: readonly LineText[]): string {
  return (lines.find(({ kind }) => kind === 'headline') ?? lines[0])?.text ?? 'A sheet without words';
}

function aboutOf({ race, pollster, fieldStartOn, fieldEndOn, language }: Consequence): string {
  const days = formatDayRange(fieldStartOn, fieldEndOn, 'en-GB', { withYear: true });
  return [race, pollster, days, LANGUAGE_NAMES[language as Language]].join(', ');
}

/** How much of each comes down, in one sentence. */
export function consequenceSummary(consequences: readonly Consequence[]): string {
  const count = (effect: Consequence['effect']) => consequences.filter((one) => one.effect === effect).length;
  const [pulled, replaced, flagged] = [count('pulled'), count('replaced'), count('flagged')];
  if (consequences.length === 0) return 'Nothing in print rests on this release.';
  const parts = [
    pulled > 0 ? `${sheets(pulled)} pulled` : null,
    replaced > 0 ? `${sheets(replaced)} replaced in the same moment` : null,
    flagged > 0 ? `${sheets(flagged)} with the same numbers kept and marked` : null,
  ].filter((part) => part !== null);
  return `${parts.join(', ')}.`;
}

const sheets = (count: number) => (count === 1 ? '1 sheet' : `${count} sheets`);
