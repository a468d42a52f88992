import { entries } from '../../reference/adapter';
import type { Figure, Figures, ReadTable } from '../../reference/entry';

/** From the input of a published entry to the engine's figures, in the order or under the keys of the entry. */
export type Call = (input: Figures, readTable: ReadTable) => Figure;

/** A call whose input has the shape that the entries of its name have. */
export function call<Input extends object>(map: (input: Input, readTable: ReadTable) => Figure): Call {
  return (input, readTable) => map(input as unknown as Input, readTable);
}

/** The engine's figures for an input that has the shape of a reference file's. */
export function engine(file: string, input: Figures, readTable: ReadTable = noTable): Figures {
  const run = entries[file];
  if (!run) throw new TypeError(`engine requires an entry of the adapter; ${file} is none`);
  return run(input, readTable);
}

/** One of the engine's figures. */
export function figureOf(figures: Figures, key: string): number {
  const figure = figures[key];
  if (typeof figure !== 'number') throw new TypeError(`figureOf requires a number at ${key}`);
  return figure;
}

/** Both ends of one of the engine's intervals. */
export function endsOf(figures: Figures, key: string): [low: number, high: number] {
  const ends = figures[key];
  if (!Array.isArray(ends)) throw new TypeError(`endsOf requires an interval at ${key}`);
  const [low, high] = ends as readonly Figure[];
  if (typeof low !== 'number' || typeof high !== 'number')
    throw new TypeError(`endsOf requires two ends at ${key}`);
  return [low, high];
}

const noTable: ReadTable = (name) => {
  throw new TypeError(`no table is at hand; ${name} was asked for`);
};
