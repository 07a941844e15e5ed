import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { isPerSide, movesBetween } from '@/lib/match/moves'
import { describeSetting } from '@/lib/match/setting-words'
import { resolveSetting } from '@/lib/match/settings'
import { readPositionFields, SIDES_FIELD, stateFieldName } from '@/lib/match/state-fields'
import { decodeState, encodeState, enumerateStates } from '@/lib/match/states'
import { CATALOGUE_PREAMPS, cataloguePreamp } from '../support/catalogue-preamps'
import { PREAMPS } from '../support/preamps'

describe('the demo catalogue', () => {
  // Counted by hand from the controls: gains × loads × capacitances × filter, and MC loads only where MC is in.
  test.each([
    ['tarn-2', 'first', 4 * 8 * 4 * 2],
    ['tarn-2', 'second', 4 * 6 * 4 * 2],
    ['merrin-5', 'only', 5 * 3],
    ['ember-3', 'only', (1 + 3) * 2],
    ['sedge-1', 'only', 1],
  ])('%s, %s board: %d combinations', (model, board, count) => {
    expect(enumerateStates(cataloguePreamp(model, board))).toHaveLength(count)
  })

  test('the same switches mean something else on the other board', () => {
    const values = (board: string) => describeSetting(cataloguePreamp('tarn-2', board), { bank: '10000100' }).map(({ label, value }) => `${label} ${value}`)
    expect(values('first')).toEqual(['Load 980 Ω', 'Gain 36 dB', 'Capacitance 270 pF', 'Rumble Off'])
    expect(values('second')).toEqual(['Gain 42 dB', 'Load 47 kΩ', 'Capacitance 170 pF', 'Rumble Off'])
  })

  test('every combination resolves, and goes through its text and its form fields unchanged', () => {
    for (const preamp of [...CATALOGUE_PREAMPS, ...PREAMPS]) {
      for (const state of enumerateStates(preamp)) {
        expect('clash' in resolveSetting(preamp, state)).toBe(false)
        expect(decodeState(preamp, encodeState(preamp, state))).toEqual(state)
      }
    }
  })

  test('mono stays as it stands, so no move ever touches it', () => {
    const ember = cataloguePreamp('ember-3', 'only')
    const present = { input: 'mm', 'mc-load': '100', rumble: '0', mono: '1' }
    for (const state of enumerateStates(ember, present)) {
      const moves = movesBetween(ember, { left: present, right: present }, state)
      expect(moves.some(({ control }) => control === 'mono')).toBe(false)
    }
  })
})

describe('positions as form fields', () => {
  const anyPositions = fc.constantFrom(...CATALOGUE_PREAMPS, ...PREAMPS).chain((preamp) => {
    const any = fc.constantFrom(...enumerateStates(preamp))
    return fc.tuple(any, any).map(([left, other]) => ({
      preamp,
      left,
      right: Object.fromEntries(preamp.controls.map((control) => [control.id, (isPerSide(control) ? other : left)[control.id]])),
    }))
  })

  test('come back as they were, each side by itself', () => {
    fc.assert(
      fc.property(anyPositions, ({ preamp, left, right }) => {
        const fields = new Map<string, string[]>([[SIDES_FIELD, ['each']]])
        for (const control of preamp.controls) {
          for (const [side, state] of [['left', left], ['right', right]] as const) {
            const stand = state[control.id]
            const bits = control.kind === 'bank' || (control.kind === 'buttons' && control.latch === 'each')
            const on = [...stand].flatMap((bit, index) => (bit === '1' ? [String(index + 1)] : []))
            fields.set(stateFieldName(side, control.id), bits ? on : [stand])
          }
        }
        expect(readPositionFields(preamp, (name) => fields.get(name) ?? [])).toEqual({ left, right })
      }),
    )
  })

  test('are not there, or do not fit', () => {
    const merrin = cataloguePreamp('merrin-5', 'only')
    const read = (fields: Record<string, string[]>) => readPositionFields(merrin, (name) => fields[name] ?? [])
    expect(read({})).toBeNull()
    expect(read({ sides: ['alike'] })).toBeNull()
    expect(read({ sides: ['alike'], 'left.plugs': ['33'], 'left.slide': ['56'] })).toBeNull()
    expect(read({ sides: ['alike'], 'left.plugs': ['30'], 'left.slide': ['56'], 'right.plugs': ['10'] })).toEqual({
      left: { plugs: '30', slide: '56' },
      right: { plugs: '30', slide: '56' },
    })
  })
})
