// @ts-check
import { execFileSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, lstatSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { localBinary, root, run, say } from './process.mjs';

const folders = ['app', 'components', 'db', 'lib', 'public'];
const files = [
  'instrumentation.ts',
  'next.config.ts',
  'package-lock.json',
  'package.json',
  'postcss.config.mjs',
  'proxy.ts',
  'tsconfig.json',
];

/** Everything a build reads, tracked or about to be; a test or a text changes no build. */
function sourceFiles() {
  const known = existsSync(join(root, '.git')) ? listedByGit() : folders.flatMap((folder) => walk(folder));
  const isSource = (/** @type {string} */ path) =>
    files.includes(path) || folders.some((folder) => path.startsWith(`${folder}/`));
  return [...new Set([...known, ...files])]
    .filter((path) => isSource(path) && existsSync(join(root, path)))
    .sort();
}

function listedByGit() {
  const args = ['ls-files', '-z', '--cached', '--others', '--exclude-standard'];
  return execFileSync('git', args, { cwd: root, encoding: 'utf8' }).split('\0').filter(Boolean);
}

/**
 * @param {string} folder
 * @returns {string[]}
 */
function walk(folder) {
  const place = join(root, folder);
  if (!existsSync(place)) return [];
  return readdirSync(place, { withFileTypes: true }).flatMap((entry) => {
    const path = `${folder}/${entry.name}`;
    return entry.isDirectory() ? walk(path) : [path];
  });
}

export function hashSource() {
  const hash = createHash('sha256').update(process.versions.node);
  for (const path of sourceFiles()) {
    if (!lstatSync(join(root, path)).isFile()) continue;
    const content = readFileSync(join(root, path));
    hash.update(`\0${path}\0${content.length}\0`).update(content);
  }
  return hash.digest('hex');
}

/** Builds the application unless the last complete build was of this very source. */
export async function buildIfChanged() {
  const stamp = join(root, '.next/leadline-source');
  const wanted = hashSource();
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return true;

  rmSync(stamp, { force: true });
  say('Building');
  const env = { NEXT_TELEMETRY_DISABLED: '1', NODE_ENV: 'production' };
  const status = await run(localBinary('next'), ['build'], { env });
  if (status !== 0) return false;
  writeFileSync(stamp, wanted);
  return true;
}
