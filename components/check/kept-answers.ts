import { fromQuery, toQuery, type AnswersInput } from '@/lib/setups/schema'
import { STEP_KEYS, STEPS, type Step } from '@/lib/setups/terms'

/**
 * Answers kept on the device, for a connection that breaks and a tab that closes. Typed text only: nothing here that
 * the address does not hold as well.
 */
const PLACE = 'setdown.check'

export function keepAnswers(answers: AnswersInput): void {
  try {
    window.localStorage.setItem(PLACE, toQuery(answers))
  } catch {
    // Storage may be full or switched off; the address still holds everything.
  }
}

export function keptAnswers(): AnswersInput {
  try {
    return fromQuery(window.localStorage.getItem(PLACE) ?? '')
  } catch {
    return {}
  }
}

export function forgetAnswers(): void {
  try {
    window.localStorage.removeItem(PLACE)
  } catch {
    // As above.
  }
}

/**
 * Going back lands on an address that was written before later steps were answered. When the kept answers say all that
 * this address says, they are the same check, and what they say of later steps is still the owner's.
 * @returns the answers to add; empty when the kept ones are of another check
 */
export function answersBeyond(step: Step, address: AnswersInput, kept: AnswersInput): AnswersInput {
  const said = Object.entries(fromQuery(toQuery(address)))
  const same = said.length > 0 && said.every(([key, text]) => key === 'leaflet' || kept[key as keyof AnswersInput] === text)
  if (!same) return {}
  const later = STEPS.slice(STEPS.indexOf(step) + 1).flatMap((each) => STEP_KEYS[each])
  return Object.fromEntries(later.filter((key) => kept[key] !== undefined && address[key] === undefined).map((key) => [key, kept[key]]))
}
