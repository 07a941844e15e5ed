import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { nominalFactor } from '@/lib/match/physics/printed-condition'
import { factorToNominal, outputAt, perChannelRms, velocityAs, type Velocity } from '@/lib/match/physics/velocity'
import { expectWithin } from '../../support/tolerances'
import { logarithmic } from './arbitraries'

const manner = { kind: fc.constantFrom('peak' as const, 'rms' as const), direction: fc.constantFrom('lateral' as const, 'vertical' as const, 'perChannel' as const) }
const velocity: fc.Arbitrary<Velocity> = fc.record({ metresPerSecond: logarithmic(0.001, 1), ...manner })

// Source of these checks: geometry of the groove and the definition of RMS.
describe('velocity', () => {
  test('said in another manner and back is the same', () => {
    fc.assert(
      fc.property(velocity, fc.record(manner), (any, other) => {
        const there = { metresPerSecond: velocityAs(any, other), ...other }
        expectWithin(velocityAs(there, any), any.metresPerSecond, { relative: 1e-12 })
        expectWithin(perChannelRms(there), perChannelRms(any), { relative: 1e-12 })
      }),
    )
  })

  test('output follows velocity in proportion', () => {
    fc.assert(
      fc.property(velocity, velocity, logarithmic(1e-4, 1e-2), (printed, target, outputVolts) => {
        const output = outputAt(target, { outputVolts, velocity: printed })
        expectWithin(outputAt(printed, { outputVolts: output, velocity: target }), outputVolts, { relative: 1e-12 })
      }),
    )
  })
})

describe('printed conditions', () => {
  test('a condition fully said has one factor, and one half said has the right one within its range', () => {
    fc.assert(
      fc.property(logarithmic(0.01, 0.2), manner.kind, fc.constantFrom('lateral' as const, 'perChannel' as const), (metresPerSecond, kind, direction) => {
        const exact = factorToNominal({ metresPerSecond, kind, direction })
        const said = nominalFactor({ form: 'atVelocity', metresPerSecond, kind, direction })
        expect([said.low, said.nominal, said.high, said.assumed]).toEqual([exact, exact, exact, null])
        const half = nominalFactor({ form: 'atVelocity', metresPerSecond, direction })
        expect(half.low).toBeLessThanOrEqual(exact)
        expect(half.high).toBeGreaterThanOrEqual(exact)
      }),
    )
  })

  test('low, nominal and high stand in order, and twice the velocity halves them', () => {
    fc.assert(
      fc.property(logarithmic(0.005, 0.03), fc.option(manner.kind, { nil: undefined }), (metresPerSecond, kind) => {
        const factor = nominalFactor({ form: 'atVelocity', metresPerSecond, kind })
        expect(factor.low).toBeLessThanOrEqual(factor.nominal)
        expect(factor.nominal).toBeLessThanOrEqual(factor.high)
        if (metresPerSecond > 0.017) return
        expectWithin(nominalFactor({ form: 'atVelocity', metresPerSecond: 2 * metresPerSecond, kind }).nominal, factor.nominal / 2, { relative: 1e-12 })
      }),
    )
  })

  test('what was assumed is said', () => {
    expect(nominalFactor({ form: 'atVelocity', metresPerSecond: 0.05 }).assumed).toEqual({ kind: 'peak', direction: 'lateral' })
    expect(nominalFactor({ form: 'atVelocity', metresPerSecond: 0.0354 }).assumed).toEqual({ kind: 'peak', direction: 'perChannel' })
    expect(nominalFactor({ form: 'none' }).assumed).toBe('no-velocity')
  })

  test('a velocity of zero is refused', () => {
    expect(() => nominalFactor({ form: 'atVelocity', metresPerSecond: 0 })).toThrow(RangeError)
  })
})
