import 'server-only'
import { eq, max } from 'drizzle-orm'
import { sheets } from '@/db/schema/setups'
import { can } from '../access/permit'
import type { Context } from '../kernel/context'
import { newId } from '../kernel/ids'
import { newSheetCode } from './codes'
import { reckon, requestKeyOf, type Reckoned } from './reckon'
import { headOf, insertRevision } from './rows'
import type { AnswersInput } from './schema'

/** Numbers are said on the phone: the first has four figures. */
const FIRST_NUMBER = 1001
const FIRST_LETTER = 'A'

export interface SavedSheet {
  number: number
  code: string
}

/** Which of its owner's units and cartridges a sheet is about; null where it is about none of them, or nobody knows. */
export interface SheetPlace {
  unitId: string | null
  cartridgeId: string | null
}
const NOWHERE: SheetPlace = { unitId: null, cartridgeId: null }

/**
 * Checks the answers and keeps the result as revision A of a new sheet.
 * Called again with the same key and the same answers (a double press, a retry, a page gone back to), it makes no
 * second sheet and gives back the first. It belongs to whoever is signed in.
 * @param key any text that stays the same for one filled-in form; without it every call makes a sheet
 * @param place things of the same person's
 * @throws Fault bad_input with a sentence for each answer that needs putting right
 */
export function saveSheet(context: Context, { answers, key, place }: { answers: AnswersInput; key?: string; place?: SheetPlace }): SavedSheet {
  return keepAsSheet(context, reckon(context, answers), { key, place })
}

/** Keeps what was already reckoned as revision A of a new sheet. */
export function keepAsSheet({ db, actor, now }: Context, reckoned: Reckoned, { key, place = NOWHERE }: { key?: string; place?: SheetPlace } = {}): SavedSheet {
  const ownerId = actor.kind === 'person' && can(actor, 'shelf:read') ? actor.id : null
  const requestKey = key ? requestKeyOf(key, reckoned.answers) : null
  return db.transaction(
    (tx) => {
      const made = requestKey && tx.select({ number: sheets.number, code: sheets.code }).from(sheets).where(eq(sheets.requestKey, requestKey)).get()
      if (made) return made
      const last = tx.select({ number: max(sheets.number) }).from(sheets).get()?.number
      const number = last ? last + 1 : FIRST_NUMBER
      const sheet = tx
        .insert(sheets)
        .values({ id: newId('sht'), number, code: newSheetCode(), ownerId, ...place, ...headOf(reckoned, FIRST_LETTER, now), requestKey, createdAt: now })
        .returning()
        .get()
      insertRevision(tx, sheet, FIRST_LETTER, reckoned, now)
      return { number: sheet.number, code: sheet.code }
    },
    // Takes the write lock at once: two presses at the same moment queue up instead of both reading first.
    { behavior: 'immediate' },
  )
}
