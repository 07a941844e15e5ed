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
    setupFiles: ['tests/support/setup.ts'],
  },
})
