// @ts-check
import { existsSync, readFileSync } from 'node:fs';

/** @typedef {{ passed: number, failed: number }} Counts */

/**
 * A test that was skipped proves nothing, so it counts as failed; so does a runner that ends badly
 * without naming a failed test (a file that does not load, an error outside any test).
 * @param {Counts} counts
 * @param {number} status the runner's exit status
 * @returns {Counts}
 */
function withStatus(counts, status) {
  const silent = counts.failed === 0 && (status !== 0 || counts.passed === 0);
  return silent ? { ...counts, failed: 1 } : counts;
}

/**
 * @param {string} file the JSON report of vitest
 * @param {number} status
 * @returns {Counts}
 */
export function countUnit(file, status) {
  const report = readReport(file);
  if (!report) return { passed: 0, failed: 1 };
  const passed = Number(report.numPassedTests ?? 0);
  const failed = Number(report.numTotalTests ?? 0) - passed;
  return withStatus({ passed, failed }, status);
}

/**
 * @param {string} file the JSON report of Playwright
 * @param {number} status
 * @returns {Counts}
 */
export function countBrowser(file, status) {
  const report = readReport(file);
  if (!report?.stats) return { passed: 0, failed: 1 };
  const { expected = 0, unexpected = 0, flaky = 0, skipped = 0 } = report.stats;
  return withStatus({ passed: expected, failed: unexpected + flaky + skipped }, status);
}

/** @param {string} file */
function readReport(file) {
  if (!existsSync(file)) return null;
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return null;
  }
}

/**
 * @param {Counts[]} all
 * @returns {Counts}
 */
export function addCounts(all) {
  return {
    passed: all.reduce((sum, counts) => sum + counts.passed, 0),
    failed: all.reduce((sum, counts) => sum + counts.failed, 0),
  };
}
