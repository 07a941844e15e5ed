/** The physics against an independent circuit simulator. Source: fixtures/circuits, netlists and ngspice's own output. */
import { describe, expect, test } from 'vitest'
import { armResonanceHertz, armResponseDecibels } from '@/lib/match/physics/arm'
import { magnitude } from '@/lib/match/physics/complex'
import { toDecibels } from '@/lib/match/physics/decibels'
import { lineResponseDecibels } from '@/lib/match/physics/line-output'
import { nodeImpedance, responseDecibels } from '@/lib/match/physics/loading'
import { bassHalfMagnitude, playbackDecibels } from '@/lib/match/physics/riaa'
import { cartridgeLoad, netGain, stepUpNodeImpedance } from '@/lib/match/physics/step-up'
import { hasNgspice, liveOutput, storedOutput } from '../support/ngspice'
import { expectWithin, type Tolerance } from '../support/tolerances'

type Figure = (hertz: number) => number
interface Circuit {
  readonly name: string
  readonly columns: readonly (readonly [figure: Figure, tolerance: Tolerance])[]
}

const DB = { db: 1e-4 }
const OHMS = { relative: 1e-5 }

const movingMagnet = { coilOhms: 720, coilHenries: 0.54, loadOhms: 47_000, loadFarads: 230e-12 }
const movingCoil = { coilOhms: 14, coilHenries: 31e-6, loadOhms: 220, loadFarads: 680e-12 }
const transformer = {
  coilOhms: 11,
  coilHenries: 24e-6,
  turnsRatio: 16,
  primaryOhms: 1.9,
  secondaryOhms: 410,
  primaryHenries: 2.6,
  loadOhms: 47_000,
  loadFarads: 190e-12,
}
const line = { outputOhms: 2200, couplingFarads: 0.47e-6, cableFarads: 900e-12, inputOhms: 33_000 }
const armResonance = armResonanceHertz({ massKilograms: 0.018, complianceMetresPerNewton: 0.014 })

// The circuit of the equalisation is not normalised: the offset at 1 kHz is that of its own plain elements.
const lagLead = (hertz: number, pole: number, zero: number) =>
  toDecibels(Math.hypot(1, 2 * Math.PI * hertz * zero) / Math.hypot(1, 2 * Math.PI * hertz * pole))
const bassAt1k = lagLead(1000, 3180e-6, 318e-6)
const playbackAt1k = bassAt1k + lagLead(1000, 75e-6, 0)
const with7950At1k = playbackAt1k - toDecibels(Math.hypot(1, 1 / (2 * Math.PI * 1000 * 7950e-6)))

const CIRCUITS: readonly Circuit[] = [
  {
    name: 'mm-loading',
    columns: [
      [(hertz) => responseDecibels(movingMagnet, hertz), DB],
      [(hertz) => nodeImpedance(movingMagnet, hertz).re, OHMS],
      [(hertz) => nodeImpedance(movingMagnet, hertz).im, OHMS],
    ],
  },
  {
    name: 'mc-loading',
    columns: [
      [(hertz) => responseDecibels(movingCoil, hertz), DB],
      [(hertz) => nodeImpedance(movingCoil, hertz).re, OHMS],
      [(hertz) => nodeImpedance(movingCoil, hertz).im, OHMS],
    ],
  },
  {
    name: 'step-up',
    columns: [
      [(hertz) => toDecibels(netGain(transformer, hertz)), DB],
      [(hertz) => stepUpNodeImpedance(transformer, hertz).re, OHMS],
      [(hertz) => stepUpNodeImpedance(transformer, hertz).im, OHMS],
      [(hertz) => magnitude(cartridgeLoad(transformer, hertz)), OHMS],
    ],
  },
  { name: 'line-output', columns: [[(hertz) => lineResponseDecibels(line, hertz), DB]] },
  {
    name: 'riaa',
    columns: [
      [(hertz) => playbackDecibels(hertz) + playbackAt1k, DB],
      [(hertz) => playbackDecibels(hertz, { with7950: true }) + with7950At1k, DB],
      [(hertz) => toDecibels(bassHalfMagnitude(hertz)) + bassAt1k, DB],
    ],
  },
  { name: 'arm', columns: [[(hertz) => armResponseDecibels({ hertz, resonanceHertz: armResonance, qualityFactor: 3 }), DB]] },
]

function compare({ name, columns }: Circuit, rows: readonly (readonly number[])[]): void {
  expect(rows.length).toBeGreaterThan(20)
  for (const [hertz, ...values] of rows) {
    expect(values).toHaveLength(columns.length)
    for (const [i, [figure, tolerance]] of columns.entries()) {
      expectWithin(figure(hertz), values[i], tolerance, `${name}, column ${i + 1}, ${hertz} Hz`)
    }
  }
}

describe('circuits, stored output', () => {
  test.each(CIRCUITS)('$name', (circuit) => compare(circuit, storedOutput(circuit.name)))
})

// The set of tests is chosen here, so that a machine without the simulator says so instead of passing over it.
if (hasNgspice()) {
  describe('circuits, run now', () => {
    test.each(CIRCUITS)('$name', (circuit) => compare(circuit, liveOutput(circuit.name)))
  })
} else {
  test('ngspice is not installed: circuits were compared with their stored output only, not run', () => {
    expect(CIRCUITS.every(({ name }) => storedOutput(name).length > 0)).toBe(true)
  })
}
