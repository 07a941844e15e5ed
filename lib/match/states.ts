import type { Control, ControlState, Group } from './controls'
import { canStandAt, hasBits, keyOf, memberCount, membersOf, placesOf } from './groups'
import type { Preamp } from './preamp'
import { resolveSetting, wayThrough } from './settings'

/** True when every control stands the same. */
export function statesEqual(a: ControlState, b: ControlState): boolean {
  const ids = Object.keys(a)
  return ids.length === Object.keys(b).length && ids.every((id) => a[id] === b[id])
}

/**
 * Every real combination of what a check computes: input, gain, load, capacitance, filter. What changes nothing
 * (mono, switches without a use, groups that do nothing at the moment) stays as it stands in `present`, or as
 * delivered; of combinations that come to the same thing only the one nearest to it is listed.
 * Positions that exclude each other are left out.
 *
 * @param present how one channel stands now
 */
export function enumerateStates(preamp: Preamp, present: ControlState = preamp.asDelivered): ControlState[] {
  const nearest = new Map<string, { state: ControlState; distance: number }>()
  for (const state of everyState(preamp, present)) {
    const meaning = meaningOf(preamp, state)
    if (meaning === null) continue
    const distance = differences(preamp, state, present)
    const known = nearest.get(meaning)
    if (!known || distance < known.distance) nearest.set(meaning, { state, distance })
  }
  // A present state that breaks an exclusion by what is held would leave nothing to choose from.
  if (nearest.size === 0 && present !== preamp.asDelivered) return enumerateStates(preamp)
  return [...nearest.values()].map(({ state }) => state)
}

/** All states, real or not, over the members that some group uses for more than show. */
function everyState(preamp: Preamp, present: ControlState): ControlState[] {
  let states: ControlState[] = [{}]
  for (const control of preamp.controls) {
    const stands = standsOf(preamp, control, present[control.id] ?? preamp.asDelivered[control.id])
    states = states.flatMap((state) => stands.map((stand) => ({ ...state, [control.id]: stand })))
  }
  return states
}

/** The states of one control that matter, exclusions within it removed early so that long banks stay short. */
function standsOf(preamp: Preamp, control: Control, held: string): string[] {
  const groups = preamp.groups.filter((group) => group.control === control.id && group.sets !== 'other')
  if (groups.length === 0) return [held]
  if (!hasBits(control)) return placesOf(control).map(({ id }) => id)
  const varied = new Set(groups.flatMap((group) => membersOf(preamp, group)))
  const pairs = preamp.exclusions.filter((one) => one.control === control.id).map((one) => one.members)
  let stands = ['']
  for (let member = 1; member <= memberCount(control); member++) {
    const bits = varied.has(member) ? ['0', '1'] : [held[member - 1]]
    stands = stands.flatMap((stand) => bits.map((bit) => stand + bit))
    stands = stands.filter((stand) => !pairs.some(([a, b]) => stand[a - 1] === '1' && stand[b - 1] === '1'))
  }
  return stands
}

/** What a state comes to, as a text that two states share when they come to the same thing; null when it is not real. */
function meaningOf(preamp: Preamp, state: ControlState): string | null {
  const way = wayThrough(preamp, state)
  if ('clash' in way) return null
  const switched = way.active.filter(isComputed).map((group) => `${group.id}=${keyOf(preamp, group, state)}`)
  return [way.path.id, way.gain.id, ...switched].join(' ')
}

/** Input and gain are told by what they come to; the rest by how its switches stand. */
function isComputed(group: Group): boolean {
  return group.sets === 'load' || group.sets === 'capacitance' || group.sets === 'filter'
}

/** How many switches, places, plugs or buttons stand otherwise. */
function differences(preamp: Preamp, a: ControlState, b: ControlState): number {
  let count = 0
  for (const control of preamp.controls) {
    const from = a[control.id]
    const to = b[control.id] ?? ''
    if (from === to) continue
    if (!hasBits(control)) count++
    else for (let bit = 0; bit < from.length; bit++) if (from[bit] !== to[bit]) count++
  }
  return count
}

/** Anything outside letters, figures and hyphens, written so that it stands in a URL and never meets our own marks. */
function inUrl(text: string): string {
  return text.replace(/[^A-Za-z0-9-]/gu, (character) => `~${character.codePointAt(0)?.toString(36)}~`)
}

/** A state as compact URL-safe text, such as `bank.10000010_gain.56`. Empty for a preamp without controls. */
export function encodeState(preamp: Preamp, state: ControlState): string {
  return preamp.controls.map(({ id }) => `${inUrl(id)}.${inUrl(state[id] ?? '')}`).join('_')
}

/**
 * The state behind such a text, whether or not it is a real combination; null on anything that is not a state of
 * this preamp. For forms, which name the pair that excludes each other.
 */
export function parseState(preamp: Preamp, text: string): ControlState | null {
  const parts = text === '' ? [] : text.split('_')
  if (parts.length !== preamp.controls.length) return null
  const state: ControlState = {}
  for (const [index, control] of preamp.controls.entries()) {
    const head = `${inUrl(control.id)}.`
    if (!parts[index].startsWith(head)) return null
    const rest = parts[index].slice(head.length)
    const stand = hasBits(control) ? rest : placesOf(control).find(({ id }) => inUrl(id) === rest)?.id
    if (stand === undefined || !canStandAt(control, stand)) return null
    state[control.id] = stand
  }
  return state
}

/** The state behind such a text; null on anything that is not a real combination of this preamp. */
export function decodeState(preamp: Preamp, text: string): ControlState | null {
  const state = parseState(preamp, text)
  return state && !('clash' in resolveSetting(preamp, state)) ? state : null
}
