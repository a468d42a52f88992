import { formatPercent, roundHalfUp } from '@/lib/format/number';
import type { Lexicon, Replacement } from './lexicon/types';
import type { Hit } from './phrases';
import type { Reading } from './reading';
import type { WordingGrade, WordingMark, WordingRule } from './types';

export type Judged = {
  rule: WordingRule;
  grade: WordingGrade;
  message: string;
  release?: number | null;
  claim?: string | null;
  replacement?: string | null;
};

/** A mark on token places. Words inside quotation marks are somebody else's: said, not graded. */
export function markAt(reading: Reading, { from, to: own, tail }: Hit, judged: Judged): WordingMark {
  const to = tail ?? own;
  const { folded, tokens, input } = reading;
  const start = folded.starts[tokens[from]?.from ?? 0] ?? 0;
  const end = folded.ends[(tokens[to - 1]?.to ?? 1) - 1] ?? start;
  const quoted = reading.quotations.some((span) => span.start <= start && end <= span.end);
  return {
    start,
    end,
    phrase: input.text.slice(start, end),
    rule: judged.rule,
    grade: quoted ? 'cannot-judge' : judged.grade,
    quoted,
    release: judged.release ?? null,
    claim: judged.claim ?? null,
    message: quoted ? `Quoted words, not judged. In our own words: ${judged.message}` : judged.message,
    // Between the two parts of a verb stand words that a replacement would lose.
    replacement: quoted || tail !== undefined ? null : (judged.replacement ?? null),
  };
}

/** Supported words of the language, with names and figures filled in; null where it has none. */
export function replacementOf(
  { replacements }: Lexicon,
  key: Replacement,
  slots: Readonly<Record<string, string>> = {},
): string | null {
  const text = replacements[key];
  if (text === null) return null;
  const filled = text.replace(/\{(\w+)\}/g, (hole, name: string) => slots[name] ?? hole);
  return filled.includes('{') ? null : filled;
}

/** A percentage as the language prints it, with no more decimals than it has. */
export function percentText({ locale }: Lexicon, pct: number, decimals?: number): string {
  const own = String(roundHalfUp(pct, 2)).split('.')[1]?.length ?? 0;
  return formatPercent(pct, decimals ?? own, locale);
}

const WEIGHT: readonly WordingGrade[] = ['wrong', 'not-supported', 'house-style', 'cannot-judge'];

/** In the order of the text; where one rule marks overlapping words, its gravest mark stays. */
export function settleMarks(marks: readonly WordingMark[]): WordingMark[] {
  const weighed = [...marks].sort(
    (a, b) => WEIGHT.indexOf(a.grade) - WEIGHT.indexOf(b.grade) || b.end - b.start - (a.end - a.start),
  );
  const kept: WordingMark[] = [];
  for (const mark of weighed) {
    const overlaps = kept.some(
      (one) => one.rule === mark.rule && one.start < mark.end && mark.start < one.end,
    );
    if (!overlaps) kept.push(mark);
  }
  return kept.sort((a, b) => a.start - b.start || a.end - b.end);
}
