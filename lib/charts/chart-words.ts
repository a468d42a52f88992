import type { Reason, Verdict } from '@/lib/findings/check-types';
import { formatPercent, formatPoints, formatSigned } from '@/lib/format/number';

/** The words of a picture in one language. Numbers inside them are formatted already. */
export type ChartWords = {
  /** Of numbers, such as en-GB. */
  locale: string;
  leadLabel: (first: string, second: string) => string;
  changeLabel: (option: string) => string;
  leadChangeLabel: (first: string, second: string) => string;
  thresholdLabel: (option: string, pct: string) => string;
  ahead: (option: string) => string;
  towards: (option: string) => string;
  down: string;
  up: string;
  below: (pct: string) => string;
  above: (pct: string) => string;
  noMargin: string;
  notTested: string;
  points: (value: string) => string;
  range: (level: string, low: string, high: string) => string;
  heavierWeighting: (low: string, high: string) => string;
  verdict: Record<Verdict, string>;
  legend: {
    darker: (levels: string) => string;
    tinted: (side: string) => string;
    dashed: string;
    hatched: string;
    halfWeight: string;
    hollowWeight: string;
    dashedWeight: string;
  };
};

export const ENGLISH_CHART_WORDS: ChartWords = {
  locale: 'en-GB',
  leadLabel: (first, second) => `${first} minus ${second}`,
  changeLabel: (option) => `${option}, change`,
  leadChangeLabel: (first, second) => `${first} minus ${second}, change`,
  thresholdLabel: (option, pct) => `${option} against ${pct}`,
  ahead: (option) => `${option} ahead`,
  towards: (option) => `Towards ${option}`,
  down: 'Down',
  up: 'Up',
  below: (pct) => `Below ${pct}`,
  above: (pct) => `Above ${pct}`,
  noMargin: 'No margin of sampling error',
  notTested: 'Not tested',
  points: (value) => `${value} points`,
  range: (level, low, high) => `${level} range from ${low} to ${high}`,
  heavierWeighting: (low, high) => `with heavier weighting from ${low} to ${high}`,
  verdict: {
    holds: 'Larger than sampling error alone would usually produce.',
    fragile: 'The poll cannot settle it.',
    'does-not-hold': 'No larger than chance could produce.',
    'cannot-be-tested': 'It cannot be tested.',
  },
  legend: {
    darker: (levels) => `Darker: more likely range (${levels}).`,
    tinted: (side) => `Tinted side: ${side}.`,
    dashed: 'Dashed: heavier weighting.',
    hatched: 'Hatched: the range reaches the tinted side.',
    halfWeight: 'Half-filled weight: the poll cannot settle it.',
    hollowWeight: 'Hollow weight: not shown by this poll.',
    dashedWeight: 'Dashed weight: it cannot be tested.',
  },
};

const WITHOUT_MARGIN: readonly Reason[] = ['no-sampling-basis', 'no-sample-size'];

/** What stands in the place of the water. */
export function untestedNote(reasons: readonly Reason[], words: ChartWords): string {
  return reasons.some((reason) => WITHOUT_MARGIN.includes(reason)) ? words.noMargin : words.notTested;
}

/** A value of the quantity as it is printed at the line or in a sentence. */
export function formatValue(
  value: number,
  decimals: number,
  quantity: 'share' | 'threshold' | 'lead' | 'change' | 'lead-change',
  { locale }: ChartWords,
): string {
  const isShare = quantity === 'share' || quantity === 'threshold';
  return isShare ? formatPercent(value, decimals, locale) : formatSigned(value, decimals, locale);
}

/** Half-width of an interval, in points: ± 6.9. */
export function formatMargin(marginPp: number, { locale }: ChartWords): string {
  return `± ${formatPoints(marginPp, 1, locale)}`;
}

/** A level such as 0.95 as 95%, without decimals it does not need. */
export function formatLevel(level: number, { locale }: ChartWords): string {
  const pct = Number((level * 100).toPrecision(12));
  const decimals = Math.min(6, (String(pct).split('.')[1] ?? '').length);
  return formatPercent(pct, decimals, locale);
}
