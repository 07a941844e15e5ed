import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { powerToDecibels } from '@/lib/match/physics/decibels'
import { logSpacedHertz } from '@/lib/match/physics/grid'
import { nodeImpedance, qualityFactor } from '@/lib/match/physics/loading'
import { inputVolts, noiseFigureDecibels, noiseIntegrals, noiseVolts, signalToNoiseDecibels, type NoiseNetwork } from '@/lib/match/physics/noise'
import { noiseBandwidthHertz, voltageNoiseFromSnr } from '@/lib/match/physics/noise-conversion'
import { playbackPower } from '@/lib/match/physics/riaa'
import { stepUpNodeImpedance } from '@/lib/match/physics/step-up'
import { aWeightingPower } from '@/lib/match/physics/weighting'
import { expectWithin } from '../../support/tolerances'
import { anyLoading, logarithmic, stepUp, wholeLoading } from './arbitraries'

/** The same integrals by brute force: 20 000 points, trapezium rule in ln f. Textbook rule, written for this test. */
function densely(network: NoiseNetwork, with7950: boolean) {
  const grid = logSpacedHertz({ low: 20, high: 20_000, count: 20_001 })
  const step = Math.log(1000) / 20_000
  const sums = { flat: { resistance: 0, impedance: 0 }, aWeighted: { resistance: 0, impedance: 0 } }
  grid.forEach((f, i) => {
    const z = 'turnsRatio' in network ? stepUpNodeImpedance(network, f) : nodeImpedance(network, f)
    const flat = playbackPower(f, { with7950 }) * f * step * (i === 0 || i === 20_000 ? 0.5 : 1)
    const a = flat * aWeightingPower(f)
    sums.flat.resistance += z.re * flat
    sums.aWeighted.resistance += z.re * a
    sums.flat.impedance += (z.re ** 2 + z.im ** 2) * flat
    sums.aWeighted.impedance += (z.re ** 2 + z.im ** 2) * a
  })
  return sums
}

function expectDenseAgreement(network: NoiseNetwork, with7950: boolean): void {
  const quick = noiseIntegrals(network, { with7950 })
  const dense = densely(network, with7950)
  for (const weighting of ['flat', 'aWeighted'] as const) {
    const limit = { db: 0.002 }
    expectWithin(powerToDecibels(quick[weighting].resistanceOhmHertz), powerToDecibels(dense[weighting].resistance), limit, weighting)
    expectWithin(powerToDecibels(quick[weighting].impedanceSquaredOhmHertz), powerToDecibels(dense[weighting].impedance), limit, weighting)
  }
}

// Source: the same integrand by brute force, above.
describe('noise integrals', () => {
  test('few points agree with many for any coil up to Q = 50', () => {
    fc.assert(
      fc.property(wholeLoading.filter((network) => (qualityFactor(network) ?? 0) < 50), fc.boolean(), expectDenseAgreement),
      { numRuns: 60 },
    )
  })

  test('and for any step-up', () => {
    fc.assert(fc.property(stepUp, fc.boolean(), expectDenseAgreement), { numRuns: 40 })
  })

  test('are finite with any part missing', () => {
    fc.assert(
      fc.property(anyLoading, fc.boolean(), (network, with7950) => {
        const { flat, aWeighted } = noiseIntegrals(network, { with7950 })
        for (const value of [...Object.values(flat), ...Object.values(aWeighted)]) expect(Number.isFinite(value)).toBe(true)
      }),
    )
  })
})

// Source of these checks: Nyquist's law and the sum of powers.
describe('noise, laws', () => {
  test('thermal noise grows as the root of temperature, the rest not at all', () => {
    fc.assert(
      fc.property(wholeLoading, logarithmic(100, 500), logarithmic(1.01, 4), (network, kelvin, factor) => {
        const { flat } = noiseIntegrals(network)
        const preamp = { voltsPerRootHertz: 2e-9, amperesPerRootHertz: 1e-13 }
        const cool = noiseVolts(flat, { ...preamp, kelvin })
        const warm = noiseVolts(flat, { ...preamp, kelvin: kelvin * factor })
        expectWithin(warm.thermal / cool.thermal, Math.sqrt(factor), { relative: 1e-12 })
        expect(warm.total).toBeGreaterThan(cool.total)
        expect([warm.voltage, warm.current]).toEqual([cool.voltage, cool.current])
      }),
    )
  })

  test('R, L times k and C by k multiplies thermal noise by √k and current noise by k', () => {
    fc.assert(
      fc.property(wholeLoading, logarithmic(0.1, 10), (network, k) => {
        const { coilOhms, coilHenries, loadOhms, loadFarads } = network
        const scaled = { coilOhms: coilOhms * k, coilHenries: coilHenries * k, loadOhms: loadOhms * k, loadFarads: loadFarads / k }
        const [small, large] = [noiseIntegrals(network).flat, noiseIntegrals(scaled).flat]
        expectWithin(large.resistanceOhmHertz / small.resistanceOhmHertz, k, { relative: 1e-6 })
        expectWithin(large.impedanceSquaredOhmHertz / small.impedanceSquaredOhmHertz, k * k, { relative: 1e-6 })
      }),
    )
  })

  test('a plain resistor gives √(4kTRB)', () => {
    const { flat } = noiseIntegrals({ coilOhms: 1000, coilHenries: 0, loadOhms: Infinity, loadFarads: 0 })
    const { thermal } = noiseVolts(flat, { voltsPerRootHertz: 0, amperesPerRootHertz: 0, kelvin: 300 })
    expectWithin(thermal, Math.sqrt(4 * 1.380649e-23 * 300 * 1000 * noiseBandwidthHertz('flat')), { relative: 1e-9 })
  })

  test('a preamp without noise of its own adds nothing, and a shorted, cold network makes none', () => {
    const { flat } = noiseIntegrals({ coilOhms: 600, coilHenries: 0.4, loadOhms: 47_000, loadFarads: 200e-12 })
    const silent = { voltsPerRootHertz: 0, amperesPerRootHertz: 0 }
    expect(noiseFigureDecibels(noiseVolts(flat, { ...silent, kelvin: 298 }))).toBe(0)
    expect(noiseFigureDecibels(noiseVolts(flat, { ...silent, kelvin: 0 }))).toBe(0)
    expect(signalToNoiseDecibels({ signalVolts: 1, noise: 0 })).toBe(Infinity)
  })

  test('the signal is the EMF after load and transformer', () => {
    expectWithin(inputVolts({ coilOhms: 10, coilHenries: 0, loadOhms: 90, loadFarads: 0 }, 1e-3), 0.9e-3, { relative: 1e-12 })
  })
})

describe('a printed ratio turned into voltage noise', () => {
  test('gives the ratio back, flat or A-weighted, and says that it is a conversion', () => {
    fc.assert(
      fc.property(logarithmic(40, 100), fc.constantFrom('flat' as const, 'aWeighted' as const), fc.boolean(), (snrDecibels, weighting, with7950) => {
        const converted = voltageNoiseFromSnr({ snrDecibels, referenceVolts: 5e-3, weighting, with7950 })
        expect(converted.origin).toBe('converted-from-snr')
        const noise = converted.voltsPerRootHertz * Math.sqrt(noiseBandwidthHertz(weighting, { with7950 }))
        expectWithin(signalToNoiseDecibels({ signalVolts: 5e-3, noise }), snrDecibels, { db: 1e-9 })
      }),
    )
  })

  // Source: reckoned, 5 mV/(10^4·√8630 Hz).
  test('80 dB flat re 5 mV is 5.38 nV per root hertz', () => {
    const { voltsPerRootHertz } = voltageNoiseFromSnr({ snrDecibels: 80, referenceVolts: 5e-3, weighting: 'flat' })
    expectWithin(voltsPerRootHertz * 1e9, 5.382, { absolute: 0.001 })
  })
})
