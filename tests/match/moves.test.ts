import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { ControlState, Move, Positions, Preamp } from '@/lib/match'
import { isPerSide, movesBetween, flip, sidesDiffer } from '@/lib/match/moves'
import { enumerateStates } from '@/lib/match/states'
import { bankPreamp, buttonPreamp, mixedPreamp, plugPreamp, PREAMPS } from '../support/preamps'

const alike = (state: ControlState): Positions => ({ left: state, right: { ...state } })
const bank = (bits: string): ControlState => ({ bank: bits })

/** Moves made by a hand: each by itself, on the side it names. */
function applied(preamp: Preamp, present: Positions, moves: Move[]): Positions {
  const after = { left: { ...present.left }, right: { ...present.right } }
  for (const move of moves) {
    const control = preamp.controls.find(({ id }) => id === move.control)
    const bits = control?.kind === 'bank' || (control?.kind === 'buttons' && control.latch === 'each')
    for (const side of ['left', 'right'] as const) {
      if (move.side !== 'both' && move.side !== side) continue
      const stand = after[side][move.control]
      const member = move.member ?? 0
      after[side][move.control] = bits ? stand.slice(0, member - 1) + move.to + stand.slice(member) : move.to
    }
  }
  return after
}

/** A preamp with how it stands on either side and where it is to go. */
const anyTask = fc.constantFrom(...PREAMPS).chain((preamp) => {
  const states = enumerateStates(preamp)
  const any = fc.constantFrom(...states)
  return fc.tuple(any, any, any).map(([left, other, target]) => {
    const right = Object.fromEntries(preamp.controls.map((control) => [control.id, (isPerSide(control) ? other : left)[control.id]]))
    return { preamp, present: { left, right }, target }
  })
})

describe('moves', () => {
  test('made one by one, they bring both sides to the target', () => {
    fc.assert(
      fc.property(anyTask, ({ preamp, present, target }) => {
        expect(applied(preamp, present, movesBetween(preamp, present, target))).toEqual({ left: target, right: target })
      }),
    )
  })

  test('there are none exactly when both sides stand at the target', () => {
    fc.assert(
      fc.property(anyTask, ({ preamp, present, target }) => {
        const there = !sidesDiffer(present) && !sidesDiffer({ left: present.left, right: target })
        expect(movesBetween(preamp, present, target).length === 0).toBe(there)
      }),
    )
  })

  test('one move for both sides, with what its group comes to before and after', () => {
    expect(movesBetween(bankPreamp(), alike(bank('10000010')), bank('00000000'))).toEqual([
      { control: 'bank', member: 1, side: 'both', from: '1', to: '0', group: 'gain', before: '42 dB', after: '36 dB' },
      { control: 'bank', member: 7, side: 'both', from: '1', to: '0', group: 'capacitance', before: '290 pF', after: '70 pF' },
    ])
  })

  test('sides that stand differently get their own', () => {
    const moves = movesBetween(bankPreamp(), { left: bank('10000000'), right: bank('00000001') }, bank('00000000'))
    expect(moves.map(({ member, side, before, after }) => [member, side, before, after])).toEqual([
      [1, 'left', '42 dB', '36 dB'],
      [8, 'right', 'On', 'Off'],
    ])
  })

  test('of two that exclude each other, the one to OFF comes first', () => {
    const moves = movesBetween(bankPreamp(), alike(bank('00010000')), bank('00100000'))
    expect(moves.map(({ member, to }) => [member, to])).toEqual([
      [4, '0'],
      [3, '1'],
    ])
  })

  test('a plug is one move for each side that needs it', () => {
    const present = { left: { load: 'p1000', gain: 'low' }, right: { load: 'p10', gain: 'low' } }
    expect(movesBetween(plugPreamp(), present, { load: 'p100', gain: 'low' })).toEqual([
      { control: 'load', member: null, side: 'left', from: 'p1000', to: 'p100', group: 'load', before: '1 kΩ', after: '100 Ω' },
      { control: 'load', member: null, side: 'right', from: 'p10', to: 'p100', group: 'load', before: '10 Ω', after: '100 Ω' },
    ])
  })

  test('on a row that lets the others out, the one move is to press the new one', () => {
    const present = alike({ input: 'mm', 'mc-load': 'l100', extra: '00' })
    expect(movesBetween(buttonPreamp(), present, { input: 'mc', 'mc-load': 'l400', extra: '10' })).toEqual([
      { control: 'input', member: 2, side: 'both', from: 'mm', to: 'mc', group: 'input', before: 'MM', after: 'MC' },
      { control: 'mc-load', member: 3, side: 'both', from: 'l100', to: 'l400', group: 'mc-load', before: 'Not in use', after: '400 Ω' },
      { control: 'extra', member: 1, side: 'both', from: '0', to: '1', group: 'rumble', before: 'Off', after: 'On' },
    ])
  })

  test('the group named is the one that does something at the target', () => {
    const [slide, first] = movesBetween(mixedPreamp(), alike({ six: '000000', input: 'mm' }), { six: '100000', input: 'mc' }).reverse()
    expect(first).toMatchObject({ member: 1, group: 'mc-gain', after: '64 dB' })
    expect(slide).toMatchObject({ control: 'input', member: null, before: 'MM', after: 'MC' })
  })

  test('values that two figures cannot tell apart get a third', () => {
    const preamp = bankPreamp()
    const large = preamp.groups.map((group) =>
      group.sets === 'load' && group.how === 'parallel' ? { ...group, resistorsOhms: group.resistorsOhms.map((one) => ({ ...one, low: 5e6, nominal: 5e6, high: 5e6 })) } : group,
    )
    const [move] = movesBetween({ ...preamp, groups: large }, alike(bank('00000000')), bank('00100000'))
    expect([move.before, move.after]).toEqual(['47 kΩ', '46.6 kΩ'])
  })
})

describe('one control moved by hand', () => {
  test('a switch turns over', () => {
    expect(flip(bankPreamp(), bank('10000000'), 'bank', 1)).toEqual({ state: bank('00000000') })
    expect(flip(bankPreamp(), bank('10000000'), 'bank', 8)).toEqual({ state: bank('10000001') })
  })

  test('a button that lets the others out, a plug and a slide go where they are sent', () => {
    const state = { input: 'mm', 'mc-load': 'l100', extra: '00' }
    expect(flip(buttonPreamp(), state, 'mc-load', 3)).toEqual({ state: { ...state, 'mc-load': 'l400' } })
    expect(flip(buttonPreamp(), state, 'extra', 'mono')).toEqual({ state: { ...state, extra: '01' } })
    expect(flip(plugPreamp(), { load: 'p10', gain: 'low' }, 'gain', 'high')).toEqual({ state: { load: 'p10', gain: 'high' } })
  })

  test('a pair that excludes each other is refused, and turning one of them off is not', () => {
    expect(flip(bankPreamp(), bank('00100000'), 'bank', 4)).toEqual({ clash: { control: 'bank', members: [3, 4] } })
    expect(flip(bankPreamp(), bank('00110000'), 'bank', 4)).toEqual({ state: bank('00100000') })
  })

  test('what is not there is an error that says so', () => {
    expect(() => flip(bankPreamp(), bank('00000000'), 'bank', 9)).toThrow('has no "9"')
    expect(() => flip(bankPreamp(), bank('00000000'), 'lever', 1)).toThrow('no control "lever"')
  })

  test('turning every control twice comes back', () => {
    fc.assert(
      fc.property(anyTask, fc.integer({ min: 1, max: 8 }), ({ preamp, target }, member) => {
        for (const control of preamp.controls) {
          if (control.kind !== 'bank' || member > control.switchCount) continue
          const once = flip(preamp, target, control.id, member)
          if ('clash' in once) continue
          expect(flip(preamp, once.state, control.id, member)).toEqual({ state: target })
        }
      }),
    )
  })
})
