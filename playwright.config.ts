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
    env: { PORT: String(port) },
    timeout: 60_000,
    reuseExistingServer: false,
    stdout: 'ignore',
    gracefulShutdown: { signal: 'SIGTERM', timeout: 5000 },
  },
})
