import { symbol } from 'd3-shape';
import { roundPx, type SceneNode, type SceneRole } from './scene';
import type { SoundingFrame } from './sounding-frame';
import type { SoundingScale } from './sounding-scale';
import type { SoundingSpec } from './sounding-spec';

/**
 * The line and its weight, let down to the estimate. The weight says the verdict by its filling, as the mark
 * beside the verdict's word does.
 */
export function leadNodes(spec: SoundingSpec, scale: SoundingScale, frame: SoundingFrame): SceneNode[] {
  const x = roundPx(scale.x(spec.estimatePp));
  const tip = frame.basePx - 1 - WEIGHT_HEIGHT * frame.weightScale;
  const from = frame.estimateBasePx === null ? 0 : frame.estimateBasePx + 5;
  const draw = (role: SceneRole, half = false): SceneNode => ({
    kind: 'path',
    role,
    d: weightPath(x, tip, frame.weightScale, half),
  });
  return [
    { kind: 'line', role: 'lead-line', x1: x, y1: roundPx(from), x2: x, y2: roundPx(tip + 1) },
    ...weightRoles(spec).map((role) => draw(role, role === 'weight-half-fill')),
  ];
}

function weightRoles({ verdict, bands }: SoundingSpec): SceneRole[] {
  if (bands.length === 0 || verdict === 'cannot-be-tested') return ['weight-dashed'];
  if (verdict === 'fragile') return ['weight-half', 'weight-half-fill'];
  return [verdict === 'does-not-hold' ? 'weight-hollow' : 'weight'];
}

const WEIGHT_HEIGHT = 15;

/** A drop with its tip at (x, tip); the half is its left side. */
function weightPath(x: number, tip: number, scale: number, half: boolean): string {
  const shape = symbol({
    draw(context) {
      const px = (dx: number) => x + dx * scale;
      const py = (dy: number) => tip + dy * scale;
      context.moveTo(px(0), py(0));
      if (!half) {
        context.bezierCurveTo(px(3), py(3), px(5), py(7), px(5), py(10));
        context.bezierCurveTo(px(5), py(12.76), px(2.76), py(15), px(0), py(15));
      } else {
        context.lineTo(px(0), py(15));
      }
      context.bezierCurveTo(px(-2.76), py(15), px(-5), py(12.76), px(-5), py(10));
      context.bezierCurveTo(px(-5), py(7), px(-3), py(3), px(0), py(0));
      context.closePath();
    },
  });
  return shape.digits(3)() ?? '';
}
