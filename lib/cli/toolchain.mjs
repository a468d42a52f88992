// @ts-check
import { spawnSync } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { run, say } from './process.mjs';

/** @typedef {{ ok: true, env: Record<string, string> } | { ok: false, message: string }} Toolchain */

/**
 * @param {string} range the "engines.node" of package.json, such as ">=20.20 <21"
 * @param {string} version such as "20.20.2"
 */
export function admitsNode(range, version) {
  return range.split(/\s+/).every((part) => {
    const match = /^(>=|<)(\d+)(?:\.(\d+))?/.exec(part);
    if (!match) return false;
    const [major = 0, minor = 0] = version.split('.').map(Number);
    const distance = major - Number(match[2]) || minor - Number(match[3] ?? 0);
    return match[1] === '>=' ? distance >= 0 : distance < 0;
  });
}

/** @param {string} root */
export function checkNode(root) {
  const { engines } = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8'));
  if (admitsNode(engines.node, process.versions.node)) return;
  say(`Leadline needs Node ${engines.node}; this is ${process.versions.node}.`);
  process.exit(1);
}

/** @param {string} command */
export function isInstalled(command) {
  return spawnSync('sh', ['-c', `command -v ${command}`], { stdio: 'ignore' }).status === 0;
}

/** The folder that holds include/node for exactly this Node, or null: a header of another version builds a crash. */
export function findHeaders() {
  const places = [join(dirname(process.execPath), '..'), '/usr', '/usr/local'];
  return places.find((place) => headerVersion(place) === process.versions.node) ?? null;
}

/** @param {string} place */
function headerVersion(place) {
  const file = join(place, 'include/node/node_version.h');
  if (!existsSync(file)) return null;
  const text = readFileSync(file, 'utf8');
  const part = (/** @type {string} */ name) =>
    new RegExp(`#define NODE_${name}_VERSION (\\d+)`).exec(text)?.[1];
  return [part('MAJOR'), part('MINOR'), part('PATCH')].join('.');
}

/**
 * better-sqlite3 is compiled on this machine, so that nothing prepared elsewhere is downloaded.
 * @returns {Promise<Toolchain>}
 */
export async function ensureToolchain() {
  const missing = missingPackages();
  if (missing.length > 0) {
    const installed = await aptInstall(missing);
    if (!installed || missingPackages().length > 0) {
      return { ok: false, message: `A compiler is needed. Run: ${aptCommand(missing)}` };
    }
  }
  const headers = findHeaders();
  if (!headers) {
    return {
      ok: false,
      message:
        `The C++ headers of Node ${process.versions.node} were not found (include/node beside Node itself). ` +
        `They come with the archives of nodejs.org; for Debian's own Node run: ${aptCommand(['libnode-dev'])}`,
    };
  }
  return { ok: true, env: { npm_config_build_from_source: 'true', npm_config_nodedir: headers } };
}

function missingPackages() {
  const packages = [
    ['python3', 'python3'],
    ['make', 'make'],
    ['g++', 'g++'],
  ].flatMap(([command = '', name = '']) => (isInstalled(command) ? [] : [name]));
  return findHeaders() ? packages : [...packages, 'libnode-dev'];
}

const browserPlaces = ['/usr/bin/chromium', '/usr/bin/chromium-browser'];

/** The browser for the browser tests, installed through apt when root and there is none; null when there is none. */
export async function ensureChromium() {
  const find = () => browserPlaces.find((place) => existsSync(place)) ?? null;
  const found = find();
  if (found) return found;
  const installed = await aptInstall(['chromium']);
  const place = installed ? find() : null;
  if (!place) say(`The browser tests need Chromium. Run: ${aptCommand(['chromium'])}`);
  return place;
}

/** @param {string[]} packages */
export function aptCommand(packages) {
  return `apt-get update && apt-get install -y ${packages.join(' ')}`;
}

/** @param {string[]} packages */
async function aptInstall(packages) {
  if (process.getuid?.() !== 0 || !isInstalled('apt-get')) return false;
  say(`Installing ${packages.join(', ')} through apt`);
  const env = { DEBIAN_FRONTEND: 'noninteractive' };
  await run('apt-get', ['update', '-q'], { env });
  return (
    (await run('apt-get', ['install', '-y', '-q', '--no-install-recommends', ...packages], { env })) === 0
  );
}
