import { fileURLToPath } from 'node:url'
import react from '@vitejs/plugin-react'
import { defineConfig } from 'vitest/config'

const here = (path: string) => fileURLToPath(new URL(path, import.meta.url))

export default defineConfig({
  plugins: [react()],
  resolve: {
    alias: [
      { find: 'server-only', replacement: here('./tests/support/server-only.ts') },
      { find: /^@\//, replacement: here('./') },
    ],
  },
  test: {
    include: ['tests/**/*.test.{ts,tsx}'],
    exclude: ['tests/pages/**', 'node_modules/**'],
    environment: 'node',
    // Far above what any test takes on a quiet machine: a busy one must not fail them.
    testTimeout: 120_000,
    hookTimeout: 120_000,
    // Settings for whatever asks for them. The folder cannot be made, so nothing opens a real database by mistake.
    env: {
      DATA_DIR: '/dev/null/setdown',
      PUBLIC_ADDRESS: 'http://localhost:3000',
      APP_SECRET: 'known-to-every-test-and-so-to-nobody-else',
      LOG_LEVEL: 'silent',
    },
    setupFiles: ['tests/support/setup.ts'],
  },
})
