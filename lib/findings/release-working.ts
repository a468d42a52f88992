import type { BaseFigures } from './base-figures';
import { blocNote, type BlocOnBase } from './blocs';
import type { Policy } from './check-types';
import type { Term } from './measured';
import type { BaseSource, TestedEntry, UntestedEntry } from './release-entry';
import { baseSteps, ROLE_SUFFIX, type BaseRole } from './working-base';
import { breakingSteps, littleSteps } from './working-beside';
import { figure, type WorkingStep } from './working-step';
import { testSteps } from './working-test';
import { untestedSteps } from './working-untested';
import { verdictSteps } from './working-verdict';

/** How the bases of a finding come about. */
export function sourceSteps(sources: readonly BaseSource[], policy: Policy): WorkingStep[] {
  return sources.flatMap(({ base, answer, role, after }) => [
    ...baseSteps(base, answer, policy, role),
    ...after,
  ]);
}

/** The worked calculation of a tested finding. */
export function testedWorking(
  { entry, measured, fields, breaking }: TestedEntry,
  policy: Policy,
  little?: { littleChanged: boolean; earlierPct: number },
): WorkingStep[] {
  const writing = entry.write();
  const isOneBase = measured.bases.length === 1;
  const deff = measured.bases[0]?.deff.value ?? 1;
  return [
    ...sourceSteps(entry.sources, policy),
    ...entry.before(),
    ...testSteps(measured, fields, writing, policy),
    ...verdictSteps(measured, fields, writing, policy),
    ...breakingSteps(
      isOneBase
        ? { ...fields, breakingDeff: breaking === null ? null : deff * breaking }
        : { ...fields, breakingFactor: breaking },
      measured,
    ),
    ...(little
      ? littleSteps({ ...fields, littleChanged: little.littleChanged }, measured, little.earlierPct, policy)
      : []),
  ];
}

/** What stands against a test, and the margin of independent samples where the same people were asked twice. */
export function untestedWorking({ entry, untested }: UntestedEntry, policy: Policy): WorkingStep[] {
  const { independentMarginPp } = untested;
  const steps = untestedSteps(
    untested,
    entry.sources.map(({ answer }) => answer),
    policy,
  );
  const beside: WorkingStep[] =
    typeof independentMarginPp === 'number'
      ? [
          {
            label: 'Margin if different people had been asked',
            formula: 'q · SE of two independent samples',
            substituted: 'not the margin of this change',
            result: figure(independentMarginPp),
            unit: 'points',
          },
        ]
      : [];
  return [...sourceSteps(entry.sources, policy), ...entry.before(), ...steps, ...beside];
}

/** People left in a re-based question; none where it is not re-based. */
export function rebasedSteps(
  figures: BaseFigures,
  rebasedN: number | null | undefined,
  role: BaseRole,
): WorkingStep[] {
  if (rebasedN === undefined || rebasedN === null || !figures.sampled) return [];
  const { deff, nEff } = figures.sampled;
  return [
    {
      label: `Effective size of the people left in${ROLE_SUFFIX[role]}`,
      formula: 'n left / d',
      substituted: `${figure(rebasedN)} / ${figure(deff.value)}`,
      result: figure(nEff),
      unit: 'people',
    },
  ];
}

/** How the figure of each bloc among these names came about on a base. */
export function blocSteps(
  base: BaseFigures,
  names: readonly string[],
  blocs: readonly BlocOnBase[],
  role: BaseRole,
): WorkingStep[] {
  return blocs
    .filter(({ name }) => names.includes(name) && typeof base.units.get(name) === 'number')
    .map((bloc) => {
      const pct = (option: string) => figure((base.units.get(option) ?? 0) / 10 ** base.decimals);
      const { options, source } = blocNote(bloc);
      return {
        label: `Bloc ${bloc.name}${ROLE_SUFFIX[role]}`,
        formula: source === 'summed' ? 'sum of the printed shares' : 'as the tables give it',
        substituted: source === 'summed' ? options.map(pct).join(' + ') : options.join(', '),
        result: pct(bloc.name),
        unit: 'percent',
      };
    });
}

/** Names in an estimate, once each. */
export function namesIn(terms: readonly Term[]): string[] {
  return [...new Set(terms.map(({ option }) => option))];
}
