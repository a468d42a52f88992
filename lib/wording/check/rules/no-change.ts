import { percentText, replacementOf, type Judged } from '../marks';
import { subjectOf } from '../parties';
import type { Hit } from '../phrases';
import type { Reading } from '../reading';
import { scopeOf } from '../scope';
import type { WordingMark } from '../types';
import { changeOf, leadChangeOf, rankedOptions, shareOf, type Claimed } from '../verdicts';
import { releasesFor } from '../which-release';
import { isAboutPoll, isAboutSubgroup, isOfTrade } from './about';
import { agreed } from './agreed';
import { comparisonFault } from './comparison';

/**
 * Standing still. A change that was not shown is not "no change": only a test of equivalence supports "little
 * changed". Altman and Bland, British Medical Journal 311 (1995) 485, "absence of evidence", from memory.
 */
export function markNoChanges(reading: Reading): WordingMark[] {
  const little = reading.cues('littleChanged');
  const steady = reading.cues('steady').filter((hit) => !reading.has('littleChanged', hit));
  return [...little, ...steady]
    .filter(
      (hit) =>
        scopeOf(reading, hit) === 'claimed' && isAboutPoll(reading, hit) && !isAboutSubgroup(reading, hit),
    )
    .flatMap((hit) => judgeSaid(reading, hit));
}

function judgeSaid(reading: Reading, hit: Hit): WordingMark[] {
  const { releases } = reading.input;
  const subject = subjectOf(reading, hit);
  if (releases.length === 0 || subject === 'unknown') return [];
  if (!subject && !reading.has('raceWords', reading.sentenceAt(hit.from))) return [];
  const judgements = releasesFor(reading, hit, subject ? [subject.option] : []).map(
    (release): Judged | null => {
      const checked = releases[release]!;
      const fault = comparisonFault(reading, hit, release);
      if (fault) return fault;
      if (!checked.previous) {
        if (!isOfTrade(reading, hit)) return null;
        return {
          rule: 'no-change',
          grade: 'cannot-judge',
          release,
          message: 'No earlier release is given to compare with.',
        };
      }
      const [a = '', b = ''] = rankedOptions(checked);
      const found = subject
        ? changeOf(releases, release, subject.option)
        : leadChangeOf(releases, release, a, b);
      const option = subject?.option ?? '';
      const slots = {
        now: percentText(reading.lexicon.words, shareOf(checked.facts, option) ?? 0),
        then: percentText(reading.lexicon.words, shareOf(checked.previous, option) ?? 0),
      };
      return found && judge(reading, found, subject ? slots : null);
    },
  );
  return agreed(reading, hit, judgements, 'no-change');
}

function judge(
  { lexicon: { words } }: Reading,
  found: Claimed,
  slots: Record<string, string> | null,
): Judged | null {
  const base = { rule: 'no-change' as const, release: found.release, claim: found.claim };
  const say = (key: Parameters<typeof replacementOf>[1]) => (slots ? replacementOf(words, key, slots) : null);
  switch (found.verdict) {
    case 'holds':
      return {
        ...base,
        grade: 'wrong',
        message: 'The figures moved by more than chance would usually produce.',
        replacement: say((found.estimatePp ?? 0) > 0 ? 'isUp' : 'isDown'),
      };
    case 'fragile':
      return {
        ...base,
        grade: 'not-supported',
        message: 'The figures differ; the two polls cannot settle whether opinion moved.',
        replacement: say((found.estimatePp ?? 0) > 0 ? 'higherUnsettled' : 'lowerUnsettled'),
      };
    case 'does-not-hold':
      return found.littleChanged
        ? null
        : {
            ...base,
            grade: 'not-supported',
            message: 'That no change was found does not show that there was none.',
            replacement: say(found.estimatePp === 0 ? 'sameFigure' : 'chanceChange'),
          };
    case 'cannot-be-tested':
      return {
        ...base,
        grade: 'not-supported',
        message: 'The change cannot be tested, and neither can its absence.',
        replacement: say('untestedChange'),
      };
  }
}
