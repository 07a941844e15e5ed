import * as fc from 'fast-check'
import { expect, test } from 'vitest'
import { MOST_ATTEMPTS, waitAfter } from '@/lib/mail/back-off'

const MINUTE = 60_000

test('a minute, then doubled, six hours at most', () => {
  const minutes = Array.from({ length: 12 }, (_, index) => waitAfter(index + 1, 0.5) / MINUTE)
  expect(minutes).toEqual([1, 2, 4, 8, 16, 32, 64, 128, 256, 360, 360, 360])
})

test('never more than a fifth off, whichever way chance has it', () => {
  const attempts = fc.integer({ min: 1, max: MOST_ATTEMPTS })
  const chance = fc.double({ min: 0, max: 1, maxExcluded: true, noNaN: true })
  fc.assert(
    fc.property(attempts, chance, (attempt, random) => {
      const middle = waitAfter(attempt, 0.5)
      expect(Math.abs(waitAfter(attempt, random) - middle)).toBeLessThanOrEqual(middle * 0.2 + 1)
    }),
  )
})

test('mail held up together does not come back together', () => {
  expect(waitAfter(5, 0.1)).toBeLessThan(waitAfter(5, 0.9))
})
