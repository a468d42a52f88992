import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { LINE_KIND_NAMES } from '@/lib/domain/sheet';
import type { DraftInput } from '@/lib/wording/draft-input';
import { draftSheet } from '@/lib/wording/draft-sheet';
import { explain } from '@/lib/wording/why';
import { claimsAbove } from '@/lib/wording/never-says-more';
import { GOLDEN_CASES } from './golden-cases';

const fileOf = (name: string) => new URL(`./golden/${name}.txt`, import.meta.url);

/** A sheet as a copy editor reads it; each of these files has been read, and is changed by hand or not at all. */
function readable(input: DraftInput): string {
  const { finding } = input;
  const reasons = finding.reasons.length > 0 ? ` (${finding.reasons.join(', ')})` : '';
  const lines = draftSheet(input).map(({ kind, text }) => `${LINE_KIND_NAMES[kind]}\n${text}\n`);
  const staff = [`Why, for staff\n${explain(finding, input.answer).join(' ')}\n`];
  return [`Verdict: ${finding.verdict}${reasons}\n`, ...lines, ...staff].join('\n');
}

describe('a drafted sheet', () => {
  it.each(Object.entries(GOLDEN_CASES))('reads as the desk agreed: %s', (name, input) => {
    expect(readable(input)).toBe(readFileSync(fileOf(name), 'utf8'));
  });

  it.each(Object.entries(GOLDEN_CASES))('says no more than its verdict: %s', (_, input) => {
    const { verdict } = input.finding;
    expect(draftSheet(input).flatMap(({ text }) => claimsAbove(verdict, text))).toEqual([]);
  });
});
