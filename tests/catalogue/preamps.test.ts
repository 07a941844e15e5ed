import { describe, expect, test } from 'vitest'
import { PREAMPS } from '@/content/catalogue/preamps/all'
import { PreampEntry } from '@/lib/catalogue/schema-preamp'
import { toPreamp } from '@/lib/catalogue/to-preamp'
import { boardForSerial, toPreampView } from '@/lib/catalogue/views'
import { controlsInWords, gainsInWords, takesInWords } from '@/lib/catalogue/format'
import { describeSetting, enumerateStates, resolveSetting, type Preamp } from '@/lib/match'
import { expectWithin } from '../support/tolerances'

const boards = PREAMPS.flatMap((entry) => entry.boards.map((board) => [`${entry.id}, ${board.id}`, toPreamp(entry, board)] as const))
const entryOf = (id: string) => PREAMPS.find((entry) => entry.id === id) as PreampEntry
const engine = (id: string, board = 0): Preamp => toPreamp(entryOf(id), entryOf(id).boards[board])

/** Every number anywhere in a value, with the way to it. */
function numbersIn(value: unknown, way = ''): [string, number][] {
  if (typeof value === 'number') return [[way, value]]
  if (typeof value !== 'object' || value === null) return []
  return Object.entries(value).flatMap(([key, inner]) => numbersIn(inner, `${way}.${key}`))
}

/** What a setting's groups come to, by label. */
const comesTo = (preamp: Preamp, state: Record<string, string>) =>
  Object.fromEntries(describeSetting(preamp, state).map(({ label, value }) => [label, value]))

describe.each(boards)('%s', (_, preamp) => {
  test('every number is finite and not negative', () => {
    for (const [way, number] of numbersIn(preamp)) {
      expect(Number.isFinite(number), way).toBe(true)
      expect(number, way).toBeGreaterThanOrEqual(0)
    }
  })

  test('every combination comes to a real setting in SI', () => {
    const states = enumerateStates(preamp)
    expect(states.length).toBeGreaterThan(0)
    for (const state of states) {
      const setting = resolveSetting(preamp, state)
      if ('clash' in setting) throw new Error(`${JSON.stringify(state)} is listed and cannot be set`)
      // From a 10 Ω plug to a base of 47 kΩ, or more behind a transformer; capacitance in picofarads, never farads.
      expect(setting.loadOhms.low).toBeGreaterThan(9)
      expect(setting.loadOhms.high).toBeLessThan(70_000)
      expect(setting.inputFarads.low).toBeGreaterThan(50e-12)
      expect(setting.inputFarads.high).toBeLessThan(1e-9)
      expect(setting.gain.pathId).toBe(setting.path.id)
    }
  })

  test('no gain passes the output limit, and an output-limited board reaches it at each', () => {
    // Source: one output stage, so overload at 1 kHz × gain is its limit in volts. Printed figures are rounded: 0.25 dB.
    for (const gain of preamp.gains) {
      const at1kHz = gain.overload.find(({ hertz }) => hertz === 1000)?.volts ?? NaN
      const reached = 20 * Math.log10((at1kHz * 10 ** (gain.gainDecibels.nominal / 20)) / preamp.maximumOutputVolts.nominal)
      if (preamp.topology === 'output-limited') expectWithin(reached, 0, { db: 0.25 }, gain.id)
      else expect(reached, gain.id).toBeLessThan(0.25)
    }
  })
})

test('the content passes the schema', () => {
  for (const entry of PREAMPS) expect(PreampEntry.safeParse(entry).error?.issues, entry.id).toBeUndefined()
})

test('each preamp has the combinations that its controls allow', () => {
  // 2⁸; three quarters of them without 3 and 4 together; 5 plugs × 3 gains; 2 filters × (MM + 3 MC loads), mono apart.
  const counts = boards.map(([name, preamp]) => [name, enumerateStates(preamp).length])
  expect(Object.fromEntries(counts)).toEqual({
    'sedge-1, only': 1,
    'tarn-2, first': 256,
    'tarn-2, second': 192,
    'merrin-5, only': 15,
    'ember-3, only': 8,
  })
})

test('the legends of the Tarn 2 moved with its second board', () => {
  const [first, second] = [engine('tarn-2', 0), engine('tarn-2', 1)]
  const all = { Gain: '36 dB', Load: '47 kΩ', Capacitance: '70 pF', Rumble: 'Off' }
  expect(comesTo(first, { bank: '00000000' })).toEqual(all)
  expect(comesTo(second, { bank: '00000000' })).toEqual(all)
  expect(comesTo(second, { bank: '10000010' })).toEqual({ ...all, Gain: '42 dB', Capacitance: '270 pF' })
  expect(comesTo(first, { bank: '00010010' })).toEqual({ ...all, Gain: '42 dB', Capacitance: '170 pF' })
  expect(comesTo(second, { bank: '11001001' })).toEqual({ ...all, Gain: '66 dB', Load: '100 Ω', Rumble: 'On' })
})

test('on the second board switches 3 and 4 cannot both be ON', () => {
  expect(resolveSetting(engine('tarn-2', 1), { bank: '00110000' })).toEqual({ clash: { control: 'bank', members: [3, 4] } })
  expect(resolveSetting(engine('tarn-2', 0), { bank: '00110000' })).not.toHaveProperty('clash')
})

test('the MC gains of the Tarn 2 run through the quieter input', () => {
  const { gains } = engine('tarn-2')
  for (const gain of gains) {
    const quiet = gain.gainDecibels.nominal >= 60
    expect(gain.pathId).toBe(quiet ? 'mc' : 'mm')
    expectWithin(gain.voltageNoise.nominal, quiet ? 0.9e-9 : 4.5e-9, { relative: 1e-9 })
  }
})

test('through the transformer of the Ember 3 a cartridge sees about what the button says', () => {
  const ember = engine('ember-3')
  for (const ohms of [40, 100, 400]) {
    const setting = resolveSetting(ember, { ...ember.asDelivered, input: 'mc', 'mc-load': String(ohms) })
    if ('clash' in setting) throw new Error('a real combination was refused')
    const { stepUp } = setting.path
    if (!stepUp) throw new Error('the MC input has lost its transformer')
    // Reflected load: R_p + (R_s + R)/n², the formula for transformers with windings.
    const seen = stepUp.primaryOhms.nominal + (stepUp.secondaryOhms.nominal + setting.loadOhms.nominal) / stepUp.ratio.nominal ** 2
    expectWithin(seen, ohms, { relative: 0.02 })
    // 62 dB from the sockets: the transformer's part and the amplifier's.
    expectWithin(setting.gain.gainDecibels.nominal + 20 * Math.log10(stepUp.ratio.nominal), 62, { db: 0.01 })
  }
})

test('no plug is no position', () => {
  const plugs = engine('merrin-5').controls.find(({ kind }) => kind === 'plugs')
  expect(plugs).toMatchObject({ positions: ['10 Ω', '30 Ω', '100 Ω', '300 Ω', '1 kΩ'].map((label) => ({ label })) })
})

test('a serial number belongs to the board it was built on', () => {
  const tarn = toPreampView(entryOf('tarn-2'))
  expect(boardForSerial(tarn, 18_999)?.id).toBe('first')
  expect(boardForSerial(tarn, 19_000)?.id).toBe('second')
  expect(boardForSerial(tarn, 19_000.5)).toBeNull()
  expect(boardForSerial(tarn, -1)).toBeNull()
  expect(boardForSerial({ boards: tarn.boards.slice(0, 1) }, 19_000)).toBeNull()
  expect(boardForSerial(toPreampView(entryOf('sedge-1')), 7)?.id).toBe('only')
})

test('a list says what each takes, its gains and what there is to set', () => {
  const lines = PREAMPS.map(toPreampView).map((view) => [takesInWords(view), gainsInWords(view), controlsInWords(view)])
  expect(lines).toEqual([
    ['MM', '40 dB, one gain', 'Fixed 47 kΩ, 100 pF'],
    ['MM and MC', '36 to 66 dB', 'Two banks of 8 switches'],
    ['MC', '56 to 72 dB', 'Load plugs, 10 Ω to 1 kΩ'],
    ['MM and MC', '40 or 62 dB', 'Valves, front buttons'],
  ])
})
