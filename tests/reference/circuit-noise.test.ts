/**
 * Noise of a node as the simulator gives it, density by density, then equalised, weighted and summed here by the
 * trapezium rule. Source: fixtures/circuits/mm-noise, ngspice's own output.
 */
import { describe, expect, test } from 'vitest'
import { kelvinOf, noiseIntegrals, noiseVolts } from '@/lib/match/physics/noise'
import { playbackPower } from '@/lib/match/physics/riaa'
import { aWeightingPower } from '@/lib/match/physics/weighting'
import { toDecibels } from '@/lib/match/physics/decibels'
import { hasNgspice, liveOutput, storedOutput } from '../support/ngspice'
import { expectWithin } from '../support/tolerances'

const network = { coilOhms: 830, coilHenries: 0.61, loadOhms: 47_000, loadFarads: 260e-12 }
// A resistor of 1 kΩ at 25 °C through gains of 1.3555 and 0.12 mA/V; 4kTR by the SI value of k.
const resistorNoise = Math.sqrt(4 * 1.380649e-23 * 298.15 * 1000)
const preamp = { voltsPerRootHertz: 1.3555 * resistorNoise, amperesPerRootHertz: 0.12e-3 * resistorNoise, kelvin: kelvinOf(25) }
const silent = { ...preamp, voltsPerRootHertz: 0, amperesPerRootHertz: 0 }

const WEIGHTS = {
  flat: (hertz: number) => playbackPower(hertz),
  aWeighted: (hertz: number) => playbackPower(hertz) * aWeightingPower(hertz),
  flatWith7950: (hertz: number) => playbackPower(hertz, { with7950: true }),
}

/** ∫ density²·W df by the trapezium rule in ln f. */
function summed(rows: readonly (readonly number[])[], column: number, weight: (hertz: number) => number): number {
  let power = 0
  for (let i = 1; i < rows.length; i += 1) {
    const [f0, f1] = [rows[i - 1][0], rows[i][0]]
    const g0 = rows[i - 1][column] ** 2 * weight(f0) * f0
    const g1 = rows[i][column] ** 2 * weight(f1) * f1
    power += ((g0 + g1) / 2) * Math.log(f1 / f0)
  }
  return Math.sqrt(power)
}

function compare(rows: readonly (readonly number[])[]): void {
  expect(rows).toHaveLength(301)
  const plain = noiseIntegrals(network)
  const cut = noiseIntegrals(network, { with7950: true })
  const near = (actual: number, expected: number, what: string) =>
    expectWithin(toDecibels(actual), toDecibels(expected), { db: 0.003 }, what)
  near(noiseVolts(plain.flat, silent).total, summed(rows, 1, WEIGHTS.flat), 'thermal, flat')
  near(noiseVolts(plain.aWeighted, silent).total, summed(rows, 1, WEIGHTS.aWeighted), 'thermal, A')
  near(noiseVolts(plain.flat, preamp).total, summed(rows, 2, WEIGHTS.flat), 'total, flat')
  near(noiseVolts(plain.aWeighted, preamp).total, summed(rows, 2, WEIGHTS.aWeighted), 'total, A')
  near(noiseVolts(cut.flat, preamp).total, summed(rows, 2, WEIGHTS.flatWith7950), 'total, flat, 7950 µs')
}

describe('noise of a circuit', () => {
  test('stored output', () => compare(storedOutput('mm-noise')))
  if (hasNgspice()) test('run now', () => compare(liveOutput('mm-noise')))
  else test('ngspice is not installed: compared with the stored output only, not run', () => expect(storedOutput('mm-noise')).toHaveLength(301))
})
