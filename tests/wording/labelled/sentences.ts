import { readFileSync } from 'node:fs';
import { z } from 'zod';
import { CONTEXTS, type ContextName } from './contexts';

/** What a phrase can be marked for. */
export const RULES = [
  'lead',
  'level',
  'change',
  'no-change',
  'majority',
  'plurality',
  'threshold',
  'forecast',
  'proof',
  'record',
  'figure',
  'date',
  'percent-points',
  'margin',
  'margin-basis',
  'not-comparable',
  'subgroup',
  'population',
  'missing',
  'by-eye',
  'significance',
] as const;

export const GRADES = ['wrong', 'not-supported', 'house-style', 'cannot-judge'] as const;

/** Languages that sentences are labelled in, whether or not the product speaks them yet. */
export const LANGUAGES = ['en', 'es', 'fr', 'de'] as const;

const contextNames = Object.keys(CONTEXTS) as [ContextName, ...ContextName[]];

const sentence = z.strictObject({
  id: z.string().regex(/^(en|es|fr|de)-\d{3}$/),
  language: z.enum(LANGUAGES),
  context: z.enum(contextNames),
  text: z.string().min(1),
  /** Every mark that the text must get; none where it must pass. */
  expect: z.array(
    z.strictObject({
      /** Occurs once in the text; empty only where the whole text is meant. */
      phrase: z.string(),
      rule: z.enum(RULES),
      grade: z.enum(GRADES),
      quoted: z.literal(true).optional(),
    }),
  ),
});

export type LabelledSentence = z.infer<typeof sentence>;

const correction = z.strictObject({ id: sentence.shape.id, expect: sentence.shape.expect });

export const FIRST = 'sentences-first.json';
export const MORE = 'sentences-more.json';
/** Spanish and French, frozen before the rules of those languages were written. */
export const ES_FR = 'sentences-es-fr.json';
/** English and German written after the English rules were tuned, and frozen before those who tune saw them again. */
export const FRESH_EN = 'sentences-fresh-en.json';
export const FRESH_DE = 'sentences-fresh-de.json';
/** Labels that were found wrong after their list was frozen, by id; the reasons stand in the README. */
export const CORRECTIONS = 'corrected-labels.json';

export const fileOf = (name: string) => new URL(`./${name}`, import.meta.url);

/** One list of labelled sentences as it was written, refused where its form is not as above. */
export function writtenIn(name: string): LabelledSentence[] {
  return z.array(sentence).parse(read(name));
}

/** One list of labelled sentences, with its corrected labels. */
export function sentencesOf(name: string): LabelledSentence[] {
  const corrected = new Map(correctionsOf().map(({ id, expect }) => [id, expect]));
  return writtenIn(name).map((one) => ({ ...one, expect: corrected.get(one.id) ?? one.expect }));
}

export const correctionsOf = () => z.array(correction).parse(read(CORRECTIONS));

const read = (name: string): unknown => JSON.parse(readFileSync(fileOf(name), 'utf8'));
