import type { ControlState } from '../../match/controls'
import type { MatchInputs } from '../../match/inputs'
import { movesBetween } from '../../match/moves'
import { describeGroup, ohmsInWords } from '../../match/setting-words'
import type { MatchResult, Move, OtherSetting, SettingSummary } from '../../match/result'
import { added, decibels, figureText, gainText, listed, roomRange, sentenceCase, voltsText } from '../format'
import { findingClause } from './findings'

/** One other setting as a row: what it is, what it comes to, why or why not. */
export interface OtherRow {
  key: string
  setting: string
  comesTo: string
  why: string
  worthATry: boolean
}

/** How many rows stand for all of them before "Show all". */
const MOST_ROWS = 8

/** The rows of a sheet: those worth a try, then one for each way of being wrong; and every one of them. */
export function otherRows(result: MatchResult, inputs: MatchInputs): { shown: OtherRow[]; all: OtherRow[] } {
  const { chosen, others } = result
  if (!chosen) return { shown: [], all: [] }
  const row = (other: OtherSetting): OtherRow => ({
    key: JSON.stringify(other.setting.state),
    setting: settingWords(chosen.setting.state, other.setting.state, inputs),
    comesTo: comesTo(chosen.setting, other, inputs),
    why: whyWords(other, chosen.setting, inputs),
    worthATry: other.worthATry !== null,
  })
  const worth = others.filter(({ worthATry }) => worthATry !== null)
  const kinds = new Map<string, OtherSetting[]>()
  for (const other of others.filter(({ worthATry }) => worthATry === null)) {
    const kind = `${differsIn(chosen.setting, other.setting).join('+')} ${other.against?.code ?? ''}`
    kinds.set(kind, [...(kinds.get(kind) ?? []), other])
  }
  const representatives = [...kinds.values()]
    .sort((a, b) => a[0].distance - b[0].distance || nearness(chosen.setting, a[0].setting) - nearness(chosen.setting, b[0].setting))
    .map((alike) => alikeRow(row(alike[0]), alike.length))
  return { shown: [...worth.map(row), ...representatives].slice(0, MOST_ROWS), all: others.map(row) }
}

/** Gain and capacitance are what an owner asks about first. */
const ORDER: Difference[] = ['gain', 'capacitance', 'load', 'filter', 'input']
const nearness = (a: SettingSummary, b: SettingSummary) => Math.max(...differsIn(a, b).map((part) => ORDER.indexOf(part)))

function alikeRow(row: OtherRow, count: number): OtherRow {
  return count > 1 ? { ...row, setting: `${row.setting}, and ${count - 1} like it` } : row
}

type Difference = 'input' | 'gain' | 'load' | 'capacitance' | 'filter'

function differsIn(a: SettingSummary, b: SettingSummary): Difference[] {
  const parts: [Difference, boolean][] = [
    ['input', a.pathId !== b.pathId],
    ['gain', a.gainDecibels !== b.gainDecibels],
    ['load', a.loadOhms !== b.loadOhms],
    ['capacitance', a.inputFarads !== b.inputFarads],
    ['filter', (a.filter === null) !== (b.filter === null)],
  ]
  return parts.filter(([, differs]) => differs).map(([part]) => part)
}

/** "Switch 6 ON", "Switch 1 stays ON", "Gain 72 dB": what to do from the advice to get there. */
export function settingWords(from: ControlState, to: ControlState, inputs: MatchInputs): string {
  const { preamp, present } = inputs
  const moves = movesBetween(preamp, { left: from, right: from }, to)
  const alike = present && moves.every(({ control }) => present.left[control] === present.right[control])
  const parts = preamp.controls.flatMap((control) => {
    const own = moves.filter((move) => move.control === control.id)
    if (own.length === 0) return []
    const stands = alike ? present.left[control.id] : undefined
    if (control.kind === 'bank') return bankWords(own, stands)
    const places = control.kind === 'buttons' ? control.buttons : control.positions
    if (control.kind === 'buttons' && control.latch === 'each') {
      return own.map(({ member, to: bit }) => `${places[(member ?? 1) - 1]?.label ?? ''} ${bit === '1' ? 'in' : 'out'}`)
    }
    const label = places.find(({ id }) => id === to[control.id])?.label ?? ''
    if (control.kind === 'plugs') return [`${label} plugs`]
    return [control.kind === 'buttons' ? `${label} in` : `${control.label} ${label}`]
  })
  return parts.join(', ')
}

function bankWords(moves: readonly Move[], stands: string | undefined): string[] {
  const say = (bit: string, stays: boolean) => {
    const members = moves.filter(({ member, to }) => to === bit && (stands?.[(member ?? 1) - 1] === bit) === stays).map(({ member }) => String(member))
    if (members.length === 0) return []
    const verb = stays ? (members.length === 1 ? ' stays' : ' stay') : ''
    return [`${members.length === 1 ? 'Switch' : 'Switches'} ${listed(members)}${verb} ${bit === '1' ? 'ON' : 'OFF'}`]
  }
  return [...say('1', true), ...say('1', false), ...say('0', true), ...say('0', false)]
}

function comesTo(chosen: SettingSummary, { setting, outputVolts }: OtherSetting, inputs: MatchInputs): string {
  const words: Record<Difference, () => string> = {
    input: () => `${inputs.preamp.paths.find(({ id }) => id === setting.pathId)?.label ?? setting.pathId.toUpperCase()} input`,
    gain: () => `${gainText(setting.gainDecibels)}, ${voltsText(outputVolts)} RMS`,
    load: () => loadWords(setting, inputs),
    capacitance: () => totalFarads(setting, inputs),
    filter: () => (setting.filter ? 'Rumble filter' : 'No rumble filter'),
  }
  const parts = differsIn(chosen, setting)
  // A moving coil has so little inductance that its capacitance says nothing.
  const telling = parts.length > 1 && inputs.cartridge.type === 'moving-coil' ? parts.filter((part) => part !== 'capacitance') : parts
  return sentenceCase(telling.map((part) => words[part]()).join(', '))
}

/** The load as its plug or button calls it, else what stands at the input. */
export function loadWords({ state, loadOhms }: SettingSummary, { preamp }: MatchInputs): string {
  const groups = preamp.groups.filter(({ sets }) => sets === 'load')
  const words = groups.map((group) => describeGroup(preamp, group, state)).filter((text) => text !== 'Not in use')
  return words[0] ?? ohmsInWords(loadOhms)
}

/** Everything across the coil with this setting: wiring, lead, preamp. */
export function totalFarads(setting: SettingSummary, { arm }: MatchInputs): string {
  const inside = { low: setting.inputFarads, nominal: setting.inputFarads, high: setting.inputFarads, origin: 'printed' as const }
  return figureText(added([arm.wiringFarads, arm.leadFarads, inside]), 'farads')
}

function whyWords(other: OtherSetting, chosen: SettingSummary, inputs: MatchInputs): string {
  const { worthATry, against, setting, roomDecibels, distance } = other
  if (against) return `Not this: ${findingClause(against, inputs)}.`
  const room = sentenceCase(roomRange(roomDecibels))
  switch (worthATry) {
    case 'if-dull':
      return 'Worth a try if it sounds dull.'
    case 'if-bright':
      return 'Worth a try if it sounds bright.'
    case 'if-rumble':
      return `Worth a try if the woofers flap on a warp. Takes ${decibels(filterAt20Hertz(setting))} at 20 Hz.`
    case 'if-quiet':
      return `Worth a try if it plays too quietly. ${room}.`
    case 'if-loud':
      return `Worth a try if the volume sits too low. ${room}.`
    case 'if-load':
      return setting.loadOhms > chosen.loadOhms ? 'Worth a try if it sounds dull or quiet.' : 'Worth a try if it sounds bright.'
    case null:
      return distance > 1 ? 'It would do too, with more to move.' : 'It would do as well.'
  }
}

/** Butterworth high-pass at 20 Hz: 10·log10(1 + (corner/20)^(2·order)). */
function filterAt20Hertz({ filter }: SettingSummary): number {
  return filter ? 10 * Math.log10(1 + (filter.cornerHertz / 20) ** (2 * filter.order)) : 0
}

/** "Two are worth a try", "None is better". */
export function othersHeading(rows: readonly OtherRow[]): string {
  const worth = rows.filter(({ worthATry }) => worthATry).length
  if (worth === 0) return 'None of them is better'
  const words = ['', 'One', 'Two', 'Three', 'Four', 'Five', 'Six', 'Seven', 'Eight']
  return `${words[worth] ?? String(worth)} ${worth === 1 ? 'is' : 'are'} worth a try`
}
