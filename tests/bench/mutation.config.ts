import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const at = (path: string) => fileURLToPath(new URL(path, import.meta.url));

/** The tests that are held against a changed engine: the pure numbers and findings, nothing that starts a server. */
export default defineConfig({
  resolve: { alias: { '@': at('../..'), 'server-only': at('../support/empty.ts') } },
  test: {
    environment: 'node',
    include: ['tests/{stats,findings,reference,published}/**/*.test.ts'],
    // The frozen engines are other code; a command's own process runs the engine unchanged.
    exclude: ['tests/findings/archive.test.ts', 'tests/reference/run-set.test.ts', 'node_modules/**'],
    // One worker for all files, so that packages are loaded once for each change.
    isolate: false,
    testTimeout: 20_000,
    setupFiles: ['tests/support/setup.ts'],
  },
});
