import { describe, expect, test } from 'vitest'
import { movesBetween, type ControlState, type Positions, type Preamp } from '@/lib/match'
import { cautionFor, clashInWords, endStateLines, moveLines } from '@/components/panel/move-words'
import { positionsInWords, stateInWords } from '@/components/panel/state-words'
import { listedNumbers, sharedUnit } from '@/components/panel/words'
import { bankPreamp, buttonPreamp, fixedPreamp, mixedPreamp, plugPreamp } from '../../support/preamps'

const bank = (bits: string): ControlState => ({ bank: bits })
const alike = (state: ControlState): Positions => ({ left: state, right: state })
const lines = (preamp: Preamp, present: Positions, target: ControlState) =>
  moveLines(preamp, movesBetween(preamp, present, target)).map(({ title, detail }) => [title, detail])

describe('moves in words', () => {
  test('a switch and what it changes', () => {
    expect(lines(bankPreamp(), alike(bank('10000010')), bank('00000001'))).toEqual([
      ['Switch 1 to OFF', 'Gain goes from 42 to 36 dB'],
      ['Switch 7 to OFF', 'The preamp adds 70 pF, not 290 pF'],
      ['Switch 8 to ON', 'Rumble goes on'],
    ])
  })

  test('a change of unit names both', () => {
    expect(lines(bankPreamp(), alike(bank('00000000')), bank('00100000'))).toEqual([['Switch 3 to ON', 'Load goes from 47 kΩ to 980 Ω']])
  })

  test('two switches of one group say once what they come to', () => {
    expect(lines(bankPreamp(), alike(bank('00000000')), bank('11000000'))).toEqual([
      ['Switch 1 to ON', 'Gain goes from 36 to 66 dB, with switch 2'],
      ['Switch 2 to ON', 'Goes with switch 1'],
    ])
  })

  test('sides that differ are named', () => {
    expect(lines(bankPreamp(), { left: bank('10000000'), right: bank('00000100') }, bank('00000000'))).toEqual([
      ['Left: 1 to OFF', 'Gain 42 dB to 36 dB'],
      ['Right: 6 to OFF', 'Capacitance 170 pF to 70 pF'],
    ])
  })

  test('load plugs and a slide', () => {
    expect(lines(plugPreamp(), alike({ load: 'p1000', gain: 'high' }), { load: 'p100', gain: 'middle' })).toEqual([
      ['Take out 1 kΩ, put in 100 Ω', 'Both sides. The plugs are in the box they came in'],
      ['Gain to 64 dB', 'One step down from 72 dB'],
    ])
    const present = { left: { load: 'p10', gain: 'low' }, right: { load: 'p100', gain: 'low' } }
    expect(lines(plugPreamp(), present, { load: 'p100', gain: 'low' })).toEqual([
      ['Left: take out 10 Ω, put in 100 Ω', 'The plugs are in the box they came in'],
    ])
  })

  test('buttons are pressed in one go, and those that come out by themselves are named', () => {
    const present = alike({ input: 'mm', 'mc-load': 'l100', extra: '00' })
    expect(lines(buttonPreamp(), present, { input: 'mc', 'mc-load': 'l400', extra: '10' })).toEqual([
      ['Press MC, 400 Ω and Rumble', 'MM and 100 Ω come out by themselves'],
    ])
    expect(lines(buttonPreamp(), alike({ input: 'mm', 'mc-load': 'l100', extra: '10' }), { input: 'mc', 'mc-load': 'l100', extra: '00' })).toEqual([
      ['Press MC', 'MM comes out by itself'],
      ['Let Rumble out', 'Press it once more, so that it comes out'],
    ])
  })

  test('a slide without numbers says where it comes from', () => {
    expect(lines(mixedPreamp(), alike({ six: '000000', input: 'mm' }), { six: '100000', input: 'mc' })).toEqual([
      ['Switch 1 to ON', 'MC gain becomes 64 dB'],
      ['Input to MC', 'From MM'],
    ])
  })
})

describe('the whole end state', () => {
  test.each([
    ['00000000', 'All eight OFF, both sides'],
    ['11111111', 'All eight ON, both sides'],
    ['10000010', 'Only 1 and 7 ON, both sides'],
    ['01110000', 'Only 2 to 4 ON, both sides'],
    ['11101111', 'Only 4 OFF, both sides'],
  ])('%s', (bits, words) => {
    expect(endStateLines(bankPreamp(), bank(bits)).map(({ title }) => title)).toEqual([words])
  })

  test('of plugs, slides and buttons', () => {
    expect(endStateLines(plugPreamp(), { load: 'p100', gain: 'low' }).map(({ title }) => title)).toEqual(['100 Ω plugs, both sides', 'Gain to 56 dB'])
    expect(endStateLines(buttonPreamp(), { input: 'mc', 'mc-load': 'l400', extra: '10' })).toEqual([
      { title: 'MC, 400 Ω and Rumble in', detail: 'All other buttons out' },
    ])
    expect(endStateLines(fixedPreamp(), {})).toEqual([])
  })

  test('several banks are told apart', () => {
    const preamp = bankPreamp()
    const second = { ...preamp.controls[0], id: 'more', label: 'Load' } as Preamp['controls'][number]
    const two: Preamp = { ...preamp, controls: [...preamp.controls, second] }
    expect(endStateLines(two, { bank: '00000000', more: '10000000' }).map(({ title }) => title)).toEqual([
      'Switches: all eight OFF, both sides',
      'Load: only 1 ON, both sides',
    ])
  })
})

describe('the setting for those who cannot see the drawing', () => {
  test('of a bank', () => {
    expect(stateInWords(bankPreamp(), bank('10000010'))).toBe('Switches 1 and 7 ON, the rest OFF. Gain 42 dB, load 47 kΩ, capacitance 290 pF, rumble off.')
    expect(stateInWords(bankPreamp(), bank('00000000'))).toMatch(/^All switches OFF\. Gain 36 dB/)
  })

  test('of plugs, slides, buttons and nothing', () => {
    expect(stateInWords(plugPreamp(), { load: 'p100', gain: 'middle' })).toMatch(/^100 Ω plug in and gain at 64 dB\. Load 100 Ω, gain 64 dB\.$/)
    expect(stateInWords(buttonPreamp(), { input: 'mm', 'mc-load': 'l100', extra: '00' })).toBe(
      'Input: MM in, MC load: 100 Ω in and filter and output: all out. Input MM, MC load not in use, rumble off, mono off.',
    )
    expect(stateInWords(fixedPreamp(), {})).toBe('It has no switches.')
  })

  test('sides that differ are told one by one', () => {
    expect(positionsInWords(bankPreamp(), { left: bank('10000000'), right: bank('00000000') })).toMatch(/^Left: Switch 1 ON, .*\. Right: All switches OFF\./)
  })
})

test('a clash says which to turn off first: the one that was ON', () => {
  const clash = { control: 'bank', members: [3, 4] as [number, number] }
  expect(clashInWords(bankPreamp(), clash, 4)).toBe('Switches 3 and 4 cannot both be ON. Turn 3 off first.')
  expect(clashInWords(bankPreamp(), clash, 3)).toBe('Switches 3 and 4 cannot both be ON. Turn 4 off first.')
  expect(clashInWords(buttonPreamp(), { control: 'extra', members: [1, 2] })).toBe('Rumble and Mono cannot both be in. Let Rumble out first.')
})

test('the caution of the act: load plugs outweigh switches, and nothing to move needs none', () => {
  const slide = movesBetween(plugPreamp(), alike({ load: 'p10', gain: 'low' }), { load: 'p10', gain: 'high' })
  const both = movesBetween(plugPreamp(), alike({ load: 'p10', gain: 'low' }), { load: 'p100', gain: 'high' })
  expect(cautionFor(slide, plugPreamp())).toBe('switch')
  expect(cautionFor(both, plugPreamp())).toBe('load')
  expect(cautionFor([], plugPreamp())).toBeNull()
  expect(cautionFor(null, plugPreamp())).toBe('load')
  expect(cautionFor(null, buttonPreamp())).toBe('switch')
  expect(cautionFor(null, fixedPreamp())).toBeNull()
})

test('numbers in a row are a span, and a shared unit is named once', () => {
  expect(listedNumbers([1, 3, 4, 5, 7, 8])).toBe('1, 3 to 5, 7 and 8')
  expect(sharedUnit(['56 dB', '64 dB'])).toEqual({ unit: 'dB', short: ['56', '64'] })
  expect(sharedUnit(['10 Ω', '1 kΩ'])).toEqual({ unit: '', short: ['10 Ω', '1 kΩ'] })
})
