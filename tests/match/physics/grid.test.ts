import { describe, expect, test } from 'vitest'
import { logQuadrature, logSpacedHertz } from '@/lib/match/physics/grid'
import { fromDecibels, powerToDecibels, toDecibels } from '@/lib/match/physics/decibels'
import { expectWithin } from '../../support/tolerances'

describe('frequencies', () => {
  test('stand in equal ratios with both ends', () => {
    const grid = logSpacedHertz({ low: 20, high: 20_000, count: 4 })
    for (const [i, expected] of [20, 200, 2000, 20_000].entries()) expectWithin(grid[i], expected, { relative: 1e-12 })
    expect(grid[3]).toBe(20_000)
    expect(() => logSpacedHertz({ low: 0, high: 20_000, count: 4 })).toThrow(RangeError)
  })

  // Source: closed integrals.
  test('integrals over them come out as in closed form', () => {
    const { hertz, weightHertz } = logQuadrature({ low: 20, high: 20_000, count: 24 })
    const integral = (g: (f: number) => number) => hertz.reduce((sum, f, i) => sum + g(f) * weightHertz[i], 0)
    expectWithin(integral(() => 1), 19_980, { relative: 1e-9 })
    expectWithin(integral((f) => 1 / f), Math.log(1000), { relative: 1e-9 })
    expectWithin(integral((f) => 1 / (1 + (f / 1000) ** 2)), 1000 * (Math.atan(20) - Math.atan(0.02)), { relative: 1e-6 })
  })
})

describe('decibels', () => {
  test('there and back', () => {
    expectWithin(toDecibels(10), 20, { db: 1e-12 })
    expectWithin(fromDecibels(toDecibels(0.037)), 0.037, { relative: 1e-12 })
    expectWithin(powerToDecibels(2), 3.0103, { db: 1e-4 })
    expect(toDecibels(0)).toBe(-Infinity)
  })
})
