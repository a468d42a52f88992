import { askChange, askLeadChange, question, sampledBase } from './ask';
import { unitsOf } from './base-figures';
import type { Pair } from './check-types';
import { criticalAt } from './critical-at';
import type { ReleaseFinding } from './judge-types';
import { littleChanged } from './little-changed';
import { measureChange } from './measure-change';
import { measureLeadChange } from './measure-lead-change';
import { measureOverlap, waveShares, type Named } from './measure-overlap';
import { sideSource, type ReadComparison, type ReleaseContext } from './release-context';
import { settleEntries, type BaseSource, type Entry } from './release-entry';
import { requireSampled } from './release-one-base';
import { carry, onTwoBases, workingOf } from './release-outcome';
import { withReasons } from './release-reasons';
import { blocSteps, testedWorking } from './release-working';
import type { Question } from './settle';
import { trackedWaves } from './tracking-waves';
import { writeChange, writeLeadChange } from './working-error';
import { overlapSteps, writeOverlap, type SharedWave } from './working-overlap';

export type AskedChanges = {
  options: readonly string[];
  pairs: readonly Pair[];
  netScores: readonly Pair[];
};

type Head =
  | { kind: 'change'; option: string; named: Named }
  | { kind: 'lead-change' | 'net-score-change'; pair: Pair; named: Named };

/** Changes of shares, leads and net scores, overlapping ones too: one family. */
export function findChanges(
  context: ReleaseContext,
  earlier: ReadComparison,
  { options, pairs, netScores }: AskedChanges,
): ReleaseFinding[] {
  const { policy } = context;
  const heads: Head[] = [
    ...options.map((option): Head => ({ kind: 'change', option, named: [option] })),
    ...pairs.map((pair): Head => ({ kind: 'lead-change', pair, named: pair })),
    ...netScores.map((pair): Head => ({ kind: 'net-score-change', pair, named: pair })),
  ];
  const sources = [sideSource(context.release, 'this', policy), sideSource(earlier, 'earlier', policy)];
  const outcomes = settleEntries(
    heads.map(({ named }) => entryOf(context, earlier, sources, named)),
    policy,
  );
  return outcomes.flatMap((outcome, index): ReleaseFinding[] => {
    const head = heads[index];
    if (!head) return [];
    if (head.kind !== 'change') {
      const { kind, pair } = head;
      return [carry({ kind, pair, ...onTwoBases(outcome) }, pair, () => workingOf(outcome, policy))];
    }
    const { kind, option } = head;
    if ('untested' in outcome) {
      return [carry({ kind, option, ...outcome.untested }, [option], () => workingOf(outcome, policy))];
    }
    const { figures } = earlier.read;
    const earlierPct = unitsOf(figures, option) / 10 ** figures.decimals;
    const isSmall = littleChanged(outcome.measured, outcome.fields, earlierPct, policy);
    return [
      carry(
        {
          kind,
          option,
          ...outcome.fields,
          breakingFactor: outcome.breaking,
          littleChanged: isSmall,
          trace: outcome.trace,
        },
        [option],
        () => testedWorking(outcome, policy, { littleChanged: isSmall, earlierPct }),
      ),
    ];
  });
}

function entryOf(
  context: ReleaseContext,
  earlier: ReadComparison,
  sources: readonly BaseSource[],
  named: Named,
): Entry {
  const { policy, release } = context;
  const [late, early] = [release.read.figures, earlier.read.figures];
  const { overlap, course } = earlier;
  const plain = askPlain(context, earlier, named);
  const asked =
    overlap && overlap.shared < overlap.window
      ? question(plain.bases, named, plain.terms, policy, ([second, first = second]) =>
          measureOverlap(first, second, named, overlap),
        )
      : plain;
  const judged = withReasons(asked, [...release.reasons, ...earlier.reasons, ...course.reasons]);
  const waves = overlap && judged.measured ? sharedWaves(context, earlier, named) : null;
  const sides = () => [requireSampled(late), requireSampled(early)] as const;
  return {
    question: judged,
    sources,
    waves,
    write: () => {
      const [later, before] = sides();
      if (waves) return writeOverlap(named, later, before, waves);
      const [first, second] = named;
      return second === undefined
        ? writeChange({ option: first }, later, before)
        : writeLeadChange({ pair: [first, second] }, later, before);
    },
    before: () => [
      ...blocSteps(late, named, release.blocs, 'this'),
      ...blocSteps(early, named, earlier.blocs, 'earlier'),
      ...(overlap && waves ? overlapSteps(named, ...sides(), overlap) : []),
    ],
    ...(course.reasons.includes('same-people')
      ? { independentMarginPp: independentMargin(context, earlier, named, plain) }
      : {}),
  };
}

function askPlain({ policy, release }: ReleaseContext, { read }: ReadComparison, named: Named): Question {
  const [first, second] = named;
  return second === undefined
    ? askChange(read.figures, release.read.figures, first, policy)
    : askLeadChange(read.figures, release.read.figures, [first, second], policy);
}

/** The margin that two independent samples would have; null where a figure or a base has none. */
function independentMargin(
  { policy, release }: ReleaseContext,
  { read }: ReadComparison,
  named: Named,
  plain: Question,
): number | null {
  const later = sampledBase(release.read.figures);
  const earlier = sampledBase(read.figures);
  if (!later || !earlier || plain.estimatePp === null) return null;
  const [first, second] = named;
  const { df, standardError } =
    second === undefined
      ? measureChange(earlier, later, first)
      : measureLeadChange(earlier, later, [first, second]);
  return 100 * criticalAt(1 - policy.level, df) * standardError('chosen');
}

function sharedWaves(
  { release }: ReleaseContext,
  { read, overlap }: ReadComparison,
  named: Named,
): SharedWave[] {
  const [earlier, later] = [requireSampled(read.figures), requireSampled(release.read.figures)];
  if (!overlap) return [];
  return trackedWaves(overlap, earlier.sampled, later.sampled).map((wave, place) => ({
    ...wave,
    shares: waveShares(earlier, later, named, overlap, place),
  }));
}
