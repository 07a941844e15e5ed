import { afterEach, beforeEach } from 'vitest'
import { assertQuietConsole, watchConsole } from './console'

// What the product reads at its door. Nothing is there: a test that opens the database of these settings fails.
Object.assign(process.env, {
  DATA_DIR: '/dev/null/nowhere',
  PUBLIC_ADDRESS: 'http://localhost:3000',
  APP_SECRET: 'a secret of the tests alone, 32 long',
  LOG_LEVEL: 'silent',
})

beforeEach(watchConsole)
afterEach(assertQuietConsole)

if (typeof document !== 'undefined') {
  const { cleanup } = await import('@testing-library/react')
  afterEach(cleanup)
}
