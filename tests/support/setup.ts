import { afterEach, beforeEach } from 'vitest'
import { assertQuietConsole, watchConsole } from './console'

beforeEach(watchConsole)
afterEach(assertQuietConsole)

if (typeof document !== 'undefined') {
  const { cleanup } = await import('@testing-library/react')
  afterEach(cleanup)
}
