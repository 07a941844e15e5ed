import type { Control, ControlState, Exclusion, Group, Positions } from './controls'
import { controlOf, hasBits, isActive, memberCount, membersOf, placesOf, standOf } from './groups'
import type { Preamp } from './preamp'
import type { Move } from './result'
import { describeGroup } from './setting-words'
import { clashIn, resolveSetting } from './settings'
import { statesEqual } from './states'

type Side = 'left' | 'right'

/** True when the two channels stand differently. */
export function sidesDiffer({ left, right }: Positions): boolean {
  return !statesEqual(left, right)
}

/**
 * What a hand has to do to bring both channels from where they stand to `target`. One move for both sides where both
 * make the same one. On a row where pressing one button lets the others out, the one move is that press.
 * Of two switches that exclude each other, the one that goes OFF comes first.
 */
export function movesBetween(preamp: Preamp, present: Positions, target: ControlState): Move[] {
  return preamp.controls.flatMap((control) => {
    const moves = hasBits(control) ? bitMoves(preamp, control, present, target) : placeMoves(preamp, control, present, target)
    return moves.sort((a, b) => waits(preamp, moves, a) - waits(preamp, moves, b))
  })
}

/** True for a control of which each channel has its own. */
export function isPerSide(control: Control): boolean {
  return control.kind === 'bank' || control.kind === 'plugs'
}

function bitMoves(preamp: Preamp, control: Control, present: Positions, target: ControlState): Move[] {
  const to = standOf(preamp, target, control)
  const left = standOf(preamp, present.left, control)
  const right = standOf(preamp, present.right, control)
  const moves: Move[] = []
  for (let member = 1; member <= memberCount(control); member++) {
    const bit = member - 1
    const move = (side: Move['side']) => moveOf(preamp, control, member, side, present, target, [left[bit] === to[bit] ? right[bit] : left[bit], to[bit]])
    const sides = sidesToMove(left[bit], right[bit], to[bit], control)
    moves.push(...sides.map(move))
  }
  return moves
}

function placeMoves(preamp: Preamp, control: Control, present: Positions, target: ControlState): Move[] {
  const to = standOf(preamp, target, control)
  const from = { left: standOf(preamp, present.left, control), right: standOf(preamp, present.right, control) }
  const member = control.kind === 'buttons' ? placesOf(control).findIndex(({ id }) => id === to) + 1 : null
  return sidesToMove(from.left, from.right, to, control).map((side) => {
    const start = side === 'both' ? (from.left === to ? from.right : from.left) : from[side]
    return moveOf(preamp, control, member, side, present, target, [start, to])
  })
}

function sidesToMove(left: string, right: string, to: string, control: Control): Move['side'][] {
  if (!isPerSide(control)) return left === to && right === to ? [] : ['both']
  if (left === right) return left === to ? [] : ['both']
  return [...(left === to ? [] : (['left'] as const)), ...(right === to ? [] : (['right'] as const))]
}

function moveOf(
  preamp: Preamp,
  control: Control,
  member: number | null,
  side: Move['side'],
  present: Positions,
  target: ControlState,
  [from, to]: [string, string],
): Move {
  const start = side === 'right' || (side === 'both' && !isPerSide(control) && present.left[control.id] === target[control.id]) ? 'right' : 'left'
  const group = groupChanged(preamp, control, member, target)
  const words = group ? beforeAndAfter(preamp, group, present[start as Side], target) : { before: '', after: '' }
  return { control: control.id, member, side, from, to, group: group?.id ?? '', ...words }
}

/** The group a member belongs to; one that does something at the target comes before one that does nothing there. */
function groupChanged(preamp: Preamp, control: Control, member: number | null, target: ControlState): Group | undefined {
  const groups = preamp.groups.filter(
    (group) => group.control === control.id && (!hasBits(control) || member === null || membersOf(preamp, group).includes(member)),
  )
  return groups.find((group) => isActive(preamp, group, target)) ?? groups[0]
}

/** Two figures, or three where two would read the same before and after. */
function beforeAndAfter(preamp: Preamp, group: Group, present: ControlState, target: ControlState): { before: string; after: string } {
  const words = (figures: number) => ({
    before: describeGroup(preamp, group, present, figures),
    after: describeGroup(preamp, group, target, figures),
  })
  const plain = words(2)
  return plain.before === plain.after ? words(3) : plain
}

/** 1 for a switch to put ON whose partner has to go OFF first. */
function waits(preamp: Preamp, moves: Move[], move: Move): number {
  if (move.to !== '1') return 0
  const partners = preamp.exclusions
    .filter(({ control, members }) => control === move.control && members.includes(move.member ?? 0))
    .flatMap(({ members }) => members)
  return moves.some((other) => other.to === '0' && partners.includes(other.member ?? 0)) ? 1 : 0
}

/**
 * One control moved by hand: a switch or a button that stands by itself is turned over; a place, a plug or a button
 * that lets the others out is gone to. `to` is a member (1-based) or the id of a place, plug or button.
 *
 * @returns the new state, or the pair that this would set against each other. A pair that stood like that before
 *          does not hold the hand back from undoing it.
 * @throws when the control has no such member
 */
export function flip(preamp: Preamp, state: ControlState, controlId: string, to: number | string): { state: ControlState } | { clash: Exclusion } {
  const control = controlOf(preamp, controlId)
  const stand = standOf(preamp, state, control)
  const member = typeof to === 'number' ? to : placesOf(control).findIndex(({ id }) => id === to) + 1
  if (member < 1 || member > memberCount(control)) throw new Error(`"${controlId}" of ${preamp.modelName} has no "${to}".`)
  const next = hasBits(control) ? turned(stand, member) : placesOf(control)[member - 1].id
  const flipped = { ...state, [controlId]: next }
  const before = clashBetween(preamp, state)
  const after = clashBetween(preamp, flipped)
  return after && !before ? { clash: after } : { state: flipped }
}

function turned(stand: string, member: number): string {
  return stand.slice(0, member - 1) + (stand[member - 1] === '1' ? '0' : '1') + stand.slice(member)
}

function clashBetween(preamp: Preamp, state: ControlState): Exclusion | null {
  const pair = clashIn(preamp, state)
  if (pair) return pair
  const setting = resolveSetting(preamp, state)
  return 'clash' in setting ? setting.clash : null
}
