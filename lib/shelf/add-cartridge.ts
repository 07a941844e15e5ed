import 'server-only'
import { and, eq, isNull } from 'drizzle-orm'
import { sheets } from '@/db/schema/setups'
import { ownedCartridges } from '@/db/schema/shelf'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { newId } from '@/lib/kernel/ids'
import { sheetByCode } from '@/lib/setups/rows'
import { mustHaveShelf } from './owner'
import { readCartridge } from './read-cartridge'
import { countCartridges } from './rows'
import type { AddCartridgeInput } from './schema'
import { MAX_CARTRIDGES } from './terms'

/**
 * Puts a cartridge on the shelf: out of the catalogue, or as its leaflet was typed in. One that was taken over from one
 * of the owner's sheets belongs to that sheet from then on.
 * @throws Fault sign_in; bad_input by field; not_found for a sheet that is not theirs; conflict when the shelf is full
 */
export function addCartridge({ db, actor, now }: Context, { fromSheet, ...input }: AddCartridgeInput): { id: string } {
  const owner = mustHaveShelf(actor, 'cartridge:add')
  const cartridge = { id: newId('crt'), ownerId: owner.id, ...readCartridge(input), createdAt: now }
  return db.transaction((tx) => {
    if (countCartridges(tx, owner.id) >= MAX_CARTRIDGES) throw new Fault('conflict', `A shelf holds ${MAX_CARTRIDGES} cartridges, and yours is full.`)
    tx.insert(ownedCartridges).values(cartridge).run()
    if (fromSheet) {
      const sheet = permit(actor, 'sheet:place', sheetByCode(tx, fromSheet))
      tx.update(sheets).set({ cartridgeId: cartridge.id }).where(and(eq(sheets.id, sheet.id), isNull(sheets.cartridgeId))).run()
    }
    return { id: cartridge.id }
  })
}
