import { VerdictMark, VERDICT_NAMES } from '@/components/charts/verdict-mark';
import type { Verdict } from '@/lib/findings/check-types';

/** The verdicts of one release as a row of marks; each is named aloud. */
export function VerdictRow({
  verdicts,
  isBeingRecomputed = false,
}: {
  verdicts: readonly Verdict[];
  /** Marks of an earlier policy or engine are not shown: they may be wrong by now. */
  isBeingRecomputed?: boolean;
}) {
  if (isBeingRecomputed) return <span className="text-soft">Being computed anew</span>;
  if (verdicts.length === 0) return <span className="text-soft">Nothing tested</span>;
  return (
    <ul className="flex flex-wrap gap-1">
      {verdicts.map((verdict, at) => (
        <li key={`${at} ${verdict}`} title={VERDICT_NAMES[verdict]} className="[&_.verdict]:gap-0">
          <VerdictMark verdict={verdict} name="" />
          <span className="sr-only">{VERDICT_NAMES[verdict]}</span>
        </li>
      ))}
    </ul>
  );
}
