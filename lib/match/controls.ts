import type { Quantity } from './quantity'

/**
 * What a hand can set on a preamp, as data. The same data computes every setting, lists every move
 * and draws the panel.
 */

/** A bank of small switches, one bank on each channel. State: one character a switch, '1' is ON. */
export interface SwitchBank {
  kind: 'bank'
  id: string
  label: string
  place: 'back' | 'front' | 'underside'
  switchCount: number
}

/** A slide with a few places, one for both channels. State: the place's id. */
export interface Slide {
  kind: 'slide'
  id: string
  label: string
  place: 'back' | 'front' | 'underside'
  positions: { id: string; label: string }[]
}

/** A pair of sockets, one on each channel, that take one plug out of a set. State: the plug's id. */
export interface LoadPlugs {
  kind: 'plugs'
  id: string
  label: string
  place: 'back' | 'front' | 'underside'
  positions: { id: string; label: string }[]
}

/**
 * A row of push buttons for both channels. `one-in`: pressing one lets the others out; state: the id of the one in.
 * `each`: every button stands by itself; state: one character a button, '1' is in.
 */
export interface ButtonRow {
  kind: 'buttons'
  id: string
  label: string
  place: 'back' | 'front' | 'underside'
  latch: 'one-in' | 'each'
  buttons: { id: string; label: string }[]
}

export type Control = SwitchBank | Slide | LoadPlugs | ButtonRow

/** How every control stands on one channel: control id to its state string. */
export type ControlState = Record<string, string>

/** How a unit stands. Controls that serve both channels hold the same state on either side. */
export interface Positions {
  left: ControlState
  right: ControlState
}

/** An infrasonic (rumble) filter. Butterworth high-pass. */
export interface Filter {
  cornerHertz: number
  order: 1 | 2 | 3 | 4
}

/** Which part of a control a group uses: 1-based members of a bank or button row; null is the whole control. */
interface GroupBase {
  id: string
  label: string
  control: string
  members: number[] | null
  /** The group only does something while another group stands at one of these options. */
  onlyWhen?: { group: string; options: string[] }
}

/** One of several gains. Key: the members' bits in order ('10'), or the position's or button's id. */
export interface GainGroup extends GroupBase {
  sets: 'gain'
  how: 'choice'
  options: Record<string, { gainId: string }>
}

/** One of several inputs (MM, MC). */
export interface InputGroup extends GroupBase {
  sets: 'input'
  how: 'choice'
  options: Record<string, { pathId: string }>
}

/** A load chosen outright: the resistance that then stands across the input, base included. */
export interface LoadChoiceGroup extends GroupBase {
  sets: 'load'
  how: 'choice'
  options: Record<string, { loadOhms: Quantity }>
}

/** Resistors switched across the base load; any number at once. Members in order. */
export interface LoadParallelGroup extends GroupBase {
  sets: 'load'
  how: 'parallel'
  resistorsOhms: Quantity[]
}

/** Capacitors switched across the base capacitance; they add up. Members in order. */
export interface CapacitanceGroup extends GroupBase {
  sets: 'capacitance'
  how: 'sum'
  capacitorsFarads: Quantity[]
}

/** The rumble filter, on or off; '1' or the option id 'on' is on. */
export interface FilterGroup extends GroupBase {
  sets: 'filter'
  how: 'on-off'
  filter: Filter
}

/** Changes nothing that a check computes (mono). Kept as it stands. */
export interface OtherGroup extends GroupBase {
  sets: 'other'
  how: 'on-off'
}

export type Group =
  | GainGroup
  | InputGroup
  | LoadChoiceGroup
  | LoadParallelGroup
  | CapacitanceGroup
  | FilterGroup
  | OtherGroup

/** Members of one control that must not be ON together. */
export interface Exclusion {
  control: string
  members: [number, number]
}
