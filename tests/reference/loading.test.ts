import { describe, expect, test } from 'vitest'
import {
  deviationDecibels,
  fallBelowReferenceHertz,
  levelLossDecibels,
  peakHeightDecibels,
  peakHertz,
  resonanceHertz,
} from '@/lib/match/physics/loading'
import { expectWithin } from '../support/tolerances'

/** Rounding of the printed table, half a unit of its last digit. */
const HALF_CENTIBEL = { db: 0.0051 }
const HALF_HERTZ = { absolute: 0.51 }

describe('published loading rows', () => {
  // Source: reckoned (closed form and an independent circuit simulation agree).
  test.each([
    { mH: 500, ohm: 1000, pF: 100, lc: 22508, peak: null, height: null, fall: 21306, at10k: -0.36, at20k: -2.54, loss: -0.19 },
    { mH: 500, ohm: 1000, pF: 200, lc: 15915, peak: 10484, height: 0.85, fall: 19740, at10k: 0.84, at20k: -3.19, loss: -0.17 },
    { mH: 500, ohm: 1000, pF: 400, lc: 11254, peak: 9527, height: 2.9, fall: 15729, at10k: 2.85, at20k: -7.99, loss: -0.14 },
    { mH: 470, ohm: 610, pF: 150, lc: 18955, peak: 10220, height: 0.37, fall: 21948, at10k: 0.37, at20k: -1.99, loss: -0.11 },
    { mH: 470, ohm: 610, pF: 300, lc: 13403, peak: 10767, height: 2.23, fall: 18173, at10k: 2.17, at20k: -4.85, loss: -0.08 },
    { mH: 700, ohm: 1300, pF: 250, lc: 12031, peak: 7278, height: 0.57, fall: 14487, at10k: 0.1, at20k: -8.03, loss: -0.22 },
    { mH: 700, ohm: 1300, pF: 450, lc: 8967, peak: 7215, height: 2.13, fall: 12186, at10k: 0.2, at20k: -12.7, loss: -0.17 },
  ])('$mH mH, $ohm Ω into 47 kΩ and $pF pF', ({ mH, ohm, pF, lc, peak, height, fall, at10k, at20k, loss }) => {
    const network = { coilOhms: ohm, coilHenries: mH * 1e-3, loadOhms: 47_000, loadFarads: pF * 1e-12 }
    expectWithin(resonanceHertz(network), lc, HALF_HERTZ, 'LC')
    expectWithin(fallBelowReferenceHertz(network), fall, HALF_HERTZ, '−3 dB')
    expectWithin(deviationDecibels(network, 10_000), at10k, HALF_CENTIBEL, '10 kHz')
    expectWithin(deviationDecibels(network, 20_000), at20k, HALF_CENTIBEL, '20 kHz')
    expectWithin(levelLossDecibels(network), loss, HALF_CENTIBEL, 'loss')
    if (peak === null || height === null) {
      expect(peakHertz(network)).toBeNull()
      expect(peakHeightDecibels(network)).toBeNull()
    } else {
      expectWithin(peakHertz(network), peak, HALF_HERTZ, 'peak')
      expectWithin(peakHeightDecibels(network), height, HALF_CENTIBEL, 'height')
    }
  })

  // Source: reckoned, voltage divider.
  test.each([
    [10, 0.828],
    [5, 1.584],
    [2, 3.522],
    [1, 6.021],
  ])('a load of %d times the coil costs %d dB', (ratio, cost) => {
    const network = { coilOhms: 12, coilHenries: 0, loadOhms: 12 * ratio, loadFarads: 0 }
    expectWithin(levelLossDecibels(network), -cost, { db: 0.0006 })
  })

  // Source: read (measured 1980, 100 Ω down to 5 Ω: the audio band hardly moves). The half decibel is ours.
  test('a low load costs a moving coil level and leaves its audio band alone', () => {
    const at = (loadOhms: number) => ({ coilOhms: 10, coilHenries: 20e-6, loadOhms, loadFarads: 200e-12 })
    expectWithin(deviationDecibels(at(100), 20_000), 0, { db: 0.01 })
    expectWithin(deviationDecibels(at(5), 20_000), 0, { db: 0.5 })
    expect(levelLossDecibels(at(5))).toBeLessThan(-9)
  })
})
