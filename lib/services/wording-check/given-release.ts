import 'server-only';
import { z } from 'zod';
import { given, NOT_DISCLOSED } from '@/lib/domain/disclosed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { MODES, POPULATIONS, RACE_KINDS } from '@/lib/domain/vocabulary';
import { CheckRefused } from '@/lib/findings/check-refused';
import type { Base, CheckDocument } from '@/lib/findings/check-types';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import { refusalOf } from '@/lib/findings/refusal-of';

const name = (what: string) =>
  z.string({ error: what }).trim().min(1, what).max(160, 'At most 160 characters.');
const isDay = (text: string) =>
  /^\d{4}-\d{2}-\d{2}$/.test(text) && new Date(`${text}T00:00:00Z`).toJSON()?.startsWith(text) === true;
const day = z.string({ error: 'A day is YYYY-MM-DD.' }).refine(isDay, 'A day is YYYY-MM-DD.');
const dates = z
  .strictObject({ fieldStartOn: day, fieldEndOn: day, publishedOn: day.optional() }, 'Give the field dates.')
  .refine(({ fieldStartOn, fieldEndOn }) => fieldStartOn <= fieldEndOn, {
    path: ['fieldEndOn'],
    error: 'Field dates end no earlier than they start.',
  });

const words = z.looseObject({
  names: z.strictObject(
    {
      race: name('Name the race.'),
      kind: z.enum(RACE_KINDS, 'Not a kind of race.').default('candidate'),
      pollster: name('Name the pollster.'),
      sponsor: name('Name the sponsor.').nullish(),
      population: z.enum(POPULATIONS, 'Not a population.').nullish(),
      mode: z.enum(MODES, 'Not a mode.').nullish(),
      question: z
        .string()
        .trim()
        .min(1, 'Give the question.')
        .max(2000, 'At most 2,000 characters.')
        .nullish(),
    },
    'Give the names of race and pollster.',
  ),
  dates,
  previousDates: dates.optional(),
});

export type GivenRelease = { facts: ReleaseFacts; previous: ReleaseFacts | null };

/**
 * Reads a release that is not one of the desk's: a check document without a policy, with the names and dates that
 * words go by. Strict like every check document.
 *
 * @throws CheckRefused with the path of the field
 */
export function readGivenRelease(input: unknown, index: number): GivenRelease {
  const result = words.safeParse(input);
  if (!result.success) throw refusalOf(result.error);
  const { names, dates: current, previousDates, ...rest } = result.data;
  if ('policy' in rest) throw new CheckRefused('policy', 'The policy is the desk’s own.');
  const document = parseCheckDocument(rest);
  if (document.previous && !previousDates)
    throw new CheckRefused('previousDates', 'Give the field dates of the earlier release.');
  const factsFor = (base: Base, of: z.output<typeof dates>, which: string): ReleaseFacts =>
    factsOf(names, of, base, document, `given-${index}-${which}`);
  return {
    facts: factsFor(document.release, current, 'release'),
    previous:
      document.previous && previousDates ? factsFor(document.previous, previousDates, 'previous') : null,
  };
}

const disclosed = <T>(value: T | null | undefined) => (value == null ? NOT_DISCLOSED : given(value));

function factsOf(
  names: z.output<typeof words>['names'],
  { fieldStartOn, fieldEndOn, publishedOn = fieldEndOn }: z.output<typeof dates>,
  base: Base,
  { thresholds = [] }: CheckDocument,
  id: string,
): ReleaseFacts {
  const { race, kind, pollster, sponsor, population, mode, question } = names;
  return {
    releaseId: id,
    versionId: id,
    version: 1,
    race: {
      id: `race ${race}`,
      name: race,
      kind,
      thresholds: thresholds.map(({ option, pct }) => ({ option, pct, base: 'answers' })),
    },
    pollster: { id: `pollster ${pollster}`, name: pollster },
    sponsor: disclosed(sponsor ? { id: `sponsor ${sponsor}`, name: sponsor } : null),
    population: disclosed(population),
    sampleSource: base.sampleSource,
    mode: disclosed(mode),
    design: base.design,
    fieldStartOn,
    fieldEndOn,
    publishedOn,
    n: disclosed(base.n),
    deff: base.deff ? { ...base.deff, df: base.deff.df ?? null } : null,
    statedMargin: disclosed(base.statedMargin),
    modelledInterval: base.modelledInterval ?? null,
    questionWording: disclosed(question),
    decimals: base.decimals,
    shares: base.shares.map(({ option, pct, answer = true }) => ({
      option,
      units: pct === null ? null : Math.round(pct * 10 ** base.decimals),
      isAnswer: answer,
    })),
    sourceUrl: NOT_DISCLOSED,
  };
}
