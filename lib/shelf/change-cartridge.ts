import 'server-only'
import { eq } from 'drizzle-orm'
import { ownedCartridges } from '@/db/schema/shelf'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { readCartridge } from './read-cartridge'
import { cartridgeById } from './rows'
import type { ChangeCartridgeInput } from './schema'

/** Changes what is kept of a cartridge. Sheets stay as they were reckoned. @throws Fault not_found; bad_input by field */
export function changeCartridge({ db, actor }: Context, { cartridgeId, ...input }: ChangeCartridgeInput): { id: string } {
  return db.transaction((tx) => {
    const { id } = permit(actor, 'cartridge:change', cartridgeById(tx, cartridgeId))
    tx.update(ownedCartridges).set(readCartridge(input)).where(eq(ownedCartridges.id, id)).run()
    return { id }
  })
}
