import { valueOf } from '@/lib/domain/disclosed';
import { formatTrimmed, roundHalfUp } from '@/lib/format/number';
import { markAt, percentText, replacementOf, type Judged } from '../marks';
import { objectOf, subjectOf } from '../parties';
import type { Quantity } from '../quantities';
import type { Reading } from '../reading';
import { clauseOf } from '../scope';
import { sizeOf } from '../sizes';
import type { WordingMark } from '../types';
import { isRounded, leadOf, rankedOptions, shareOf } from '../verdicts';
import { releasesFor, releasesNamed } from '../which-release';
import { isAboutSubgroup } from './about';
import { linkedOption } from './linked-option';

/** Every number against the release: shares by name, sizes of leads, sample sizes. Common practice, no source. */
export function markFigures(reading: Reading): WordingMark[] {
  if (reading.input.releases.length === 0) return [];
  return [...markShares(reading), ...markSizes(reading), ...markSamples(reading)];
}

function markShares(reading: Reading): WordingMark[] {
  return reading.quantities.flatMap((quantity) => {
    if (quantity.unit === 'points' || quantity.unit === 'fraction' || isAboutSubgroup(reading, quantity))
      return [];
    const linked = linkedOption(reading, quantity);
    if (!linked) return [];
    const judged = judgeShare(reading, quantity, linked);
    return judged ? [markAt(reading, quantity, judged)] : [];
  });
}

function judgeShare(
  reading: Reading,
  quantity: Quantity,
  { option, mayBeEarlier }: { option: string; mayBeEarlier: boolean },
): Judged | null {
  const { releases } = reading.input;
  const candidates = releasesNamed(reading, quantity, [option]);
  const facts = candidates.flatMap((release) => {
    const { facts: now, previous } = releases[release]!;
    return [now, ...(mayBeEarlier && previous ? [previous] : [])].map((one) => ({ release, one }));
  });
  const known = facts.filter(({ one }) => shareOf(one, option) !== null);
  const [first] = known;
  if (!first) return null;
  const fitting = known.find(({ one }) =>
    isRounded(quantity.value, quantity.decimals, shareOf(one, option) ?? -1),
  );
  const { release, one } = fitting ?? first;
  const pct = shareOf(one, option) ?? 0;
  const share = printedShare(pct, one.decimals);
  const base = {
    rule: 'figure' as const,
    release,
    replacement: replacementOf(reading.lexicon.words, 'atShare', {
      share: percentText(reading.lexicon.words, pct, one.decimals),
    }),
  };
  if (!fitting) return { ...base, grade: 'wrong', message: `The release gives ${option} ${share}%.` };
  return quantity.decimals > one.decimals
    ? {
        ...base,
        grade: 'house-style',
        message: `The release prints ${share}%: no more decimals than it has.`,
      }
    : null;
}

const printedShare = (pct: number, decimals: number) => roundHalfUp(pct, decimals).toFixed(decimals);

/** "Leads by 9 points" where the figures differ by 6. */
function markSizes(reading: Reading): WordingMark[] {
  const { releases } = reading.input;
  const groups = ['leadStrong', 'leadWeak', 'leadNoun', 'trailStrong', 'trailWeak'] as const;
  const seen = new Set<number>();
  return groups.flatMap((group) =>
    reading.cues(group).flatMap((hit) => {
      const size = sizeOf(reading, hit);
      const subject = subjectOf(reading, hit);
      if (!size || seen.has(size.from) || subject === 'unknown' || isAboutSubgroup(reading, hit)) return [];
      if (
        reading.has('marginNoun', clauseOf(reading, size)) &&
        reading.has('plusMinus', { from: size.from - 3, to: size.from })
      )
        return [];
      const object = subject ? objectOf(reading, hit, subject.option) : null;
      if (object === 'unknown') return [];
      const gaps = releasesFor(reading, hit, subject ? [subject.option] : []).flatMap((release) =>
        gapsOf(reading, release, subject?.option ?? null, object?.option ?? null),
      );
      seen.add(size.from);
      if (gaps.length === 0 || gaps.some(({ pp }) => isRounded(size.value, size.decimals, pp))) return [];
      const [{ pp, release, claim }] = gaps as [(typeof gaps)[number]];
      return [
        markAt(
          reading,
          { from: size.from, to: size.to },
          {
            rule: 'figure',
            grade: 'wrong',
            release,
            claim,
            message: `The printed figures differ by ${roundHalfUp(pp, releases[release]!.facts.decimals)} points.`,
            replacement: replacementOf(reading.lexicon.words, 'points', {
              n: formatTrimmed(pp, 1, reading.lexicon.words.locale),
            }),
          },
        ),
      ];
    }),
  );
}

/** The gap in print, and the gap of figures rounded to whole percents, which papers print too. */
function gapsOf(reading: Reading, release: number, subject: string | null, object: string | null) {
  const { releases } = reading.input;
  const checked = releases[release]!;
  const ranked = rankedOptions(checked);
  const a = subject ?? ranked[0];
  const b = object ?? ranked.find((option) => option !== a);
  const found = a && b ? leadOf(releases, release, a, b) : null;
  if (!a || !b || !found || found.estimatePp === null) return [];
  const whole = [a, b].map((option) => roundHalfUp(shareOf(checked.facts, option) ?? 0, 0));
  const { claim } = found;
  return [Math.abs(found.estimatePp), Math.abs((whole[0] ?? 0) - (whole[1] ?? 0))].map((pp) => ({
    pp,
    release,
    claim,
  }));
}

const LEAST_SAMPLE = 50;

/** "surveyed 1,012 likely voters", "a sample of 900". */
function markSamples(reading: Reading): WordingMark[] {
  return reading.quantities.flatMap((quantity) => {
    if (quantity.unit !== 'none' || quantity.value < LEAST_SAMPLE || !isSample(reading, quantity)) return [];
    const all = releasesFor(reading, quantity).flatMap((release) => {
      const { facts, previous } = reading.input.releases[release]!;
      return [facts, ...(previous ? [previous] : [])].map((one) => ({ release, n: valueOf(one.n) }));
    });
    const [first] = all;
    const isLoose = reading.cueAt('approximately', quantity.from - 1) !== null;
    const fits = all.some(({ n }) => n !== null && Math.abs(n - quantity.value) <= (isLoose ? 0.05 * n : 0));
    if (!first || fits) return [];
    const isKnown = first.n !== null;
    return [
      markAt(
        reading,
        { from: quantity.from, to: quantity.numberTo },
        {
          rule: 'figure',
          grade: isKnown ? 'wrong' : 'cannot-judge',
          release: first.release,
          message: isKnown
            ? `The release gives a sample of ${first.n}.`
            : 'The release does not give its sample size.',
          replacement: isKnown ? String(first.n) : null,
        },
      ),
    ];
  });
}

function isSample(reading: Reading, { from, to }: Quantity): boolean {
  const people = { from: to, to: to + 3 };
  if (
    ['voters', 'likelyVoters', 'registeredVoters', 'adults'].some((group) =>
      reading.has(group as 'voters', people),
    )
  )
    return true;
  if (reading.cueAt('countedPeople', to)) return true;
  const before = { from: from - 4, to: from };
  return reading.has('sampleMarkers', before) || reading.has('interviewed', { from: from - 2, to: from });
}
