/**
 * A picture as plain data: what is drawn where, in roles instead of colours. Two renderers (SVG text and JSX) make
 * the same picture of it, and evidence keeps it.
 */
export type Scene = {
  widthPx: number;
  heightPx: number;
  title: string;
  description: string;
  nodes: SceneNode[];
};

export type SceneRole =
  | 'land'
  | 'water-1'
  | 'water-2'
  | 'water-3'
  | 'edge'
  | 'inner-edge'
  | 'hatch'
  | 'whisker'
  | 'calm-whisker'
  | 'shore'
  | 'bar-filled'
  | 'bar-hollow'
  | 'lead-line'
  | 'weight'
  | 'weight-half'
  | 'weight-half-fill'
  | 'weight-hollow'
  | 'weight-dashed'
  | 'tick'
  | 'side'
  | 'estimate'
  | 'untested';

export type SceneNode =
  | { kind: 'rect'; role: SceneRole; x: number; y: number; width: number; height: number }
  | { kind: 'line'; role: SceneRole; x1: number; y1: number; x2: number; y2: number }
  | { kind: 'path'; role: SceneRole; d: string }
  | { kind: 'text'; role: SceneRole; x: number; y: number; anchor: 'start' | 'middle' | 'end'; text: string };

/** Three decimals: enough for any screen, and the same bytes on every machine. */
export function roundPx(value: number): number {
  return Math.round(value * 1000) / 1000 + 0;
}
