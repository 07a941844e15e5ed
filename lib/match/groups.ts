import type { Control, ControlState, Group } from './controls'
import type { Preamp } from './preamp'

/**
 * Reading groups off a state. A group's key is what it stands at: the bits of its members in order ('10') on a bank
 * or on buttons that stand by themselves, the id of the place, plug or button on every other control.
 */

/** The control with this id. Throws when the preamp has none: the data, not the owner, is then at fault. */
export function controlOf(preamp: Preamp, id: string): Control {
  const control = preamp.controls.find((one) => one.id === id)
  if (!control) throw new Error(`${preamp.modelName} has no control "${id}".`)
  return control
}

/** The group with this id. Throws when the preamp has none. */
export function groupOf(preamp: Preamp, id: string): Group {
  const group = preamp.groups.find((one) => one.id === id)
  if (!group) throw new Error(`${preamp.modelName} has no group "${id}".`)
  return group
}

/** True where each member stands by itself, so that the state is a string of bits. */
export function hasBits(control: Control): boolean {
  return control.kind === 'bank' || (control.kind === 'buttons' && control.latch === 'each')
}

/** How many members a control has: switches, buttons, places or plugs. */
export function memberCount(control: Control): number {
  if (control.kind === 'bank') return control.switchCount
  return control.kind === 'buttons' ? control.buttons.length : control.positions.length
}

/** The places, plugs or buttons of a control, in order; none for a bank, whose switches have only numbers. */
export function placesOf(control: Control): { id: string; label: string }[] {
  if (control.kind === 'bank') return []
  return control.kind === 'buttons' ? control.buttons : control.positions
}

/** Members (1-based) that a group uses. */
export function membersOf(preamp: Preamp, group: Group): number[] {
  if (group.members) return group.members
  return Array.from({ length: memberCount(controlOf(preamp, group.control)) }, (_, index) => index + 1)
}

/** How a control stands in a state. Throws when the state leaves it out or holds what it cannot stand at. */
export function standOf(preamp: Preamp, state: ControlState, control: Control): string {
  const stand = state[control.id]
  if (stand === undefined) throw new Error(`The state says nothing about "${control.id}" of ${preamp.modelName}.`)
  if (!canStandAt(control, stand)) throw new Error(`"${control.id}" of ${preamp.modelName} cannot stand at "${stand}".`)
  return stand
}

/** True when the string is a state of this control. */
export function canStandAt(control: Control, stand: string): boolean {
  if (hasBits(control)) return stand.length === memberCount(control) && /^[01]*$/.test(stand)
  return placesOf(control).some(({ id }) => id === stand)
}

/** What a group stands at in a state. */
export function keyOf(preamp: Preamp, group: Group, state: ControlState): string {
  const control = controlOf(preamp, group.control)
  const stand = standOf(preamp, state, control)
  if (!hasBits(control) || !group.members) return stand
  let key = ''
  for (const member of group.members) key += stand[member - 1]
  return key
}

/** True when the group does something: the group it waits for, if any, does something and stands at one of the options. */
export function isActive(preamp: Preamp, group: Group, state: ControlState, depth = 0): boolean {
  if (!group.onlyWhen) return true
  if (depth > preamp.groups.length) throw new Error(`Groups of ${preamp.modelName} wait for each other in a circle.`)
  const other = groupOf(preamp, group.onlyWhen.group)
  return group.onlyWhen.options.includes(keyOf(preamp, other, state)) && isActive(preamp, other, state, depth + 1)
}

/** True when an on-off group is on: one of its switches is ON, one of its buttons is in, or its slide stands at 'on'. */
export function isOn(preamp: Preamp, group: Group, state: ControlState): boolean {
  const control = controlOf(preamp, group.control)
  const key = keyOf(preamp, group, state)
  if (hasBits(control)) return key.includes('1')
  if (!group.members) return key === 'on' || key === '1'
  return group.members.includes(placesOf(control).findIndex(({ id }) => id === key) + 1)
}

/**
 * Which of a group's parts (resistors, capacitors) are in circuit: the members that are ON, or the one part that
 * belongs to the place a whole control stands at.
 */
export function partsIn<T>(preamp: Preamp, group: Group, parts: T[], state: ControlState): T[] {
  const control = controlOf(preamp, group.control)
  const key = keyOf(preamp, group, state)
  if (hasBits(control)) return parts.filter((_, index) => key[index] === '1')
  const at = placesOf(control).findIndex(({ id }) => id === key)
  return parts.slice(at, at + 1)
}
