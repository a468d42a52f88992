import { describe, expect, it } from 'vitest';
import { lexiconOf } from '@/lib/wording/check/lexicon/compiled';
import { WORDING_LANGUAGES, WORDING_RULES } from '@/lib/wording/check/types';
import { FIRST, FRESH_DE, FRESH_EN, MORE } from '../labelled/sentences';
import { measure, scoresOf, type Measured, type Score } from './measure';

const UNSUPPORTED = ['wrong', 'not-supported'];
const all = [FIRST, MORE, FRESH_EN, FRESH_DE].flatMap(measure);
const languages = WORDING_LANGUAGES.filter((language) => lexiconOf(language) !== null);
const of = (language: string) => all.filter(({ sentence }) => sentence.language === language);

const share = (part: number, whole: number) => (whole === 0 ? '–' : (part / whole).toFixed(3));
const row = ({ rule, labels, found, marks, right }: Score) =>
  `${rule.padEnd(16)} recall ${share(found, labels)} of ${labels}`.padEnd(42) +
  `precision ${share(right, marks)} of ${marks}`;

function total(scores: readonly Score[]): Score {
  const sum = (key: 'labels' | 'found' | 'marks' | 'right') =>
    scores.reduce((so, score) => so + score[key], 0);
  return {
    rule: 'all',
    labels: sum('labels'),
    found: sum('found'),
    marks: sum('marks'),
    right: sum('right'),
  };
}

function recallOf(
  measured: readonly Measured[],
  rules: readonly string[],
  grades: readonly string[],
): number {
  const counts = (one: { rule: string; grade: string }) =>
    rules.includes(one.rule) && grades.includes(one.grade);
  const labels = measured.flatMap(({ sentence }) => sentence.expect.filter(counts)).length;
  return measured.flatMap(({ found }) => found.filter(counts)).length / labels;
}

describe.each(languages)('the wording check on the labelled sentences in %s', (language) => {
  const scores = scoresOf(of(language), WORDING_RULES);
  process.stdout.write(
    [`labelled sentences, ${language}`, ...scores.map(row), row(total(scores)), ''].join('\n'),
  );

  it.each(['lead', 'change'])('finds 95 in 100 unsupported words of every kind: %s', (rule) => {
    expect(recallOf(of(language), [rule], UNSUPPORTED)).toBeGreaterThanOrEqual(0.95);
  });

  it('finds nine in ten of all that is labelled', () => {
    const { found, labels } = total(scores);
    expect(found / labels).toBeGreaterThanOrEqual(0.9);
  });

  it('is right in nine of ten marks', () => {
    const { right, marks } = total(scores);
    expect(right / marks).toBeGreaterThanOrEqual(0.9);
  });

  it.each(WORDING_RULES)('finds four in five of the rule %s', (rule) => {
    const score = scores.find((one) => one.rule === rule);
    expect((score?.found ?? 0) / (score?.labels ?? 1)).toBeGreaterThanOrEqual(0.8);
  });
});
