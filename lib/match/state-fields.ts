import type { Control, ControlState, Positions } from './controls'
import { hasBits, memberCount } from './groups'
import { isPerSide } from './moves'
import type { Preamp } from './preamp'
import { encodeState, parseState } from './states'

/**
 * Positions as plain form fields, so that a form with drawn switches works without script: checkboxes named after
 * the side and the control, one value a switch that is ON; radios for everything that stands at one place.
 */

export type Side = 'left' | 'right'

/** Says whether both sides are alike. Its presence says that the other fields were there as well. */
export const SIDES_FIELD = 'sides'

/** The field of one control. Controls that serve both sides have the left one only. */
export function stateFieldName(side: Side, controlId: string): string {
  return `${side}.${controlId}`
}

/**
 * Reads positions out of such fields.
 * @param valuesOf all values of a field, none when it is not there
 * @returns null when the fields are not there, or do not describe a state of this preamp. The state may still hold a
 *          pair that excludes each other; the form says so.
 */
export function readPositionFields(preamp: Preamp, valuesOf: (name: string) => string[]): Positions | null {
  const [sides] = valuesOf(SIDES_FIELD)
  if (sides !== 'alike' && sides !== 'each') return null
  const left = stateOf(preamp, 'left', valuesOf)
  const right = sides === 'each' ? stateOf(preamp, 'right', valuesOf) : left
  return left && right && { left, right }
}

function stateOf(preamp: Preamp, side: Side, valuesOf: (name: string) => string[]): ControlState | null {
  const stands = preamp.controls.map((control): [string, string] => {
    const values = valuesOf(stateFieldName(isPerSide(control) ? side : 'left', control.id))
    return [control.id, hasBits(control) ? bitsOf(control, values) : (values[0] ?? '')]
  })
  return parseState(preamp, encodeState(preamp, Object.fromEntries(stands)))
}

function bitsOf(control: Control, values: string[]): string {
  return Array.from({ length: memberCount(control) }, (_, index) => (values.includes(String(index + 1)) ? '1' : '0')).join('')
}
