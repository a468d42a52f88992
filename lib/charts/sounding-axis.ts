import { roundPx, type SceneNode } from './scene';
import type { SoundingFrame } from './sounding-frame';
import type { SoundingScale } from './sounding-scale';

/** The graduated bar of a chart's border: filled and hollow by turns, numbered at its changes. */
export function axisNodes(scale: SoundingScale, frame: SoundingFrame): SceneNode[] {
  const segments = scale.stops.slice(1).map((end, at): SceneNode => {
    const start = scale.stops[at] ?? end;
    const isHollow = Math.abs(Math.round(start / scale.stepPp)) % 2 === 1;
    const [x, to] = [roundPx(scale.x(start)), roundPx(scale.x(end))];
    return {
      kind: 'rect',
      role: isHollow ? 'bar-hollow' : 'bar-filled',
      x,
      y: frame.barPx,
      width: roundPx(to - x),
      height: frame.barHeightPx,
    };
  });
  const y = frame.tickBasePx;
  if (y === null) return segments;
  const ticks = scale.ticks.map(({ value, label }): SceneNode => ({
    kind: 'text',
    role: 'tick',
    x: roundPx(scale.x(value)),
    y,
    anchor: 'middle',
    text: label,
  }));
  return [...segments, ...ticks];
}
