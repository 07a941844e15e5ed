import { fromQuery, toQuery, type AnswersInput } from '@/lib/setups/schema'

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
 * this address says, they are the same check, and what they say beyond it is still the owner's.
 * @returns the answers to add; empty when the kept ones are of another check
 */
export function answersBeyond(address: AnswersInput, kept: AnswersInput): AnswersInput {
  const said = Object.entries(fromQuery(toQuery(address)))
  const same = said.length > 0 && said.every(([key, text]) => key === 'leaflet' || kept[key as keyof AnswersInput] === text)
  if (!same) return {}
  return Object.fromEntries(Object.entries(kept).filter(([key]) => address[key as keyof AnswersInput] === undefined))
}
