import { formatMargin, formatValue, type ChartWords } from './chart-words';
import { roundPx, type SceneNode } from './scene';
import { ESTIMATE_PX, SIDE_PX, type SoundingFrame } from './sounding-frame';
import type { SoundingScale } from './sounding-scale';
import type { SoundingSpec } from './sounding-spec';
import { fitText, textWidthPx, wrapText } from './text-width';

/** The figure over the line: its text, the middle of its box and the width it may take. */
export type EstimateLabel = { text: string; xPx: number; widthPx: number };

type Size = { widthPx: number; hasMargin?: boolean };

const EDGE_PX = 2;
const BOLD = 1.06;

/** Whose value and the value; a long name is cut, never the figure. Kept inside the picture. */
export function estimateLabel(
  spec: SoundingSpec,
  size: Size,
  scale: SoundingScale,
  words: ChartWords,
): EstimateLabel {
  const value = valueText(spec, size.hasMargin ?? true, words);
  const fontPx = ESTIMATE_PX * BOLD;
  const roomPx = size.widthPx - 2 * EDGE_PX - textWidthPx(` ${value}`, fontPx);
  const name = fitText(spec.name, roomPx, fontPx);
  const text = name ? `${name} ${value}` : value;
  const widthPx = textWidthPx(text, fontPx);
  const half = widthPx / 2 + EDGE_PX;
  const xPx = Math.min(Math.max(scale.x(spec.estimatePp), half), size.widthPx - half);
  return { text, xPx: roundPx(xPx), widthPx };
}

function valueText(spec: SoundingSpec, hasMargin: boolean, words: ChartWords): string {
  const value = formatValue(spec.estimatePp, spec.decimals, spec.quantity, words);
  const outer = spec.bands[0];
  const isSymmetric = spec.quantity !== 'share' && spec.quantity !== 'threshold';
  if (!hasMargin || !outer || !isSymmetric) return value;
  return `${value} ${formatMargin((outer.highPp - outer.lowPp) / 2, words)}`;
}

/** The words of a full picture; a row has none. */
export function labelNodes(
  spec: SoundingSpec,
  size: Size,
  scale: SoundingScale,
  frame: SoundingFrame,
  label: EstimateLabel,
): SceneNode[] {
  if (frame.estimateBasePx === null) return [];
  return [
    {
      kind: 'text',
      role: 'estimate',
      x: label.xPx,
      y: frame.estimateBasePx,
      anchor: 'middle',
      text: label.text,
    },
    ...sideNodes(spec, size, scale, frame),
    ...noteNodes(spec, size, scale, frame),
  ];
}

const SHORE_GAP_PX = 8;
const BETWEEN_PX = 14;

/** The two sides by name, on either side of the shore; where one has no room both move, and the arrows still tell. */
function sideNodes(spec: SoundingSpec, size: Size, scale: SoundingScale, frame: SoundingFrame): SceneNode[] {
  const y = frame.sideBasePx;
  if (!spec.sides || spec.shorePp === null || y === null) return [];
  const roomPx = size.widthPx - 2 * EDGE_PX;
  const eachPx = (roomPx - BETWEEN_PX) / 2 - textWidthPx('‹ ', SIDE_PX);
  const left = `‹ ${fitText(spec.sides.left, eachPx, SIDE_PX)}`;
  const right = `${fitText(spec.sides.right, eachPx, SIDE_PX)} ›`;
  const [leftPx, rightPx] = [textWidthPx(left, SIDE_PX), textWidthPx(right, SIDE_PX)];
  const shore = scale.x(spec.shorePp);
  const leftEnd = Math.min(
    Math.max(shore - SHORE_GAP_PX, EDGE_PX + leftPx),
    size.widthPx - EDGE_PX - rightPx - BETWEEN_PX,
  );
  const rightStart = Math.min(
    Math.max(shore + SHORE_GAP_PX, leftEnd + BETWEEN_PX),
    size.widthPx - EDGE_PX - rightPx,
  );
  return [
    { kind: 'text', role: 'side', x: roundPx(leftEnd), y, anchor: 'end', text: left },
    { kind: 'text', role: 'side', x: roundPx(rightStart), y, anchor: 'start', text: right },
  ];
}

const LINE_PX = 17;
const WEIGHT_PX = 12;

/** What is said in the place of the water, on the roomiest stretch that neither the line nor the shore crosses. */
function noteNodes(spec: SoundingSpec, size: Size, scale: SoundingScale, frame: SoundingFrame): SceneNode[] {
  if (spec.untestedNote === null) return [];
  const { x, roomPx, anchor } = noteRoom(spec, size, scale);
  const lines = wrapText(spec.untestedNote, roomPx, SIDE_PX);
  const middle = (frame.topPx + frame.basePx) / 2 + SIDE_PX / 3;
  const first = middle - ((lines.length - 1) * LINE_PX) / 2;
  return lines.map((text, at) => ({
    kind: 'text',
    role: 'untested',
    x: roundPx(x),
    y: roundPx(first + at * LINE_PX),
    anchor,
    text,
  }));
}

type Room = { x: number; roomPx: number; anchor: 'start' | 'end' };

/** Where the note hangs: off the estimate where the roomiest stretch reaches it, else off the shore. */
function noteRoom(spec: SoundingSpec, size: Size, scale: SoundingScale): Room {
  const at = scale.x(spec.estimatePp);
  const marks = [
    { x: at, gapPx: WEIGHT_PX },
    ...(spec.shorePp === null ? [] : [{ x: scale.x(spec.shorePp), gapPx: SHORE_GAP_PX }]),
  ];
  const edges = [
    { x: 0, gapPx: EDGE_PX },
    ...marks.toSorted((one, other) => one.x - other.x),
    { x: size.widthPx, gapPx: EDGE_PX },
  ];
  const rooms = edges.slice(1).map((right, before): Room => {
    const left = edges[before] ?? right;
    const [from, to] = [left.x + left.gapPx, right.x - right.gapPx];
    const hangsRight = before === 0 || right.x === at;
    return { x: hangsRight ? to : from, roomPx: to - from, anchor: hangsRight ? 'end' : 'start' };
  });
  return rooms.reduce((best, room) => (room.roomPx >= best.roomPx ? room : best));
}
