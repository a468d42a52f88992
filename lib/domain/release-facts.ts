import type { Disclosed } from './disclosed';
import type { Mode, Population, RaceKind, StatedDesign, ThresholdBase } from './vocabulary';

/** An interval as a pollster prints it: half-width in points, the unit it is rounded to, its level 0–1. */
export type StatedMargin = { pp: number; unit: number; level: number };

export type FactShare = {
  option: string;
  /** Units of the last printed decimal (47.0 with one decimal is 470); null where not disclosed. */
  units: number | null;
  isAnswer: boolean;
};

export type FactThreshold = { option: string; pct: number; base: ThresholdBase };

/**
 * One version of one release, one question on one base, as plain data: what findings, wording and charts are
 * made from, and what evidence keeps. Days are `YYYY-MM-DD`.
 */
export type ReleaseFacts = {
  releaseId: string;
  versionId: string;
  version: number;
  race: { id: string; name: string; kind: RaceKind; thresholds: FactThreshold[] };
  pollster: { id: string; name: string };
  sponsor: Disclosed<{ id: string; name: string }>;
  population: Disclosed<Population>;
  sampleSource: 'probability' | 'quota' | 'opt-in' | 'blended' | 'unknown';
  mode: Disclosed<Mode>;
  design: StatedDesign;
  fieldStartOn: string;
  fieldEndOn: string;
  publishedOn: string;
  n: Disclosed<number>;
  deff: { source: 'design' | 'kish' | 'stated'; value: number; df: number | null } | null;
  statedMargin: Disclosed<StatedMargin>;
  modelledInterval: StatedMargin | null;
  questionWording: Disclosed<string>;
  decimals: number;
  shares: FactShare[];
  sourceUrl: Disclosed<string>;
};

/** Percent as printed of a share kept in units, e.g. 470 with one decimal is 47. */
export function pctOf(units: number, decimals: number): number {
  return units / 10 ** decimals;
}
