import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { magnitude } from '@/lib/match/physics/complex'
import { loadingMagnitude, nodeImpedance } from '@/lib/match/physics/loading'
import {
  bassCornerHertz,
  cartridgeLoad,
  equivalentLoading,
  lossFromTurnsGainDecibels,
  netGain,
  reflectedLoadWithWindingsOhms,
  stepUpDeviationDecibels,
  stepUpNodeImpedance,
  trebleCornerHertz,
} from '@/lib/match/physics/step-up'
import { expectWithin } from '../../support/tolerances'
import { hertz, stepUp } from './arbitraries'

// Source of every check here: circuit theory, as a law that must hold whatever the values.
describe('step-up, laws', () => {
  test('every figure is finite', () => {
    fc.assert(
      fc.property(stepUp, hertz, (network, f) => {
        const z = stepUpNodeImpedance(network, f)
        const seen = cartridgeLoad(network, f)
        for (const value of [netGain(network, f), stepUpDeviationDecibels(network, f), z.re, z.im, seen.re, seen.im]) {
          expect(Number.isFinite(value)).toBe(true)
        }
      }),
    )
  })

  test('without capacitance and inductances a transformer gives less than its turns, by the divider of its resistances', () => {
    fc.assert(
      fc.property(stepUp, (any) => {
        const network = { ...any, loadFarads: 0, coilHenries: 0, primaryHenries: null }
        const load = reflectedLoadWithWindingsOhms(network)
        const divided = (network.loadOhms / network.turnsRatio ** 2) / (network.coilOhms + load)
        expectWithin(lossFromTurnsGainDecibels(network), 20 * Math.log10(divided), { db: 1e-9 })
      }),
    )
  })

  test('without primary inductance it is a coil and load brought to the secondary', () => {
    fc.assert(
      fc.property(stepUp, hertz, (any, f) => {
        const network = { ...any, primaryHenries: null }
        const same = equivalentLoading(network)
        expectWithin(netGain(network, f), network.turnsRatio * loadingMagnitude(same, f), { relative: 1e-9 })
        const z = nodeImpedance(same, f)
        expectWithin(magnitude(stepUpNodeImpedance(network, f)), magnitude(z), { relative: 1e-9 })
        expectWithin(stepUpDeviationDecibels(network, trebleCornerHertz(network) ?? NaN), -3, { db: 1e-6 })
      }),
    )
  })

  test('an endless primary inductance is none, and a large one nearly none', () => {
    fc.assert(
      fc.property(stepUp, (any) => {
        const none = { ...any, primaryHenries: null }
        expect(netGain({ ...any, primaryHenries: Infinity }, 1000)).toBe(netGain(none, 1000))
        expectWithin(netGain({ ...any, primaryHenries: 1e9 }, 1000), netGain(none, 1000), { relative: 1e-6 })
      }),
    )
  })

  test('at the bass corner the level is 3.01 dB down', () => {
    fc.assert(
      fc.property(stepUp, (any) => {
        // Coil inductance and capacitance are left out of the corner, so they are left out here.
        const network = { ...any, primaryHenries: any.primaryHenries ?? 1, coilHenries: 0, loadFarads: 0 }
        const corner = bassCornerHertz(network) ?? NaN
        expectWithin(netGain(network, corner) / netGain({ ...network, primaryHenries: null }, corner), Math.SQRT1_2, { relative: 1e-9 })
      }),
    )
  })

  test('what the coil sees is the reflected load with the windings', () => {
    fc.assert(
      fc.property(stepUp, hertz, (any, f) => {
        const network = { ...any, primaryHenries: null, loadFarads: 0 }
        expectWithin(magnitude(cartridgeLoad(network, f)), reflectedLoadWithWindingsOhms(network), { relative: 1e-9 })
      }),
    )
  })
})

describe('step-up, limits', () => {
  const network = { coilOhms: 10, coilHenries: 20e-6, loadOhms: 47_000, loadFarads: 0, turnsRatio: 20, primaryOhms: 1, secondaryOhms: 300, primaryHenries: 2 }

  test('at 0 Hz a primary inductance passes nothing', () => {
    expect(netGain(network, 0)).toBe(0)
    expect(stepUpNodeImpedance(network, 0).re).toBeGreaterThan(0)
    expect(cartridgeLoad(network, 0).re).toBe(1)
  })

  test('with nothing connected the coil sees the primary inductance, or nothing', () => {
    const open = { ...network, loadOhms: Infinity }
    expectWithin(magnitude(cartridgeLoad(open, 1000)), 2 * Math.PI * 1000 * 2, { relative: 1e-6 })
    expect(cartridgeLoad({ ...open, primaryHenries: null }, 1000).re).toBe(Infinity)
    expectWithin(netGain({ ...open, primaryHenries: null }, 1000), 20, { relative: 1e-12 })
  })
})
