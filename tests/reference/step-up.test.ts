import { describe, test } from 'vitest'
import { inputVolts } from '@/lib/match/physics/noise'
import { reflectedFarads, reflectedLoadOhms, turnsRatioOfImpedances, windingOhms } from '@/lib/match/physics/step-up'
import { expectWithin } from '../support/tolerances'

const ideal = { coilHenries: 0, loadFarads: 0, primaryOhms: 0, secondaryOhms: 0, primaryHenries: null }

describe('published step-up values', () => {
  // Source: read.
  test('1:10 into 47 kΩ is 470 Ω to the cartridge', () => {
    expectWithin(reflectedLoadOhms({ loadOhms: 47_000, turnsRatio: 10 }), 470, { absolute: 1e-9 })
  })

  // Source: read; √(50000/150) = 18.26, printed as 1:18.
  test('a label of 150 : 50k is 1:18', () => {
    expectWithin(Math.round(turnsRatioOfImpedances({ primaryOhms: 150, secondaryOhms: 50_000 })), 18, { absolute: 0 })
  })

  // Source: read (5.14 mV), reckoned (5.139 mV).
  test('0.30 mV behind 40 Ω through 1:35.4 into 47 kΩ gives 5.14 mV', () => {
    const network = { ...ideal, coilOhms: 40, loadOhms: 47_000, turnsRatio: 35.4 }
    expectWithin(inputVolts(network, 0.3e-3) * 1e3, 5.139, { absolute: 0.0006 })
  })

  // Source: reckoned, ideal transformer: impedances go with the square of the turns.
  test('capacitance reflects as n²C and windings add as R_primary + R_secondary/n²', () => {
    expectWithin(reflectedFarads({ loadFarads: 200e-12, turnsRatio: 20 }), 80e-9, { relative: 1e-12 })
    const network = { ...ideal, coilOhms: 5, loadOhms: 47_000, turnsRatio: 20, primaryOhms: 2, secondaryOhms: 800 }
    expectWithin(windingOhms(network), 4, { absolute: 1e-12 })
  })
})
