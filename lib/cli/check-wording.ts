import { readFileSync } from 'node:fs';
import { z } from 'zod';
import { CheckRefused } from '@/lib/findings/check-refused';
import type { CheckDocument } from '@/lib/findings/check-types';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import { resolvePolicy } from '@/lib/findings/policy';
import { refusalOf } from '@/lib/findings/refusal-of';
import { readGivenRelease } from '@/lib/services/wording-check/given-release';
import { checkedReleaseOf } from '@/lib/wording/check/checked-release';
import { checkWording, MAX_TEXT } from '@/lib/wording/check/check-wording';
import { TEXT_PARTS, WORDING_LANGUAGES } from '@/lib/wording/check/types';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';

const STANDARD_INPUT = 0;
const REFUSED = 2;
const USAGE = 'Usage: npm run check:wording -- FILE (or - for standard input)\n';

const phrase = z.string().trim().min(1).max(80);
const perLanguage = <T extends z.ZodType>(list: T) =>
  z.partialRecord(z.enum(WORDING_LANGUAGES), z.array(list).max(200));

/** What of a house style the check reads; the rest is as the product ships it. */
const houseStyle = z
  .strictObject({
    percent: z.enum(['sign', 'word', 'per-cent']),
    numbers: z.enum(['figures', 'words-to-nine']),
    margins: z.enum(['whole', 'half', 'tenth']),
    onePollHeadlines: z.enum(['allow', 'warn', 'refuse']),
    banned: perLanguage(phrase),
    preferred: perLanguage(z.strictObject({ say: phrase, insteadOf: phrase })),
  })
  .partial();

const schema = z.strictObject(
  {
    text: z.string({ error: 'Give the text.' }).max(MAX_TEXT, 'At most 20,000 characters.'),
    language: z.enum(WORDING_LANGUAGES, 'The language is en, es, fr or de.').default('en'),
    part: z.enum(TEXT_PARTS, 'The part is whole, line, headline or spoken.').default('whole'),
    houseStyle: houseStyle.optional(),
    releases: z.array(z.unknown()).default([]),
    policy: z.unknown().optional(),
  },
  'The document is an object with text, language, part, houseStyle and releases.',
);

function main([file]: string[]): void {
  if (file === undefined) {
    process.stderr.write(USAGE);
    process.exitCode = 1;
    return;
  }
  const text = readText(file);
  if (text === null) return;
  try {
    print(marksOf(jsonOf(text)));
  } catch (error) {
    if (!(error instanceof CheckRefused)) throw error;
    print({ error: error.toRefusal() });
    process.exitCode = REFUSED;
  }
}

function marksOf(input: unknown) {
  const result = schema.safeParse(input);
  if (!result.success) throw refusalOf(result.error);
  const { text, language, part, releases, policy: given, houseStyle: own } = result.data;
  const policy = resolvePolicy(readPolicy(given));
  return checkWording({
    text,
    language,
    part,
    releases: releases.map((release, index) =>
      at(`releases[${index}]`, () => {
        const { facts, previous } = readGivenRelease(release, index);
        return checkedReleaseOf(facts, previous, policy);
      }),
    ),
    houseStyle: {
      ...DEFAULT_HOUSE_STYLE,
      ...own,
      banned: { ...DEFAULT_HOUSE_STYLE.banned, ...own?.banned },
      preferred: { ...DEFAULT_HOUSE_STYLE.preferred, ...own?.preferred },
    },
    policy,
  });
}

/** Read by the rules of a check document, on a release that no policy refuses. */
function readPolicy(policy: unknown): CheckDocument['policy'] {
  if (policy === undefined) return undefined;
  const release = {
    sampleSource: 'unknown',
    n: null,
    design: 'unweighted',
    decimals: 0,
    shares: [{ option: '-', pct: 0 }],
  };
  return parseCheckDocument({ policy, release }).policy;
}

function at<T>(place: string, read: () => T): T {
  try {
    return read();
  } catch (error) {
    if (!(error instanceof CheckRefused)) throw error;
    throw new CheckRefused(error.path === '' ? place : `${place}.${error.path}`, error.message);
  }
}

function readText(file: string): string | null {
  try {
    return readFileSync(file === '-' ? STANDARD_INPUT : file, 'utf8');
  } catch {
    process.stderr.write(`The file ${file} cannot be read.\n`);
    process.exitCode = 1;
    return null;
  }
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text.replace(/^\uFEFF/, ''));
  } catch {
    throw new CheckRefused('', 'The document is not JSON.');
  }
}

function print(value: unknown): void {
  process.stdout.write(`${JSON.stringify(value, null, 2)}\n`);
}

main(process.argv.slice(2));
