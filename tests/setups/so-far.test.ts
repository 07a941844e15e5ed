import { describe, expect, test } from 'vitest'
import { readAnswers } from '@/lib/setups/answers'
import type { AnswersInput } from '@/lib/setups/schema'
import { fieldView, outputView } from '@/lib/setups/views-field'
import { meaningMatters, soFar } from '@/lib/setups/views-so-far'
import { stepViews } from '@/lib/setups/views-steps'
import { bankPreamp } from '../support/preamps'

// Whole checks with little known take their time on a busy machine.
const slow = { timeout: 60_000 }
const preamp = bankPreamp()
const MAGNET: AnswersInput = { type: 'moving-magnet', output: '5.4', velocity: '5', meaning: 'peak-lateral', coil: '700' }

describe('what we can say so far', () => {
  test('without a preamp there is nothing to say yet, and no arithmetic', () => {
    expect(soFar(MAGNET, null)).toMatchObject({ heading: 'Nothing yet', treble: null, settled: ['moving magnet', '5.4 mV', '700 Ω'] })
  })

  test('the heading follows the output', slow, () => {
    expect(soFar({}, preamp).heading).toBe('Now the cartridge')
    expect(soFar({ type: 'moving-magnet' }, preamp).heading).toBe('Its output decides the most')
    expect(soFar(MAGNET, preamp)).toMatchObject({ heading: 'It will be loud enough', short: 'So far: loud enough. Treble still open' })
    expect(soFar({ ...MAGNET, next: 'phono' }, preamp).heading).toBe('Two phono stages in a row')
  })

  test('a lead that is known narrows capacitance and treble, and never widens them', slow, () => {
    const before = soFar(MAGNET, preamp)
    const after = soFar({ ...MAGNET, lead: '120', armWiring: '20' }, preamp)
    const width = ({ capacitance }: typeof before) => (capacitance ? capacitance.high - capacitance.low : NaN)
    expect(width(after)).toBeLessThan(width(before))
    const band = ({ treble }: typeof before) => (treble ? treble.high.map((high, i) => high - treble.low[i]) : [])
    expect(Math.max(...band(after))).toBeLessThan(Math.max(...band(before)))
    expect(before.open).toContain('arm lead')
    expect(after.open).not.toContain('arm lead')
  })

  test('a moving coil has no capacitance to look at; a ceramic gets its own answer', slow, () => {
    expect(soFar({ type: 'moving-coil', output: '0.4', velocity: '5', coil: '10' }, preamp).capacitance).toBeNull()
    expect(soFar({ type: 'other', other: 'ceramic' }, preamp)).toMatchObject({ treble: null, open: [] })
  })

  test('it is plain data, the same after a trip over the wire', slow, () => {
    const view = soFar(MAGNET, preamp)
    expect(JSON.parse(JSON.stringify(view))).toEqual(view)
  })
})

describe('what the groove speed means', () => {
  test('is not asked about an output that is not there, not printed for a speed, or said already', slow, () => {
    for (const input of [{ type: 'moving-magnet' }, { ...MAGNET, meaning: '', velocity: 'none' }, MAGNET]) {
      expect(meaningMatters(input, preamp)).toBe(false)
    }
  })

  test('is asked where the two ends of it lead to other advice', slow, () => {
    // 5.4 mV or 2.7 mV: a step of this preamp's gain lies between them.
    expect(meaningMatters({ ...MAGNET, output: '5.4', meaning: '' }, preamp)).toBe(true)
  })

  test('stands under the output in words', () => {
    const view = (input: AnswersInput) => outputView(readAnswers({ ...MAGNET, ...input }).answers)
    expect(view({})).toEqual({
      question: 'What does the leaflet mean by 5 cm/s?',
      understood: 'Understood: 5.4 mV RMS at 5 cm/s peak, sideways.',
      ifNotSaid: 'If it does not say, we work with 3.8 to 5.4 mV.',
      atReference: null,
    })
    // RMS over peak is √2 (definition): 5.4 mV becomes 3.8 mV.
    expect(view({ meaning: 'rms-lateral' }).atReference).toBe('That is 3.8 mV at 5 cm/s peak, sideways, where we compare.')
    // Per cm/s, RMS of one channel, times 2.5: the reference level.
    expect(view({ output: '2', velocity: 'per-cm', meaning: 'rms-channel' })).toMatchObject({
      understood: 'Understood: 2 mV RMS per cm/s RMS, one channel.',
      atReference: 'That is 5 mV at 5 cm/s peak, sideways, where we compare.',
    })
    expect(view({ velocity: 'none' }).ifNotSaid).toBe('We work with 2.7 to 7.6 mV, since no speed is stated.')
  })
})

describe('beside a field', () => {
  const view = (field: Parameters<typeof fieldView>[0], input: AnswersInput) => {
    const raw = { ...MAGNET, ...input }
    return fieldView(field, raw, readAnswers(raw).answers, 'moving-magnet')
  }

  test('stands what would be used, by what is known of the rest', () => {
    expect(view('inductance', {}).ifUnknown).toBe('We will use 400 to 550 mH, which is usual for a moving magnet of this output.')
    expect(view('lead', {}).ifUnknown).toBe('We will use 80 to 200 pF, which is usual for an arm lead.')
  })

  test('stands what was understood, unless it only repeats what was typed', () => {
    expect(view('coil', { coil: '0.7k' }).understood).toBe('700 Ω')
    expect(view('coil', { coil: '700' }).understood).toBeNull()
  })
})

test('each step says its answer, or what it will ask, or what is to be put right', () => {
  const lines = stepViews({ ...MAGNET, preamp: 'bank-model', inductance: '0.5', present: 'delivered' }, 'Bank model').map(({ line }) => line)
  expect(lines).toEqual([
    'Bank model, as it came',
    'Moving magnet, one value to put right',
    'Capacitance, if you know it',
    'Amplifier or other input',
  ])
})
