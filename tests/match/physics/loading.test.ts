import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { magnitude } from '@/lib/match/physics/complex'
import {
  dampingRatio,
  deviationDecibels,
  fallBelowReferenceHertz,
  halfPowerHertz,
  levelLossDecibels,
  loadingMagnitude,
  maximumDeviationDecibels,
  naturalHertz,
  nodeImpedance,
  parallelOhms,
  peakHeightAboveBassDecibels,
  peakHeightDecibels,
  peakHertz,
  qualityFactor,
  resonanceHertz,
  responseDecibels,
} from '@/lib/match/physics/loading'
import { expectWithin } from '../../support/tolerances'
import { anyLoading, hertz, logarithmic, wholeLoading } from './arbitraries'

const movingMagnet = { coilOhms: 700, coilHenries: 0.5, loadOhms: 47_000, loadFarads: 250e-12 }

// Source of every check here: circuit theory, as a law that must hold whatever the values.
describe('loading, laws', () => {
  test('every figure is finite or absent, with any part missing', () => {
    fc.assert(
      fc.property(anyLoading, hertz, (network, f) => {
        const z = nodeImpedance(network, f)
        for (const value of [responseDecibels(network, f), deviationDecibels(network, f), levelLossDecibels(network), z.re, z.im, maximumDeviationDecibels(network)]) {
          expect(Number.isFinite(value)).toBe(true)
        }
        for (const figure of [resonanceHertz, naturalHertz, qualityFactor, dampingRatio, peakHertz, peakHeightDecibels, peakHeightAboveBassDecibels, fallBelowReferenceHertz, halfPowerHertz]) {
          const value = figure(network)
          expect(value === null || Number.isFinite(value)).toBe(true)
        }
      }),
    )
  })

  test('doubling the capacitance lowers the resonance by √2', () => {
    fc.assert(
      fc.property(wholeLoading, (network) => {
        const doubled = resonanceHertz({ ...network, loadFarads: network.loadFarads * 2 }) ?? NaN
        expectWithin((resonanceHertz(network) ?? NaN) / doubled, Math.SQRT2, { relative: 1e-12 })
      }),
    )
  })

  test('R and L times k with C divided by k leaves the response and multiplies the impedance by k', () => {
    fc.assert(
      fc.property(wholeLoading, logarithmic(0.01, 100), hertz, (network, k, f) => {
        const scaled = {
          coilOhms: network.coilOhms * k,
          coilHenries: network.coilHenries * k,
          loadOhms: network.loadOhms * k,
          loadFarads: network.loadFarads / k,
        }
        expectWithin(loadingMagnitude(scaled, f), loadingMagnitude(network, f), { relative: 1e-9 })
        expectWithin(qualityFactor(scaled), qualityFactor(network) ?? NaN, { relative: 1e-9 })
        expectWithin(magnitude(nodeImpedance(scaled, f)) / k, magnitude(nodeImpedance(network, f)), { relative: 1e-9 })
      }),
    )
  })

  test('L and C both times k moves the whole response down the scale by k', () => {
    fc.assert(
      fc.property(wholeLoading, logarithmic(0.1, 10), hertz, (network, k, f) => {
        const slowed = { ...network, coilHenries: network.coilHenries * k, loadFarads: network.loadFarads * k }
        expectWithin(loadingMagnitude(slowed, f / k), loadingMagnitude(network, f), { relative: 1e-9 })
      }),
    )
  })

  test('a higher load never lowers the output, at any frequency', () => {
    fc.assert(
      fc.property(wholeLoading, logarithmic(1.001, 100), hertz, (network, k, f) => {
        const lighter = { ...network, loadOhms: network.loadOhms * k }
        expect(loadingMagnitude(lighter, f)).toBeGreaterThanOrEqual(loadingMagnitude(network, f))
        expect(qualityFactor(lighter) ?? 0).toBeGreaterThanOrEqual(0)
      }),
    )
  })

  test('the node impedance is the source beside the load, |Z| = |R + jωL|·|H|, and never has a negative real part', () => {
    fc.assert(
      fc.property(wholeLoading, hertz, (network, f) => {
        const z = nodeImpedance(network, f)
        const source = Math.hypot(network.coilOhms, 2 * Math.PI * f * network.coilHenries)
        expectWithin(magnitude(z), source * loadingMagnitude(network, f), { relative: 1e-9 })
        expect(z.re).toBeGreaterThan(0)
      }),
    )
  })

  test('the peak is where the response is highest, and there is one exactly when Q is above 1/√2', () => {
    fc.assert(
      fc.property(wholeLoading, (network) => {
        const peak = peakHertz(network)
        const q = qualityFactor(network) ?? NaN
        fc.pre(Math.abs(q * Math.SQRT2 - 1) > 1e-9)
        expect(peak !== null).toBe(q > Math.SQRT1_2)
        if (peak === null) return
        const top = responseDecibels(network, peak)
        expect(top).toBeGreaterThanOrEqual(responseDecibels(network, peak * 1.01))
        expect(top).toBeGreaterThanOrEqual(responseDecibels(network, peak * 0.99))
        expectWithin(peakHeightDecibels(network), deviationDecibels(network, peak), { db: 1e-6 })
      }),
    )
  })

  test('at the −3 dB point the response is 3.000 dB down, and lower everywhere above it', () => {
    fc.assert(
      fc.property(wholeLoading, logarithmic(1.001, 100), (network, above) => {
        const fall = fallBelowReferenceHertz(network) ?? NaN
        expectWithin(deviationDecibels(network, fall), -3, { db: 1e-6 })
        expect(deviationDecibels(network, fall * above)).toBeLessThan(-3)
        const half = halfPowerHertz(network) ?? NaN
        expectWithin(responseDecibels(network, half) - responseDecibels(network, 0), -10 * Math.log10(2), { db: 1e-6 })
      }),
    )
  })

  test('no point from 1 to 20 kHz departs further than the maximum deviation', () => {
    fc.assert(
      fc.property(wholeLoading, logarithmic(1000, 20_000), (network, f) => {
        expect(Math.abs(deviationDecibels(network, f))).toBeLessThanOrEqual(maximumDeviationDecibels(network) + 1e-9)
      }),
    )
  })
})

describe('loading, limits', () => {
  test('without capacitance or inductance there is no resonance, Q or peak', () => {
    for (const network of [{ ...movingMagnet, loadFarads: 0 }, { ...movingMagnet, coilHenries: 0 }]) {
      for (const figure of [resonanceHertz, naturalHertz, qualityFactor, peakHertz, peakHeightDecibels]) expect(figure(network)).toBeNull()
      expect(fallBelowReferenceHertz(network)).toBeGreaterThan(0)
    }
    expect(fallBelowReferenceHertz({ ...movingMagnet, coilHenries: 0, loadFarads: 0 })).toBeNull()
  })

  test('a vanishing part gives what its absence gives', () => {
    const little = { ...movingMagnet, loadFarads: 1e-18 }
    expectWithin(responseDecibels(little, 20_000), responseDecibels({ ...movingMagnet, loadFarads: 0 }, 20_000), { db: 1e-6 })
    expectWithin(fallBelowReferenceHertz(little), fallBelowReferenceHertz({ ...movingMagnet, loadFarads: 0 }) ?? NaN, { relative: 1e-3 })
    const light = { ...movingMagnet, loadOhms: 1e15 }
    expectWithin(responseDecibels(light, 20_000), responseDecibels({ ...movingMagnet, loadOhms: Infinity }, 20_000), { db: 1e-6 })
  })

  test('a coil that nothing damps rings without limit', () => {
    const lossless = { coilOhms: 0, coilHenries: 0.5, loadOhms: Infinity, loadFarads: 250e-12 }
    expect(qualityFactor(lossless)).toBe(Infinity)
    expect(peakHeightDecibels(lossless)).toBe(Infinity)
    expectWithin(peakHertz(lossless), resonanceHertz(lossless) ?? NaN, { relative: 1e-12 })
  })

  test('loads in parallel combine, and none is no load', () => {
    expectWithin(parallelOhms(47_000, 47_000), 23_500, { relative: 1e-12 })
    expectWithin(parallelOhms(100, Infinity), 100, { relative: 1e-12 })
    expect(parallelOhms()).toBe(Infinity)
    expect(parallelOhms(0, 100)).toBe(0)
  })
})
