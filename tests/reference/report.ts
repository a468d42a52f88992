import type { FileReport } from './run-file';

const MOST_FAULTS = 20;

/** A file's line, and below it what went wrong. */
export function printFile(report: FileReport): string {
  const { path, cases, figures, worst, bySize, faults } = report;
  if (cases === 0) return [path, ...faults.map((fault) => `  FAILED ${fault}`)].join('\n');
  const line = [
    path.padEnd(36),
    `${cases} cases`.padStart(10),
    `${figures} figures`.padStart(15),
    `  worst relative error ${worst ? printError(worst.relative) : 'none'}`,
    worst && worst.relative > 0 ? ` (${worst.at})` : '',
    bySize.count > 0 ? `; ${bySize.count} near 0, off by at most ${printError(bySize.largest)}` : '',
  ].join('');
  const more = faults.length - MOST_FAULTS;
  const shown = faults.slice(0, MOST_FAULTS).map((fault) => `  FAILED ${fault}`);
  return [line, ...shown, ...(more > 0 ? [`  and ${more} more`] : [])].join('\n');
}

/** The last line: cases, by outcome; a file that could not be run counts as one that failed. */
export function printTotal(reports: readonly FileReport[]): string {
  const sum = (count: (report: FileReport) => number) =>
    reports.reduce((total, one) => total + count(one), 0);
  const failed = sum(({ failedCases }) => failedCases);
  const wholeFiles = sum(({ cases }) => (cases === 0 ? 1 : 0));
  return `${sum(({ cases }) => cases) - failed} passed, ${failed + wholeFiles} failed`;
}

function printError(relative: number): string {
  return relative === 0 ? '0' : relative.toExponential(1);
}
