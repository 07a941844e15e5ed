import 'server-only'
import { eq } from 'drizzle-orm'
import { sheets } from '@/db/schema/setups'
import { can } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { addRevision } from '@/lib/setups/add-revision'
import { saveSheet } from '@/lib/setups/save-sheet'
import type { AnswersInput } from '@/lib/setups/schema'
import { placeChosen } from './place'

/**
 * Keeps a filled-in check: as the next revision of the sheet whose answers were changed, or as a sheet of its own where
 * there is none or it cannot be changed. For someone with a shelf it stands beside the unit and cartridge they chose.
 * @param key stays the same for one filled-in form
 * @throws Fault bad_input with a sentence for each answer that needs putting right
 */
export function keepCheck(context: Context, { answers: { sheet, ...answers }, key }: { answers: AnswersInput; key?: string }): { code: string } {
  const place = placeChosen(context, answers)
  if (sheet) {
    try {
      return addRevision(context, sheet, () => answers, (tx, row) => {
        if (!can(context.actor, 'sheet:place', row)) return
        const chosen = { ...(place.unitId && { unitId: place.unitId }), ...(place.cartridgeId && { cartridgeId: place.cartridgeId }) }
        if (Object.keys(chosen).length > 0) tx.update(sheets).set(chosen).where(eq(sheets.id, row.id)).run()
      })
    } catch (trouble) {
      // Gone, full, or someone else's to change.
      if (!(trouble instanceof Fault) || trouble.code === 'bad_input') throw trouble
    }
  }
  return saveSheet(context, { answers, key, place })
}
