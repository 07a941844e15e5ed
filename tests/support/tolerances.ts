import { expect } from 'vitest'

export type Tolerance = { readonly db: number } | { readonly relative: number } | { readonly absolute: number }

/**
 * Fails with both values and the tolerance when they lie apart. `db` compares two figures in decibels, `relative`
 * two quantities by their ratio, `absolute` two in the unit they share. Infinities of the same sign agree.
 */
export function expectWithin(actual: number | null | undefined, expected: number, tolerance: Tolerance, what = 'value'): void {
  if (actual === expected) return
  const [name, limit] = Object.entries(tolerance)[0] as [string, number]
  const distance =
    typeof actual !== 'number' ? NaN : name === 'relative' ? Math.abs(actual / expected - 1) : Math.abs(actual - expected)
  const message = `${what}: actual ${String(actual)}, expected ${expected}, apart by ${distance}, tolerance ${limit} (${name})`
  expect(distance <= limit, message).toBe(true)
}
