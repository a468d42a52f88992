import * as z from 'zod';
import { type Disclosed, given, NOT_DISCLOSED, NOT_ENTERED } from './disclosed';
import { plainName } from './plain-name';
import { readPrintedNumber } from './printed-number';
import type { StatedMargin } from './release-facts';
import {
  DEFF_SOURCES,
  DESIGNS,
  MODES,
  POPULATIONS,
  RACE_KINDS,
  SAMPLE_SOURCES,
  THRESHOLD_BASES,
} from './vocabulary';

const MAX_OPTIONS = 30;

const line = (what: string, max = 160) =>
  z.string({ error: what }).overwrite(plainName).min(1, what).max(max, `At most ${max} characters.`);

const isDay = (text: string) => {
  const date = new Date(`${text}T00:00:00Z`);
  return !Number.isNaN(date.getTime()) && date.toISOString().startsWith(text);
};
const day = (what: string) =>
  z
    .string({ error: what })
    .regex(/^\d{4}-\d{2}-\d{2}$/, what)
    .refine(isDay, 'There is no such day.');

/**
 * A form field that a pollster can withhold: what was typed, and the mark "not disclosed", which wins.
 * Blank and unmarked is "not entered".
 */
function disclosed<T>(read: (text: string) => T | { problem: string }, max = 200) {
  return z
    .strictObject({
      notDisclosed: z.boolean(),
      value: z.string().max(max, `At most ${max} characters.`),
    })
    .transform((field, ctx): Disclosed<T> => {
      if (field.notDisclosed) return NOT_DISCLOSED;
      const text = field.value.trim();
      if (text === '') return NOT_ENTERED;
      const value = read(text);
      if (isProblem(value)) {
        ctx.addIssue({ code: 'custom', path: ['value'], message: value.problem });
        return z.NEVER;
      }
      return given(value);
    });
}

const isProblem = (value: unknown): value is { problem: string } =>
  typeof value === 'object' && value !== null && 'problem' in value;

function oneOf<T extends string>(list: readonly T[]) {
  return (text: string) => list.find((entry) => entry === text) ?? { problem: 'Choose one from the list.' };
}

/** Nothing is left of a text of invisible characters alone. */
const readName = (text: string) => plainName(text) || { problem: 'Type it, or leave this empty.' };

function readCount(text: string) {
  const plain = text.replace(/[\s,.’'](?=\d{3}\b)/g, '');
  const count = /^\d{1,9}$/.test(plain) ? Number(plain) : 0;
  return count >= 1 ? count : { problem: 'The sample size is a whole number of people, such as 1,012.' };
}

function readHttpUrl(text: string) {
  try {
    const url = new URL(text);
    if (url.protocol === 'http:' || url.protocol === 'https:') return url.href;
  } catch {
    // Answered below.
  }
  return { problem: 'A link starts with https:// or http://.' };
}

/** A decimal as typed, with comma or point; null where it is none. */
export function readDecimal(text: string): number | null {
  const printed = readPrintedNumber(text.replace(/^±\s*/, ''));
  return printed && printed.units / 10 ** printed.decimals;
}

const typedInterval = z.strictObject({
  pp: z.string().max(20),
  unit: z.string().max(20),
  level: z.string().max(20),
});

function readInterval(
  field: z.infer<typeof typedInterval>,
  fail: (key: 'pp' | 'unit' | 'level', message: string) => void,
): StatedMargin | null {
  const pp = readDecimal(field.pp);
  const unit = readDecimal(field.unit);
  const level = readDecimal(field.level);
  if (pp === null || pp <= 0 || pp >= 100) fail('pp', 'Type the margin in points as printed, such as 3.7.');
  else if (unit === null || unit <= 0 || unit > 10) fail('unit', 'To what is it rounded: 0.1, 0.5 or 1?');
  else if (level === null || level <= 50 || level >= 100)
    fail('level', 'A level is above 50 and below 100%.');
  else return { pp, unit, level: level / 100 };
  return null;
}

const statedMargin = z
  .strictObject({ notDisclosed: z.boolean(), ...typedInterval.shape })
  .transform((field, ctx): Disclosed<StatedMargin> => {
    if (field.notDisclosed) return NOT_DISCLOSED;
    if (field.pp.trim() === '') return NOT_ENTERED;
    const { pp, unit, level } = field;
    const value = readInterval({ pp, unit, level }, (key, message) =>
      ctx.addIssue({ code: 'custom', path: [key], message }),
    );
    return value ? given(value) : z.NEVER;
  });

const modelledInterval = typedInterval.transform((field, ctx): StatedMargin | null => {
  if (field.pp.trim() === '') return null;
  const value = readInterval(field, (key, message) => ctx.addIssue({ code: 'custom', path: [key], message }));
  return value ?? z.NEVER;
});

const deff = z
  .strictObject({
    source: z.enum(['', ...DEFF_SOURCES]),
    value: z.string().max(20),
    df: z.string().max(20),
  })
  .transform((field, ctx) => {
    if (field.source === '') return null;
    const value = readDecimal(field.value);
    if (value === null || value < 0.5 || value > 10) {
      const message = 'A design effect lies between 0.5 and 10.';
      ctx.addIssue({ code: 'custom', path: ['value'], message });
      return z.NEVER;
    }
    if (field.df.trim() === '' || field.source !== 'design') return { source: field.source, value, df: null };
    const df = Number(field.df.trim());
    if (!Number.isInteger(df) || df < 1) {
      const message = 'Degrees of freedom are a whole number, 1 or more.';
      ctx.addIssue({ code: 'custom', path: ['df'], message });
      return z.NEVER;
    }
    return { source: field.source, value, df };
  });

const share = z
  .strictObject({
    option: line('Name the option.', 120),
    printed: z.string().max(20),
    notDisclosed: z.boolean(),
    isAnswer: z.boolean(),
  })
  .transform((field, ctx) => {
    if (field.notDisclosed) return { option: field.option, printed: null, isAnswer: field.isAnswer };
    const printed = readPrintedNumber(field.printed);
    if (!printed || printed.units > 100 * 10 ** printed.decimals) {
      const message =
        field.printed.trim() === ''
          ? 'Type the share as printed, or mark it as not disclosed.'
          : 'A share is a number from 0 to 100, as printed.';
      // The name goes on, so that one which stands there twice is told in the same round.
      ctx.addIssue({ code: 'custom', path: ['printed'], message });
    }
    return { option: field.option, printed, isAnswer: field.isAnswer };
  });

const threshold = z
  .strictObject({
    option: line('Name the option that the rule is about.', 120),
    pct: z.string().max(20),
    base: z.enum(THRESHOLD_BASES),
  })
  .transform((field, ctx) => {
    const pct = readDecimal(field.pct);
    if (pct !== null && pct > 0 && pct < 100) return { option: field.option, pct, base: field.base };
    ctx.addIssue({ code: 'custom', path: ['pct'], message: 'A threshold lies above 0 and below 100%.' });
    return { option: field.option, pct: 0, base: field.base };
  });

// Names are looked at together with faults elsewhere, not only once those are mended.
const named = z.array(z.looseObject({ option: z.string() }));
const ofRace = z.looseObject({ options: z.array(z.string()), thresholds: named });
const ofRelease = z.looseObject({ shares: named });

export const newRaceInput = z
  .strictObject({
    name: line('Name the race.', 120),
    kind: z.enum(RACE_KINDS),
    options: z
      .array(line('Name the option.', 120))
      .min(1, 'Name the answer options, one a line.')
      .max(MAX_OPTIONS, `At most ${MAX_OPTIONS} options.`),
    thresholds: z.array(threshold).max(10, 'At most ten thresholds.'),
  })
  .superRefine(
    (race, ctx) => {
      refuseRepeats(race.options, (index) => ['options', index], ctx);
      for (const [index, { option }] of race.thresholds.entries())
        if (option !== '' && !race.options.includes(option))
          ctx.addIssue({
            code: 'custom',
            path: ['thresholds', index, 'option'],
            message: 'A threshold is about one of the options above.',
          });
    },
    { when: ({ value }) => ofRace.safeParse(value).success },
  );

function refuseRepeats(names: string[], path: (index: number) => (string | number)[], ctx: z.RefinementCtx) {
  const seen = new Set<string>();
  for (const [index, name] of names.entries()) {
    const plain = name.normalize('NFC').toLowerCase();
    if (plain !== '' && seen.has(plain))
      ctx.addIssue({ code: 'custom', path: path(index), message: 'This option stands here twice.' });
    seen.add(plain);
  }
}

const days = z.object({
  fieldStartOn: day('When did interviewing begin?'),
  fieldEndOn: day('When did interviewing end?'),
  publishedOn: day('When was or will it be published?'),
});

function refuseDisorder(
  { fieldStartOn, fieldEndOn, publishedOn }: z.infer<typeof days>,
  ctx: z.RefinementCtx,
) {
  const refuse = (path: string, message: string) => ctx.addIssue({ code: 'custom', path: [path], message });
  if (fieldEndOn < fieldStartOn) refuse('fieldEndOn', 'Interviewing cannot end before it began.');
  else if (publishedOn < fieldEndOn)
    refuse('publishedOn', 'A release cannot come out before its interviews ended.');
}

/** What the release form sends, and what services accept: strings as typed, parsed here on both sides. */
export const releaseInput = z
  .strictObject({
    race: z.discriminatedUnion('kind', [
      z.strictObject({ kind: z.literal('existing'), id: line('Choose a race.', 64) }),
      z.strictObject({ kind: z.literal('new'), race: newRaceInput }),
    ]),
    pollster: line('Who did the fieldwork?', 120),
    sponsor: disclosed(readName, 120),
    population: disclosed(oneOf(POPULATIONS)),
    sampleSource: z.enum(SAMPLE_SOURCES, { error: 'Choose how people came into the sample.' }),
    mode: disclosed(oneOf(MODES)),
    design: z.enum(DESIGNS, { error: 'Choose how the sample was weighted.' }),
    ...days.shape,
    embargo: z
      .strictObject({
        local: z
          .string()
          .regex(/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}(:\d{2})?$/, 'Type date and time of the embargo.'),
        zone: line('Choose the time zone of the embargo.', 64),
      })
      .nullable(),
    n: disclosed(readCount),
    deff,
    statedMargin,
    modelledInterval,
    wording: disclosed(readName, 2000),
    sameQuestion: z.boolean(),
    shares: z
      .array(share)
      .min(1, 'Type at least one option with its share.')
      .max(MAX_OPTIONS, `At most ${MAX_OPTIONS} options.`),
    sourceUrl: disclosed(readHttpUrl, 2000),
    methodNote: z.string().max(20_000, 'At most 20,000 characters.'),
  })
  .superRefine(
    (release, ctx) => {
      refuseRepeats(
        release.shares.map((entry) => entry.option),
        (index) => ['shares', index, 'option'],
        ctx,
      );
    },
    { when: ({ value }) => ofRelease.safeParse(value).success },
  )
  // Told together with faults elsewhere, not only once those are mended.
  .superRefine(refuseDisorder, { when: ({ value }) => days.safeParse(value).success });

export type ReleaseFormValues = z.input<typeof releaseInput>;
export type ReleaseInput = z.output<typeof releaseInput>;
