import * as z from 'zod';

/** The form of a check document: keys, kinds and the range of each single field. What joins fields comes after. */

const NUMBER = 'Enter a number.';
export const number = z.number({ error: NUMBER });

const level = number.refine((value) => value > 0.5 && value < 1, {
  error: 'A level lies between 0.5 and 1, such as 0.95.',
});
const deffValue = number.refine((value) => value >= 0.5 && value <= 10, {
  error: 'A design effect lies from 0.5 to 10.',
});
/** So that effective counts stay whole numbers that can be held exactly. */
const MOST_PEOPLE = 1e15;
/** Smaller ones would vanish when taken as a part of 1. */
const LEAST_PCT = 1e-12;

export const wholeFrom = (least: number, error: string) =>
  number.refine((value) => Number.isInteger(value) && value >= least, { error });

export const people = (error: string) =>
  wholeFrom(1, error).refine((value) => value <= MOST_PEOPLE, { error: 'No sample has so many people.' });

const statedInterval = z.strictObject({
  pp: number.refine((value) => value >= LEAST_PCT && value < 100, {
    error: 'A margin in points lies between 0 and 100.',
  }),
  unit: number.refine((value) => value > 0 && value <= 10, {
    error: 'The unit a margin is rounded to lies above 0 and not above 10 points.',
  }),
  level,
});

const deff = z.strictObject({
  source: z.enum(['design', 'kish', 'stated'], {
    error: 'A design effect comes from design, kish or stated.',
  }),
  value: deffValue,
  df: wholeFrom(1, 'Degrees of freedom are a whole number of at least 1.').optional(),
});

export const option = z.string({ error: 'An option needs its name.' });

const share = z.strictObject({
  option,
  pct: number
    .refine((value) => value >= 0 && value <= 100, { error: 'A share lies from 0 to 100 percent.' })
    .nullable(),
  answer: z.boolean({ error: 'answer is true or false.' }).optional(),
});

export const base = z.strictObject({
  sampleSource: z.enum(['probability', 'quota', 'opt-in', 'blended', 'unknown'], {
    error: 'The sample source is probability, quota, opt-in, blended or unknown.',
  }),
  n: people('The sample size is a whole number of at least 1.').nullable(),
  design: z.enum(['weighted', 'unweighted', 'clustered'], {
    error: 'The design is weighted, unweighted or clustered.',
  }),
  deff: deff.nullable().optional(),
  statedMargin: statedInterval.nullable().optional(),
  modelledInterval: statedInterval.nullable().optional(),
  decimals: number.refine((value) => Number.isInteger(value) && value >= 0 && value <= 6, {
    error: 'Decimals are a whole number from 0 to 6.',
  }),
  shares: z
    .array(share, { error: 'Shares are a list.' })
    .min(1, { error: 'A release needs at least one share.' }),
});

const range = z.tuple([number, number], { error: 'A range has a low and a high end.' });
const assumed = z.strictObject({ value: deffValue, range });

export const policy = z.strictObject({
  level: level.optional(),
  assumed: z
    .strictObject({
      weighted: assumed.optional(),
      clustered: assumed.optional(),
      unweighted: assumed.optional(),
    })
    .optional(),
  kishRange: range.optional(),
  comparisonBasis: z.boolean({ error: 'comparisonBasis is true or false.' }).optional(),
  indifferencePp: number
    .refine((value) => value > 0, { error: 'The margin of indifference lies above 0 points.' })
    .optional(),
  minimumNEff: number
    .refine((value) => value >= 1, { error: 'The smallest effective sample size is at least 1.' })
    .optional(),
});

export const threshold = z.strictObject({
  option,
  pct: number.refine((value) => value >= LEAST_PCT && value < 100, {
    error: 'A threshold lies between 0 and 100 percent.',
  }),
});

export const checkDocumentSchema = z.strictObject(
  {
    policy: policy.optional(),
    release: base,
    previous: base.nullable().optional(),
    pairs: z.array(z.tuple([option, option], { error: 'A pair names two options.' })).optional(),
    changes: z.array(option).optional(),
    thresholds: z.array(threshold).optional(),
  },
  { error: (issue) => (issue.code === 'invalid_type' ? 'A check document is a JSON object.' : undefined) },
);
