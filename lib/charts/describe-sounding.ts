import { formatLevel, formatValue, type ChartWords } from './chart-words';
import type { SoundingSpec } from './sounding-spec';

/** The figures of a picture in one sentence: estimate, range, range with heavier weighting. */
export function figuresSentence(spec: SoundingSpec, words: ChartWords): string {
  const isShare = spec.quantity === 'share' || spec.quantity === 'threshold';
  const value = (pp: number, decimals = 1) => formatValue(pp, decimals, spec.quantity, words);
  const estimate = value(spec.estimatePp, spec.decimals);
  const parts = [isShare ? estimate : words.points(estimate)];
  const outer = spec.bands[0];
  if (outer) {
    parts.push(words.range(formatLevel(outer.level, words), value(outer.lowPp), value(outer.highPp)));
  }
  if (spec.far) parts.push(words.heavierWeighting(value(spec.far.lowPp), value(spec.far.highPp)));
  const note = spec.untestedNote ? ` ${spec.untestedNote}.` : '';
  return `${spec.label}: ${parts.join(', ')}.${note}`;
}

/** The picture in words for who does not see it: its figures and what the poll shows by them. */
export function describeSounding(spec: SoundingSpec, words: ChartWords): string {
  const figures = figuresSentence(spec, words);
  return spec.verdict && !spec.untestedNote ? `${figures} ${words.verdict[spec.verdict]}` : figures;
}
