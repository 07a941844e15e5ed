import type { AnswersInput } from '../setups/schema'
import { STEP_KEYS, type AnswerKey } from '../setups/terms'

/** Parts of a check's answers: those about the cartridge, and all the others. Pure; the browser fills forms with them. */

const CARTRIDGE_KEYS: readonly AnswerKey[] = STEP_KEYS.cartridge.filter((key) => key !== 'own')
const isCartridgeKey = (key: string) => CARTRIDGE_KEYS.some((each) => each === key)

/** Marks of values that came out of the catalogue start with the name of their field. */
const marksOf = ({ leaflet = '' }: AnswersInput) => leaflet.split(' ').filter(Boolean)
const isCartridgeMark = (mark: string) => isCartridgeKey(mark.split('.')[0])

/** What of these answers is about the cartridge, with the marks of what its leaflet says. */
export function cartridgeAnswersOf(answers: AnswersInput): AnswersInput {
  const own = Object.fromEntries(Object.entries(answers).filter(([key, text]) => isCartridgeKey(key) && text !== ''))
  const marks = marksOf(answers).filter(isCartridgeMark)
  return marks.length > 0 ? { ...own, leaflet: marks.join(' ') } : own
}

/** The same answers about another cartridge; about none without one. */
export function withCartridge(answers: AnswersInput, cartridge: AnswersInput | null): AnswersInput {
  const others = Object.fromEntries(Object.entries(answers).filter(([key]) => !isCartridgeKey(key) && key !== 'own' && key !== 'leaflet'))
  const marks = [...marksOf(answers).filter((mark) => !isCartridgeMark(mark)), ...(cartridge ? marksOf(cartridge) : [])]
  return { ...others, ...cartridge, ...(marks.length > 0 ? { leaflet: marks.join(' ') } : {}) }
}
