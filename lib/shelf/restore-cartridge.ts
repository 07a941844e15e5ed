import 'server-only'
import { eq } from 'drizzle-orm'
import { ownedCartridges } from '@/db/schema/shelf'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { cartridgeById } from './rows'
import type { CartridgeInput } from './schema'

/** Brings back a cartridge that was put away. @throws Fault not_found */
export function restoreCartridge({ db, actor }: Context, { cartridgeId }: CartridgeInput): { id: string } {
  return db.transaction((tx) => {
    const { id } = permit(actor, 'cartridge:remove', cartridgeById(tx, cartridgeId))
    tx.update(ownedCartridges).set({ archivedAt: null }).where(eq(ownedCartridges.id, id)).run()
    return { id }
  })
}
