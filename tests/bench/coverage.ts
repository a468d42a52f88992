/** Coverage of the intervals, size of the tests, size and power of the verdicts. `--draws=N` for fewer or more. */
import { mkdirSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { fileURLToPath } from 'node:url';
import { format, resolveConfig } from 'prettier';
import {
  clusteredCoverageTable,
  differenceCoverageTable,
  exactCoverageTable,
  testSizeTable,
} from './coverage-tables';
import { verdictMarkdown, verdictTable } from './verdict-table';

const SEED = 20_040_701;
const DRAWS = 10_000;

const draws = Number(process.argv.find((one) => one.startsWith('--draws='))?.slice(8) ?? DRAWS);
if (!Number.isInteger(draws) || draws < 100) throw new RangeError('--draws requires a whole number from 100');

const verdicts = verdictTable(draws, SEED);
const simulated = `${draws} draws a row, seed ${SEED}; ± is the Monte Carlo standard error.`;
const sections = [
  '# Coverage and size',
  'Level 0.95, percent. Clustered polls are drawn so that the design effect named is their true one.',
  '## Coverage of the intervals of a share, simple random samples (exact sums)',
  exactCoverageTable(),
  `## Coverage of the intervals of a share, clustered samples\n\n${simulated}`,
  clusteredCoverageTable(draws, SEED),
  `## Coverage of the intervals of a difference\n\n${simulated}`,
  differenceCoverageTable(draws, SEED),
  `## Size of the tests at 5 percent\n\n${simulated} Two options at p each; two polls of one population.`,
  testSizeTable(draws, SEED),
  verdictMarkdown(verdicts).replace(/^#/gm, '##'),
];

await write('../../test-results/coverage.md', sections.join('\n\n'));
process.stdout.write(`${sections.join('\n\n')}\n`);
// Only the full run is kept with the code: it is the same again until the engine changes.
if (draws === DRAWS) {
  await write('results/verdict-rates.json', JSON.stringify(verdicts));
  await write('results/verdict-rates.md', verdictMarkdown(verdicts));
}

async function write(name: string, text: string): Promise<void> {
  const path = fileURLToPath(new URL(name, import.meta.url));
  mkdirSync(dirname(path), { recursive: true });
  writeFileSync(path, await format(text, { ...(await resolveConfig(path)), filepath: path }));
}
