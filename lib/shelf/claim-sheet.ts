import 'server-only'
import { and, eq, isNull } from 'drizzle-orm'
import { sheets } from '@/db/schema/setups'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import type { MatchInputs } from '@/lib/match/inputs'
import { revisionOf, sheetByCode } from '@/lib/setups/rows'
import type { AnswersInput } from '@/lib/setups/schema'
import { fromStored } from '@/lib/setups/stored'
import { placeGuessed } from './place'
import type { ClaimSheetInput } from './schema'

/**
 * Puts a sheet that nobody keeps on one's own shelf, by its code, beside the unit and the cartridge that it is about
 * where that is plain. Of two who do so at the same moment, one gets it. Doing it again changes nothing.
 * @throws Fault not_found; sign_in; conflict when someone else keeps it
 */
export function claimSheet({ db, actor }: Context, { sheet: code }: ClaimSheetInput): { number: number } {
  return db.transaction(
    (tx) => {
      const row = sheetByCode(tx, code)
      if (actor.kind === 'person' && row.ownerId === actor.id) return { number: row.number }
      if (actor.kind === 'person' && row.ownerId !== null) {
        throw new Fault('conflict', 'Someone keeps this sheet already. You can start one of your own from it.')
      }
      const sheet = permit(actor, 'sheet:keep', row)
      const revision = revisionOf(tx, sheet.id)
      const { preamp, cartridge } = fromStored<MatchInputs>(revision.inputs)
      const { board, cart } = fromStored<AnswersInput>(revision.answers)
      const place = placeGuessed(
        { db: tx, actor },
        { modelId: preamp.modelId, boardId: board ? preamp.boardId : undefined, cartridgeName: cartridge.name.trim(), catalogueId: cart || undefined },
      )
      const ownerId = actor.kind === 'person' ? actor.id : null
      tx.update(sheets).set({ ownerId, ...place }).where(and(eq(sheets.id, sheet.id), isNull(sheets.ownerId))).run()
      return { number: sheet.number }
    },
    // The one who comes second reads after the first has written.
    { behavior: 'immediate' },
  )
}
