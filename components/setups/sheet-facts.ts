import type { MatchResult } from '@/lib/match/result'
import { STEP_KEYS, type AnswerKey, type NumberField, type Step } from '@/lib/setups/terms'
import { toQuery, type AnswersInput } from '@/lib/setups/schema'
import { STEP_PATHS } from '@/lib/setups/views-steps'
import type { Outcome, SheetView } from '@/lib/setups/views'

/** What a page of a sheet needs to know about it, worked out once. */

/** The setting whose figures the sheet shows first: tonight's while the verdict is open, else the advised one. */
export function adviceOf({ result: { match, tonight } }: SheetView): Outcome | null {
  if (tonight) return tonight
  const { chosen, curves, stages, verdict } = match
  return chosen && curves ? { evaluation: chosen, verdict: verdictAsSet(match, verdict), curves, stages } : null
}

/** With the advised setting in place nothing is left to change. */
function verdictAsSet({ moves }: MatchResult, verdict: Outcome['verdict']): Outcome['verdict'] {
  return verdict === 'suits-with-changes' && moves?.length !== 0 ? 'suits' : verdict
}

/** Settings one step away. */
export function neighboursOf({ others }: MatchResult) {
  return others.filter(({ distance }) => distance === 1)
}

/** Only the newest revision can be acted on, and only by those who may change the sheet. */
export function canAct({ letter, revisions, mayChange }: SheetView): boolean {
  return mayChange && revisions[revisions.length - 1]?.letter === letter
}

export interface SheetPaths {
  /** Where its answers can be changed, from the first step on. */
  change: string
  anotherCartridge: string
  tellPresent: string
  enter: (at: { step: Step; field: NumberField }) => string
}

export function pathsOf({ answers, code }: Pick<SheetView, 'answers' | 'code'>): SheetPaths {
  const query = toQuery({ ...answers, sheet: code })
  return {
    change: `${STEP_PATHS.preamp}?${query}`,
    anotherCartridge: `${STEP_PATHS.cartridge}?${toQuery(withoutStep(answers, 'cartridge'))}`,
    tellPresent: `${STEP_PATHS.preamp}?${query}#present`,
    enter: ({ step, field }) => `${STEP_PATHS[step]}?${query}#${field}`,
  }
}

function withoutStep(answers: AnswersInput, step: Step): AnswersInput {
  const dropped: readonly AnswerKey[] = [...STEP_KEYS[step], 'sheet', 'leaflet']
  return Object.fromEntries(Object.entries(answers).filter(([key]) => !dropped.includes(key as AnswerKey)))
}
