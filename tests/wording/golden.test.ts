import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { LINE_KIND_NAMES, LINE_KINDS } from '@/lib/domain/sheet';
import { carries } from '@/lib/wording/carries';
import type { DraftInput } from '@/lib/wording/draft-input';
import { draftLine } from '@/lib/wording/draft-sheet';
import { explain } from '@/lib/wording/why';
import { claimsAbove } from '@/lib/wording/never-says-more';
import { GOLDEN_CASES } from './golden-cases';
import { JUDGED_CASES } from './judged-cases';

const fileOf = (name: string) => new URL(`./golden/${name}.txt`, import.meta.url);

const CASES = Object.entries({ ...GOLDEN_CASES, ...JUDGED_CASES });

function linesOf(input: DraftInput) {
  const kinds = LINE_KINDS.filter((kind) => kind !== 'correction-notice' && carries(kind, input.claim.kind));
  return kinds.map((kind) => ({ kind, text: draftLine(input, kind) }));
}

/** A sheet as a copy editor reads it; each of these files has been read, and is changed by hand or not at all. */
function readable(input: DraftInput): string {
  const { finding } = input;
  const reasons = finding.reasons.length > 0 ? ` (${finding.reasons.join(', ')})` : '';
  const lines = linesOf(input).map(({ kind, text }) => `${LINE_KIND_NAMES[kind]}\n${text}\n`);
  const staff = [`Why, for staff\n${explain(finding, input.answer).join(' ')}\n`];
  return [`Verdict: ${finding.verdict}${reasons}\n`, ...lines, ...staff].join('\n');
}

describe('a drafted sheet', () => {
  it.each(CASES)('reads as the desk agreed: %s', (name, input) => {
    expect(readable(input)).toBe(readFileSync(fileOf(name), 'utf8'));
  });

  it.each(CASES)('says no more than its verdict: %s', (_, input) => {
    const { verdict } = input.finding;
    expect(linesOf(input).flatMap(({ text }) => claimsAbove(verdict, text))).toEqual([]);
  });
});
