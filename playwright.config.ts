import { randomBytes } from 'node:crypto'
import { mkdtempSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { defineConfig } from '@playwright/test'

/** Debian's browser, told not to reach out for anything of its own. */
const launchOptions = {
  executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
  args: [
    '--no-sandbox',
    '--disable-gpu',
    '--disable-quic',
    '--no-first-run',
    '--disable-background-networking',
    '--disable-component-update',
    '--disable-sync',
  ],
}

// The server and the tests share one database and one secret. This file is read again in every worker, which finds both
// in what it inherits.
process.env.PAGES_DATA_DIR ??= mkdtempSync(join(tmpdir(), 'setdown-pages-'))
process.env.PAGES_APP_SECRET ??= randomBytes(32).toString('hex')

const port = 3217
const address = `http://127.0.0.1:${port}`

export default defineConfig({
  testDir: 'tests/pages',
  testMatch: '**/*.spec.ts',
  outputDir: 'test-results/pages',
  forbidOnly: true,
  workers: 2,
  // Slow machines are not failures: only what never comes is.
  timeout: 90_000,
  expect: { timeout: 15_000 },
  reporter: [['list']],
  use: { baseURL: address, launchOptions, locale: 'en-GB', timezoneId: 'UTC', screenshot: 'only-on-failure' },
  projects: [
    { name: 'desktop', use: { viewport: { width: 1440, height: 900 } } },
    { name: 'phone', use: { viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true } },
  ],
  webServer: {
    command: 'node scripts/serve-throwaway.mjs',
    url: `${address}/api/health`,
    env: { PORT: String(port), DATA_DIR: process.env.PAGES_DATA_DIR, APP_SECRET: process.env.PAGES_APP_SECRET },
    timeout: 60_000,
    reuseExistingServer: false,
    stdout: 'ignore',
    gracefulShutdown: { signal: 'SIGTERM', timeout: 5000 },
  },
})
