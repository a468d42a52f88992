import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { check } from '@/lib/findings/check';
import type { CheckDocument } from '@/lib/findings/check-types';
import { working, type WorkingStep } from '@/lib/findings/working';
import cases from '../reference/findings/cases.json';
import { judge } from './release-documents';
import { CHECKED_FINDINGS, JUDGED_DOCUMENTS, JUDGED_FINDINGS } from './working-cases';

/** A step as one reads it aloud: what it is, how it is found, with the numbers in it, what comes out. */
function lineOf({ label, formula, substituted, result, unit }: WorkingStep): string {
  return `${label}: ${formula} | ${substituted} = ${result}${unit === '' ? '' : ` ${unit}`}`;
}

const written = (name: string, steps: readonly WorkingStep[]) =>
  [`# ${name}`, ...steps.map(lineOf), ''].join('\n');

const fileOf = (name: string) => readFileSync(new URL(`./workings/${name}.txt`, import.meta.url), 'utf8');

/** Each of these files has been read against the rules, and is changed by hand or not at all. */
describe('a worked calculation', () => {
  test.each(Object.entries(CHECKED_FINDINGS))('of a checked release reads as agreed: %s', (name, indices) => {
    const document = cases.find(({ id }) => id === name)!.input as unknown as CheckDocument;
    const answer = check(document);
    const texts = indices.map((index) => {
      const finding = answer.findings[index]!;
      const about = Object.entries(finding).flatMap(([key, value]) =>
        NAMES.has(key) ? [String(value)] : [],
      );
      return written(about.join(' '), working(document, answer, index));
    });
    expect(texts.join('\n')).toBe(fileOf(name));
  });

  test.each(Object.entries(JUDGED_DOCUMENTS))('of a judged release reads as agreed: %s', (name, document) => {
    const keys = JUDGED_FINDINGS[name as keyof typeof JUDGED_DOCUMENTS];
    const { findings } = judge(document);
    const texts = keys.map((key) => written(key, findings.find((one) => one.key === key)!.working));
    expect(texts.join('\n')).toBe(fileOf(name));
  });
});

const NAMES = new Set(['kind', 'option', 'pair', 'pct', 'verdict']);
