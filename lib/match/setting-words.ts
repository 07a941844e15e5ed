import type { ControlState, Group, LoadChoiceGroup } from './controls'
import { controlOf, isActive, isOn, keyOf, placesOf } from './groups'
import type { Preamp } from './preamp'
import { resolveSetting, totalGainDecibels } from './settings'

/** A number to so many figures, without empty decimals. */
function toFigures(value: number, figures: number): string {
  return String(Number(value.toPrecision(figures)))
}

/** A resistance as people read it: two figures unless told otherwise, such as "47 kΩ", "980 Ω", "2.2 MΩ". */
export function ohmsInWords(ohms: number, figures = 2): string {
  const rounded = Number(ohms.toPrecision(figures))
  if (rounded >= 1e6) return `${toFigures(ohms / 1e6, figures)} MΩ`
  if (rounded >= 1e3) return `${toFigures(ohms / 1e3, figures)} kΩ`
  return `${toFigures(ohms, figures)} Ω`
}

/** A capacitance as people read it: two figures unless told otherwise, such as "170 pF", "2.2 nF". */
export function faradsInWords(farads: number, figures = 2): string {
  const rounded = Number(farads.toPrecision(figures))
  if (rounded >= 1e-6) return `${toFigures(farads / 1e-6, figures)} µF`
  if (rounded >= 1e-9) return `${toFigures(farads / 1e-9, figures)} nF`
  return `${toFigures(farads / 1e-12, figures)} pF`
}

/** A gain as people read it, such as "42 dB", "63.5 dB". */
export function gainInWords(decibels: number): string {
  return `${Math.round(decibels * 10) / 10} dB`
}

/** Said of a group that waits for another one. */
const NOT_IN_USE = 'Not in use'

/**
 * What a group comes to in a state, in display words. Load and capacitance are the whole of what then stands there,
 * middle values. A load that is printed on its plug or button is called as printed there.
 */
export function describeGroup(preamp: Preamp, group: Group, state: ControlState, figures = 2): string {
  if (group.sets === 'other' || group.sets === 'filter') return isOn(preamp, group, state) ? 'On' : 'Off'
  const setting = resolveSetting(preamp, state)
  if ('clash' in setting || !isActive(preamp, group, state)) return NOT_IN_USE
  if (group.sets === 'gain') return gainInWords(totalGainDecibels(setting))
  if (group.sets === 'input') return setting.path.label
  if (group.sets === 'capacitance') return faradsInWords(setting.inputFarads.nominal, figures)
  const printed = group.how === 'choice' ? printedLoad(preamp, group, state) : null
  return printed ?? ohmsInWords(setting.loadOhms.nominal, figures)
}

function printedLoad(preamp: Preamp, group: LoadChoiceGroup, state: ControlState): string | null {
  const key = keyOf(preamp, group, state)
  const label = placesOf(controlOf(preamp, group.control)).find(({ id }) => id === key)?.label
  return label?.includes('Ω') ? label : null
}

/** Every group with what it comes to, in the order of the data. */
export function describeSetting(preamp: Preamp, state: ControlState): { group: string; label: string; value: string }[] {
  return preamp.groups.map((group) => ({ group: group.id, label: group.label, value: describeGroup(preamp, group, state) }))
}
