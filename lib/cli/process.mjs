// @ts-check
import { spawn } from 'node:child_process';
import { fileURLToPath } from 'node:url';

export const root = fileURLToPath(new URL('../..', import.meta.url));

/** @param {string} text */
export function say(text) {
  process.stdout.write(`${text}\n`);
}

/**
 * Runs a command to its end with our own input and output, and answers its exit status.
 * A command that a signal ended counts as failed, as a shell would count it.
 * @param {string} command
 * @param {string[]} args
 * @param {{ env?: Record<string, string | undefined>, forwardSignals?: boolean }} [options]
 * @returns {Promise<number>}
 */
export function run(command, args, { env = {}, forwardSignals = false } = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, args, { cwd: root, stdio: 'inherit', env: { ...process.env, ...env } });
    const stopForwarding = forwardSignals ? forwardTo(child) : () => {};
    child.once('error', (error) => {
      stopForwarding();
      say(`${command} could not be started: ${error.message}`);
      resolve(127);
    });
    child.once('exit', (code, signal) => {
      stopForwarding();
      resolve(code ?? 128 + (signalNumbers[signal ?? ''] ?? 0));
    });
  });
}

/** @type {Record<string, number>} */
const signalNumbers = { SIGHUP: 1, SIGINT: 2, SIGQUIT: 3, SIGABRT: 6, SIGKILL: 9, SIGSEGV: 11, SIGTERM: 15 };

/**
 * A terminal sends Ctrl-C to the whole group, so the child has its SIGINT already; only what is
 * sent to this process alone is passed on. The child ignores a second stop while it is stopping.
 * @param {import('node:child_process').ChildProcess} child
 */
function forwardTo(child) {
  const names = /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP']);
  const handlers = names.map((name) => {
    const handler = () => {
      child.kill(name);
    };
    process.on(name, handler);
    return { name, handler };
  });
  return () => handlers.forEach(({ name, handler }) => process.off(name, handler));
}

/** @param {string} name */
export function localBinary(name) {
  return fileURLToPath(new URL(`../../node_modules/.bin/${name}`, import.meta.url));
}
