import { valueOf } from '@/lib/domain/disclosed';
import type { Finding } from '@/lib/findings/check-types';
import { formatTrimmed } from '@/lib/format/number';
import { markAt, type Judged } from '../marks';
import { optionsIn, subjectOf } from '../parties';
import type { Hit } from '../phrases';
import type { Quantity } from '../quantities';
import type { Reading } from '../reading';
import { clauseOf, scopeOf } from '../scope';
import type { CheckedRelease, WordingMark } from '../types';
import { leadOf, rankedOptions, type Claimed } from '../verdicts';
import { releasesFor } from '../which-release';

/**
 * Margins: whose, of what, and whether there is one at all. A lead has a margin of its own, about twice that of a
 * share: Pew Research Center, "5 key things to know about the margin of error" (2016), from memory. A sample that is
 * not random has none: AAPOR's advice on opt-in samples, from memory.
 */
export function markMargins(reading: Reading): WordingMark[] {
  if (reading.input.releases.length === 0) return [];
  return [...markStated(reading), ...markWithin(reading)];
}

function markStated(reading: Reading): WordingMark[] {
  const nouns = reading
    .cues('marginNoun')
    .filter((hit) => !reading.has('noMargin', { from: hit.from - 1, to: hit.to }));
  const seen = new Set<number>();
  const marks: WordingMark[] = [];
  for (const quantity of reading.quantities) {
    if (!isMarginSize(reading, quantity) || isOfRounding(reading, quantity)) continue;
    const judged = judgeStated(reading, quantity);
    if (judged)
      marks.push(
        markAt(
          reading,
          judged.rule === 'margin' ? withSign(reading, quantity) : withNoun(reading, quantity),
          judged,
        ),
      );
    seen.add(reading.sentenceAt(quantity.from).index);
  }
  for (const noun of nouns) {
    if (seen.has(reading.sentenceAt(noun.from).index) || isDenied(reading, noun)) continue;
    if (scopeOf(reading, noun) !== 'claimed') continue;
    if (reading.has('withinMargin', noun) || reading.has('outsideMargin', noun)) continue;
    const release = baseless(reading, noun);
    if (release !== null && isOwned(reading, noun)) marks.push(markAt(reading, noun, notRandom(release)));
  }
  return marks;
}

const REACH = 6;

/** "±3.7 points", "margin of error of 3 points", "a 3-point margin of error". */
function isMarginSize(reading: Reading, { from, to, unit }: Quantity): boolean {
  if (reading.has('plusMinus', { from: from - 3, to: from })) return true;
  if (unit === 'fraction') return false;
  if (reading.has('marginNoun', { from: to, to: to + 1 })) return true;
  const sentence = reading.sentenceAt(from);
  for (let at = from - 1; at >= Math.max(sentence.from, from - REACH); at -= 1) {
    if (reading.cueAt('marginNoun', at)) return !isDenied(reading, { from: at, to: at + 1 });
    if (reading.quantityAt(at) || reading.mentionAt(at) || reading.tokens[at]?.text === ',') return false;
  }
  return false;
}

function withSign(reading: Reading, { from, to }: Quantity): Hit {
  for (let at = from - 1; at >= from - 3; at -= 1) {
    const sign = reading.cueAt('plusMinus', at);
    if (sign) return { from: sign.from, to };
  }
  return { from, to };
}

/** The size together with the noun of its sentence. */
function withNoun(reading: Reading, quantity: Quantity): Hit {
  const size = withSign(reading, quantity);
  const noun = reading.cues('marginNoun').find((hit) => sameSentence(reading, hit, quantity));
  return noun ? { from: Math.min(noun.from, size.from), to: Math.max(noun.to, size.to) } : size;
}

const isOfRounding = (reading: Reading, { from }: Hit) =>
  reading.has('roundingWords', { from: reading.sentenceAt(from).from, to: from });
const isDenied = (reading: Reading, { from }: Hit) => reading.has('negators', { from: from - 4, to: from });
const isOwned = (reading: Reading, { from }: Hit) => reading.cueAt('ownsMargin', from - 1) !== null;

function baseless(reading: Reading, hit: Hit): number | null {
  const releases = releasesFor(reading, hit);
  const isBaseless = (index: number) =>
    reading.input.releases[index]?.answer.base.basis === 'none' &&
    reading.input.releases[index]?.facts.sampleSource !== 'probability';
  return releases.length > 0 && releases.every(isBaseless) ? (releases[0] ?? null) : null;
}

const notRandom = (release: number): Judged => ({
  rule: 'margin-basis',
  grade: 'wrong',
  release,
  message: 'The sample is not random and no interval is stated: it has no margin of sampling error.',
});

function judgeStated(reading: Reading, quantity: Quantity): Judged | null {
  const without = baseless(reading, quantity);
  if (without !== null) return notRandom(without);
  const [release] = releasesFor(reading, quantity);
  const all = releasesFor(reading, quantity).map((index) => reading.input.releases[index]!);
  if (release === undefined) return null;
  const isOfLead = saysLead(reading, quantity) && !isOfShare(reading, quantity);
  const known = all.flatMap((checked) =>
    isOfLead ? leadMargins(checked) : [...shareMargins(checked), ...testMargins(checked, () => true)],
  );
  if (known.length === 0) return null;
  const fits = known.some(
    (margin) => Math.abs(margin - quantity.value) <= tolerance(reading, quantity) + 1e-9,
  );
  if (fits || isWider(reading, quantity, known)) return null;
  const stated = shareMargins(all[0]!)[0];
  const size = (isOfLead ? leadMargins(all[0]!)[0] : stated) ?? 0;
  const shown = formatTrimmed(size, 1, 'en-GB');
  const replacement = `±${formatTrimmed(size, 1, reading.lexicon.words.locale)}`;
  const message = isOfLead
    ? `That is not the margin of this lead, which is about ±${shown} points.`
    : `The margin stated, or worked out here, is ±${shown} points.`;
  return { rule: 'margin', grade: 'wrong', release, message, replacement };
}

/** "or ±10 if weighting cost more": beside a margin its wider end, up to what a doubled design effect would make it. */
function isWider(reading: Reading, quantity: Quantity, known: readonly number[]): boolean {
  if (!reading.cueAt('orWords', withSign(reading, quantity).from - 1)) return false;
  return known.some((margin) => quantity.value > margin && quantity.value <= margin * 1.5 + 0.5);
}

/** Half a unit of the last decimal printed; half a point where a desk rounds to halves. */
const tolerance = (reading: Reading, { decimals, value }: Quantity) =>
  decimals > 1
    ? 0.005
    : (value * 2) % 1 === 0 && reading.input.houseStyle.margins !== 'tenth'
      ? 0.5
      : decimals === 1
        ? 0.05
        : 0.5;

/** "±7 points for the lead", "the margin for the lead is ±7". */
function saysLead(reading: Reading, hit: Hit): boolean {
  const sentence = reading.sentenceAt(hit.from);
  const clause = clauseOf(reading, hit);
  if (reading.has('leadOrGap', { from: hit.to, to: Math.min(clause.to, hit.to + REACH) })) return true;
  const noun = reading.cues('marginNoun').findLast(({ from, to }) => from >= sentence.from && to <= hit.from);
  return (
    noun !== undefined && reading.has('leadOrGap', { from: noun.to, to: Math.min(hit.from, noun.to + 3) })
  );
}

const isOfShare = (reading: Reading, { from, to }: Hit) =>
  reading.has('shareWords', { from: to, to: Math.min(clauseOf(reading, { from, to }).to, to + 4) });

function shareMargins({ facts, previous, answer }: CheckedRelease): number[] {
  const stated = [facts, previous].map((one) => (one ? valueOf(one.statedMargin)?.pp : null));
  const all = [
    ...stated,
    facts.modelledInterval?.pp,
    answer.base.maximumMarginPp,
    answer.previousBase?.maximumMarginPp,
  ];
  return all.filter((margin): margin is number => typeof margin === 'number');
}

/** Of leads and changes; a test against a threshold has the margin of one share. */
const leadMargins = (checked: CheckedRelease) => testMargins(checked, ({ kind }) => kind !== 'threshold');

function testMargins({ answer }: CheckedRelease, fits: (finding: Finding) => boolean): number[] {
  return answer.findings.flatMap((one) =>
    one.kind !== 'share' && 'marginPp' in one && fits(one) ? [one.marginPp] : [],
  );
}

/** "Within the margin of error": of a lead, only its own test says that. */
function markWithin(reading: Reading): WordingMark[] {
  const hits = [
    ...marginSides(reading, 'within').map((hit) => ({ ...hit, isWithin: true })),
    ...marginSides(reading, 'outside').map((hit) => ({ ...hit, isWithin: false })),
  ];
  return hits.flatMap((hit) => {
    const found = leadSaid(reading, hit);
    if (!found) return [];
    const isDeniedHere = reading.has('negators', { from: hit.from - 3, to: hit.from });
    const isWithin = hit.isWithin !== isDeniedHere;
    return [markAt(reading, hit, judgeWithin(isWithin, found))];
  });
}

/** "Within the margin", "larger than the 7.4-point margin of error": from the first word to the noun. */
function marginSides(reading: Reading, side: 'within' | 'outside'): Hit[] {
  const prefixes = reading.cues(side === 'within' ? 'withinWords' : 'outsideWords').flatMap((hit) => {
    const noun = reading.cues('marginNoun').find(({ from }) => from >= hit.to && from <= hit.to + REACH);
    return noun && sameSentence(reading, hit, noun) ? [{ from: hit.from, to: noun.to }] : [];
  });
  const fixed = reading.cues(side === 'within' ? 'withinMargin' : 'outsideMargin');
  return [
    ...prefixes,
    ...fixed.filter((hit) => !prefixes.some((one) => one.from < hit.to && hit.from < one.to)),
  ];
}

const sameSentence = (reading: Reading, a: Hit, b: Hit) =>
  reading.sentenceAt(a.from).index === reading.sentenceAt(b.from).index;

function leadSaid(reading: Reading, hit: Hit): Claimed | null {
  const { releases } = reading.input;
  const [release] = releasesFor(reading, hit);
  if (release === undefined) return null;
  const sentence = reading.sentenceAt(hit.from);
  const names = [...new Set(optionsIn(reading, sentence.from, sentence.to).map(({ name }) => name))];
  const ranked = rankedOptions(releases[release]!);
  const subject = subjectOf(reading, hit);
  const a = subject && subject !== 'unknown' ? subject.option : ranked[0];
  const b = names.find((name) => name !== a) ?? ranked.find((name) => name !== a);
  return a && b ? leadOf(releases, release, a, b) : null;
}

function judgeWithin(isWithin: boolean, { verdict, release, claim, marginPp }: Claimed): Judged {
  const base = { rule: 'margin' as const, release, claim };
  const own = marginPp === null ? '' : ` (±${formatTrimmed(marginPp, 1, 'en-GB')} points)`;
  if (verdict === 'cannot-be-tested')
    return {
      ...base,
      rule: 'margin-basis',
      grade: 'wrong',
      message: 'There is no margin to compare this with.',
    };
  const holds = verdict === 'holds';
  if (isWithin === holds)
    return {
      ...base,
      grade: verdict === 'fragile' ? 'not-supported' : 'wrong',
      message: `The lead’s own test${own} says otherwise.`,
    };
  if (verdict === 'fragile')
    return {
      ...base,
      grade: isWithin ? 'house-style' : 'not-supported',
      message: `The poll cannot settle this lead${own}.`,
    };
  return {
    ...base,
    grade: 'house-style',
    message: `True of the lead’s own margin${own}; say what chance alone could produce.`,
  };
}
