/** A column of a CSV file, as text; '' where nothing was written. */
export type Table = ReadonlyMap<string, readonly string[]>;

/** Reads a table that a case names, from the reference set's own data folder. */
export type ReadTable = (name: string) => Table;

/** What a reference file's case is turned into: its keys with the engine's figures. */
export type Figures = { readonly [key: string]: Figure };
export type Figure = number | string | boolean | null | readonly Figure[] | Figures;

/** From the input of a case to the engine's figures under the file's keys. */
export type Entry = (input: Figures, readTable: ReadTable) => Figures;

/** An entry whose input has the shape that the file's cases have; the figures are R's own, so no parsing is lost. */
export function entry<Input extends object>(map: (input: Input, readTable: ReadTable) => Figures): Entry {
  return (input, readTable) => map(input as unknown as Input, readTable);
}

/** A column of numbers. */
export function numbers(table: Table, column: string): number[] {
  const values = table.get(column);
  if (!values) throw new TypeError(`numbers requires the column ${column}`);
  return values.map(Number);
}
