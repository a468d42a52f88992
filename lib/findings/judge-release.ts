import { askedPairs } from './asked';
import { baseAnswer } from './base-figures';
import type { Pair } from './check-types';
import { ENGINE_VERSION } from './engine-version';
import type { ComparisonAnswer, ReleaseDocument, ReleaseJudgement } from './judge-types';
import { findChanges } from './release-changes';
import { readContext, type ReadComparison, type ReleaseContext } from './release-context';
import { findGaps, presentSubgroups } from './release-gaps';
import { findLeads, findShares, findThresholds } from './release-one-base';

/**
 * What the numbers of a release support: shares, blocs, leads, net scores, changes, thresholds and gaps between
 * subgroups, each with its test, verdict and worked calculation.
 *
 * Where check answers the document that evidence is frozen in, this is the whole of what a desk may ask: comparisons
 * that differ and are overridden, tracking averages with waves in common, people asked twice, re-based questions,
 * subgroups. Both measure and judge by the same functions. All leads, net scores and leads of blocs are one family;
 * all changes another; thresholds a third; the gaps of each question one of their own.
 *
 * @param document a release document that parseReleaseDocument has accepted; never changed
 * @returns findings in the order of their families; `working` of each is made when it is first read
 * @example
 * judgeRelease({
 *   release: {
 *     sampleSource: 'probability', n: 900, design: 'unweighted', decimals: 0,
 *     shares: [{ option: 'Approve', pct: 42 }, { option: 'Disapprove', pct: 53 }],
 *   },
 *   netScores: [{ approve: 'Approve', disapprove: 'Disapprove' }],
 * }).findings[2].marginPp; // => 6.3271059...
 */
export function judgeRelease(document: ReleaseDocument): ReleaseJudgement {
  const context = readContext(document);
  const { policy, release, earlier } = context;
  const netScores = (document.netScores ?? []).map(({ approve, disapprove }): Pair => [approve, disapprove]);
  const pairs = pairsOf(context, netScores);
  const { rebasedN, figures } = release.read;
  return {
    engine: ENGINE_VERSION,
    base: baseAnswer(figures, policy),
    ...(rebasedN === undefined ? {} : { rebasedN }),
    comparison: earlier && comparisonAnswer(context, earlier),
    findings: [
      ...findShares(context),
      ...findLeads(context, pairs, netScores),
      ...(earlier ? findChanges(context, earlier, changesOf(context, earlier, pairs, netScores)) : []),
      ...findThresholds(context, document.thresholds ?? []),
      ...(document.subgroups ?? []).flatMap((one) => findGaps(one, policy)),
    ],
    subgroups: (document.subgroups ?? []).map((one) => presentSubgroups(one, policy)),
  };
}

function pairsOf({ document, release }: ReleaseContext, netScores: readonly Pair[]): readonly Pair[] {
  const pairs = askedPairs(document, release.read.figures);
  if (document.pairs) return pairs;
  return pairs.filter((pair) => !netScores.some((net) => pair.every((name) => net.includes(name))));
}

/** What changes are asked about: those named, else every name in a lead that is an answer or a bloc both times. */
function changesOf(
  { document, release }: ReleaseContext,
  { read }: ReadComparison,
  pairs: readonly Pair[],
  netScores: readonly Pair[],
) {
  const blocs = new Set((document.blocs ?? []).map(({ name }) => name));
  const isThere = (name: string) =>
    [release.read.figures, read.figures].every(
      (figures) => figures.answers.includes(name) || (blocs.has(name) && figures.units.has(name)),
    );
  const inBoth = (asked: readonly Pair[]) =>
    asked.filter((pair) => pair.every((name) => read.figures.units.has(name)));
  return {
    options: document.changes ?? [...new Set([...pairs, ...netScores].flat())].filter(isThere),
    pairs: inBoth(pairs),
    netScores: inBoth(netScores),
  };
}

function comparisonAnswer(
  { document, policy }: ReleaseContext,
  { read, course }: ReadComparison,
): ComparisonAnswer {
  const comparability = document.comparison?.comparability;
  return {
    status: course.status,
    base: baseAnswer(read.figures, policy),
    differences: comparability?.differences ?? [],
    unknowns: comparability?.unknowns ?? [],
    wasLookedInto: comparability !== undefined,
    overrideReason: course.overrideReason,
    overlap: course.overlap,
  };
}
