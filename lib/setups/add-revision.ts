import 'server-only'
import type { Transaction } from '@/db/client'
import { permit } from '../access/permit'
import type { Context } from '../kernel/context'
import { Fault } from '../kernel/errors'
import { reckon } from './reckon'
import { insertRevision, revisionOf, saysTheSame, sheetByCode, type SheetRow } from './rows'
import type { AnswersInput } from './schema'
import { fromStored } from './stored'

const LAST_LETTER = 'Z'

/** The letter after this one. @throws Fault conflict after Z */
function letterAfter(letter: string): string {
  if (letter === LAST_LETTER) {
    throw new Fault('conflict', 'This sheet has as many revisions as it can hold. Start a new one from it instead.')
  }
  return String.fromCharCode(letter.charCodeAt(0) + 1)
}

/**
 * Adds a revision to the sheet behind a code, reckoned now; earlier ones stay as they were. Where the newest one
 * says the same already, that one is it: a double press adds nothing.
 * @param change makes the answers out of those of the newest revision
 * @param also is done in the same transaction, whether or not a revision was added
 * @throws Fault not_found, bad_input, conflict; sign_in or not_allowed where an owner keeps it
 */
export function addRevision(
  context: Context,
  code: string,
  change: (answers: AnswersInput) => AnswersInput,
  also?: (tx: Transaction, sheet: SheetRow, letter: string) => void,
): { code: string; letter: string } {
  const { db, actor, now } = context
  const before = permit(actor, 'sheet:change', sheetByCode(db, code))
  const answers = change(fromStored<AnswersInput>(revisionOf(db, before.id).answers))
  const reckoned = reckon(context, answers)
  return db.transaction(
    (tx) => {
      const sheet = permit(actor, 'sheet:change', sheetByCode(tx, code))
      const newest = revisionOf(tx, sheet.id)
      const same = saysTheSame(newest, reckoned)
      const letter = same ? newest.letter : letterAfter(newest.letter)
      if (!same) insertRevision(tx, sheet, letter, reckoned, now)
      also?.(tx, sheet, letter)
      return { code: sheet.code, letter }
    },
    { behavior: 'immediate' },
  )
}
