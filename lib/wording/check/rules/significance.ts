import { markAt, replacementOf, type Judged } from '../marks';
import { objectOf, subjectOf } from '../parties';
import type { Hit } from '../phrases';
import type { Reading } from '../reading';
import { scopeOf } from '../scope';
import type { WordingMark } from '../types';
import { changeOf, leadChangeOf, leadOf, rankedOptions, type Claimed } from '../verdicts';
import { releasesFor } from '../which-release';
import { isAboutPoll, isAboutSubgroup } from './about';

type Said = Hit & { kind: 'statistical' | 'plain' | 'clear' };

/**
 * Significance is for what a test found so, and the plain word says more than the test: AP Stylebook polls chapter as
 * quoted publicly; Gelman and Stern, The American Statistician 60 (2006) 328–331; both from memory.
 */
export function markSignificance(reading: Reading): WordingMark[] {
  const said: Said[] = [
    ...reading.cues('statSignificant').map((hit): Said => ({ ...hit, kind: 'statistical' })),
    ...reading
      .cues('significant')
      .filter((hit) => !reading.has('statSignificant', hit))
      .map((hit): Said => ({ ...hit, kind: 'plain' })),
    ...reading.cues('clear').map((hit): Said => ({ ...hit, kind: 'clear' })),
  ];
  return said
    .filter(
      (hit) =>
        isAboutPoll(reading, hit) && !isAboutSubgroup(reading, hit) && reading.input.releases.length > 0,
    )
    .flatMap((hit) => {
      const found = claimAround(reading, hit);
      const scope = scopeOf(reading, hit);
      if (!found || scope === 'open') return [];
      const judged = scope === 'denied' ? judgeDenied(found, hit) : judge(reading, found, hit);
      return judged ? [markAt(reading, hit, judged)] : [];
    });
}

/** What the sentence calls significant: a change where it speaks of one and there is an earlier release, else a lead. */
function claimAround(reading: Reading, hit: Hit): Claimed | null {
  const { releases } = reading.input;
  const subject = subjectOf(reading, hit);
  const option = subject && subject !== 'unknown' ? subject.option : null;
  const [release] = releasesFor(reading, hit, option ? [option] : []);
  if (release === undefined) return null;
  const sentence = reading.sentenceAt(hit.from);
  const ranked = rankedOptions(releases[release]!);
  const other = option ? objectOf(reading, hit, option) : null;
  const a = option ?? ranked[0];
  const b = (other && other !== 'unknown' ? other.option : null) ?? ranked.find((one) => one !== a);
  const isMoving =
    ['up', 'down', 'dramatic'].some((group) => reading.has(group as 'up', sentence)) ||
    reading.has('changeNouns', sentence);
  if (isMoving && releases[release]?.previous) {
    return option
      ? changeOf(releases, release, option)
      : a && b
        ? leadChangeOf(releases, release, a, b)
        : null;
  }
  return a && b ? leadOf(releases, release, a, b) : null;
}

function judge(reading: Reading, found: Claimed, { kind }: Said): Judged | null {
  const { words } = reading.lexicon;
  const base = { rule: 'significance' as const, release: found.release, claim: found.claim };
  if (found.verdict === 'holds') {
    if (kind === 'clear') return null;
    const replacement = replacementOf(words, 'largerThanChance');
    return {
      ...base,
      grade: 'house-style',
      message: 'Say it plainly: larger than chance alone would usually produce.',
      replacement,
    };
  }
  const replacement = kind === 'clear' ? null : replacementOf(words, 'couldBeChance');
  if (found.verdict === 'fragile')
    return {
      ...base,
      grade: 'not-supported',
      message: 'The poll cannot settle this: not significant without a doubt.',
      replacement: null,
    };
  const grade = kind === 'statistical' ? 'wrong' : 'not-supported';
  return { ...base, grade, message: 'No test of these figures found this.', replacement };
}

function judgeDenied(found: Claimed, { kind }: Said): Judged | null {
  if (found.verdict !== 'holds' || kind === 'clear') return null;
  return {
    rule: 'significance',
    grade: 'wrong',
    release: found.release,
    claim: found.claim,
    message: 'The test found it larger than chance would usually produce.',
  };
}
