import { baseAnswer, proportionOf, roundingUnitsPp } from './base-figures';
import type { Base, BaseAnswer, Policy, TestFields } from './check-types';
import type { FindingTrace, ReleaseUntestedFields, TraceBase, TraceWave } from './judge-types';
import type { Measured } from './measured';
import type { ReadQuestion } from './question-base';
import type { ReleaseQuestion } from './release-reasons';
import { settle } from './settle';
import type { BaseRole } from './working-base';
import type { EstimateWriting } from './working-error';
import type { WorkingStep } from './working-step';

/** A base as the working tells of it: where its design effect comes from, and what was done after. */
export type BaseSource = {
  role: BaseRole;
  name: string | null;
  base: Base;
  answer: BaseAnswer;
  after: readonly WorkingStep[];
};

/** One question of a family with what its trace and working need beside. */
export type Entry = {
  question: ReleaseQuestion;
  sources: readonly BaseSource[];
  /** How the estimate is written; only for what is tested. */
  write: () => EstimateWriting;
  /** Steps on the figures themselves: sums of blocs, shared waves. */
  before: () => WorkingStep[];
  waves: readonly TraceWave[] | null;
  /** Of a threshold, in percent. */
  thresholdPct?: number;
  /** Of people asked twice. */
  independentMarginPp?: number | null;
};

export type TestedEntry = {
  entry: Entry;
  measured: Measured;
  fields: TestFields;
  breaking: number | null;
  trace: FindingTrace;
};
export type UntestedEntry = { entry: Entry; untested: ReleaseUntestedFields };

/**
 * Judges the questions of one family together, each with the trace of its numbers.
 *
 * @param entries all questions of the family, in order
 * @param policy the desk's policy, complete
 */
export function settleEntries(entries: readonly Entry[], policy: Policy): (TestedEntry | UntestedEntry)[] {
  const outcomes = settle(
    entries.map(({ question }) => question),
    policy,
  );
  const size = outcomes.filter((outcome) => 'tested' in outcome).length;
  return outcomes.flatMap((outcome, index): (TestedEntry | UntestedEntry)[] => {
    const entry = entries[index];
    if (!entry) return [];
    if ('untested' in outcome) {
      const beside =
        entry.independentMarginPp === undefined ? {} : { independentMarginPp: entry.independentMarginPp };
      return [{ entry, untested: { ...outcome.untested, ...beside } }];
    }
    const { fields, breaking } = outcome.tested;
    const before = size - Math.round((1 - policy.level) / fields.alpha);
    return [
      {
        entry,
        measured: outcome.measured,
        fields,
        breaking,
        trace: traceOf(entry, outcome.measured, { size, before }, policy),
      },
    ];
  });
}

/** The base of a question as the working tells of it. */
export function sourceOf(
  read: ReadQuestion,
  role: BaseRole,
  policy: Policy,
  after: readonly WorkingStep[],
): BaseSource {
  return {
    role,
    name: null,
    base: read.everyone.base,
    answer: baseAnswer(read.everyone.figures, policy),
    after,
  };
}

const TRACE_ROLES: Record<BaseRole, TraceBase['role']> = {
  only: 'release',
  this: 'release',
  earlier: 'comparison',
  group: 'group',
  against: 'against',
  whole: 'against',
};

function traceOf(
  { question, sources, waves, thresholdPct }: Entry,
  { bases }: Measured,
  family: FindingTrace['family'],
  policy: Policy,
): FindingTrace {
  return {
    terms: question.terms.map(({ base, option, sign }) => ({
      base: question.bases.indexOf(base),
      name: option,
      sign,
      p: proportionOf(base, option),
      roundingUnitsPp: [...roundingUnitsPp(base, option)],
    })),
    bases: bases.map(({ basis, n, deff }, place) => ({
      role: TRACE_ROLES[sources[place]?.role ?? 'only'],
      name: sources[place]?.name ?? null,
      basis,
      n,
      deff: deff.value,
      deffRange: deff.range,
      deffSource: deff.source,
      df: deff.df,
    })),
    thresholdPct: thresholdPct ?? null,
    level: policy.level,
    family,
    waves: waves && [...waves],
  };
}
