import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import type { Figure, Figures, ReadTable } from '../reference/entry';
import { readCsv } from '../reference/reference-set';

/** One example out of the literature or a manual, with the figures printed there and R 4.2.2's own. */
export type PublishedEntry = {
  readonly id: string;
  readonly source: string;
  /** The printed figures were recalled, with no copy of the source at hand. */
  readonly from_memory: boolean;
  readonly input: Figures;
  /** As printed, to `digits` decimals; null in a list is printed as "<0", null alone where nothing is printed. */
  readonly published: number | readonly (number | null)[] | null;
  readonly digits?: number | readonly number[];
  readonly computed: Figure;
  /** Whether R's figure rounds to the printed one; where it does not, `note` says why. */
  readonly agrees?: readonly (boolean | null)[];
  readonly note?: string;
};

const at = (path: string) => fileURLToPath(new URL(path, import.meta.url));

export const publishedEntries = JSON.parse(
  readFileSync(at('./published.json'), 'utf8'),
) as readonly PublishedEntry[];

/** A data set in `data/`. */
export const readPublishedTable: ReadTable = (name) => readCsv(at(`./data/${name}`));
