// @ts-check
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { root, run, say } from './process.mjs';
import { checkNode, ensureToolchain } from './toolchain.mjs';

/** A compiled module belongs to one Node as well as to one lock file. */
function lockHash() {
  const lock = readFileSync(join(root, 'package-lock.json'));
  return createHash('sha256').update(lock).update(process.versions.modules).digest('hex');
}

/** Installs what the lock file names, unless the last complete installation was of this very lock file. */
export async function installIfChanged() {
  checkNode(root);
  const stamp = join(root, 'node_modules/.leadline-lock');
  const wanted = lockHash();
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return true;

  const toolchain = await ensureToolchain();
  if (!toolchain.ok) {
    say(toolchain.message);
    return false;
  }
  rmSync(stamp, { force: true });
  say('Installing packages from the lock file; SQLite is compiled, which takes a minute or two');
  const status = await run('npm', ['ci', '--include=dev'], { env: toolchain.env });
  if (status !== 0) {
    say(`npm ci failed with status ${status}`);
    return false;
  }
  writeFileSync(stamp, wanted);
  return true;
}
