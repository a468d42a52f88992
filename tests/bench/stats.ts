/** Speed of the engine against R on the same data, in one run. `--strict` fails on a missed aim too. */
import { mkdtempSync, rmSync } from 'node:fs';
import { cpus, tmpdir } from 'node:os';
import { join } from 'node:path';
import { benchFindings, benchMemory } from './bench-findings';
import { benchRespondents } from './bench-respondents';
import { benchSeries } from './bench-series';
import { ensureR, versionOfR } from './r';
import { Report } from './report';

async function main(): Promise<number> {
  ensureR();
  const report = new Report();
  report.say(
    `Node ${process.versions.node}, ${versionOfR()}, ${cpus().length} × ${cpus()[0]?.model ?? 'unknown'}`,
  );
  const folder = mkdtempSync(join(tmpdir(), 'leadline-bench-'));
  try {
    report.say("Times are the fastest of many: ours by the clock, R's in processor time.");
    await benchFindings(report, folder);
    benchMemory(report);
    await benchRespondents(report, folder);
    await benchSeries(report, folder);
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
  return report.end(process.argv.includes('--strict'));
}

main().then(
  (status) => process.exit(status),
  (error: unknown) => {
    console.error(error);
    process.exit(1);
  },
);
