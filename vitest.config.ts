import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const at = (path: string) => fileURLToPath(new URL(path, import.meta.url));

export default defineConfig({
  resolve: {
    alias: { '@': at('.'), 'server-only': at('./tests/support/empty.ts') },
  },
  test: {
    environment: 'node',
    include: ['tests/**/*.test.{ts,tsx}'],
    // Minutes of killing processes: npm run test:crash sets how often.
    exclude: ['tests/e2e/**', 'node_modules/**', ...(process.env.CRASH_POINTS ? [] : ['tests/crash/**'])],
    testTimeout: 20_000,
    hookTimeout: 30_000,
    setupFiles: ['tests/support/setup.ts'],
  },
});
