import { askLead, askThreshold, sampledBase } from './ask';
import { blocNote } from './blocs';
import type { Pair } from './check-types';
import type { AskedThreshold, ReleaseFinding } from './judge-types';
import type { SampledBase } from './measure-change';
import type { ReleaseContext } from './release-context';
import { sideSource } from './release-context';
import { settleEntries, type BaseSource, type Entry } from './release-entry';
import { carry, onOneBase, workingOf } from './release-outcome';
import { withReasons, type ReleaseQuestion } from './release-reasons';
import { blocSteps, namesIn, sourceSteps } from './release-working';
import { baseAnswer, type BaseFigures } from './base-figures';
import { findShare } from './share-interval';
import { countsTheBase } from './threshold-base';
import { writeLead, writeThreshold, type EstimateWriting } from './working-error';
import { shareSteps } from './working-share';

/** Every share of the release, then every bloc, each with its interval. */
export function findShares(context: ReleaseContext): ReleaseFinding[] {
  const { document, policy, release } = context;
  const { figures } = release.read;
  const options = document.release.shares.map(({ option }) => option);
  return [...options, ...release.blocs.map(({ name }) => name)].map((name): ReleaseFinding => {
    const bloc = release.blocs.find((one) => one.name === name);
    const share = findShare(figures, name, policy.level);
    const n = figures.sampled?.n ?? null;
    const df = figures.sampled?.deff.df ?? null;
    return carry(bloc ? { ...share, bloc: blocNote(bloc) } : share, [name], () => [
      ...sourceSteps([sideSource(release, 'only', policy)], policy),
      ...blocSteps(figures, [name], release.blocs, 'only'),
      ...shareSteps(share, { n, df }, baseAnswer(figures, policy), policy),
    ]);
  });
}

/** Leads and net scores: one family. */
export function findLeads(
  context: ReleaseContext,
  pairs: readonly Pair[],
  netScores: readonly Pair[],
): ReleaseFinding[] {
  const { policy, release } = context;
  const asked = [
    ...pairs.map((pair) => ({ kind: 'lead' as const, pair })),
    ...netScores.map((pair) => ({ kind: 'net-score' as const, pair })),
  ];
  const sources = [sideSource(release, 'only', policy)];
  const entries = asked.map(({ pair }) =>
    entryOf(
      context,
      sources,
      withReasons(askLead(release.read.figures, pair, policy), release.reasons),
      (one) => writeLead({ pair }, one),
    ),
  );
  return settleEntries(entries, policy).flatMap((outcome, index) => {
    const head = asked[index];
    return head
      ? [carry({ ...head, ...onOneBase(outcome) }, head.pair, () => workingOf(outcome, policy))]
      : [];
  });
}

/** Shares against fixed values: one family. A rule's value is tested only where the shares count what the rule does. */
export function findThresholds(
  context: ReleaseContext,
  thresholds: readonly AskedThreshold[],
): ReleaseFinding[] {
  const { policy, release, document } = context;
  const shares = {
    hasNonAnswers: document.release.shares.some(({ answer }) => answer === false),
    population: document.release.population ?? null,
  };
  const sources = [sideSource(release, 'only', policy)];
  const entries = thresholds.map(({ option, pct, countedBase }): Entry => {
    const isCounted = countedBase === undefined || countsTheBase(countedBase, shares);
    const question = withReasons(askThreshold(release.read.figures, { option, pct }, policy), [
      ...release.reasons,
      ...(isCounted ? [] : (['other-base'] as const)),
    ]);
    const entry = entryOf(context, sources, question, (one) =>
      writeThreshold({ option, thresholdPct: pct }, one),
    );
    return { ...entry, thresholdPct: pct };
  });
  return settleEntries(entries, policy).flatMap((outcome, index): ReleaseFinding[] => {
    const asked = thresholds[index];
    if (!asked) return [];
    const { option, pct } = asked;
    return [
      carry(
        { kind: 'threshold', option, thresholdPct: pct, ...onOneBase(outcome) },
        [option, String(pct)],
        () => workingOf(outcome, policy),
      ),
    ];
  });
}

function entryOf(
  { release }: ReleaseContext,
  sources: readonly BaseSource[],
  question: ReleaseQuestion,
  write: (one: SampledBase) => EstimateWriting,
): Entry {
  const { figures } = release.read;
  return {
    question,
    sources,
    write: () => write(requireSampled(figures)),
    before: () => blocSteps(figures, namesIn(question.terms), release.blocs, 'only'),
    waves: null,
  };
}

/** The sampled part of a base that something was tested on. */
export function requireSampled(figures: BaseFigures): SampledBase {
  const sampled = sampledBase(figures);
  if (!sampled) throw new TypeError('requireSampled requires a base with a margin');
  return sampled;
}
