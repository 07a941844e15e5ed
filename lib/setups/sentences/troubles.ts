import { readField } from '../field-reading'
import { choiceOf } from '../answers'
import type { AnswersInput } from '../schema'
import type { SheetTrouble } from '../terms-sheet'
import { UNKNOWN_WORDS } from './unknowns'
import type { UnknownName } from '../../match/inputs'

/** Why a form of a sheet came back undone, in our own words. The number has its sentence beside its box. */
const SENTENCES: Record<Exclude<SheetTrouble, 'number'>, string> = {
  full: 'This sheet has as many revisions as it can hold. Start a new one from it instead.',
  wait: 'That is more than we work out in a minute. Press again in a minute.',
  refused: 'That could not be done with this sheet. Change an answer, or start a new one from it.',
}

export function troubleSentence(trouble: SheetTrouble): string | null {
  return trouble === 'number' ? null : SENTENCES[trouble]
}

/** What is wrong with a number that was typed on a sheet: what it was understood as, and what would do. */
export function numberTrouble(unknown: UnknownName, typed: string, answers: AnswersInput): string {
  const { field, name } = UNKNOWN_WORDS[unknown]
  const read = field && readField(field, { ...answers, [field]: typed, [`${field}How`]: 'one' }, choiceOf(answers))
  return read?.trouble?.sentence ?? `Type the ${name.toLowerCase()} as it stands there, such as 0.4.`
}
