import {
  formatCount,
  formatPercent,
  formatPoints,
  formatSigned,
  formatTrimmed,
  roundHalfUp,
} from '@/lib/format/number';
import type { HouseStyle } from './house-style';
import { say } from './say';
import { speakNumber, speakSigned, type Noun } from './speak';
import type { Voice } from './voice';

const UNITS: Record<HouseStyle['margins'], number> = { whole: 1, half: 0.5, tenth: 0.1 };

/** A share as the release printed it, with the desk's percent style; the language's words where undisclosed. */
export function printShare(units: number | null, decimals: number, voice: Voice): string {
  if (units === null) return voice.style.messages[voice.language].terms.notDisclosed;
  return printPercent(units / 10 ** decimals, decimals, voice);
}

export function printPercent(pct: number, decimals: number, voice: Voice): string {
  const { style, language, locale, isSpoken } = voice;
  if (style.percent === 'sign' && !isSpoken) return formatPercent(pct, decimals, locale);
  const { terms } = style.messages[language];
  const n = isSpoken
    ? speakNumber(roundHalfUp(pct, decimals), voice, 'percent')
    : formatPoints(pct, decimals, locale);
  return say(style.percent === 'per-cent' ? terms.perCent : terms.percent, { n }, locale);
}

/** A difference of printed shares, without its sign; in words up to nine where the desk writes them so. */
export function printGap(pp: number, decimals: number, voice: Voice): string {
  const size = roundHalfUp(Math.abs(pp), decimals);
  const { style, language } = voice;
  if (style.numbers === 'words-to-nine' && !voice.isSpoken) {
    const word = style.messages[language].terms.numbers[size];
    if (word !== undefined) return word;
  }
  return printNumber(size, decimals, voice, 'points');
}

/** A number with at most so many decimals. */
export function printNumber(value: number, decimals: number, voice: Voice, noun?: Noun): string {
  if (voice.isSpoken) return speakNumber(roundHalfUp(value, decimals), voice, noun);
  return formatTrimmed(value, decimals, voice.locale);
}

/** A net score: always with its sign, but for zero. */
export function printSigned(pp: number, decimals: number, voice: Voice): string {
  if (voice.isSpoken) return speakSigned(roundHalfUp(pp, decimals), voice);
  return formatSigned(pp, decimals, voice.locale);
}

/** A number of people. */
export function printCount(count: number, voice: Voice): string {
  return voice.isSpoken
    ? speakNumber(roundHalfUp(count, 0), voice, 'people')
    : formatCount(count, voice.locale);
}

/**
 * Rounds a margin or the end of a range for text as the desk does, but finer where that would move it across (or
 * onto) what it is compared with: a range that excludes zero never reads as if it began at zero.
 */
export function roundBeside(value: number, shore: number, style: HouseStyle): number {
  const side = Math.sign(value - shore);
  const rounded = [UNITS[style.margins], 0.1, 0.01].map((unit) => roundTo(value, unit));
  return rounded.find((one) => Math.sign(one - shore) === side) ?? roundTo(value, 0.001);
}

/** Rounds a size upwards, for sentences that promise "at least so much would have been found". */
export function roundUp(value: number, style: HouseStyle): number {
  const unit = UNITS[style.margins];
  return roundHalfUp(Math.ceil(roundHalfUp(value / unit, 6)) * unit, 3);
}

function roundTo(value: number, unit: number): number {
  return roundHalfUp(roundHalfUp(value / unit, 0) * unit, 3);
}
