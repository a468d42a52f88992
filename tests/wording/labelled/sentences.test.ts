import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { CONTEXTS } from './contexts';
import {
  correctionsOf,
  ES_FR,
  GRADES,
  fileOf,
  FIRST,
  FRESH_DE,
  FRESH_EN,
  LANGUAGES,
  MORE,
  RULES,
  sentencesOf,
  writtenIn,
  type LabelledSentence,
} from './sentences';

const LISTS = [FIRST, MORE, ES_FR, FRESH_EN, FRESH_DE].map((name) => ({
  name,
  sentences: sentencesOf(name),
}));
const all = LISTS.flatMap(({ sentences }) => sentences);
const idsOf = (sentences: LabelledSentence[]) => sentences.map(({ id }) => id);
const timesIn = (text: string, phrase: string) => text.split(phrase).length - 1;

describe('the labelled sentences', () => {
  it('have ids and texts of their own', () => {
    expect(new Set(idsOf(all)).size).toBe(all.length);
    expect(new Set(all.map(({ language, text }) => `${language} ${text}`)).size).toBe(all.length);
  });

  it('name phrases that stand in their text once, or the whole text for what is missing', () => {
    const misplaced = all.filter(({ text, expect: marks }) =>
      marks.some(({ phrase, rule }) =>
        phrase === '' ? rule !== 'missing' : rule === 'missing' || timesIn(text, phrase) !== 1,
      ),
    );
    expect(idsOf(misplaced)).toEqual([]);
  });

  it('never grade what somebody else is quoted with above cannot-judge', () => {
    const graded = all.filter((one) =>
      one.expect.some((mark) => mark.quoted && mark.grade !== 'cannot-judge'),
    );
    expect(idsOf(graded)).toEqual([]);
  });

  it.each(LISTS)('let at least two in five pass: $name', ({ sentences }) => {
    const passing = sentences.filter((one) => one.expect.length === 0);
    expect(passing.length / sentences.length).toBeGreaterThanOrEqual(0.4);
  });

  it.each(LANGUAGES)('let at least two in five pass in each language: %s', (language) => {
    const inLanguage = all.filter((one) => one.language === language);
    const passing = inLanguage.filter((one) => one.expect.length === 0);
    expect(passing.length / inLanguage.length).toBeGreaterThanOrEqual(0.4);
  });

  it.each([
    ['en', 300],
    ['es', 40],
    ['fr', 40],
    ['de', 40],
  ] as const)('are enough to measure by: %s', (language, least) => {
    expect(all.filter((one) => one.language === language).length).toBeGreaterThanOrEqual(least);
  });

  it.each(RULES)('ask for every rule at least eight times in English: %s', (rule) => {
    const marks = all.filter((one) => one.language === 'en').flatMap((one) => one.expect);
    expect(marks.filter((mark) => mark.rule === rule).length).toBeGreaterThanOrEqual(8);
  });

  it('ask for every grade, and for marks in quotations', () => {
    const marks = all.flatMap((one) => one.expect);
    expect(new Set(marks.map(({ grade }) => grade))).toEqual(new Set(GRADES));
    expect(marks.filter(({ quoted }) => quoted).length).toBeGreaterThanOrEqual(8);
  });

  it('use every context', () => {
    const used = new Set<string>(all.map(({ context }) => context));
    expect(Object.keys(CONTEXTS).filter((name) => !used.has(name))).toEqual([]);
  });

  it('are at least 170 in the list that was written before the rules', () => {
    expect(sentencesOf(FIRST).length).toBeGreaterThanOrEqual(170);
  });

  it.each([FIRST, ES_FR, FRESH_EN, FRESH_DE])('were frozen before the rules were tuned: %s', (name) => {
    const hash = createHash('sha256')
      .update(readFileSync(fileOf(name)))
      .digest('hex');
    const stored = readFileSync(fileOf(name.replace('.json', '.sha256')), 'utf8');
    expect(stored).toBe(`${hash}  ${name}\n`);
  });

  it('have corrected labels only where a sentence has that id and had another label', () => {
    const written = new Map(LISTS.flatMap(({ name }) => writtenIn(name)).map((one) => [one.id, one.expect]));
    const idle = correctionsOf().filter(({ id, expect: marks }) => {
      const before = written.get(id);
      return !before || JSON.stringify(before) === JSON.stringify(marks);
    });
    expect(idle).toEqual([]);
  });
});
