import { formatPercent, formatPoints, formatTrimmed, roundHalfUp } from '@/lib/format/number';
import type { HouseStyle } from './house-style';
import { say } from './say';

/** How one house style prints in one language. */
export type Voice = { style: HouseStyle; language: keyof HouseStyle['messages']; locale: string };

const UNITS: Record<HouseStyle['margins'], number> = { whole: 1, half: 0.5, tenth: 0.1 };

export function voiceOf(style: HouseStyle, language: Voice['language']): Voice {
  return { style, language, locale: style.locales[language] };
}

/** A share as the release printed it, with the desk's percent style; the language's words where undisclosed. */
export function printShare(units: number | null, decimals: number, voice: Voice): string {
  if (units === null) return voice.style.messages[voice.language].terms.notDisclosed;
  return printPercent(units / 10 ** decimals, decimals, voice);
}

export function printPercent(pct: number, decimals: number, { style, language, locale }: Voice): string {
  if (style.percent === 'sign') return formatPercent(pct, decimals, locale);
  return say(style.messages[language].terms.percent, { n: formatPoints(pct, decimals, locale) }, locale);
}

/** A difference of printed shares, without its sign; in words up to nine where the desk writes them so. */
export function printGap(pp: number, decimals: number, { style, language, locale }: Voice): string {
  const size = roundHalfUp(Math.abs(pp), decimals);
  const word = style.numbers === 'words-to-nine' ? style.messages[language].terms.numbers[size] : undefined;
  return word ?? formatTrimmed(size, decimals, locale);
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
