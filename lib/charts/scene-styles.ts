import type { SceneRole } from './scene';
import type { TokenName } from './tokens';

type Ink = TokenName | 'none' | 'hatch';

export type RoleStyle = { fill: Ink; stroke?: TokenName; rest?: string };

const TEXT = (fill: TokenName, rest: string): RoleStyle => ({ fill, rest });

/** How each role is drawn. `hatch` is the pattern of the picture itself. */
export const ROLE_STYLES: Record<SceneRole, RoleStyle> = {
  land: { fill: 'land' },
  'water-1': { fill: 'water-1' },
  'water-2': { fill: 'water-2' },
  'water-3': { fill: 'water-3' },
  edge: { fill: 'none', stroke: 'water-4', rest: 'stroke-width:1.4' },
  'inner-edge': { fill: 'none', stroke: 'water-5', rest: 'stroke-width:.8' },
  hatch: { fill: 'hatch' },
  whisker: { fill: 'none', stroke: 'caution', rest: 'stroke-width:1.6;stroke-dasharray:4 3' },
  'calm-whisker': { fill: 'none', stroke: 'water-4', rest: 'stroke-width:1.6;stroke-dasharray:4 3' },
  shore: { fill: 'none', stroke: 'ink', rest: 'stroke-width:1.5;stroke-dasharray:1 3;stroke-linecap:round' },
  'bar-filled': { fill: 'ink', stroke: 'ink', rest: 'stroke-width:.8' },
  'bar-hollow': { fill: 'paper', stroke: 'ink', rest: 'stroke-width:.8' },
  'lead-line': { fill: 'none', stroke: 'ink', rest: 'stroke-width:1.6' },
  weight: { fill: 'ink' },
  'weight-half': { fill: 'paper', stroke: 'caution', rest: 'stroke-width:1.4' },
  'weight-half-fill': { fill: 'caution' },
  'weight-hollow': { fill: 'paper', stroke: 'ink', rest: 'stroke-width:1.4' },
  'weight-dashed': { fill: 'paper', stroke: 'soft', rest: 'stroke-width:1.4;stroke-dasharray:2.6 1.8' },
  tick: TEXT('soft', 'font-size:12px'),
  side: TEXT('soft', 'font-size:13px'),
  estimate: TEXT('ink', 'font-size:15px;font-weight:600'),
  untested: TEXT('soft', 'font-size:13px'),
};
