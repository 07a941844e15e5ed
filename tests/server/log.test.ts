import { expect, test } from 'vitest'
import { withoutCodes } from '@/lib/server/log'

test('the code of a sheet never stands in a logged path', () => {
  expect(withoutCodes('/sheets/k7m2-w8qd-h4tx')).toBe('/sheets/(hidden)')
  expect(withoutCodes('/api/sheets/k7m2-w8qd-h4tx?revision=A')).toBe('/api/sheets/(hidden)')
  expect(withoutCodes('/check?draft=k7m2')).toBe('/check')
})
