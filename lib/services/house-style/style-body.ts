import 'server-only';
import { z } from 'zod';
import { type DeskPolicy, deskPolicySchema, NOT_RANDOM } from '@/lib/domain/house-style';
import { LANGUAGES } from '@/lib/domain/vocabulary';
import { DEFAULT_POLICY } from '@/lib/findings/policy';
import { DEFAULT_HOUSE_STYLE, type HouseStyle } from '@/lib/wording/house-style';
import { completed } from './leaves';

/** House style and policy: what is decided, agreed to and put in force together. */
export type StyleBody = { style: HouseStyle; policy: DeskPolicy };

export const DEFAULT_DESK_POLICY: DeskPolicy = deskPolicySchema.parse({
  ...DEFAULT_POLICY,
  comparisonBasis: basisFor(DEFAULT_POLICY.comparisonBasis),
});

/** A stored house style; what later versions of the product added is filled in as they ship it. */
export function readStyle(stored: string): HouseStyle {
  const body = JSON.parse(stored) as Record<string, unknown>;
  const [banned, preferred] = [body.banned, body.preferred].map(perLanguage);
  return completed(DEFAULT_HOUSE_STYLE, { ...body, banned, preferred });
}

/** Older styles have one list of phrases, held against every language. */
function perLanguage(phrases: unknown): unknown {
  if (!Array.isArray(phrases)) return phrases;
  return Object.fromEntries(LANGUAGES.map((language) => [language, phrases]));
}

/** A stored policy; older ones have one comparison basis for every kind of sample. */
export function readPolicy(stored: string): DeskPolicy {
  const body = JSON.parse(stored) as Record<string, unknown>;
  const { comparisonBasis } = body;
  const basis = typeof comparisonBasis === 'boolean' ? basisFor(comparisonBasis) : comparisonBasis;
  return completed(DEFAULT_DESK_POLICY, { ...body, comparisonBasis: basis });
}

function basisFor(isOn: boolean): DeskPolicy['comparisonBasis'] {
  return { quota: isOn, 'opt-in': isOn, blended: isOn, unknown: isOn };
}

const LOCALES = /^[a-z]{2}(?:-[A-Z]{2})?$/;
const phrase = z.string().trim().min(1, 'Say which phrase.').max(80, 'At most 80 characters.');
const phrases = z.array(phrase).max(200, 'At most 200 phrases.');
const preferred = z
  .array(z.strictObject({ say: phrase, insteadOf: phrase }))
  .max(200, 'At most 200 phrases.');
const rung = z.array(phrase).min(1, 'Every verdict needs a verb.').max(40, 'At most 40 verbs.');
const sentence = z
  .string()
  .trim()
  .min(1, 'A sentence cannot be empty.')
  .max(6000, 'At most 6,000 characters.');

/** One decision of a house style each; messages are looked at as sentences beside this. */
export const STYLE_FIELDS: Record<string, z.ZodType> = {
  'style.newsroom': z
    .string()
    .trim()
    .min(1, 'Say how the desk calls itself.')
    .max(80, 'At most 80 characters.'),
  'style.comparisonRule': z.string().trim().min(1, 'Name the rule.').max(200, 'At most 200 characters.'),
  ...Object.fromEntries(
    NOT_RANDOM.map((kind) => [
      `style.comparisonRules.${kind}`,
      z.string().trim().max(200, 'At most 200 characters.'),
    ]),
  ),
  'style.percent': z.enum(['sign', 'word', 'per-cent']),
  'style.numbers': z.enum(['figures', 'words-to-nine']),
  'style.margins': z.enum(['whole', 'half', 'tenth']),
  ...Object.fromEntries(
    LANGUAGES.map((language) => [
      `style.locales.${language}`,
      z
        .string()
        .regex(LOCALES, 'A language with its country, such as en-GB.')
        .refine((locale) => locale.startsWith(language), 'Of the same language.'),
    ]),
  ),
  ...Object.fromEntries(
    (['holds', 'fragile', 'does-not-hold', 'cannot-be-tested'] as const).map((verdict) => [
      `style.ladder.${verdict}`,
      rung,
    ]),
  ),
  ...Object.fromEntries(
    LANGUAGES.flatMap((language) => [
      [`style.banned.${language}`, phrases],
      [`style.preferred.${language}`, preferred],
    ]),
  ),
  'style.twiceTheMargin': z.boolean(),
  'style.onePollHeadlines': z.enum(['allow', 'warn', 'refuse']),
  'style.asPrintedNight': z.boolean(),
  'style.shelfLifeDays': z.number().int('Whole days.').min(1, 'At least a day.').max(3650).nullable(),
};

export const SENTENCE = sentence;
