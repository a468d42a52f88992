import { markAt, percentText, replacementOf, type Judged } from '../marks';
import { subjectOf, type Party } from '../parties';
import type { Hit } from '../phrases';
import type { Reading } from '../reading';
import { scopeOf } from '../scope';
import { sizeOf } from '../sizes';
import type { WordingMark } from '../types';
import { changeOf, isRounded, leadChangeOf, leadOf, rankedOptions, shareOf, type Claimed } from '../verdicts';
import { releasesFor } from '../which-release';
import { isAboutPoll, isAboutSubgroup, isOfTrade } from './about';
import { agreed } from './agreed';
import { comparisonFault, namesPeriodOutside } from './comparison';

type Said = Hit & { direction: 1 | -1; ofLead: boolean };

/**
 * Words of movement. Only a tested change has a direction; a poll never shows a surge or momentum: AP Stylebook polls
 * chapter and BBC Editorial Guidelines, section 10, as quoted publicly, from memory. Sizes of changes that pass a test
 * are exaggerated on average (Gelman and Carlin, Perspectives on Psychological Science 9 (2014) 641–651).
 */
export function markChanges(reading: Reading): WordingMark[] {
  const always = [...reading.cues('dramatic'), ...reading.cues('momentum')]
    .filter((hit) => scopeOf(reading, hit) === 'claimed' && isAboutPoll(reading, hit))
    .map((hit) => markAt(reading, hit, DRAMATIC));
  const said = saidChanges(reading).filter(
    (hit) =>
      scopeOf(reading, hit) === 'claimed' && !isAboutSubgroup(reading, hit) && isAboutPoll(reading, hit),
  );
  return [...always, ...said.flatMap((hit) => judgeSaid(reading, hit))];
}

const DRAMATIC: Judged = {
  rule: 'change',
  grade: 'not-supported',
  message:
    'No poll supports this: changes that pass a test are somewhat exaggerated on average. Say the direction.',
};

function saidChanges(reading: Reading): Said[] {
  const of = (group: 'up' | 'down' | 'leadUp' | 'leadDown', direction: 1 | -1, ofLead: boolean): Said[] =>
    reading.cues(group).map((hit) => ({ ...hit, direction, ofLead: ofLead || isOfLead(reading, hit) }));
  const all = [
    ...of('leadUp', 1, true),
    ...of('leadDown', -1, true),
    ...of('up', 1, false),
    ...of('down', -1, false),
  ];
  return all.filter(
    (hit, index) =>
      !reading.has('dramatic', hit) &&
      !reading.has('forecast', hit) &&
      !all.some((other, place) => place < index && other.from < hit.to && hit.from < other.to),
  );
}

const NEAR = 5;

/** "Alder's lead has grown": the word before the phrase, past a few small ones, is a lead or a gap. */
function isOfLead(reading: Reading, { from }: Hit): boolean {
  for (let at = from - 1; at >= Math.max(0, from - NEAR); at -= 1) {
    if (reading.cueAt('clauseBreaks', at) || reading.tokens[at]?.text === ',') return false;
    if (reading.cueAt('gap', at) && !reading.cueAt('leadStrong', at)) return true;
    if (reading.mentionAt(at)?.kind === 'option' && !reading.cueAt('objectMarkers', at - 1)) return false;
  }
  return false;
}

function judgeSaid(reading: Reading, said: Said): WordingMark[] {
  const { releases } = reading.input;
  if (releases.length === 0) return [];
  const subject = subjectOf(reading, said);
  if (subject === 'unknown') return [markAt(reading, said, { ...UNKNOWN })];
  if (!subject && !said.ofLead) return [];
  const options = subject ? [subject.option] : [];
  const judgements = releasesFor(reading, said, options).map((release) =>
    judgeIn(reading, said, subject, release),
  );
  return [...agreed(reading, said, judgements, 'change'), ...judgeSize(reading, said, options)];
}

/** "Up 12 points" where the figures differ by 10; of the other direction nothing more is said. */
function judgeSize(reading: Reading, said: Said, options: readonly string[]): WordingMark[] {
  const size = sizeOf(reading, said);
  if (size?.unit !== 'points') return [];
  const moves = releasesFor(reading, said, options).flatMap((release) => {
    const [option = null] = options;
    const found = said.ofLead
      ? leadMove(reading, release, option)
      : changeOf(reading.input.releases, release, option ?? '');
    return found && found.estimatePp !== null ? [{ ...found, estimatePp: found.estimatePp }] : [];
  });
  const [first] = moves;
  const fits = moves.some(({ estimatePp }) => isRounded(size.value, size.decimals, Math.abs(estimatePp)));
  if (!first || fits || first.estimatePp * said.direction <= 0) return [];
  const { release, claim } = first;
  const message = 'The figures differ by another number of points.';
  return [
    markAt(
      reading,
      { from: size.from, to: size.to },
      { rule: 'change', grade: 'wrong', release, claim, message },
    ),
  ];
}

const UNKNOWN: Judged = {
  rule: 'change',
  grade: 'cannot-judge',
  message: 'A name here is in none of the releases given, so this change cannot be judged.',
};

function judgeIn(reading: Reading, said: Said, subject: Party, release: number): Judged | null {
  const checked = reading.input.releases[release]!;
  const fault = comparisonFault(reading, said, release);
  if (fault) return fault;
  if (!checked.previous) {
    if (!isOfTrade(reading, said)) return null;
    return {
      rule: 'change',
      grade: 'cannot-judge',
      release,
      message: 'No earlier release is given to tell a change from.',
    };
  }
  if (namesPeriodOutside(reading, said, release)) {
    return {
      rule: 'change',
      grade: 'cannot-judge',
      release,
      message: 'This names a time that no release given covers.',
    };
  }
  const option = subject && subject !== 'unknown' ? subject.option : null;
  const found = said.ofLead
    ? leadMove(reading, release, option)
    : changeOf(reading.input.releases, release, option ?? '');
  if (!found) return null;
  const now = option === null ? null : shareOf(checked.facts, option);
  const then = option === null ? null : shareOf(checked.previous, option);
  return judge(reading, said, found, { now: printed(reading, now), then: printed(reading, then) });
}

const printed = ({ lexicon: { words } }: Reading, pct: number | null): Record<never, never> | string =>
  pct === null ? {} : percentText(words, pct);

/** The change of the lead of whoever was ahead before, told from the side of the one who is ahead. */
function leadMove(reading: Reading, release: number, option: string | null): Claimed | null {
  const { releases } = reading.input;
  const [first, second] = rankedOptions(releases[release]!);
  const a = option ?? first;
  const b = a === first ? second : first;
  if (!a || !b) return null;
  const found = leadChangeOf(releases, release, a, b);
  const now = leadOf(releases, release, a, b)?.estimatePp ?? 0;
  if (!found || found.estimatePp === null || now >= 0) return found;
  return { ...found, estimatePp: -found.estimatePp };
}

function judge(
  reading: Reading,
  said: Said,
  found: Claimed,
  shares: { now: string | object; then: string | object },
): Judged | null {
  const { words } = reading.lexicon;
  const slots = Object.fromEntries(
    Object.entries(shares).filter((entry): entry is [string, string] => typeof entry[1] === 'string'),
  );
  const base = { rule: 'change' as const, release: found.release, claim: found.claim };
  const say = (key: Parameters<typeof replacementOf>[1]) =>
    said.ofLead ? null : replacementOf(words, key, slots);
  const { estimatePp, verdict } = found;
  if (estimatePp !== null && estimatePp * said.direction < 0) {
    const key = verdict === 'holds' ? (estimatePp > 0 ? 'isUp' : 'isDown') : 'chanceChange';
    return { ...base, grade: 'wrong', message: 'The figures moved the other way.', replacement: say(key) };
  }
  if (estimatePp === 0)
    return {
      ...base,
      grade: 'wrong',
      message: 'The two figures are the same.',
      replacement: say('sameFigure'),
    };
  if (verdict === 'holds') return null;
  if (verdict === 'fragile') {
    const key = said.direction > 0 ? 'higherUnsettled' : 'lowerUnsettled';
    return {
      ...base,
      grade: 'not-supported',
      message: 'The two polls cannot settle this change.',
      replacement: say(key),
    };
  }
  return verdict === 'does-not-hold'
    ? {
        ...base,
        grade: 'not-supported',
        message: 'Chance alone could produce this change between two such polls.',
        replacement: say('chanceChange'),
      }
    : {
        ...base,
        grade: 'not-supported',
        message: 'This change cannot be tested.',
        replacement: say('untestedChange'),
      };
}
