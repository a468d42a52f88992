import { line } from 'd3-shape';
import { roundPx, type SceneNode, type SceneRole } from './scene';
import type { SoundingFrame } from './sounding-frame';
import type { SoundingScale } from './sounding-scale';
import type { SoundingBand, SoundingSpec } from './sounding-spec';

const INSETS = [0, 0.16, 0.3];

/** The side where the claim fails. Nothing fails or stands where nothing was tested. */
export function landNodes(spec: SoundingSpec, scale: SoundingScale, frame: SoundingFrame): SceneNode[] {
  if (spec.shorePp === null || spec.land === null || spec.bands.length === 0) return [];
  const shore = scale.x(spec.shorePp);
  const [from, to] = spec.land === 'left' ? [scale.leftPx, shore] : [shore, scale.rightPx];
  return block('land', from, to, frame.topPx, frame.basePx);
}

/** Bands, their edge lines (in a row the outermost alone), hatching where the outermost reaches over the shore, the whisker. */
export function waterNodes(spec: SoundingSpec, scale: SoundingScale, frame: SoundingFrame): SceneNode[] {
  const bands = spec.bands.map((band, at) => ({ band, ...depthOf(at, spec.bands.length, frame) }));
  return [
    ...bands.flatMap(({ band, role, top, base }) =>
      bandNodes(role, onWater(band, role, spec), scale, top, base),
    ),
    ...hatchNodes(spec, scale, frame),
    ...bands
      .filter(({ role }) => frame.kind === 'full' || role === 'water-1')
      .flatMap(({ band, role, top, base }) => edgeNodes(role, band, scale, top, base)),
    ...whiskerNodes(spec, scale, frame),
  ];
}

/** The outermost band is palest; the innermost deepest however many there are. */
function depthOf(at: number, count: number, frame: SoundingFrame) {
  const depth = at === 0 ? 0 : at === count - 1 ? 2 : 1;
  const inset = (INSETS[depth] ?? 0) * (frame.basePx - frame.topPx);
  const role: SceneRole = depth === 0 ? 'water-1' : depth === 1 ? 'water-2' : 'water-3';
  return { role, top: frame.topPx + inset, base: frame.basePx - inset };
}

/** The deepest water ends at the shore, so that the hatching beyond it stays legible; its edge lines go on. */
function onWater(band: SoundingBand, role: SceneRole, { shorePp, land }: SoundingSpec): SoundingBand {
  if (role !== 'water-3' || shorePp === null) return band;
  return land === 'left'
    ? { ...band, lowPp: Math.max(band.lowPp, shorePp) }
    : { ...band, highPp: Math.min(band.highPp, shorePp) };
}

function bandNodes(role: SceneRole, band: SoundingBand, scale: SoundingScale, top: number, base: number) {
  return block(role, scale.x(band.lowPp), scale.x(band.highPp), top, base);
}

function edgeNodes(
  role: SceneRole,
  band: SoundingBand,
  scale: SoundingScale,
  top: number,
  base: number,
): SceneNode[] {
  const edge: SceneRole = role === 'water-1' ? 'edge' : 'inner-edge';
  return [band.lowPp, band.highPp].map((value) => upright(edge, scale.x(value), top, base));
}

function hatchNodes(spec: SoundingSpec, scale: SoundingScale, frame: SoundingFrame): SceneNode[] {
  const outer = spec.bands[0];
  if (!outer || spec.shorePp === null) return [];
  const [low, high] =
    spec.land === 'left'
      ? [outer.lowPp, Math.min(spec.shorePp, outer.highPp)]
      : [Math.max(spec.shorePp, outer.lowPp), outer.highPp];
  return block('hatch', scale.x(low), scale.x(high), frame.topPx, frame.basePx);
}

/**
 * How far the interval goes at the far end of the design effect's range; calm only where the claim holds. A share
 * in a row claims nothing and has no room for it.
 */
function whiskerNodes(spec: SoundingSpec, scale: SoundingScale, frame: SoundingFrame): SceneNode[] {
  const outer = spec.bands[0];
  const isShareRow = spec.verdict === null && frame.kind === 'row';
  if (!outer || !spec.far || isShareRow) return [];
  const role: SceneRole = spec.verdict === 'holds' || spec.verdict === null ? 'calm-whisker' : 'whisker';
  const arms: [number, number][] = [
    [scale.x(outer.lowPp), scale.x(spec.far.lowPp)],
    [scale.x(outer.highPp), scale.x(spec.far.highPp)],
  ];
  const y = roundPx((frame.topPx + frame.basePx) / 2);
  const half = frame.capPx / 2;
  return arms.flatMap(([from, to]): SceneNode[] => {
    const [start, end] = [roundPx(from), roundPx(to)];
    if (start === end) return [];
    const arm = path([
      [start, y],
      [end, y],
    ]);
    const cap = path([
      [end, roundPx(y - half)],
      [end, roundPx(y + half)],
    ]);
    return [{ kind: 'path', role, d: arm + cap }];
  });
}

function path(points: [number, number][]): string {
  return line().digits(3)(points) ?? '';
}

function block(role: SceneRole, from: number, to: number, top: number, base: number): SceneNode[] {
  const [x, y] = [roundPx(from), roundPx(top)];
  const width = roundPx(roundPx(to) - x);
  return width > 0 ? [{ kind: 'rect', role, x, y, width, height: roundPx(base - top) }] : [];
}

function upright(role: SceneRole, at: number, top: number, base: number): SceneNode {
  const x = roundPx(at);
  return { kind: 'line', role, x1: x, y1: roundPx(top), x2: x, y2: roundPx(base) };
}
