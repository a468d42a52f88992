// @ts-check
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** @type {import('@stryker-mutator/api/core').PartialStrykerOptions} */
const config = {
  testRunner: 'in-process',
  plugins: ['./tests/bench/mutation-runner.mjs'],
  mutate: [
    'lib/stats/**/*.ts',
    'lib/findings/**/*.ts',
    '!lib/**/*.d.ts',
    '!lib/stats/index.ts',
    '!lib/findings/archive/**',
    '!lib/findings/engine-{entry,version}.ts',
    '!lib/**/*-types.ts',
  ],
  ignorePatterns: [
    '.next',
    '.data',
    '.e2e',
    'test-results',
    'playwright-report',
    'coverage',
    'app',
    'components',
    'db',
    'drizzle',
    'public',
    'tests/{app,auth,charts,cli,components,e2e,format,import,look,services}',
  ],
  coverageAnalysis: 'perTest',
  ignoreStatic: true,
  concurrency: 2,
  timeoutMS: 10_000,
  tempDirName: join(tmpdir(), 'leadline-mutation'),
  cleanTempDir: 'always',
  reporters: ['clear-text', 'html', 'json'],
  clearTextReporter: { allowColor: false, logTests: false, reportTests: false, allowEmojis: false },
  htmlReporter: { fileName: 'test-results/mutation/report.html' },
  jsonReporter: { fileName: 'test-results/mutation/report.json' },
  thresholds: { high: 90, low: 80, break: null },
};

export default config;
