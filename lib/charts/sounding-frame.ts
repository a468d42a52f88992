/** Where the parts of a sounding stand, top to bottom, in pixels. */
export type SoundingFrame = {
  kind: 'full' | 'row';
  heightPx: number;
  minPadPx: number;
  /** Base lines of the two rows of words above the plot; null where there are none. */
  sideBasePx: number | null;
  estimateBasePx: number | null;
  topPx: number;
  basePx: number;
  barPx: number;
  barHeightPx: number;
  tickBasePx: number | null;
  capPx: number;
  weightScale: number;
};

export const SIDE_PX = 13;
export const ESTIMATE_PX = 15;

/** A full picture carries words; a row for a table is 24 px high and carries none. */
export function soundingFrame(kind: 'full' | 'row', hasSides: boolean): SoundingFrame {
  if (kind === 'row') {
    return {
      kind,
      heightPx: 24,
      minPadPx: 4,
      sideBasePx: null,
      estimateBasePx: null,
      topPx: 2.5,
      basePx: 17,
      barPx: 19.5,
      barHeightPx: 3,
      tickBasePx: null,
      capPx: 8,
      weightScale: 0.62,
    };
  }
  const estimateBasePx = hasSides ? 34 : 16;
  const topPx = estimateBasePx + 9;
  const basePx = topPx + 64;
  return {
    kind,
    heightPx: basePx + 34,
    minPadPx: 10,
    sideBasePx: hasSides ? 13 : null,
    estimateBasePx,
    topPx,
    basePx,
    barPx: basePx + 8,
    barHeightPx: 5,
    tickBasePx: basePx + 28,
    capPx: 14,
    weightScale: 1.15,
  };
}
