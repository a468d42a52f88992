import { scaleLinear } from 'd3-scale';
import { formatValue, type ChartWords } from './chart-words';
import type { SoundingSpec } from './sounding-spec';
import { textWidthPx } from './text-width';

export const TICK_PX = 12;

export type SoundingScale = {
  /** Pixels of a value, kept inside the plot. */
  x: (value: number) => number;
  leftPx: number;
  rightPx: number;
  /** Values at which the graduated bar changes, ends included. */
  stops: number[];
  stepPp: number;
  ticks: { value: number; label: string }[];
};

type ScaleSize = {
  widthPx: number;
  minPadPx: number;
  domainPp?: readonly [number, number];
  hasLabels: boolean;
};

const NARROWEST_STEP_PX = 30;
const TICK_COUNTS = [12, 10, 8, 7, 6, 5, 4, 3, 2, 1];

/** The axis of one picture: as many graduations as have room for their labels, ends on round numbers. */
export function soundingScale(spec: SoundingSpec, size: ScaleSize, words: ChartWords): SoundingScale {
  const domain = size.domainPp ?? domainOf(spec);
  const counts = TICK_COUNTS.filter((count) => count <= Math.max(2, size.widthPx / NARROWEST_STEP_PX));
  const candidates = counts.map((count) => scaleWith(count, domain, spec, size, words));
  const roomy = candidates.find((scale) => !size.hasLabels || labelsFit(scale));
  return roomy ?? withoutInnerLabels(scaleWith(1, domain, spec, size, words));
}

/** All that the picture shows, with room beside it; shares start at 0 and nothing leaves what is possible. */
export function domainOf(spec: SoundingSpec): [number, number] {
  const values = [
    spec.estimatePp,
    ...spec.bands.flatMap(({ lowPp, highPp }) => [lowPp, highPp]),
    ...(spec.far ? [spec.far.lowPp, spec.far.highPp] : []),
    ...(spec.shorePp === null ? [] : [spec.shorePp]),
    ...(spec.quantity === 'share' ? [0] : []),
  ];
  const [floor, ceiling] = limitsOf(spec);
  const low = Math.max(floor, Math.min(...values));
  const high = Math.min(ceiling, Math.max(...values));
  const span = Math.max(high - low, spec.bands.length > 0 ? 2 : 10);
  const roomLeft = spec.land === 'left' && low >= (spec.shorePp ?? low) ? 0.22 : 0.06;
  const roomRight = spec.land === 'right' && high <= (spec.shorePp ?? high) ? 0.22 : 0.06;
  return [Math.max(floor, low - span * roomLeft), Math.min(ceiling, high + span * roomRight)];
}

/** One axis for several shares: from 0 to the end of the widest. */
export function sharedDomain(specs: readonly SoundingSpec[]): [number, number] {
  return [0, Math.max(1, ...specs.map((spec) => domainOf(spec)[1]))];
}

function limitsOf({ quantity }: SoundingSpec): [number, number] {
  if (quantity === 'share' || quantity === 'threshold') return [0, 100];
  return quantity === 'lead-change' ? [-200, 200] : [-100, 100];
}

function scaleWith(
  count: number,
  domain: readonly [number, number],
  spec: SoundingSpec,
  size: ScaleSize,
  words: ChartWords,
): SoundingScale {
  const scale = scaleLinear().domain(domain).nice(count);
  const [low = 0, high = 1] = scale.domain();
  const values = scale.ticks(count);
  const stepPp = values.length > 1 ? Math.abs((values[1] ?? 0) - (values[0] ?? 0)) : high - low;
  const decimals = Math.min(6, Math.max(0, -Math.floor(Math.log10(stepPp) + 1e-9)));
  const ticks = values.map((value) => ({ value, label: formatValue(value, decimals, spec.quantity, words) }));
  const halfLabel = Math.max(0, ...ticks.map(({ label }) => textWidthPx(label, TICK_PX))) / 2;
  const padPx = size.hasLabels ? Math.max(size.minPadPx, halfLabel + 2) : size.minPadPx;
  const rightPx = size.widthPx - padPx;
  scale.range([padPx, rightPx]).clamp(true);
  const stops = [...new Set([low, ...values, high])].sort((one, other) => one - other);
  return { x: scale, leftPx: padPx, rightPx, stops, stepPp, ticks };
}

const GAP_PX = 9;

function labelsFit({ ticks, x }: SoundingScale): boolean {
  return ticks.every(({ value, label }, at) => {
    const before = ticks[at - 1];
    if (!before) return true;
    const half = (textWidthPx(label, TICK_PX) + textWidthPx(before.label, TICK_PX)) / 2;
    return x(value) - x(before.value) >= half + GAP_PX;
  });
}

function withoutInnerLabels(scale: SoundingScale): SoundingScale {
  return { ...scale, ticks: scale.ticks.filter((_, at) => at === 0 || at === scale.ticks.length - 1) };
}
