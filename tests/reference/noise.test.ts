import { describe, test } from 'vitest'
import { noiseBandwidthHertz } from '@/lib/match/physics/noise-conversion'
import { inputVolts, kelvinOf, noiseIntegrals, noiseVolts, signalToNoiseDecibels } from '@/lib/match/physics/noise'
import { expectWithin } from '../support/tolerances'

const silent = { voltsPerRootHertz: 0, amperesPerRootHertz: 0, kelvin: kelvinOf(25) }

describe('published noise rows: the cartridge’s own limit', () => {
  // Source: reckoned, 25 °C, 20 Hz to 20 kHz, RIAA, re the signal after the load; microvolts printed to 0.001.
  test.each([
    { name: 'MM 610 Ω 470 mH', ohm: 610, henry: 0.47, load: 47e3, pF: 220, mV: 5, flat: 0.576, a: 0.425, snr: 78.68, snrA: 81.32 },
    { name: 'MM 1000 Ω 500 mH', ohm: 1000, henry: 0.5, load: 47e3, pF: 200, mV: 5, flat: 0.627, a: 0.457, snr: 77.87, snrA: 80.62 },
    { name: 'moving iron 450 Ω 120 mH', ohm: 450, henry: 0.12, load: 47e3, pF: 200, mV: 4, flat: 0.29, a: 0.184, snr: 82.73, snrA: 86.66 },
    { name: 'high-output MC 120 Ω', ohm: 120, henry: 0.5e-3, load: 47e3, pF: 200, mV: 2, flat: 0.13, a: 0.08, snr: 83.69, snrA: 87.98 },
    { name: 'low-output MC 10 Ω', ohm: 10, henry: 20e-6, load: 100, pF: 0, mV: 0.5, flat: 0.036, a: 0.022, snr: 82.04, snrA: 86.33 },
    { name: 'low-output MC 40 Ω', ohm: 40, henry: 50e-6, load: 400, pF: 0, mV: 0.3, flat: 0.072, a: 0.044, snr: 71.58, snrA: 75.87 },
  ])('$name', ({ ohm, henry, load, pF, mV, flat, a, snr, snrA }) => {
    const network = { coilOhms: ohm, coilHenries: henry, loadOhms: load, loadFarads: pF * 1e-12 }
    const integrals = noiseIntegrals(network)
    const signalVolts = inputVolts(network, mV * 1e-3)
    const flatNoise = noiseVolts(integrals.flat, silent).total
    const aNoise = noiseVolts(integrals.aWeighted, silent).total
    expectWithin(flatNoise * 1e6, flat, { absolute: 0.00051 }, 'flat µV')
    expectWithin(aNoise * 1e6, a, { absolute: 0.00051 }, 'A µV')
    expectWithin(signalToNoiseDecibels({ signalVolts, noise: flatNoise }), snr, { db: 0.01 }, 'flat')
    expectWithin(signalToNoiseDecibels({ signalVolts, noise: aNoise }), snrA, { db: 0.01 }, 'A')
  })

  // Source: reckoned.
  test('noise bandwidths are 8630 Hz with RIAA and 3214 Hz with RIAA and A', () => {
    expectWithin(noiseBandwidthHertz('flat'), 8630, { absolute: 0.5 })
    expectWithin(noiseBandwidthHertz('aWeighted'), 3214, { absolute: 0.5 })
  })

  // Source: read, a construction article of September 2007: about 81 dB(A) for a typical moving magnet and 89 dB(A) for
  // a high-output moving coil of 2.5 mV, re 5 cm/s. Its cartridges are not stated, so this is a check of magnitude.
  test('typical cartridges land near the published limits', () => {
    const snrA = (network: Parameters<typeof noiseIntegrals>[0], emf: number) =>
      signalToNoiseDecibels({
        signalVolts: inputVolts(network, emf),
        noise: noiseVolts(noiseIntegrals(network).aWeighted, silent).total,
      })
    expectWithin(snrA({ coilOhms: 700, coilHenries: 0.5, loadOhms: 47e3, loadFarads: 200e-12 }, 5e-3), 81, { db: 1 })
    expectWithin(snrA({ coilOhms: 140, coilHenries: 0.5e-3, loadOhms: 47e3, loadFarads: 200e-12 }, 2.5e-3), 89, { db: 1 })
  })
})
