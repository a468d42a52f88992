// @ts-check
import { spawn } from 'node:child_process';
import { fileURLToPath } from 'node:url';

export const root = fileURLToPath(new URL('../..', import.meta.url));

/** @param {string} text */
export function say(text) {
  process.stdout.write(`${text}\n`);
}

/**
 * Runs a command to its end with our own input and output, and answers its exit status. Signals are passed
 * on; after one, this process ends with the child, since whoever sent it wants no further step.
 * @param {string} command
 * @param {string[]} args
 * @param {{ env?: Record<string, string | undefined> }} [options]
 * @returns {Promise<number>}
 */
export function run(command, args, { env = {} } = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, args, { cwd: root, stdio: 'inherit', env: { ...process.env, ...env } });
    const forwarding = forwardSignals(child);
    child.once('error', (error) => {
      forwarding.stop();
      say(`${command} could not be started: ${error.message}`);
      resolve(127);
    });
    child.once('exit', (code, signal) => {
      forwarding.stop();
      const status = code ?? 128 + (signalNumbers[signal ?? ''] ?? 0);
      if (forwarding.happened()) process.exit(status);
      resolve(status);
    });
  });
}

/** @type {Record<string, number>} */
const signalNumbers = { SIGHUP: 1, SIGINT: 2, SIGQUIT: 3, SIGABRT: 6, SIGKILL: 9, SIGSEGV: 11, SIGTERM: 15 };
const names = /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP']);

/** @param {import('node:child_process').ChildProcess} child */
function forwardSignals(child) {
  let happened = false;
  /** @param {NodeJS.Signals} name */
  const handler = (name) => {
    happened = true;
    child.kill(name);
  };
  for (const name of names) process.on(name, handler);
  return {
    happened: () => happened,
    stop: () => names.forEach((name) => process.off(name, handler)),
  };
}

/** @param {string} name */
export function localBinary(name) {
  return fileURLToPath(new URL(`../../node_modules/.bin/${name}`, import.meta.url));
}
