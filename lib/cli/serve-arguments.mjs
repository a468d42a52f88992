// @ts-check

/**
 * Under the react-server condition the package server-only resolves to nothing; without it the
 * process would die at its first import of a service.
 * @param {string[]} args
 */
export function serveArguments(args) {
  return ['--conditions=react-server', '--import', 'tsx', 'lib/cli/serve.ts', ...args];
}
