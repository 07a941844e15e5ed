import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { BALANCED_GAIN_DECIBELS, dbvOf, gainNeededDecibels, outputVolts, peakLevelVolts, reDigitalSourceDecibels } from '@/lib/match/physics/level'
import {
  bassCornerExactHertz,
  bassCornerSimpleHertz,
  lineDeviationDecibels,
  lineResponseDecibels,
  midbandLossDecibels,
  trebleCornerExactHertz,
  trebleCornerSimpleHertz,
} from '@/lib/match/physics/line-output'
import { expectWithin } from '../../support/tolerances'
import { hertz, logarithmic } from './arbitraries'

const network = fc.record({
  outputOhms: logarithmic(1, 20_000),
  couplingFarads: logarithmic(1e-7, 1e-4),
  cableFarads: logarithmic(1e-11, 1e-8),
  inputOhms: logarithmic(2000, 1e6),
})

// Source of these checks: circuit theory.
describe('line output', () => {
  test('at the exact corners the response is half the power of midband', () => {
    fc.assert(
      fc.property(network, (any) => {
        for (const corner of [trebleCornerExactHertz(any), bassCornerExactHertz(any)]) {
          expectWithin(lineDeviationDecibels(any, corner ?? NaN), -10 * Math.log10(2), { db: 1e-6 })
        }
      }),
    )
  })

  test('the simple corners approach the exact ones as the two move apart', () => {
    const apart = { outputOhms: 500, couplingFarads: 1e-3, cableFarads: 1e-12, inputOhms: 50_000 }
    expectWithin(trebleCornerSimpleHertz(apart), trebleCornerExactHertz(apart) ?? NaN, { relative: 1e-6 })
    expectWithin(bassCornerSimpleHertz(apart), bassCornerExactHertz(apart) ?? NaN, { relative: 1e-6 })
  })

  test('every figure is finite or absent, with parts missing', () => {
    const missing = fc.record({
      outputOhms: fc.constantFrom(0, 600),
      couplingFarads: fc.constantFrom(Infinity, 1e-6, 1e-12),
      cableFarads: fc.constantFrom(0, 1e-9),
      inputOhms: fc.constantFrom(Infinity, 47_000),
    })
    fc.assert(
      fc.property(missing, hertz, (any, f) => {
        for (const value of [midbandLossDecibels(any), lineResponseDecibels(any, f)]) expect(Number.isFinite(value)).toBe(true)
        for (const figure of [trebleCornerSimpleHertz, trebleCornerExactHertz, bassCornerSimpleHertz, bassCornerExactHertz]) {
          const value = figure(any)
          expect(value === null || (Number.isFinite(value) && value > 0)).toBe(true)
        }
      }),
    )
  })

  test('without capacitor or cable the response is the divider everywhere', () => {
    const plain = { outputOhms: 1000, couplingFarads: Infinity, cableFarads: 0, inputOhms: 9000 }
    for (const f of [0, 20, 20_000]) expectWithin(lineResponseDecibels(plain, f), 20 * Math.log10(0.9), { db: 1e-9 })
    expect(bassCornerExactHertz(plain)).toBeNull()
    expect(trebleCornerExactHertz(plain)).toBeNull()
  })

  test('more cable never gives more treble', () => {
    fc.assert(
      fc.property(network, logarithmic(1.01, 10), (any, k) => {
        const longer = { ...any, cableFarads: any.cableFarads * k }
        expect(lineDeviationDecibels(longer, 100_000)).toBeLessThanOrEqual(lineDeviationDecibels(any, 100_000) + 1e-9)
      }),
    )
  })
})

// Source of these checks: definitions.
describe('level', () => {
  test('the gain that is needed brings the wanted level', () => {
    fc.assert(
      fc.property(logarithmic(1e-5, 1e-2), logarithmic(0.05, 5), (inputVolts, wantedVolts) => {
        const gainDecibels = gainNeededDecibels({ inputVolts, wantedVolts })
        expectWithin(outputVolts({ inputVolts, gainDecibels }), wantedVolts, { relative: 1e-9 })
      }),
    )
  })

  test('balanced is a term of its own: twice the volts', () => {
    const single = outputVolts({ inputVolts: 1e-3, gainDecibels: 40 })
    expectWithin(outputVolts({ inputVolts: 1e-3, gainDecibels: 40, balanced: true }), 2 * single, { relative: 1e-12 })
    expectWithin(BALANCED_GAIN_DECIBELS, 6.0206, { db: 0.0001 })
  })

  test('levels refer to one volt and to the two volts of a digital source', () => {
    expect(dbvOf(1)).toBe(0)
    expect(dbvOf(0)).toBe(-Infinity)
    expectWithin(reDigitalSourceDecibels(0.5), -12.04, { db: 0.005 })
    expectWithin(peakLevelVolts({ nominalVolts: 0.5, decibelsAbove: 20 }), 5, { relative: 1e-9 })
  })
})
