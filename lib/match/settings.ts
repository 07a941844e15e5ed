import type { ControlState, Exclusion, GainGroup, Group, InputGroup, LoadChoiceGroup } from './controls'
import { controlOf, hasBits, isActive, isOn, keyOf, membersOf, partsIn, placesOf } from './groups'
import type { GainOption, InputPath, Preamp, Setting } from './preamp'
import type { Origin, Quantity } from './quantity'
import type { SettingSummary } from './result'

/** Origins from firmest to weakest. A combined value is as firm as its weakest part. */
const FIRMNESS: Origin[] = ['measured', 'printed', 'owner', 'typical', 'unknown']

function weakestOrigin(parts: Quantity[]): Origin {
  return FIRMNESS[Math.max(...parts.map(({ origin }) => FIRMNESS.indexOf(origin)))]
}

/** Resistances side by side, ohms.  R = 1 / Σ(1/Rᵢ), which rises with every part, so ends combine with ends. */
export function inParallel(parts: Quantity[]): Quantity {
  if (parts.length === 1) return parts[0]
  const combine = (end: 'low' | 'nominal' | 'high') => 1 / parts.reduce((sum, part) => sum + 1 / part[end], 0)
  return { low: combine('low'), nominal: combine('nominal'), high: combine('high'), origin: weakestOrigin(parts) }
}

/** Capacitances side by side, farads.  C = ΣCᵢ */
export function added(parts: Quantity[]): Quantity {
  if (parts.length === 1) return parts[0]
  const combine = (end: 'low' | 'nominal' | 'high') => parts.reduce((sum, part) => sum + part[end], 0)
  return { low: combine('low'), nominal: combine('nominal'), high: combine('high'), origin: weakestOrigin(parts) }
}

/** The first pair of members that stand ON together and must not; null when there is none. */
export function clashIn(preamp: Preamp, state: ControlState): Exclusion | null {
  const stands = (control: string, member: number) => state[control]?.[member - 1] === '1'
  const clash = preamp.exclusions.find(({ control, members: [one, other] }) => stands(control, one) && stands(control, other))
  return clash ?? null
}

/** What a choice group stands at; undefined at a place it says nothing about. */
function chosenIn<T>(preamp: Preamp, group: Group, options: Record<string, T>, state: ControlState): T | undefined {
  const key = keyOf(preamp, group, state)
  return Object.hasOwn(options, key) ? options[key] : undefined
}

/**
 * The members behind a combination that no option describes: its first two that are ON, or the one it stands at,
 * named twice.
 */
function undescribed(preamp: Preamp, group: Group, state: ControlState): Exclusion {
  const control = controlOf(preamp, group.control)
  const stand = state[control.id]
  if (!hasBits(control)) {
    const place = placesOf(control).findIndex(({ id }) => id === stand) + 1
    return { control: control.id, members: [place, place] }
  }
  const members = membersOf(preamp, group)
  const on = members.filter((member) => stand[member - 1] === '1')
  const first = on[0] ?? members[0]
  return { control: control.id, members: [first, on[1] ?? first] }
}

/**
 * What a combination of positions comes to: the input in use, its gain, and the load, capacitance and filter that
 * stand there. Without an input group the gain decides the input. Groups that wait for another one do nothing until
 * it stands where they need it.
 *
 * @returns the setting, or the pair of members that must not stand like this (the same member twice when no option
 *          describes it at all)
 * @throws when the state leaves out a control or holds what it cannot stand at
 */
export function resolveSetting(preamp: Preamp, state: ControlState): Setting | { clash: Exclusion } {
  const way = wayThrough(preamp, state)
  if ('clash' in way) return way
  const { path, gain, active } = way
  return { path, gain, ...acrossInput(preamp, active, state, path) }
}

/**
 * The input and the gain in use, with the groups that do something: a setting without what stands across the input.
 * Cheap, for going through every combination.
 */
export function wayThrough(
  preamp: Preamp,
  state: ControlState,
): { path: InputPath; gain: GainOption; active: Group[] } | { clash: Exclusion } {
  const clash = clashIn(preamp, state)
  if (clash) return { clash }
  const active = preamp.groups.filter((group) => isActive(preamp, group, state))
  const missing = active.find(
    (group) =>
      group.how === 'choice' && hasBits(controlOf(preamp, group.control)) && !Object.hasOwn(group.options, keyOf(preamp, group, state)),
  )
  if (missing) return { clash: undescribed(preamp, missing, state) }
  const way = inputAndGain(preamp, active, state)
  return 'clash' in way ? way : { ...way, active }
}

function inputAndGain(
  preamp: Preamp,
  active: Group[],
  state: ControlState,
): { path: InputPath; gain: GainOption } | { clash: Exclusion } {
  const inputs = active.filter((group): group is InputGroup => group.sets === 'input')
  const gains = active.filter((group): group is GainGroup => group.sets === 'gain')
  const pathId = inputs.map((group) => chosenIn(preamp, group, group.options, state)?.pathId).find((id) => id !== undefined)
  const gainIds = gains.map((group) => chosenIn(preamp, group, group.options, state)?.gainId).filter((id) => id !== undefined)
  const set = gainIds.map((id) => gainOf(preamp, id))
  const gain = set.find((one) => pathId === undefined || one.pathId === pathId)
  if (gain) return { path: pathOf(preamp, gain.pathId), gain }
  if (set.length > 0) return { clash: undescribed(preamp, gains[0], state) }
  const fixed = preamp.gains.find((one) => pathId === undefined || one.pathId === pathId)
  if (!fixed) throw new Error(`${preamp.modelName} has no gain for its input "${pathId}".`)
  return { path: pathOf(preamp, fixed.pathId), gain: fixed }
}

function gainOf(preamp: Preamp, id: string): GainOption {
  const gain = preamp.gains.find((one) => one.id === id)
  if (!gain) throw new Error(`${preamp.modelName} has no gain "${id}".`)
  return gain
}

function pathOf(preamp: Preamp, id: string): InputPath {
  const path = preamp.paths.find((one) => one.id === id)
  if (!path) throw new Error(`${preamp.modelName} has no input "${id}".`)
  return path
}

/** What stands across the input: a load chosen outright takes the place of the base; resistors and capacitors join it. */
function acrossInput(preamp: Preamp, active: Group[], state: ControlState, path: InputPath): Omit<Setting, 'path' | 'gain'> {
  let base = path.loadOhms
  const resistors: Quantity[] = []
  const capacitors: Quantity[] = []
  let filter = preamp.fixedFilter
  for (const group of active) {
    if (group.sets === 'load' && group.how === 'choice') base = loadChosen(preamp, group, state) ?? base
    else if (group.sets === 'load') resistors.push(...partsIn(preamp, group, group.resistorsOhms, state))
    else if (group.sets === 'capacitance') capacitors.push(...partsIn(preamp, group, group.capacitorsFarads, state))
    else if (group.sets === 'filter' && isOn(preamp, group, state)) filter = group.filter
  }
  return {
    loadOhms: inParallel([base, ...resistors]),
    inputFarads: added([path.inputFarads, ...capacitors]),
    filter,
  }
}

function loadChosen(preamp: Preamp, group: LoadChoiceGroup, state: ControlState): Quantity | undefined {
  return chosenIn(preamp, group, group.options, state)?.loadOhms
}

/** Gain as an owner reads it: the electronics, and a transformer built into the input. Decibels, middle values. */
export function totalGainDecibels({ gain, path }: Setting): number {
  return gain.gainDecibels.nominal + (path.stepUp ? 20 * Math.log10(path.stepUp.ratio.nominal) : 0)
}

/**
 * A setting with its middle values, for showing and storing.
 * @throws when the state is not a real combination
 */
export function summarise(preamp: Preamp, state: ControlState): SettingSummary {
  const setting = resolveSetting(preamp, state)
  if ('clash' in setting) throw new Error(`Members ${setting.clash.members.join(' and ')} of "${setting.clash.control}" exclude each other.`)
  return summaryOf(setting, state)
}

/** The summary of a setting that is resolved already, with the state it came from. */
export function summaryOf(setting: Setting, state: ControlState): SettingSummary {
  return {
    state: { ...state },
    gainDecibels: totalGainDecibels(setting),
    pathId: setting.path.id,
    loadOhms: setting.loadOhms.nominal,
    inputFarads: setting.inputFarads.nominal,
    filter: setting.filter,
  }
}
