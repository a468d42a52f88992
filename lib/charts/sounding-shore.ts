import { roundPx, type SceneNode } from './scene';
import type { SoundingFrame } from './sounding-frame';
import type { EstimateLabel } from './sounding-labels';
import type { SoundingScale } from './sounding-scale';
import type { SoundingSpec } from './sounding-spec';

/** The line at which the claim begins to fail, up to the words on its two sides, past the figure at the estimate. */
export function shoreNodes(
  spec: SoundingSpec,
  scale: SoundingScale,
  frame: SoundingFrame,
  label: EstimateLabel,
): SceneNode[] {
  if (spec.shorePp === null) return [];
  const x = roundPx(scale.x(spec.shorePp));
  const [top, base] = [frame.topPx - 2, frame.basePx + (frame.kind === 'row' ? 2 : 5)];
  const isClear = Math.abs(x - label.xPx) > label.widthPx / 2 + 5;
  const isHung = frame.estimateBasePx !== null && isClear;
  const from = isHung && frame.sideBasePx !== null ? frame.sideBasePx + 6 : top;
  return [{ kind: 'line', role: 'shore', x1: x, y1: roundPx(from), x2: x, y2: roundPx(base) }];
}
