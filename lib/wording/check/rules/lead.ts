import { objectOf, subjectOf } from '../parties';
import { markAt, replacementOf, type Judged } from '../marks';
import type { Hit } from '../phrases';
import type { Reading } from '../reading';
import { clauseOf, scopeOf } from '../scope';
import { sizeOf } from '../sizes';
import type { WordingMark } from '../types';
import { leadOf, rankedOptions, type Claimed } from '../verdicts';
import { releasesFor } from '../which-release';
import { agreed } from './agreed';
import { isAboutPoll, isAboutSubgroup } from './about';

type Said = Hit & { isStrong: boolean; isTrailing: boolean; isNoun: boolean };

/**
 * Words of leading. Judged by the test of the lead itself, not by the margin of one share: NCPP's advice and the AP
 * Stylebook's polls chapter as quoted publicly, from memory; the rungs are the desk's ladder.
 */
export function markLeads(reading: Reading): WordingMark[] {
  return saidLeads(reading).flatMap((said) => {
    if (isAboutSubgroup(reading, said)) return [];
    const scope = scopeOf(reading, said);
    if (scope === 'open' || isNoLead(reading, said)) return [];
    return scope === 'denied' ? judgeDenied(reading, said) : judgeSaid(reading, said);
  });
}

function saidLeads(reading: Reading): Said[] {
  const all: Said[] = [
    ...reading
      .cues('leadStrong')
      .map((hit) => ({ ...hit, isStrong: true, isTrailing: false, isNoun: false })),
    ...reading
      .cues('trailStrong')
      .map((hit) => ({ ...hit, isStrong: true, isTrailing: true, isNoun: false })),
    ...reading.cues('second').map((hit) => ({ ...hit, isStrong: true, isTrailing: true, isNoun: false })),
    ...reading.cues('leadWeak').map((hit) => ({ ...hit, isStrong: false, isTrailing: false, isNoun: false })),
    ...reading.cues('trailWeak').map((hit) => ({ ...hit, isStrong: false, isTrailing: true, isNoun: false })),
    ...reading.cues('leadNoun').map((hit) => ({ ...hit, isStrong: true, isTrailing: false, isNoun: true })),
  ].sort((a, b) => b.to - b.from - (a.to - a.from));
  const kept: Said[] = [];
  for (const one of all) {
    if (!kept.some((other) => other.from < one.to && one.from < other.to)) kept.push(one);
  }
  kept.sort((a, b) => a.from - b.from);
  return kept.filter((one, index) => !kept.slice(0, index).some((other) => isPartOf(reading, one, other)));
}

/** "Führt mit 8 Punkten Vorsprung vor Brook" is one claim: what follows in its clause tells its size and its object. */
function isPartOf(reading: Reading, one: Said, other: Said): boolean {
  const { to } = clauseOf(reading, other);
  if (one.from >= to) return false;
  const size = one.isNoun ? sizeOf(reading, one) : null;
  return one.objectAt !== undefined || (size !== null && size.from === sizeOf(reading, other)?.from);
}

/** "Ahead of Thursday's vote", "behind closed doors", a lead that nobody is said to have. */
function isNoLead(reading: Reading, said: Said): boolean {
  const isOf = reading.cueAt('ofWords', said.to) !== null;
  if (!said.isStrong && isOf) {
    const object = said.to + 1;
    if (reading.mentionAt(object) ?? reading.mentionAt(object + 1)) return false;
    if (reading.quantityAt(object)) return true;
    return !reading.has('pronouns', { from: object, to: object + 1 }) && !reading.cueAt('rivals', object);
  }
  return said.isNoun && !sizeOf(reading, said) && subjectOf(reading, said) === null;
}

function judgeSaid(reading: Reading, said: Said): WordingMark[] {
  if (reading.input.releases.length === 0) return [];
  const subject = subjectOf(reading, said);
  if (subject === 'unknown') return [markAt(reading, said, UNKNOWN)];
  const object = subject ? objectOf(reading, said, subject.option) : null;
  if (object === 'unknown') return [markAt(reading, said, UNKNOWN)];
  if (!subject) return judgeNobody(reading, said);
  const options = [subject.option, ...(object ? [object.option] : [])];
  const verdicts = releasesFor(reading, said, options).flatMap((release) => {
    const other = object?.option ?? rivalOf(reading, release, subject.option, said.isTrailing);
    const found = other && leadOf(reading.input.releases, release, ...ordered(subject.option, other, said));
    return found && other ? [{ found, names: ordered(subject.option, other, said) }] : [];
  });
  if (verdicts.length === 0) return [];
  const marks = agreed(
    reading,
    said,
    verdicts.map(({ found, names }) => judge(reading, said, found, names)),
    'lead',
  );
  return markStyle(
    reading,
    said,
    marks,
    verdicts.every(({ found }) => found.verdict === 'holds'),
  );
}

const UNKNOWN: Judged = {
  rule: 'lead',
  grade: 'cannot-judge',
  message: 'A name here is in none of the releases given, so this lead cannot be judged.',
};

function judgeNobody(reading: Reading, said: Said): WordingMark[] {
  const [release] = releasesFor(reading, said);
  const [a, b] = release === undefined ? [] : rankedOptions(reading.input.releases[release]!);
  if (release === undefined || !a || !b || !isAboutPoll(reading, said)) return [];
  const found = leadOf(reading.input.releases, release, a, b);
  if (!found || said.isTrailing) return [];
  const judged = judge(reading, said, found, [a, b]);
  return judged ? [markAt(reading, said, judged)] : [];
}

function ordered(subject: string, other: string, { isTrailing }: Said): [string, string] {
  return isTrailing ? [other, subject] : [subject, other];
}

/** Who else is meant where one name stands alone: whoever is first, or the runner-up to the first. */
function rivalOf(reading: Reading, release: number, option: string, isTrailing: boolean): string | null {
  const ranked = rankedOptions(reading.input.releases[release]!);
  const others = ranked.filter((other) => other !== option);
  return (isTrailing ? others[0] : others[0]) ?? null;
}

function judge(reading: Reading, said: Said, found: Claimed, [a, b]: [string, string]): Judged | null {
  const { words } = reading.lexicon;
  const base = { rule: 'lead' as const, release: found.release, claim: found.claim };
  const say = (key: Parameters<typeof replacementOf>[1]) =>
    said.isNoun ? null : replacementOf(words, key, { a, b });
  const { estimatePp, verdict } = found;
  if (estimatePp !== null && estimatePp < 0) {
    return {
      ...base,
      grade: 'wrong',
      message: `In the release ${b} has the higher figure, not ${a}.`,
      replacement: said.isTrailing ? say('isAhead') : say('trails'),
    };
  }
  if (estimatePp === 0) {
    return {
      ...base,
      grade: 'wrong',
      message: `The printed figures of ${a} and ${b} are equal.`,
      replacement: say('level'),
    };
  }
  if (verdict === 'does-not-hold') {
    return {
      ...base,
      grade: 'not-supported',
      message: 'Chance alone could produce this gap: no word of leading is supported.',
      replacement: said.isTrailing ? null : say('chanceGap'),
    };
  }
  if (verdict === 'cannot-be-tested') {
    return {
      ...base,
      grade: 'not-supported',
      message: 'This gap cannot be tested: no word of leading is supported.',
      replacement: said.isTrailing ? null : say('untestedGap'),
    };
  }
  if (verdict === 'fragile' && said.isStrong) {
    return {
      ...base,
      grade: 'not-supported',
      message: 'The poll cannot settle this lead: it may say who is ahead in this poll, never who leads.',
      replacement: said.isTrailing ? null : say('isAheadUnsettled'),
    };
  }
  return null;
}

/** Colour beside a lead that holds: "comfortably in front", "edges ahead". */
function markStyle(
  reading: Reading,
  said: Said,
  marks: readonly WordingMark[],
  isHeld: boolean,
): WordingMark[] {
  if (marks.length > 0 || !isHeld) return [...marks];
  const style = reading.cues('leadStyle').find((hit) => hit.from <= said.to + 1 && hit.to >= said.from - 1);
  if (!style) return [];
  const span = { from: Math.min(style.from, said.from), to: Math.max(style.to, said.to) };
  const message = 'How large a lead is stands in its figures; the verb needs no colour.';
  const replacement = said.isNoun
    ? null
    : replacementOf(reading.lexicon.words, said.isTrailing ? 'trails' : 'leads');
  return [markAt(reading, span, { rule: 'lead', grade: 'house-style', message, replacement })];
}

function judgeDenied(reading: Reading, said: Said): WordingMark[] {
  const subject = subjectOf(reading, said);
  if (!subject || subject === 'unknown' || said.isNoun) return [];
  const object = objectOf(reading, said, subject.option);
  if (object === 'unknown') return [];
  const [release] = releasesFor(reading, said, [subject.option]);
  const other =
    object?.option ??
    (release === undefined ? null : rivalOf(reading, release, subject.option, said.isTrailing));
  if (release === undefined || !other) return [];
  const found = leadOf(reading.input.releases, release, ...ordered(subject.option, other, said));
  if (found?.verdict !== 'holds' || (found.estimatePp ?? 0) <= 0) return [];
  const message = 'This denies a lead that the figures support.';
  return [markAt(reading, said, { rule: 'lead', grade: 'wrong', message, release, claim: found.claim })];
}
