import type { ButtonRow, Control, ControlState, Exclusion, Move, Preamp } from '@/lib/match'
import { buttonsIn, membersOn } from './state-words'
import { capitalised, countInWords, fromTo, inSentence, listed, listedNumbers } from './words'

/** What a hand has to do, one line a move, with what it changes. Texts only: page, print and mail use the same. */
export interface MoveLine {
  /** "Switch 1 to OFF" */
  title: string
  /** "Gain goes from 42 to 36 dB"; empty when it changes nothing that is computed. */
  detail: string
}

const IN_THE_BOX = 'The plugs are in the box they came in'
const NOT_IN_USE = 'Not in use'
const BY_ITSELF = { one: 'comes out by itself', many: 'come out by themselves' }

const controlOf = (preamp: Preamp, id: string): Control | undefined => preamp.controls.find((control) => control.id === id)

/** The moves as lines. All presses of buttons make one line, since they are done in one go. */
export function moveLines(preamp: Preamp, moves: Move[]): MoveLine[] {
  const lines: MoveLine[] = []
  const presses = moves.filter(({ control }) => controlOf(preamp, control)?.kind === 'buttons')
  for (const move of moves) {
    const control = controlOf(preamp, move.control)
    if (!control || (control.kind === 'buttons' && move !== presses[0])) continue
    if (control.kind === 'buttons') lines.push(...pressLines(preamp, presses))
    else lines.push(lineOf(preamp, control, move, moves))
  }
  return lines
}

function lineOf(preamp: Preamp, control: Control, move: Move, moves: Move[]): MoveLine {
  if (control.kind === 'bank') return { title: switchTitle(preamp, control, move), detail: switchDetail(preamp, move, moves) }
  const label = (id: string) => placeLabel(control, id)
  if (control.kind === 'plugs') {
    const act = `take out ${label(move.from)}, put in ${label(move.to)}`
    if (move.side === 'both') return { title: capitalised(act), detail: `Both sides. ${IN_THE_BOX}` }
    return { title: `${capitalised(move.side)}: ${act}`, detail: IN_THE_BOX }
  }
  return { title: `${groupLabel(preamp, move) ?? control.label} to ${label(move.to)}`, detail: stepFrom(control, move) }
}

function placeLabel(control: Control, id: string): string {
  if (control.kind === 'bank') return id
  const places = control.kind === 'buttons' ? control.buttons : control.positions
  return places.find((place) => place.id === id)?.label ?? id
}

const groupLabel = (preamp: Preamp, move: Move) => preamp.groups.find(({ id }) => id === move.group)?.label

function switchTitle(preamp: Preamp, control: Control, { member, side, to }: Move): string {
  const several = preamp.controls.filter(({ kind }) => kind === 'bank').length > 1
  const position = to === '1' ? 'ON' : 'OFF'
  const bank = several ? `${control.label}, ` : ''
  if (side !== 'both') return `${capitalised(side)}: ${bank}${member} to ${position}`
  return several ? `${bank}switch ${member} to ${position}` : `Switch ${member} to ${position}`
}

/** Switches of one group change it together: the first line says to what, the others go with it. */
function switchDetail(preamp: Preamp, move: Move, moves: Move[]): string {
  const together = moves.filter(({ control, group, side }) => group !== '' && control === move.control && group === move.group && side === move.side)
  const change = changeInWords(preamp, move)
  if (together.length < 2 || change === '') return change
  if (together[0] !== move) return `Goes with switch ${together[0].member}`
  return `${change}, with ${listed(together.slice(1).map(({ member }) => `switch ${member}`))}`
}

/** What a move changes: "Gain goes from 42 to 36 dB", "The preamp adds 70 pF, not 270 pF", "Rumble goes on". */
export function changeInWords(preamp: Preamp, move: Move): string {
  const group = preamp.groups.find(({ id }) => id === move.group)
  const { before, after, side } = move
  if (!group || before === after || after === NOT_IN_USE) return ''
  if (group.how === 'on-off') return `${group.label} goes ${after.toLowerCase()}`
  if (before === NOT_IN_USE) return `${group.label} becomes ${after}`
  if (side !== 'both') return `${group.label} ${before} to ${after}`
  if (group.sets === 'capacitance') return `The preamp adds ${after}, not ${before}`
  return `${group.label} goes ${fromTo(before, after)}`
}

/** "One step down from 72 dB" on a scale of numbers that rises or falls; "From MM" elsewhere. */
function stepFrom(control: Control, { from, to }: Move): string {
  const before = placeLabel(control, from)
  if (control.kind !== 'slide') return `From ${before}`
  const values = control.positions.map(({ label }) => parseFloat(label))
  const index = (id: string) => control.positions.findIndex((place) => place.id === id)
  const steps = Math.abs(index(to) - index(from))
  const change = values[index(to)] - values[index(from)]
  if (!(Math.abs(change) > 0)) return `From ${before}`
  return `${capitalised(countInWords(steps))} ${steps === 1 ? 'step' : 'steps'} ${change < 0 ? 'down' : 'up'} from ${before}`
}

function pressLines(preamp: Preamp, presses: Move[]): MoveLine[] {
  const rowOf = (move: Move) => controlOf(preamp, move.control) as ButtonRow
  const labelOf = (move: Move) => rowOf(move).buttons[(move.member ?? 1) - 1].label
  const pressed = presses.filter((move) => rowOf(move).latch === 'one-in' || move.to === '1').map(labelOf)
  const out = presses.filter((move) => rowOf(move).latch === 'one-in').map((move) => placeLabel(rowOf(move), move.from))
  const released = presses.filter((move) => rowOf(move).latch === 'each' && move.to === '0').map(labelOf)
  const lines: MoveLine[] = []
  if (pressed.length > 0) {
    const alone = out.length === 1 ? BY_ITSELF.one : BY_ITSELF.many
    lines.push({ title: `Press ${listed(pressed)}`, detail: out.length > 0 ? `${listed(out)} ${alone}` : '' })
  }
  if (released.length > 0) {
    const once = released.length === 1 ? 'Press it once more, so that it comes out' : 'Press them once more, so that they come out'
    lines.push({ title: `Let ${listed(released)} out`, detail: once })
  }
  return lines
}

/** The whole end state, for when nobody knows how the unit stands: "All eight OFF, both sides". */
export function endStateLines(preamp: Preamp, state: ControlState): MoveLine[] {
  const severalBanks = preamp.controls.filter(({ kind }) => kind === 'bank').length > 1
  const rows = preamp.controls.filter((control) => control.kind === 'buttons')
  return preamp.controls.flatMap((control): MoveLine[] => {
    const stand = state[control.id]
    if (control.kind === 'bank') return [{ title: bankState(control.label, stand, severalBanks), detail: '' }]
    if (control.kind === 'plugs') return [{ title: `${placeLabel(control, stand)} plugs, both sides`, detail: IN_THE_BOX }]
    if (control.kind === 'slide') return [{ title: `${control.label} to ${placeLabel(control, stand)}`, detail: '' }]
    if (control !== rows[0]) return []
    const pressed = rows.flatMap((row) => buttonsIn(row, state[row.id]))
    return [pressed.length > 0 ? { title: `${listed(pressed)} in`, detail: 'All other buttons out' } : { title: 'All buttons out', detail: '' }]
  })
}

function bankState(label: string, stand: string, named: boolean): string {
  const on = membersOn(stand)
  const off = membersOn([...stand].map((bit) => (bit === '1' ? '0' : '1')).join(''))
  const all = `All ${countInWords(stand.length)}`
  const words =
    on.length === 0 ? `${all} OFF` : off.length === 0 ? `${all} ON` : on.length <= off.length ? `Only ${listedNumbers(on)} ON` : `Only ${listedNumbers(off)} OFF`
  return `${named ? `${label}: ${inSentence(words)}` : words}, both sides`
}

/** "Switches 3 and 4 cannot both be ON. Turn 3 off first." `moved` is the one just pressed; the other goes first. */
export function clashInWords(preamp: Preamp, { control: id, members }: Exclusion, moved?: number): string {
  const control = controlOf(preamp, id)
  const names = members.map((member) => memberName(control, member))
  const isBank = control?.kind === 'bank'
  if (members[0] === members[1]) return `${isBank ? `Switch ${names[0]}` : names[0]} cannot stand like that here.`
  const first = members[0] === moved ? names[1] : names[0]
  return isBank
    ? `Switches ${listed(names)} cannot both be ON. Turn ${first} off first.`
    : `${listed(names)} cannot both be in. Let ${first} out first.`
}

function memberName(control: Control | undefined, member: number): string {
  if (!control || control.kind === 'bank') return String(member)
  const places = control.kind === 'buttons' ? control.buttons : control.positions
  return places[member - 1]?.label ?? String(member)
}

/**
 * Which fixed caution belongs to what is asked for: pulling a load plug opens the input, so it outweighs a switch.
 * @param moves null when the whole end state is asked for
 * @returns null when nothing is to be touched
 */
export function cautionFor(moves: Move[] | null, preamp: Preamp): 'switch' | 'load' | null {
  const touched = moves ? moves.map(({ control }) => controlOf(preamp, control)) : preamp.controls
  if (touched.length === 0) return null
  return touched.some((control) => control?.kind === 'plugs') ? 'load' : 'switch'
}
