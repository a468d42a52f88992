// @ts-check
import { rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { join } from 'node:path';
import { buildIfChanged } from './build.mjs';
import { installIfChanged } from './install.mjs';
import { localBinary, root, run, say } from './process.mjs';
import { addCounts, countBrowser, countUnit } from './test-counts.mjs';
import { ensureChromium } from './toolchain.mjs';

/** @typedef {import('./test-counts.mjs').Counts} Counts */
/** @typedef {{ name: string, quick: boolean, run: () => Promise<Counts> }} Step */

const unitReport = join(root, 'test-results/unit.json');
const browserReport = join(root, 'test-results/browser.json');
const env = { NEXT_TELEMETRY_DISABLED: '1' };

/** @param {boolean} ok @returns {Counts} */
const one = (ok) => (ok ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 });

/** @param {string} name @param {string[]} args */
const tool = async (name, args) => one((await run(localBinary(name), args, { env })) === 0);

let built = false;

/** @type {Step[]} */
const steps = [
  { name: 'types', quick: true, run: checkTypes },
  { name: 'lint', quick: true, run: () => tool('eslint', ['.', '--max-warnings=0']) },
  { name: 'format', quick: true, run: () => tool('prettier', ['--check', '--log-level=warn', '.']) },
  { name: 'migrations', quick: false, run: () => tool('drizzle-kit', ['check']) },
  { name: 'unit and service tests', quick: true, run: runUnitTests },
  { name: 'build', quick: false, run: build },
  { name: 'browser tests', quick: false, run: runBrowserTests },
];

async function checkTypes() {
  const generated = await run(localBinary('next'), ['typegen'], { env });
  return generated === 0 ? tool('tsc', ['--noEmit']) : one(false);
}

async function runUnitTests() {
  rmSync(unitReport, { force: true });
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${unitReport}`];
  const status = await run(localBinary('vitest'), ['run', ...reporters], {
    env: { ...env, NODE_ENV: 'test' },
  });
  return countUnit(unitReport, status);
}

async function build() {
  built = await buildIfChanged();
  return one(built);
}

async function runBrowserTests() {
  if (!built) {
    say('Without a build there is nothing to drive in a browser');
    return one(false);
  }
  const chromium = await ensureChromium();
  if (!chromium) return one(false);
  rmSync(browserReport, { force: true });
  const status = await run(localBinary('playwright'), ['test'], {
    env: {
      ...env,
      CHROMIUM: chromium,
      E2E_PORT: String(await freePort()),
      PLAYWRIGHT_JSON_OUTPUT_FILE: browserReport,
    },
  });
  return countBrowser(browserReport, status);
}

/** A fixed port would fail the tests of whoever has something running on it. @returns {Promise<number>} */
function freePort() {
  return new Promise((resolve) => {
    const probe = createServer().listen(0, () => {
      const address = probe.address();
      probe.close(() => resolve(typeof address === 'object' && address ? address.port : 3100));
    });
  });
}

/** @param {Step} step @returns {Promise<{ name: string, seconds: number, counts: Counts }>} */
async function take(step) {
  say(`\n== ${step.name}`);
  const startedAt = performance.now();
  const counts = await step.run();
  return { name: step.name, seconds: (performance.now() - startedAt) / 1000, counts };
}

process.chdir(root);
const results = [];
if (await installIfChanged()) {
  const quick = process.argv.includes('--quick');
  for (const step of steps.filter((step) => step.quick || !quick)) results.push(await take(step));
} else {
  results.push({ name: 'installation', seconds: 0, counts: one(false) });
}

say('');
for (const { name, seconds, counts } of results) {
  say(`${name.padEnd(24)} ${counts.failed > 0 ? 'failed' : 'ok    '} ${seconds.toFixed(0).padStart(5)} s`);
}
const total = addCounts(results.map((result) => result.counts));
say(`${total.passed} passed, ${total.failed} failed`);
process.exit(total.failed > 0 ? 1 : 0);
