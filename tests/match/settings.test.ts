import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import {
  added,
  inParallel,
  resolveSetting,
  summarise,
} from '@/lib/match/settings'
import { exactly, within, type ControlState, type Preamp, type Setting } from '@/lib/match'
import { decodeState, encodeState, enumerateStates, parseState, statesEqual } from '@/lib/match/states'
import { describeGroup, describeSetting, faradsInWords, gainInWords, ohmsInWords } from '@/lib/match/setting-words'
import { bankPreamp, buttonPreamp, fixedPreamp, mixedPreamp, plugPreamp, PREAMPS } from '../support/preamps'
import { expectWithin } from '../support/tolerances'

function settingOf(preamp: Preamp, state: ControlState): Setting {
  const setting = resolveSetting(preamp, state)
  if ('clash' in setting) throw new Error('These positions exclude each other.')
  return setting
}

const bank = (bits: string): ControlState => ({ bank: bits })

describe('what a combination comes to', () => {
  // Ohm's law: 1/(1/47000 + 1/100 + 1/470) = 82.317 Ω.
  test('resistors join the base load side by side, ends with ends', () => {
    const { loadOhms } = settingOf(bankPreamp(), bank('01011000'))
    expectWithin(loadOhms.nominal, 82.317, { relative: 1e-4 })
    expectWithin(loadOhms.low, 82.317 * 0.99, { relative: 1e-4 })
    expectWithin(loadOhms.high, 82.317 * 1.01, { relative: 1e-4 })
  })

  // Capacitances side by side add: 70 + 100 + 220 = 390 pF, low 63 + 95 + 209 = 367 pF.
  test('capacitors add to the base', () => {
    const { inputFarads } = settingOf(bankPreamp(), bank('00000110'))
    expectWithin(inputFarads.nominal, 390e-12, { relative: 1e-9 })
    expectWithin(inputFarads.low, 367e-12, { relative: 1e-9 })
    expectWithin(inputFarads.high, 413e-12, { relative: 1e-9 })
  })

  test('the gain decides the input where no control chooses it', () => {
    expect(settingOf(bankPreamp(), bank('10000000'))).toMatchObject({ path: { id: 'mm' }, gain: { id: 'g42' } })
    expect(settingOf(bankPreamp(), bank('01000000'))).toMatchObject({ path: { id: 'mc' }, gain: { id: 'g60' } })
  })

  test('an input control decides the input, and its only gain comes with it', () => {
    const state = { input: 'mc', 'mc-load': 'l40', extra: '10' }
    expect(settingOf(buttonPreamp(), state)).toMatchObject({
      path: { id: 'mc' },
      gain: { id: 'g62' },
      loadOhms: { nominal: 40 },
      filter: { cornerHertz: 20, order: 1 },
    })
  })

  test('a group that waits for another does nothing until then', () => {
    expect(settingOf(buttonPreamp(), { input: 'mm', 'mc-load': 'l40', extra: '00' }).loadOhms.nominal).toBe(47_000)
    const mixed = settingOf(mixedPreamp(), { six: '111110', input: 'mm' })
    expect(mixed).toMatchObject({ gain: { id: 'g44' }, loadOhms: { nominal: 47_000 } })
    expectWithin(mixed.inputFarads.nominal, 320e-12, { relative: 1e-9 })
    const coil = settingOf(mixedPreamp(), { six: '111110', input: 'mc' })
    expect(coil.gain.id).toBe('g64')
    expectWithin(coil.inputFarads.nominal, 70e-12, { relative: 1e-9 })
  })

  test('a fixed filter stays unless a switched one is on', () => {
    const preamp: Preamp = { ...bankPreamp(), fixedFilter: { cornerHertz: 5, order: 1 } }
    expect(settingOf(preamp, bank('00000000')).filter).toEqual({ cornerHertz: 5, order: 1 })
    expect(settingOf(preamp, bank('00000001')).filter).toEqual({ cornerHertz: 18, order: 2 })
  })

  test('members that exclude each other are named', () => {
    expect(resolveSetting(bankPreamp(), bank('00110000'))).toEqual({ clash: { control: 'bank', members: [3, 4] } })
  })

  test('a combination that no option describes is a clash of the switches behind it', () => {
    const preamp = bankPreamp()
    const [gain, ...rest] = preamp.groups
    if (gain.sets !== 'gain') throw new Error('The first group sets the gain.')
    const { '11': _both, ...options } = gain.options
    const without: Preamp = { ...preamp, groups: [{ ...gain, options }, ...rest] }
    expect(resolveSetting(without, bank('11000000'))).toEqual({ clash: { control: 'bank', members: [1, 2] } })
    expect(enumerateStates(without)).toHaveLength(3 * 6 * 4 * 2)
  })

  test('what the preamp does not have is an error that says so', () => {
    expect(() => resolveSetting(bankPreamp(), {})).toThrow('says nothing about "bank"')
    expect(() => resolveSetting(bankPreamp(), bank('0'))).toThrow('cannot stand at "0"')
    expect(() => resolveSetting(plugPreamp(), { load: 'p33', gain: 'low' })).toThrow('cannot stand at "p33"')
  })

  test('a combined value is as firm as its weakest part', () => {
    expect(inParallel([exactly(100, 'printed'), exactly(100, 'typical')])).toEqual(exactly(50, 'typical'))
    expect(added([within(100, 0.1, 'measured'), exactly(50, 'owner')]).origin).toBe('owner')
  })

  test('a single part keeps its text', () => {
    const quantity = { ...exactly(47_000), printed: '47k' }
    expect(inParallel([quantity])).toBe(quantity)
  })

  test('no control at all is a setting too', () => {
    expect(summarise(fixedPreamp(), {})).toEqual({
      state: {},
      gainDecibels: 40,
      pathId: 'mm',
      loadOhms: 47_000,
      inputFarads: 100e-12,
      filter: null,
    })
  })
})

describe('every real combination', () => {
  test('of two banks: 4 gains, 6 loads without the excluded pair, 4 capacitances, filter or not', () => {
    const states = enumerateStates(bankPreamp())
    expect(states).toHaveLength(4 * 6 * 4 * 2)
    expect(new Set(states.map((state) => state.bank)).size).toBe(states.length)
    expect(states.some(({ bank: bits }) => bits[2] === '1' && bits[3] === '1')).toBe(false)
  })

  test('of plugs and a slide: 3 by 3', () => {
    expect(enumerateStates(plugPreamp())).toHaveLength(9)
  })

  test('of buttons: the MC load counts with MC only, mono stays as it stands', () => {
    const states = enumerateStates(buttonPreamp(), { input: 'mc', 'mc-load': 'l400', extra: '01' })
    expect(states).toHaveLength((1 + 3) * 2)
    expect(states.every(({ extra }) => extra[1] === '1')).toBe(true)
    expect(states.filter(({ input }) => input === 'mm').every((state) => state['mc-load'] === 'l400')).toBe(true)
  })

  test('of a mixed panel: MM has 2 gains by 4 capacitances, MC 2 gains by 4 loads', () => {
    const states = enumerateStates(mixedPreamp(), { six: '000011', input: 'mm' })
    expect(states).toHaveLength(2 * 4 + 2 * 4)
    expect(states.every(({ six }) => six[5] === '1')).toBe(true)
    expect(states.filter(({ input }) => input === 'mc').every(({ six }) => six[4] === '1')).toBe(true)
  })

  test('nothing to set is one combination', () => {
    expect(enumerateStates(fixedPreamp())).toEqual([{}])
  })

  test('of two ways to the same gain the nearer one is listed', () => {
    const preamp = bankPreamp()
    const [gain, ...rest] = preamp.groups
    if (gain.sets !== 'gain') throw new Error('The first group sets the gain.')
    const doubled: Preamp = { ...preamp, groups: [{ ...gain, options: { ...gain.options, '01': { gainId: 'g42' } } }, ...rest] }
    const states = enumerateStates(doubled, bank('01000000'))
    expect(states).toHaveLength(3 * 6 * 4 * 2)
    expect(states.some((state) => statesEqual(state, bank('01000000')))).toBe(true)
    expect(states.some((state) => statesEqual(state, bank('10000000')))).toBe(false)
  })

  test('a present state that breaks an exclusion still leaves every combination', () => {
    expect(enumerateStates(bankPreamp(), bank('00110000'))).toHaveLength(4 * 6 * 4 * 2)
  })

  test('the present state is always among them', () => {
    for (const preamp of PREAMPS) {
      for (const present of enumerateStates(preamp)) {
        expect(enumerateStates(preamp, present).some((state) => statesEqual(state, present))).toBe(true)
      }
    }
  })
})

describe('a state as text', () => {
  test('is compact and stands in a URL', () => {
    expect(encodeState(bankPreamp(), bank('10000010'))).toBe('bank.10000010')
    expect(encodeState(buttonPreamp(), { input: 'mc', 'mc-load': 'l40', extra: '01' })).toBe('input.mc_mc-load.l40_extra.01')
    expect(encodeState(fixedPreamp(), {})).toBe('')
  })

  test('comes back as it was', () => {
    for (const preamp of PREAMPS) {
      for (const state of enumerateStates(preamp)) expect(decodeState(preamp, encodeState(preamp, state))).toEqual(state)
    }
  })

  test('ids with any characters travel safely', () => {
    fc.assert(
      fc.property(fc.uniqueArray(fc.string({ unit: 'grapheme', minLength: 1 }), { minLength: 2, maxLength: 4 }), fc.string({ unit: 'grapheme', minLength: 1 }), (ids, id) => {
        const slide = { kind: 'slide' as const, id, label: 'Slide', place: 'back' as const, positions: ids.map((one) => ({ id: one, label: one })) }
        const preamp: Preamp = { ...fixedPreamp(), controls: [slide] }
        const text = encodeState(preamp, { [id]: ids[1] })
        expect(text).toMatch(/^[A-Za-z0-9~-]+\.[A-Za-z0-9~-]+$/)
        expect(decodeState(preamp, text)).toEqual({ [id]: ids[1] })
      }),
    )
  })

  test('anything else is refused', () => {
    const refused = ['', 'bank', 'bank.', 'bank.1', 'bank.1000001', 'bank.100000100', 'bank.1000002x', 'other.10000010', 'bank.10000010_gain.1', '__proto__.1']
    for (const text of refused) expect(decodeState(bankPreamp(), text)).toBeNull()
    expect(decodeState(fixedPreamp(), 'bank.1')).toBeNull()
    fc.assert(
      fc.property(fc.string(), (text) => {
        for (const preamp of PREAMPS) {
          const state = parseState(preamp, text)
          if (state) expect(encodeState(preamp, state)).toBe(text)
        }
      }),
    )
  })

  test('a pair that excludes each other is read for the form, never for the check', () => {
    expect(decodeState(bankPreamp(), 'bank.00110000')).toBeNull()
    expect(parseState(bankPreamp(), 'bank.00110000')).toEqual(bank('00110000'))
  })
})

describe('in words', () => {
  test.each([
    [47_000, '47 kΩ'],
    [46_900, '47 kΩ'],
    [979, '980 Ω'],
    [999, '1 kΩ'],
    [99.8, '100 Ω'],
    [82.3, '82 Ω'],
    [4700, '4.7 kΩ'],
    [1e6, '1 MΩ'],
  ])('%d Ω reads %s', (ohms, words) => expect(ohmsInWords(ohms)).toBe(words))

  test.each([
    [170e-12, '170 pF'],
    [324e-12, '320 pF'],
    [1e-9, '1 nF'],
    [999e-12, '1 nF'],
    [99.6e-12, '100 pF'],
    [0, '0 pF'],
  ])('%d F reads %s', (farads, words) => expect(faradsInWords(farads)).toBe(words))

  test.each([
    [42, '42 dB'],
    [63.46, '63.5 dB'],
  ])('%d dB reads %s', (decibels, words) => expect(gainInWords(decibels)).toBe(words))

  test('every group with what it comes to', () => {
    expect(describeSetting(bankPreamp(), bank('10100100'))).toEqual([
      { group: 'gain', label: 'Gain', value: '42 dB' },
      { group: 'load', label: 'Load', value: '980 Ω' },
      { group: 'capacitance', label: 'Capacitance', value: '170 pF' },
      { group: 'rumble', label: 'Rumble', value: 'Off' },
    ])
  })

  test('a load is called as its plug or button is printed, and is not in use where its input is not', () => {
    expect(describeSetting(plugPreamp(), { load: 'p1000', gain: 'high' }).map(({ value }) => value)).toEqual(['1 kΩ', '72 dB'])
    const load = buttonPreamp().groups[1]
    expect(describeGroup(buttonPreamp(), load, { input: 'mc', 'mc-load': 'l400', extra: '00' })).toBe('400 Ω')
    expect(describeGroup(buttonPreamp(), load, { input: 'mm', 'mc-load': 'l400', extra: '00' })).toBe('Not in use')
  })
})
