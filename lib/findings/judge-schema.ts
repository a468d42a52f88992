import * as z from 'zod';
import { THRESHOLD_BASES } from '@/lib/domain/vocabulary';
import { base, number, option, people as peopleFrom, policy, threshold, wholeFrom } from './check-schema';

/** The form of a release document: keys, kinds and the range of each single field. What joins fields comes after. */

const text = (error: string) => z.string({ error }).refine((value) => value.trim() !== '', { error });
const flag = (error: string) => z.boolean({ error });
const pct = number.refine((value) => value >= 0 && value <= 100, {
  error: 'A share lies from 0 to 100 percent.',
});
const decimals = number.refine((value) => Number.isInteger(value) && value >= 0 && value <= 6, {
  error: 'Decimals are a whole number from 0 to 6.',
});
const people = peopleFrom('A number of people is a whole number of at least 1.');
const MOST_WAVES = 10_000;
const WAVES = 'The waves of an average are a whole number from 1 to 10,000.';

const questionBase = base.extend({
  rebased: z.strictObject({ n: people.nullable() }).optional(),
  population: z
    .enum(['adults', 'registered-voters', 'likely-voters'], {
      error: 'The population is adults, registered-voters or likely-voters.',
    })
    .nullable()
    .optional(),
});

const blocName = text('A bloc needs its name.');
const printed = { pct, decimals };

const bloc = z.strictObject({
  name: blocName,
  options: z.array(option).min(1, { error: 'A bloc sums at least one option.' }),
  printed: z.strictObject(printed).optional(),
});

const ITEMS = [
  'pollster',
  'race',
  'question-wording',
  'answer-options',
  'population',
  'likely-voter-method',
  'mode',
  'sample-source',
  'sample-supplier',
  'weighting-scheme',
  'sponsor-kind',
  're-basing',
  'question-order',
  'field-dates',
] as const;
const item = z.enum(ITEMS, { error: 'This is not an item of comparability.' });

const comparability = z.strictObject({
  comparable: flag('comparable is true or false.'),
  differences: z.array(
    z.strictObject({
      item,
      current: z.string({ error: 'Enter a text.' }),
      earlier: z.string({ error: 'Enter a text.' }),
      isOverridable: flag('isOverridable is true or false.'),
    }),
  ),
  unknowns: z.array(item),
});

const overlap = z.strictObject({
  window: wholeFrom(1, WAVES).refine((waves) => waves <= MOST_WAVES, { error: WAVES }),
  shared: wholeFrom(0, 'The waves shared are a whole number of at least 0.'),
  interviews: z.array(people).optional(),
  shares: z.array(z.strictObject({ option, pct: z.array(pct) })).optional(),
});

const comparison = z.strictObject({
  base: questionBase,
  comparability: comparability.optional(),
  override: z.strictObject({ reason: text('An override needs its reason.') }).optional(),
  overlap: overlap.optional(),
  samePeople: flag('samePeople is true or false.').optional(),
  blocs: z.array(z.strictObject({ name: blocName, ...printed })).optional(),
});

const restOf = z.strictObject({
  restOfWeightPct: number.refine((value) => value > 0 && value < 100, {
    error: "A group's share of the sample lies between 0 and 100 percent.",
  }),
});

const subgroupQuestion = z.strictObject({
  question: text('A question needs its name.'),
  total: z.strictObject({ name: text('The whole sample needs a name.'), base }).optional(),
  groups: z.array(
    z.strictObject({
      name: text('A group needs its name.'),
      by: text('A group needs the characteristic it is one of.'),
      base,
    }),
  ),
  gaps: z.array(
    z.strictObject({
      option,
      group: z.string({ error: 'A gap needs the name of a group.' }),
      against: z.union([z.string(), restOf], {
        error: 'A gap is against another group or the rest of the sample.',
      }),
    }),
  ),
});

export const releaseDocumentSchema = z.strictObject(
  {
    policy: policy.optional(),
    release: questionBase,
    comparison: comparison.nullable().optional(),
    blocs: z.array(bloc).optional(),
    pairs: z.array(z.tuple([option, option], { error: 'A pair names two options.' })).optional(),
    netScores: z.array(z.strictObject({ approve: option, disapprove: option })).optional(),
    changes: z.array(option).optional(),
    thresholds: z
      .array(
        threshold.extend({
          countedBase: z
            .enum(THRESHOLD_BASES, { error: 'This is not a base that a rule counts.' })
            .optional(),
        }),
      )
      .optional(),
    subgroups: z.array(subgroupQuestion).optional(),
  },
  { error: (issue) => (issue.code === 'invalid_type' ? 'A release document is a JSON object.' : undefined) },
);
