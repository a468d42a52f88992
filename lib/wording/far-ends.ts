import type { BaseAnswer, Range } from '@/lib/findings/check-types';
import type { FindingTrace } from '@/lib/findings/judge-types';
import type { TestedDraft } from './draft-finding';

/**
 * Margin and interval of a finding of a whole release at the high end of its design effects: how far the dashed
 * reach of a chart goes, and what the caveat says beside the margin.
 *
 * @param finding tested, with the trace of its numbers
 * @param base of the release, for a threshold
 */
export function farFromTrace(
  finding: TestedDraft,
  trace: FindingTrace,
  base: BaseAnswer,
): { marginPp: number; intervalPp: Range } {
  const factor = trace.waves ? largest(trace, 1) / largest(trace, 0) : separate(trace);
  const stretch = Math.sqrt(finding.kind === 'threshold' ? highOver(base) : factor);
  const [low, high] = finding.intervalPp;
  const { estimatePp, marginPp } = finding;
  return {
    marginPp: marginPp * stretch,
    intervalPp: [estimatePp - (estimatePp - low) * stretch, estimatePp + (high - estimatePp) * stretch],
  };
}

/** Variance at the high ends over variance at the chosen design effects, each base with its own. */
function separate({ terms, bases }: FindingTrace): number {
  let [chosen, wide] = [0, 0];
  bases.forEach(({ n, deff, deffRange }, place) => {
    const own = terms.filter((term) => term.base === place);
    const sum = own.reduce((total, { p }) => total + p, 0);
    const lead = own.reduce((total, { p, sign }) => total + sign * p, 0);
    const unit = (sum - lead * lead) / n;
    chosen += deff * unit;
    wide += deffRange[1] * unit;
  });
  return chosen > 0 ? wide / chosen : 1;
}

/** Of overlapping averages the larger design effect counts for every wave. */
function largest({ bases }: FindingTrace, end: 0 | 1): number {
  return Math.max(...bases.map(({ deff, deffRange }) => (end === 1 ? deffRange[1] : deff)));
}

function highOver({ deff, deffRange }: BaseAnswer): number {
  return deff && deffRange ? deffRange[1] / deff : 1;
}
