import { join } from 'node:path';
import { defineConfig } from '@playwright/test';
import { serveArguments } from './lib/cli/serve-arguments.mjs';

/** One name everywhere, since cookies and addresses go by it. */
const port = Number(process.env.E2E_PORT ?? 3100);
export const browserTests = {
  port,
  origin: `http://localhost:${port}`,
  dataFolder: '.e2e',
  password: 'soundings in forty fathoms',
};

const { origin, dataFolder, password } = browserTests;
const isolated = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  '--disable-dev-shm-usage',
];

export default defineConfig({
  testDir: 'tests/e2e',
  testMatch: '*.spec.ts',
  outputDir: 'test-results/browser',
  reporter: process.env.PLAYWRIGHT_JSON_OUTPUT_FILE ? [['list'], ['json']] : [['list']],
  forbidOnly: true,
  retries: 0,
  workers: 1,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  use: {
    baseURL: origin,
    browserName: 'chromium',
    locale: 'en-US',
    timezoneId: 'UTC',
    trace: 'retain-on-failure',
    launchOptions: { executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium', args: isolated },
  },
  webServer: {
    command: `rm -rf ${dataFolder} && exec node ${serveArguments([]).join(' ')}`,
    url: `${origin}/api/health`,
    timeout: 120_000,
    reuseExistingServer: false,
    stdout: 'ignore',
    gracefulShutdown: { signal: 'SIGTERM', timeout: 6000 },
    env: {
      NODE_ENV: 'production',
      NEXT_TELEMETRY_DISABLED: '1',
      PORT: String(port),
      LEADLINE_ORIGIN: origin,
      LEADLINE_DATA: join(process.cwd(), dataFolder),
      DEMO_PASSWORD: password,
      LEADLINE_FAKES: '1',
    },
  },
});
