import type { MatchInputs, NextInput } from '../../match/inputs'
import type { Preamp } from '../../match/preamp'

/** The things of a sheet as its sentences call them. */
export interface Names {
  /** "the Tarn 2" */
  preamp: string
  /** "Tarn 2" */
  model: string
  /** "the Calloway Wren", or "your cartridge" where nobody named it */
  cartridge: string
  /** "your amplifier" */
  next: string
  /** "your amplifier's input" */
  nextInput: string
}

const NEXT_NAMES: Record<NextInput['kind'], string> = {
  line: 'your amplifier',
  digital: 'your digital input',
  recorder: 'your recorder',
  headphones: 'your headphone stage',
  phono: 'that phono input',
  unknown: 'your amplifier',
}

export function namesOf({ preamp, cartridge, next }: MatchInputs): Names {
  const name = cartridge.name.trim()
  return {
    preamp: `the ${preamp.modelName}`,
    model: preamp.modelName,
    cartridge: name ? `the ${name}` : 'your cartridge',
    next: NEXT_NAMES[next.kind],
    nextInput: next.kind === 'digital' || next.kind === 'phono' ? NEXT_NAMES[next.kind] : `${possessive(NEXT_NAMES[next.kind])} input`,
  }
}

/** "your amplifier's", "the Calloway Wren's", "the Finches'" */
export function possessive(name: string): string {
  return name.endsWith('s') ? `${name}'` : `${name}'s`
}

/** What a hand moves on this preamp, in one word. */
export interface Handle {
  one: string
  many: string
  /** "move" two switches, "change" two plugs, "press" two buttons */
  verb: string
}

const HANDLES: Record<'bank' | 'slide' | 'plugs' | 'buttons', Handle> = {
  bank: { one: 'switch', many: 'switches', verb: 'move' },
  slide: { one: 'switch', many: 'switches', verb: 'move' },
  plugs: { one: 'pair of plugs', many: 'pairs of plugs', verb: 'change' },
  buttons: { one: 'button', many: 'buttons', verb: 'press' },
}
const SETTINGS: Handle = { one: 'setting', many: 'settings', verb: 'change' }

/** The word for these controls: one kind keeps its own, several kinds are settings. Null where there is none. */
export function handleOf(preamp: Preamp, controlIds?: readonly string[]): Handle | null {
  const controls = controlIds ? preamp.controls.filter(({ id }) => controlIds.includes(id)) : preamp.controls
  if (controls.length === 0) return null
  const handles = new Set(controls.map(({ kind }) => HANDLES[kind].one))
  return handles.size === 1 ? HANDLES[controls[0].kind] : SETTINGS
}
