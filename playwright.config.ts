import { existsSync, mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { defineConfig } from '@playwright/test';

const PORT = Number(process.env['E2E_PORT'] ?? 3217);
/** The browser of the system: the tests never download one of their own. */
const executablePath = [
  process.env['CHROMIUM_PATH'],
  '/usr/bin/chromium',
  '/usr/bin/chromium-browser',
  '/usr/bin/google-chrome',
].find((path) => path !== undefined && existsSync(path));
if (!executablePath) {
  throw new Error(
    'The browser tests need Chromium: install it (Debian: apt-get install chromium) or set CHROMIUM_PATH.',
  );
}

export default defineConfig({
  testDir: 'packages/web/e2e',
  testMatch: '**/*.e2e.ts',
  // One demo world for all: the files run one after another and each works on things of its own.
  workers: 1,
  fullyParallel: false,
  timeout: 120_000,
  expect: { timeout: 15_000 },
  forbidOnly: Boolean(process.env['CI']),
  reporter: [
    ['list'],
    ['json', { outputFile: process.env['PLAYWRIGHT_JSON_OUTPUT_NAME'] ?? '.cache/reports/browser.json' }],
  ],
  outputDir: 'test-results',
  use: {
    baseURL: `http://127.0.0.1:${PORT}`,
    screenshot: 'only-on-failure',
    trace: 'retain-on-failure',
    launchOptions: {
      executablePath,
      args: [
        '--no-sandbox',
        '--disable-gpu',
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
        '--no-first-run',
      ],
    },
  },
  webServer: {
    command: 'node packages/api/dist/main.js',
    url: `http://127.0.0.1:${PORT}/api/health/ready`,
    timeout: 120_000,
    reuseExistingServer: false,
    env: {
      PORT: String(PORT),
      DATA_DIR: mkdtempSync(join(tmpdir(), 'rivetside-browser-')),
      DEMO: '1',
      PUBLIC_URL: `http://127.0.0.1:${PORT}`,
      LOG_LEVEL: 'warn',
    },
  },
});
