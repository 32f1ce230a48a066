import { fileURLToPath } from 'node:url'
import { defineConfig } from '@playwright/test'

const port = process.env['E2E_PORT']
if (!process.env['TEST_DATABASE_URL'] || !port) {
  throw new Error('The browser tests need a database of their own: run "npm run test:e2e".')
}
const root = fileURLToPath(new URL('../..', import.meta.url))
const baseURL = `http://localhost:${port}`

export default defineConfig({
  testDir: '.',
  testMatch: '**/*.spec.ts',
  outputDir: `${root}/test-results`,
  forbidOnly: true,
  workers: 2,
  timeout: 180_000,
  expect: { timeout: 20_000 },
  reporter: 'list',
  use: {
    baseURL,
    locale: 'en-GB',
    timezoneId: 'UTC',
    trace: 'retain-on-failure',
    screenshot: 'only-on-failure',
    launchOptions: {
      executablePath: process.env['CHROMIUM_PATH'] ?? '/usr/bin/chromium',
      args: [
        '--headless',
        '--no-sandbox',
        '--disable-gpu',
        '--disable-quic',
        '--no-first-run',
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
      ],
    },
  },
  webServer: {
    command: 'node --import tsx server/cli/start.ts',
    cwd: root,
    url: baseURL,
    env: { PORT: port },
    timeout: 240_000,
    stdout: 'pipe',
    gracefulShutdown: { signal: 'SIGTERM', timeout: 15_000 },
  },
})
