import { markAt, type Judged } from '../marks';
import { subjectOf } from '../parties';
import type { Hit } from '../phrases';
import type { Reading } from '../reading';
import { scopeOf } from '../scope';
import type { WordingMark } from '../types';
import { changeOf, shareOf } from '../verdicts';
import { releasesFor } from '../which-release';
import { isAboutPoll } from './about';

const NEAR = 6;

/** Records: of many polls the highest is high by chance too, so a record takes the whole series. Common practice, no source. */
export function markRecords(reading: Reading): WordingMark[] {
  const words = reading.cues('recordWords');
  const superlatives = [...reading.cues('recordHigh'), ...reading.cues('recordLow')].flatMap((hit) => {
    const end = endOfEver(reading, hit);
    return end === null || reading.has('recordWords', hit) ? [] : [{ from: hit.from, to: end }];
  });
  return [...words, ...superlatives]
    .filter((hit) => scopeOf(reading, hit) !== 'open' && isAboutPoll(reading, hit))
    .map((hit) => markAt(reading, hit, judge(reading, hit)));
}

/** "highest since June", "lowest ever", "best yet": where the word of time ends. */
function endOfEver(reading: Reading, { to }: Hit): number | null {
  for (let at = to; at < to + NEAR; at += 1) {
    const ever = reading.cueAt('everWords', at);
    if (ever) return ever.to;
    const { text = '.' } = reading.tokens[at] ?? {};
    if (text === '.' || text === ';') return null;
  }
  return null;
}

function judge(reading: Reading, hit: Hit): Judged {
  const unknown: Judged = {
    rule: 'record',
    grade: 'cannot-judge',
    message: 'A record takes the whole series, which is not given here.',
  };
  const subject = subjectOf(reading, hit);
  if (!subject || subject === 'unknown') return unknown;
  const [release] = releasesFor(reading, hit, [subject.option]);
  const checked = release === undefined ? undefined : reading.input.releases[release];
  if (release === undefined || !checked?.previous) return unknown;
  const now = shareOf(checked.facts, subject.option);
  const then = shareOf(checked.previous, subject.option);
  if (now === null || then === null) return unknown;
  const isLow = reading.has('recordLow', hit);
  const isHigh = reading.has('recordHigh', hit);
  const base = {
    rule: 'record' as const,
    release,
    claim: changeOf(reading.input.releases, release, subject.option)?.claim ?? null,
  };
  const beaten = isLow ? then <= now : isHigh && then >= now;
  if (beaten) return { ...base, grade: 'wrong', message: `The earlier release has ${then}%.` };
  const message = 'One earlier release does not make a record: it takes a test against the whole series.';
  return { ...base, grade: 'not-supported', message };
}
