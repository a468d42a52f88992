import type { Entry } from './entry';
import { findingsEntries } from './entries/findings';
import { planningEntries } from './entries/planning';
import { proportionEntries } from './entries/proportions';
import { samplesEntries } from './entries/samples';
import { seriesEntries } from './entries/series';

/** From the name of a reference file to what runs its cases on the engine. It maps names and computes nothing. */
export const entries: Readonly<Record<string, Entry>> = {
  ...proportionEntries,
  ...planningEntries,
  ...samplesEntries,
  ...seriesEntries,
  ...findingsEntries,
};
