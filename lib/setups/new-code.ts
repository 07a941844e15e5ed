import 'server-only'
import { eq } from 'drizzle-orm'
import { sheets } from '@/db/schema/setups'
import { permit } from '../access/permit'
import type { Context } from '../kernel/context'
import { newSheetCode } from './codes'
import { sheetByCode } from './rows'

/**
 * Gives the sheet behind a code another one. From then on the old code, and every link and print with it, opens
 * nothing.
 * @throws Fault not_found; sign_in or not_allowed where an owner keeps it
 */
export function makeNewCode({ db, actor }: Context, { code }: { code: string }): { code: string } {
  return db.transaction(
    (tx) => {
      const sheet = permit(actor, 'sheet:change', sheetByCode(tx, code))
      const fresh = newSheetCode()
      tx.update(sheets).set({ code: fresh }).where(eq(sheets.id, sheet.id)).run()
      return { code: fresh }
    },
    { behavior: 'immediate' },
  )
}
