import { combine, compare, nothing, type Comparison } from './compare';
import type { Entry, Figures, ReadTable } from './entry';
import { readCases, type ReferenceCase, type ReferenceFile } from './reference-set';
import { toleranceOf } from './tolerances';

export type FileReport = {
  readonly path: string;
  readonly cases: number;
  readonly failedCases: number;
  readonly figures: number;
  readonly worst: Comparison['worst'];
  readonly bySize: Comparison['bySize'];
  /** One line for every fault, beginning with the case where it is one case's. */
  readonly faults: readonly string[];
};

/** Runs every case of one file through its entry; a case that throws is a fault, and the next one is run. */
export function runFile(
  set: string,
  file: ReferenceFile,
  entries: Readonly<Record<string, Entry>>,
  readTable: ReadTable,
): FileReport {
  const run = Object.hasOwn(entries, file.name) ? entries[file.name] : undefined;
  if (!run) return faulty(file.path, 'the adapter has no entry of that name');
  let cases: ReferenceCase[];
  try {
    cases = readCases(set, file);
  } catch (error) {
    return faulty(file.path, messageOf(error));
  }
  if (cases.length === 0) return faulty(file.path, 'the file is empty');
  const results = cases.map((one) => runCase(one, file, run, readTable));
  const { figures, worst, bySize, faults } = combine(results);
  const failedCases = results.filter((one) => one.faults.length > 0).length;
  return { path: file.path, cases: cases.length, failedCases, figures, worst, bySize, faults };
}

function runCase(one: ReferenceCase, file: ReferenceFile, run: Entry, readTable: ReadTable): Comparison {
  const named = (text: string) => `${one.id}: ${text}`;
  try {
    const answer = run(one.input as Figures, readTable);
    const result = compare(answer, one.expected, (field) => toleranceOf(file.name, field), {
      closed: file.path.startsWith('findings/'),
    });
    if (result.figures === 0) return { ...result, faults: [named('nothing is expected of it')] };
    const worst = result.worst && { ...result.worst, at: `${one.id} ${result.worst.at}` };
    return { ...result, worst, faults: result.faults.map(named) };
  } catch (error) {
    return { ...nothing, faults: [named(`threw ${messageOf(error)}`)] };
  }
}

/** A file that fails as a whole: none of its cases was run. */
export function faulty(path: string, fault: string): FileReport {
  return { path, cases: 0, failedCases: 0, ...nothing, faults: [fault] };
}

function messageOf(error: unknown): string {
  return error instanceof Error ? `${error.name}: ${error.message}` : String(error);
}
