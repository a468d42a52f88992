import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { addCounts, countBrowser, countUnit } from '@/lib/cli/test-counts.mjs';

const folder = mkdtempSync(join(tmpdir(), 'leadline-counts-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

function report(content: unknown): string {
  const file = join(folder, 'report.json');
  writeFileSync(file, typeof content === 'string' ? content : JSON.stringify(content));
  return file;
}

describe('counting what the runners report', () => {
  it('takes the numbers as they are', () => {
    expect(countUnit(report({ numTotalTests: 12, numPassedTests: 12 }), 0)).toEqual({
      passed: 12,
      failed: 0,
    });
    expect(countBrowser(report({ stats: { expected: 5, unexpected: 2 } }), 1)).toEqual({
      passed: 5,
      failed: 2,
    });
  });

  it('counts a skipped and an unsteady test as failed', () => {
    expect(countUnit(report({ numTotalTests: 12, numPassedTests: 11 }), 0)).toEqual({
      passed: 11,
      failed: 1,
    });
    const unsteady = { stats: { expected: 5, unexpected: 0, flaky: 1, skipped: 1 } };
    expect(countBrowser(report(unsteady), 0)).toEqual({ passed: 5, failed: 2 });
  });

  it('counts a runner that ends badly although no test failed', () => {
    expect(countUnit(report({ numTotalTests: 3, numPassedTests: 3 }), 1)).toEqual({ passed: 3, failed: 1 });
  });

  it('counts a runner that ran nothing', () => {
    expect(countUnit(report({ numTotalTests: 0, numPassedTests: 0 }), 0)).toEqual({ passed: 0, failed: 1 });
  });

  it('counts a report that is missing or broken', () => {
    expect(countUnit(join(folder, 'absent.json'), 0)).toEqual({ passed: 0, failed: 1 });
    expect(countBrowser(report('{ "stats":'), 0)).toEqual({ passed: 0, failed: 1 });
  });

  it('adds them up', () => {
    const all = [
      { passed: 1, failed: 0 },
      { passed: 40, failed: 2 },
    ];
    expect(addCounts(all)).toEqual({ passed: 41, failed: 2 });
  });
});
