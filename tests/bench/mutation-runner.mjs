// @ts-check
/** Runs the engine's tests against its mutants in one process: everything is loaded once, the quickest test is asked first. */
import { readdirSync } from 'node:fs';
import { join, relative } from 'node:path';
import { performance } from 'node:perf_hooks';
import { PluginKind, declareFactoryPlugin } from '@stryker-mutator/api/plugin';
import {
  DryRunStatus,
  TestStatus,
  determineHitLimitReached,
  toMutantRunResult,
} from '@stryker-mutator/api/test-runner';
import { createServer, createServerModuleRunner } from 'vite';

/** Below the folder of the changed copy, which becomes the working directory only after this module is loaded. */
const at = (/** @type {string} */ path) => join(process.cwd(), path);
const STAND_INS = 'tests/bench/mutation-tests.ts';
const folders = ['tests/stats', 'tests/findings', 'tests/reference', 'tests/published'];

/** The frozen engines are other code, a command's own process runs the engine unchanged, and the last would take seconds for each mutant. */
const leftOut = [
  'tests/findings/archive.test.ts',
  'tests/reference/run-set.test.ts',
  'tests/findings/judge-properties.test.ts',
];

/** Slow tests that are asked about mutants of one folder alone. */
const askedOnlyOf = [
  { tests: 'tests/findings/r-script.test.ts', folder: 'lib/findings/r-script' },
  { tests: 'tests/findings/release-script.test.ts', folder: 'lib/findings/r-script' },
  { tests: 'tests/stats/posterior', folder: 'lib/stats/posterior' },
];

function testFiles() {
  return folders
    .flatMap((folder) =>
      readdirSync(at(folder), { recursive: true, encoding: 'utf8' }).map((name) => join(folder, name)),
    )
    .filter((file) => file.endsWith('.test.ts') && !leftOut.includes(file))
    .sort();
}

const folderOf = (/** @type {string} */ path) => path.split('/').slice(1, 3).join('/');

/**
 * A topic of the numbers is tested by its own tests, the reference figures and the published ones; findings by all.
 * @param {string} id of a test @param {string} mutated path of the changed file
 */
function isAsked(id, mutated) {
  if (mutated.startsWith('lib/stats/') && id.startsWith('tests/findings/')) return false;
  if (id.startsWith('tests/stats/') && mutated.startsWith('lib/stats/') && mutated.split('/').length === 4) {
    if (folderOf(id) !== folderOf(mutated)) return false;
  }
  return askedOnlyOf.every(({ tests, folder }) => !id.startsWith(tests) || mutated.startsWith(folder));
}

/** What the tests and the engine import by these names is answered by the stand-ins. */
const STOOD_IN_FOR = ['vitest', './bounded-memo'];

/** The modules of the tests are served by Vite. */
function createTestServer() {
  const root = process.cwd();
  return createServer({
    root,
    configFile: false,
    logLevel: 'error',
    appType: 'custom',
    server: { middlewareMode: true, hmr: false, ws: false, watch: null },
    optimizeDeps: { noDiscovery: true, include: [] },
    resolve: { alias: { '@': root, 'server-only': at('tests/support/empty.ts') } },
    ssr: { noExternal: ['vitest'] },
    plugins: [
      {
        name: 'stand-ins',
        enforce: 'pre',
        resolveId: (source) => (STOOD_IN_FOR.includes(source) ? at(STAND_INS) : null),
      },
    ],
  });
}

/**
 * @param {import('@stryker-mutator/api/test-runner').TestResult[]} tests
 * @param {import('@stryker-mutator/api/core').MutantCoverage} [mutantCoverage]
 * @returns {import('@stryker-mutator/api/test-runner').CompleteDryRunResult}
 */
function complete(tests, mutantCoverage) {
  return { status: DryRunStatus.Complete, tests, mutantCoverage };
}

/** @typedef {import('@stryker-mutator/api/core').MutantCoverage} MutantCoverage */
/** @typedef {import('@stryker-mutator/api/test-runner').TestRunner} TestRunner */

/**
 * @typedef {object} Shared
 * @property {string | undefined} [activeMutant]
 * @property {string | undefined} [currentTestId]
 * @property {number | undefined} [hitCount]
 * @property {number | undefined} [hitLimit]
 * @property {MutantCoverage} [mutantCoverage]
 */

/** @implements {TestRunner} */
class InProcessRunner {
  /** @type {Map<string, { title: string, file: string, run: () => Promise<void>, took: number }>} */
  tests = new Map();

  /** With static mutants ignored, no mutant is active while a module is loaded: there is nothing to reload. */
  capabilities() {
    return { reloadEnvironment: true };
  }

  async init() {
    const { default: fc } = await import('fast-check');
    // The same documents for every mutant; a counterexample need not be the smallest one.
    fc.configureGlobal({ seed: 20_261_201, endOnFailure: true });
    this.server = await createTestServer();
    const { ssr } = this.server.environments;
    if (!ssr) throw new TypeError('init requires an environment for modules of the server');
    const modules = createServerModuleRunner(ssr, { hmr: false });
    const { takeTests } = await modules.import(at(STAND_INS));
    await modules.import(at('tests/support/setup.ts'));
    for (const file of testFiles()) {
      await modules.import(at(file));
      for (const test of takeTests()) this.add(file, test);
    }
  }

  /** @param {string} file @param {{ title: string, run: () => Promise<void> }} test */
  add(file, { title, run }) {
    const id = `${file}#${title}`;
    if (this.tests.has(id)) throw new TypeError(`two tests are called ${id}`);
    this.tests.set(id, { title, file, run, took: 0 });
  }

  /** What a changed module reads and writes. */
  get shared() {
    const all = /** @type {{ __stryker__?: Shared }} */ (globalThis);
    return (all.__stryker__ ??= {});
  }

  /** @param {string[]} ids @param {boolean} bail */
  async run(ids, bail) {
    /** @type {import('@stryker-mutator/api/test-runner').TestResult[]} */
    const results = [];
    for (const id of ids) {
      const test = this.tests.get(id);
      if (!test) throw new TypeError(`no test is called ${id}`);
      const start = performance.now();
      const failureMessage = await test.run().then(
        () => null,
        (error) => String(error?.message ?? error),
      );
      const timeSpentMs = performance.now() - start;
      test.took ||= timeSpentMs;
      const told = { id, name: test.title, fileName: at(test.file), timeSpentMs };
      results.push(
        failureMessage === null
          ? { ...told, status: TestStatus.Success }
          : { ...told, status: TestStatus.Failed, failureMessage },
      );
      if (failureMessage !== null && bail) break;
    }
    return complete(results);
  }

  /** @param {import('@stryker-mutator/api/test-runner').DryRunOptions} options */
  async dryRun({ files = [] }) {
    const { shared } = this;
    const mutated = files.map((file) => relative(process.cwd(), file));
    shared.activeMutant = undefined;
    const tests = [];
    for (const id of this.tests.keys()) {
      if (!mutated.some((file) => isAsked(id, file))) continue;
      shared.currentTestId = id;
      const { tests: told } = await this.run([id], false);
      tests.push(...told);
    }
    shared.currentTestId = undefined;
    return complete(tests, shared.mutantCoverage);
  }

  /** @param {import('@stryker-mutator/api/test-runner').MutantRunOptions} options */
  async mutantRun({ testFilter, activeMutant, sandboxFileName, hitLimit, disableBail }) {
    const { shared } = this;
    const took = (/** @type {string} */ id) => this.tests.get(id)?.took ?? 0;
    const mutated = relative(process.cwd(), sandboxFileName);
    const ids = [...(testFilter ?? this.tests.keys())]
      .filter((id) => isAsked(id, mutated))
      .sort((a, b) => took(a) - took(b));
    Object.assign(shared, { activeMutant: activeMutant.id, hitCount: 0, hitLimit });
    const result = await this.run(ids, !disableBail);
    const timeout = determineHitLimitReached(shared.hitCount, shared.hitLimit);
    Object.assign(shared, { activeMutant: undefined, hitCount: undefined, hitLimit: undefined });
    return toMutantRunResult(timeout ?? result);
  }

  async dispose() {
    await this.server?.close();
  }
}

const create = Object.assign(() => new InProcessRunner(), { inject: /** @type {[]} */ ([]) });

export const strykerPlugins = [declareFactoryPlugin(PluginKind.TestRunner, 'in-process', create)];
