import { askChange } from './ask';
import { baseAnswer, proportionOf, readBase, type BaseFigures } from './base-figures';
import type { Policy } from './check-types';
import type { AskedGap, ReleaseFinding, SubgroupAnswer, SubgroupQuestion } from './judge-types';
import { presentShare, type Presentation } from './present-share';
import { settleEntries, type BaseSource, type Entry } from './release-entry';
import { requireSampled } from './release-one-base';
import { carry, onTwoBases, workingOf } from './release-outcome';
import { withReasons } from './release-reasons';
import { groupAndRest } from './rest-of-sample';
import { findShare } from './share-interval';
import { writeChange } from './working-error';
import { figure, type WorkingStep } from './working-step';

/** The shares of every subgroup, each with whether it may be shown. */
export function presentSubgroups({ question, groups }: SubgroupQuestion, policy: Policy): SubgroupAnswer {
  return {
    question,
    groups: groups.map(({ name, base }) => {
      const figures = readBase(base, policy);
      return {
        name,
        base: baseAnswer(figures, policy),
        shares: base.shares.map(({ option }) => ({
          ...findShare(figures, option, policy.level),
          presentation: presentationOf(figures, option),
        })),
      };
    }),
  };
}

/** Gaps between subgroups of one question: one family. */
export function findGaps(one: SubgroupQuestion, policy: Policy): ReleaseFinding[] {
  const sides = one.gaps.map((gap) => sidesOf(one, gap, policy));
  const entries = one.gaps.map((gap, index) => entryOf(gap, sides[index], policy));
  return settleEntries(entries, policy).flatMap((outcome, index): ReleaseFinding[] => {
    const [gap, side] = [one.gaps[index], sides[index]];
    if (!gap || !side) return [];
    const { option, group, against } = gap;
    const groups = [group, typeof against === 'string' ? against : ''] as const;
    const presentation: [Presentation | null, Presentation | null] = [
      presentationOf(side.group, option),
      presentationOf(side.against, option),
    ];
    const head = { kind: 'gap' as const, question: one.question, option, groups, presentation };
    return [
      carry({ ...head, ...onTwoBases(outcome) }, [one.question, option, ...groups], () =>
        workingOf(outcome, policy),
      ),
    ];
  });
}

type Sides = { group: BaseFigures; against: BaseFigures; sources: [BaseSource, BaseSource] };

function entryOf({ option }: AskedGap, sides: Sides | undefined, policy: Policy): Entry {
  if (!sides) throw new TypeError('findGaps requires both sides of every gap');
  const { group, against, sources } = sides;
  const isSuppressed = [group, against].some((base) => presentationOf(base, option)?.outcome === 'suppress');
  return {
    question: withReasons(
      askChange(against, group, option, policy),
      isSuppressed ? ['below-presentation-standard'] : [],
    ),
    sources,
    waves: null,
    write: () => writeChange({ option }, requireSampled(group), requireSampled(against)),
    before: () => [],
  };
}

function sidesOf(one: SubgroupQuestion, gap: AskedGap, policy: Policy): Sides {
  const named = (name: string) => {
    const group = one.groups.find((candidate) => candidate.name === name);
    if (!group) throw new TypeError('findGaps requires a group of every name');
    return group;
  };
  const source = (name: string, role: BaseSource['role'], after: WorkingStep[] = []): BaseSource => {
    const { base } = named(name);
    return { role, name, base, answer: baseAnswer(readBase(base, policy), policy), after };
  };
  const group = readBase(named(gap.group).base, policy);
  if (typeof gap.against === 'string') {
    return {
      group,
      against: readBase(named(gap.against).base, policy),
      sources: [source(gap.group, 'group'), source(gap.against, 'against')],
    };
  }
  if (!one.total) throw new TypeError('findGaps requires the whole sample for the rest of it');
  const { base } = one.total;
  const total = readBase(base, policy);
  const groupN = named(gap.group).base.n;
  const people = base.n === null || groupN === null ? null : base.n - groupN;
  const weightPct = gap.against.restOfWeightPct;
  const apart = groupAndRest(total, group, gap.option, weightPct, people);
  return {
    group: apart.group,
    against: apart.rest,
    sources: [
      source(gap.group, 'group'),
      {
        role: 'whole',
        name: null,
        base,
        answer: baseAnswer(total, policy),
        after: restSteps(gap.option, { total, ...apart }, weightPct, [base.n, groupN]),
      },
    ],
  };
}

function restSteps(
  option: string,
  { total, group, rest }: { total: BaseFigures; group: BaseFigures; rest: BaseFigures },
  weightPct: number,
  [totalN, groupN]: readonly [number | null, number | null],
): WorkingStep[] {
  if (!rest.sampled || totalN === null || groupN === null) return [];
  if (typeof rest.units.get(option) !== 'number') return [];
  const w = figure(weightPct / 100);
  const pct = (base: BaseFigures) => figure(100 * proportionOf(base, option));
  return [
    {
      label: 'People in the rest of the sample',
      formula: 'n of the whole − n of the group',
      substituted: `${figure(totalN)} − ${figure(groupN)}`,
      result: figure(rest.sampled.n),
      unit: 'people',
    },
    {
      label: 'Share in the rest of the sample',
      formula: '(p of the whole − w · p of the group) / (1 − w)',
      substituted: `(${pct(total)} − ${w} · ${pct(group)}) / (1 − ${w})`,
      result: pct(rest),
      unit: 'percent',
    },
  ];
}

function presentationOf(figures: BaseFigures, option: string): Presentation | null {
  const { sampled } = figures;
  if (!sampled || typeof figures.units.get(option) !== 'number') return null;
  const { n, nEff, deff } = sampled;
  return presentShare({ p: proportionOf(figures, option), n, nEff, df: deff.df });
}
