import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { COMPLIANCE_FACTORS, armResonanceHertz, armResponseDecibels, complianceForResonance, highPassDecibels, massForResonance } from '@/lib/match/physics/arm'
import { expectWithin } from '../../support/tolerances'
import { logarithmic } from './arbitraries'

const massKilograms = logarithmic(0.004, 0.06)
const complianceMetresPerNewton = logarithmic(0.003, 0.06)

describe('arm', () => {
  // Source: reckoned, the form usual in the trade.
  test('f = 159.155/√(M[g]·C[µm/mN])', () => {
    fc.assert(
      fc.property(massKilograms, complianceMetresPerNewton, (mass, compliance) => {
        const resonance = armResonanceHertz({ massKilograms: mass, complianceMetresPerNewton: compliance })
        expectWithin(resonance, 159.155 / Math.sqrt(mass * 1e3 * compliance * 1e3), { relative: 1e-5 })
      }),
    )
  })

  // Source: mass on a spring.
  test('the mass and the compliance for a resonance give it back', () => {
    fc.assert(
      fc.property(massKilograms, logarithmic(4, 20), (mass, hertz) => {
        const compliance = complianceForResonance({ massKilograms: mass, hertz })
        expectWithin(armResonanceHertz({ massKilograms: mass, complianceMetresPerNewton: compliance }), hertz, { relative: 1e-9 })
        expectWithin(massForResonance({ complianceMetresPerNewton: compliance, hertz }), mass, { relative: 1e-9 })
      }),
    )
  })

  // Source: Butterworth 1930: 3.01 dB at the corner for every order, 6 dB per octave and order far below.
  test.each([1, 2, 3, 4])('an infrasonic filter of order %d', (order) => {
    expectWithin(highPassDecibels({ hertz: 16, cornerHertz: 16, order }), -3.0103, { db: 0.0001 })
    const far = highPassDecibels({ hertz: 0.01, cornerHertz: 16, order }) - highPassDecibels({ hertz: 0.02, cornerHertz: 16, order })
    expectWithin(far, -6.0206 * order, { db: 0.001 })
    expect(highPassDecibels({ hertz: 0, cornerHertz: 16, order })).toBe(-Infinity)
  })

  test('no filter takes nothing', () => {
    expect(highPassDecibels({ hertz: 4, cornerHertz: 0, order: 2 })).toBe(0)
    expect(highPassDecibels({ hertz: 4, cornerHertz: 16, order: 0 })).toBe(0)
  })

  // Source: second-order system.
  test('at the resonance the response is Q, far above it 0 dB, and far below it falls away', () => {
    fc.assert(
      fc.property(logarithmic(4, 20), logarithmic(0.5, 10), (resonanceHertz, qualityFactor) => {
        const at = (hertz: number) => armResponseDecibels({ hertz, resonanceHertz, qualityFactor })
        expectWithin(at(resonanceHertz), 20 * Math.log10(qualityFactor), { db: 1e-6 })
        expectWithin(at(resonanceHertz * 1e4), 0, { db: 1e-3 })
        expect(at(resonanceHertz / 1000)).toBeLessThan(-100)
        expect(at(0)).toBe(-Infinity)
      }),
    )
  })

  // Source: common practice, no source; there is no standard for these conversions.
  test('compliance conversions are ranges in order, and static halves', () => {
    for (const { low, nominal, high } of Object.values(COMPLIANCE_FACTORS)) expect([low, nominal, high]).toEqual([low, nominal, high].sort((a, b) => a - b))
    expect(COMPLIANCE_FACTORS.static.nominal).toBe(0.5)
    expect(COMPLIANCE_FACTORS.dynamic100Hz).toMatchObject({ low: 1.5, high: 2 })
  })
})
