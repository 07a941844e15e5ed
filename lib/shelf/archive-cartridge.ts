import 'server-only'
import { and, eq, isNull } from 'drizzle-orm'
import { ownedCartridges } from '@/db/schema/shelf'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { cartridgeById } from './rows'
import type { CartridgeInput } from './schema'

/** Puts a cartridge away: it is offered nowhere any more, and its sheets stay. @throws Fault not_found */
export function archiveCartridge({ db, actor, now }: Context, { cartridgeId }: CartridgeInput): { id: string } {
  return db.transaction((tx) => {
    const { id } = permit(actor, 'cartridge:remove', cartridgeById(tx, cartridgeId))
    tx.update(ownedCartridges).set({ archivedAt: now }).where(and(eq(ownedCartridges.id, id), isNull(ownedCartridges.archivedAt))).run()
    return { id }
  })
}
