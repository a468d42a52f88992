import type { ReleaseFacts } from '@/lib/domain/release-facts';
import {
  DESIGNS,
  MODES,
  type Mode,
  POPULATIONS,
  type Population,
  SAMPLE_SOURCES,
  type StatedDesign,
} from '@/lib/domain/vocabulary';
import type { ComparableItem, Difference } from '@/lib/findings/comparability';
import type { ChoiceReason } from '@/lib/findings/choose-comparison';
import type { ReleaseForm } from './form-values';

/** What of the form decides which earlier release it is compared with. */
export type ComparisonQuery = {
  /** Of a release that is being changed, which is not compared with itself; empty for a new one. */
  releaseId: string;
  raceId: string;
  pollster: string;
  wording: string | null;
  sameQuestion: boolean;
  answerOptions: string[];
  hasNonAnswers: boolean;
  population: Population | null;
  mode: Mode | null;
  sampleSource: (typeof SAMPLE_SOURCES)[number];
  design: StatedDesign;
  fieldStartOn: string | null;
  fieldEndOn: string | null;
};

export type Compared = {
  previous: ReleaseFacts | null;
  /** null where race or pollster is not on file, so that nothing earlier can be. */
  comparison: {
    reason: ChoiceReason | 'override';
    unknowns: ComparableItem[];
    differences: Difference[];
    passedOver: {
      releaseId: string;
      fieldStartOn: string;
      fieldEndOn: string;
      differences: Difference[];
    }[];
  } | null;
};

/** null until there is a race on file and a pollster. */
export function comparisonQuery(values: ReleaseForm, releaseId: string): ComparisonQuery | null {
  const { race } = values;
  const pollster = values.pollster.trim().slice(0, 120);
  if (race.kind !== 'existing' || race.id === '' || pollster === '') return null;
  const named = values.shares.filter((row) => row.option.trim() !== '').slice(0, 30);
  const wording = textOf(values.wording).slice(0, 2000);
  return {
    releaseId,
    raceId: race.id,
    pollster,
    wording: wording === '' ? null : wording,
    sameQuestion: values.sameQuestion,
    answerOptions: named.filter((row) => row.isAnswer).map((row) => row.option.trim().slice(0, 120)),
    hasNonAnswers: named.some((row) => !row.isAnswer),
    population: entryOf(POPULATIONS, textOf(values.population)),
    mode: entryOf(MODES, textOf(values.mode)),
    sampleSource: entryOf(SAMPLE_SOURCES, values.sampleSource) ?? 'unknown',
    design: entryOf(DESIGNS, values.design) ?? 'unknown',
    fieldStartOn: dayOf(values.fieldStartOn),
    fieldEndOn: dayOf(values.fieldEndOn),
  };
}

function textOf({ notDisclosed, value }: { notDisclosed: boolean; value: string }): string {
  return notDisclosed ? '' : value.trim();
}

function entryOf<T extends string>(list: readonly T[], value: string): T | null {
  return list.find((entry) => entry === value) ?? null;
}

const dayOf = (text: string) => (/^\d{4}-\d{2}-\d{2}$/.test(text) ? text : null);
