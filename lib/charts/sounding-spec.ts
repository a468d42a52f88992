import type { Verdict } from '@/lib/findings/check-types';

export type SoundingQuantity = 'lead' | 'change' | 'lead-change' | 'threshold' | 'share';

export type SoundingBand = { level: number; lowPp: number; highPp: number };

/**
 * One quantity with its uncertainty, as plain data: all that its picture is made from. Values are points for leads
 * and changes, percent of the base for shares and thresholds.
 */
export type SoundingSpec = {
  quantity: SoundingQuantity;
  /** null for a share, which claims nothing. */
  verdict: Verdict | null;
  /** Neutral name of the quantity, such as "Alder minus Brook". */
  label: string;
  /** Whose value stands at the line, such as "Alder"; empty where the label says it already. */
  name: string;
  estimatePp: number;
  decimals: number;
  /** Outermost first; empty where nothing has a margin. */
  bands: SoundingBand[];
  /** The outermost band at the far end of the design effect's range. */
  far: { lowPp: number; highPp: number } | null;
  /** Where the claim begins to fail; null for a share. */
  shorePp: number | null;
  /** The side on which the claim fails. */
  land: 'left' | 'right' | null;
  sides: { left: string; right: string } | null;
  /** What is said in the place of the water where there is none. */
  untestedNote: string | null;
};
