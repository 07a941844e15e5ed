import { describe, expect, test } from 'vitest'
import { isFromLeaflet, withMarks } from '@/lib/setups/leaflet'
import { Answers, answersFrom, fromQuery, toQuery, type AnswersInput } from '@/lib/setups/schema'
import { ANSWER_KEYS, MAX_ANSWER_LENGTH, STEP_KEYS } from '@/lib/setups/terms'

const refused = (input: AnswersInput) => {
  const result = Answers.safeParse(input)
  return Object.fromEntries((result.error?.issues ?? []).map(({ path, message }) => [path.join('.'), message]))
}

describe('answers as typed', () => {
  test('every answer belongs to one step, but for what travels along on all', () => {
    const placed = Object.values(STEP_KEYS).flat()
    expect(new Set(placed).size).toBe(placed.length)
    expect(ANSWER_KEYS.filter((key) => !placed.includes(key))).toEqual(['leaflet', 'sheet'])
  })

  test('a query keeps unfinished and wrong answers exactly as they stand', () => {
    const typed: AnswersInput = { preamp: 'tarn-2', type: 'moving-magnet', output: '5,4 mV & more?', inductance: '4', load: ' 47k ' }
    expect(fromQuery(toQuery(typed))).toEqual(typed)
  })

  test('equal answers give equal links, whatever their order', () => {
    expect(toQuery({ output: '5', name: 'A' })).toBe(toQuery({ name: 'A', output: '5' }))
  })

  test('what is no answer is dropped, what is too long is cut, and nothing is refused', () => {
    const long = 'x'.repeat(500)
    expect(answersFrom({ serial: '19123', output: ['1', '2'], name: long, mass: '' })).toEqual({
      output: '2',
      name: 'x'.repeat(MAX_ANSWER_LENGTH),
    })
  })

  test('a serial number is no answer', () => {
    expect(ANSWER_KEYS).not.toContain('serial')
    expect(fromQuery('serial=19123')).toEqual({})
  })
})

describe('answers as read', () => {
  test('nothing answered is a whole set of answers, all not known', () => {
    const answers = Answers.parse({})
    expect(answers.cartridge).toMatchObject({ type: 'unknown', outputMillivolts: null, meaning: 'not-said', velocity: 'none' })
    expect(answers.present.kind).toBe('unknown')
    expect(answers.stepUp).toBeNull()
  })

  test('each wrong answer is named with its sentence', () => {
    expect(refused({ type: 'moving-magnet', output: '4.5 V', inductance: '0.5', force: '20 g' })).toEqual({
      output: '4.5 V would be a thousand times too strong for a cartridge. Did you mean 4.5 mV?',
      inductance: '0.5 mH is a thousand times too little for a moving magnet. Did you mean 0.5 H?',
      force: '20 g would press ten times too hard on the record. Did you mean 20 mN?',
    })
  })

  test('a reversed range is named at its second value', () => {
    expect(refused({ type: 'moving-magnet', capacitanceHow: 'between', capacitance: '300', capacitanceTo: '150' })).toEqual({
      capacitanceTo: 'The second value is lower than the first. Swap them?',
    })
  })

  test('a load below the coil is named, with the swap', () => {
    expect(refused({ type: 'moving-coil', coil: '10', load: '5' }).load).toMatch(/below the coil's own 10 Ω.*Swap the two\?$/)
    expect(refused({ type: 'moving-coil', coil: '10', load: '100' })).toEqual({})
    expect(refused({ type: 'unknown', coil: '700', load: '47' }).load).toMatch(/Did you mean 47 kΩ\?$/)
  })

  test('something else has to say which', () => {
    expect(refused({ type: 'other' })).toEqual({ other: "Say which of the three it is, or choose Don't know." })
    expect(Answers.parse({ type: 'other', other: 'ceramic' }).cartridge.type).toBe('ceramic')
  })

  test('a moving coil is not asked for a capacitance: the text is kept and left out of account', () => {
    const answers = Answers.parse({ type: 'moving-coil', capacitance: 'wrong' })
    expect(answers.cartridge.capacitancePicofarads).toBeNull()
    expect(answers.given.capacitance).toBe('wrong')
  })

  test('an unknown choice is refused nowhere: it counts as not answered', () => {
    expect(Answers.parse({ type: 'laser', velocity: '9', next: 'toaster' }).cartridge).toMatchObject({ type: 'unknown', velocity: 'none' })
  })

  test('texts over the limit are refused', () => {
    expect(refused({ name: 'x'.repeat(MAX_ANSWER_LENGTH + 1) }).name).toMatch(/characters/)
  })
})

describe('values filled in from the list', () => {
  const filled = withMarks({ output: '5.4', velocity: '5', coil: '700', coilHow: 'one' }, ['output', 'coil'])

  test('are printed until they are touched, then the owner’s', () => {
    const origins = (answers: AnswersInput) => {
      const { outputMillivolts, coilOhms } = Answers.parse({ type: 'moving-magnet', ...answers }).cartridge
      return [outputMillivolts?.origin, coilOhms?.origin]
    }
    expect(origins(filled)).toEqual(['printed', 'printed'])
    expect(origins({ ...filled, coil: '710' })).toEqual(['printed', 'owner'])
    expect(origins({ ...filled, velocity: '3.54' })).toEqual(['owner', 'printed'])
    expect(origins({ ...filled, coil: '710 ', output: '5.4' })).toEqual(['printed', 'owner'])
  })

  test('are recognised after a round trip through the address', () => {
    expect(isFromLeaflet('output', fromQuery(toQuery(filled)))).toBe(true)
  })

  test('keep the marks of other fields when more are filled in', () => {
    const more = withMarks({ ...filled, armMass: '11' }, ['armMass'])
    expect(['output', 'coil', 'armMass'].every((field) => isFromLeaflet(field as 'output', more))).toBe(true)
  })
})
