import 'server-only'
import type { Context } from '../kernel/context'
import type { UnknownName } from '../match/inputs'
import { addRevision } from './add-revision'
import type { AnswersInput } from './schema'
import type { FoundNumberInput } from './schema-found'
import { UNKNOWN_WORDS } from './sentences/unknowns'
import { VALUE_FIELDS, type AnswerKey, type NumberField } from './terms'

/**
 * Takes the number that was found into the answers and reckons the sheet's next revision with it.
 * @throws Fault bad_input when it cannot be read; not_found; conflict after Z
 */
export function answerNumber(context: Context, { code, unknown, ...found }: FoundNumberInput): { code: string; letter: string } {
  return addRevision(context, code, (answers) => withFound(answers, unknown, found))
}

/** The answers with one value said outright, whatever was said about it before. */
export function withFound(answers: AnswersInput, unknown: UnknownName, found: Omit<FoundNumberInput, 'code' | 'unknown'>): AnswersInput {
  const { field } = UNKNOWN_WORDS[unknown]
  if (!field) return answers
  const { value, velocity, meaning } = found
  return {
    ...answers,
    ...(value === undefined ? {} : saidOutright(field, value)),
    ...(velocity ? { velocity } : {}),
    ...(meaning ? { meaning } : {}),
  }
}

function saidOutright(field: NumberField, value: string): AnswersInput {
  const set: Partial<Record<AnswerKey, string>> = { [field]: value }
  const ranged = VALUE_FIELDS.find((known) => known === field)
  if (ranged) {
    set[`${ranged}How`] = 'one'
    set[`${ranged}To`] = ''
  }
  if (field === 'lead') set.leadAs = 'whole'
  if (field === 'cable') set.cableAs = 'whole'
  return set
}
