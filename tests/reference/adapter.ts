import { findingsEntries } from './entries/findings';
import type { Entry } from './entry';

/** From the name of a reference file to what runs its cases on the engine. It maps names and computes nothing. */
export const entries: Readonly<Record<string, Entry>> = { ...findingsEntries };
