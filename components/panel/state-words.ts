import type { ButtonRow, Control, ControlState, Positions, Preamp } from '@/lib/match'
import { sidesDiffer } from '@/lib/match/moves'
import { describeSetting } from '@/lib/match/setting-words'
import { capitalised, inSentence, listed, listedNumbers } from './words'

/** The whole setting in words, for those who cannot see the drawing. */

/** The members of a bank or of buttons that are ON or in, 1-based. */
export function membersOn(stand: string): number[] {
  return [...stand].flatMap((bit, index) => (bit === '1' ? [index + 1] : []))
}

/** The buttons of a row that are in. */
export function buttonsIn(row: ButtonRow, stand: string): string[] {
  const isIn = (id: string, index: number) => (row.latch === 'each' ? stand[index] === '1' : stand === id)
  return row.buttons.filter(({ id }, index) => isIn(id, index)).map(({ label }) => label)
}

/** How one control stands: "1 and 7 ON, the rest OFF", "100 Ω plug in", "gain at 64 dB". */
function standInWords(control: Control, stand: string, named: boolean): string {
  if (control.kind === 'bank') {
    const on = membersOn(stand)
    const name = named ? `${inSentence(control.label)}: ` : ''
    if (on.length === 0) return `${name}all switches OFF`
    if (on.length === control.switchCount) return `${name}all switches ON`
    return `${name}${on.length > 1 ? 'switches' : 'switch'} ${listedNumbers(on)} ON, the rest OFF`
  }
  if (control.kind === 'buttons') {
    const pressed = buttonsIn(control, stand)
    return `${inSentence(control.label)}: ${pressed.length > 0 ? `${listed(pressed)} in` : 'all out'}`
  }
  const label = control.positions.find(({ id }) => id === stand)?.label ?? stand
  return control.kind === 'plugs' ? `${label} plug in` : `${inSentence(control.label)} at ${label}`
}

/** How every control of one channel stands, and what it comes to. Whole sentences. */
export function stateInWords(preamp: Preamp, state: ControlState): string {
  if (preamp.controls.length === 0) return 'It has no switches.'
  const severalBanks = preamp.controls.filter(({ kind }) => kind === 'bank').length > 1
  const stands = preamp.controls.map((control) => standInWords(control, state[control.id], severalBanks))
  const values = describeSetting(preamp, state).map(({ label, value }) => `${inSentence(label)} ${inSentence(value)}`)
  return [listed(stands), values.join(', ')]
    .filter((part) => part !== '')
    .map((part) => `${capitalised(part)}.`)
    .join(' ')
}

/** How both channels stand. */
export function positionsInWords(preamp: Preamp, positions: Positions): string {
  if (!sidesDiffer(positions)) return stateInWords(preamp, positions.left)
  return `Left: ${stateInWords(preamp, positions.left)} Right: ${stateInWords(preamp, positions.right)}`
}
