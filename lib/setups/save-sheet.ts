import 'server-only'
import { eq, max } from 'drizzle-orm'
import { sheets } from '@/db/schema/setups'
import type { Context } from '../kernel/context'
import { newId } from '../kernel/ids'
import { newSheetCode } from './codes'
import { reckon, requestKeyOf, type Reckoned } from './reckon'
import { insertRevision } from './rows'
import type { AnswersInput } from './schema'

/** Numbers are said on the phone: the first has four figures. */
const FIRST_NUMBER = 1001
const FIRST_LETTER = 'A'

export interface SavedSheet {
  number: number
  code: string
}

/**
 * Checks the answers and keeps the result as revision A of a new sheet.
 * Called again with the same key and the same answers (a double press, a retry, a page gone back to), it makes no
 * second sheet and gives back the first.
 * @param key any text that stays the same for one filled-in form; without it every call makes a sheet
 * @throws Fault bad_input with a sentence for each answer that needs putting right
 */
export function saveSheet(context: Context, { answers, key }: { answers: AnswersInput; key?: string }): SavedSheet {
  return keepAsSheet(context, reckon(context, answers), key)
}

/** Keeps what was already reckoned as revision A of a new sheet. */
export function keepAsSheet({ db, now }: Context, reckoned: Reckoned, key?: string): SavedSheet {
  const requestKey = key ? requestKeyOf(key, reckoned.answers) : null
  return db.transaction(
    (tx) => {
      const made = requestKey && tx.select({ number: sheets.number, code: sheets.code }).from(sheets).where(eq(sheets.requestKey, requestKey)).get()
      if (made) return made
      const last = tx.select({ number: max(sheets.number) }).from(sheets).get()?.number
      const sheet = { id: newId('sht'), number: last ? last + 1 : FIRST_NUMBER, code: newSheetCode(), requestKey, createdAt: now }
      tx.insert(sheets).values(sheet).run()
      insertRevision(tx, sheet.id, FIRST_LETTER, reckoned, now)
      return { number: sheet.number, code: sheet.code }
    },
    // Takes the write lock at once: two presses at the same moment queue up instead of both reading first.
    { behavior: 'immediate' },
  )
}
