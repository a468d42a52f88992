import { checkWording } from '@/lib/wording/check/check-wording';
import { checkedReleaseOf } from '@/lib/wording/check/checked-release';
import { DEFAULT_POLICY } from '@/lib/findings/policy';
import type { CheckedRelease, WordingMark, WordingRule } from '@/lib/wording/check/types';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';
import { CONTEXTS, type Context, type ContextName } from '../labelled/contexts';
import { sentencesOf, type LabelledSentence } from '../labelled/sentences';

type Expected = LabelledSentence['expect'][number];

/** One sentence against the check: what was found of what its label asks, and what was marked besides. */
export type Measured = {
  sentence: LabelledSentence;
  missed: Expected[];
  found: Expected[];
  matched: WordingMark[];
  surplus: WordingMark[];
};

const known = new Map<ContextName, CheckedRelease[]>();

function releasesOf(name: ContextName): CheckedRelease[] {
  const made =
    known.get(name) ??
    contextOf(name).releases.map(({ facts, previous }) => checkedReleaseOf(facts, previous, DEFAULT_POLICY));
  known.set(name, made);
  return made;
}

const contextOf = (name: ContextName): Context => CONTEXTS[name];

/** Every labelled sentence of a list, read by the check; a mark counts where rule and grade agree and words overlap. */
export function measure(list: string): Measured[] {
  return sentencesOf(list).map((sentence) => {
    const { marks } = checkWording({
      text: sentence.text,
      language: sentence.language,
      releases: releasesOf(sentence.context),
      houseStyle: DEFAULT_HOUSE_STYLE,
      policy: DEFAULT_POLICY,
    });
    const fits = (mark: WordingMark, label: Expected) =>
      mark.rule === label.rule && mark.grade === label.grade && overlaps(mark, label, sentence.text);
    const found = sentence.expect.filter((label) => marks.some((mark) => fits(mark, label)));
    const matched = marks.filter((mark) => sentence.expect.some((label) => fits(mark, label)));
    return {
      sentence,
      found,
      missed: sentence.expect.filter((label) => !found.includes(label)),
      matched,
      surplus: marks.filter((mark) => !matched.includes(mark)),
    };
  });
}

function overlaps({ start, end }: WordingMark, { phrase }: Expected, text: string): boolean {
  if (phrase === '') return start === end;
  const at = text.indexOf(phrase);
  return start < at + phrase.length && at < end;
}

export type Score = { rule: string; labels: number; found: number; marks: number; right: number };

/** Labels found and marks that were right, by rule. */
export function scoresOf(measured: readonly Measured[], rules: readonly WordingRule[]): Score[] {
  return rules.map((rule) => {
    const of = (rows: readonly { rule: string }[]) => rows.filter((one) => one.rule === rule).length;
    const sum = (pick: (one: Measured) => readonly { rule: string }[]) =>
      measured.reduce((total, one) => total + of(pick(one)), 0);
    const right = sum(({ matched }) => matched);
    return {
      rule,
      labels: sum(({ sentence }) => sentence.expect),
      found: sum(({ found }) => found),
      marks: right + sum(({ surplus }) => surplus),
      right,
    };
  });
}
