import 'server-only'
import { eq } from 'drizzle-orm'
import { ownedCartridges } from '@/db/schema/shelf'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { cartridgeById } from './rows'
import type { AddHoursInput } from './schema'
import { MAX_STYLUS_HOURS } from './terms'

const inTenths = (hours: number) => Math.round(hours * 10) / 10

/**
 * Adds playing hours to a stylus. Pressing twice adds once: the form says what it counted from.
 * @throws Fault not_found; bad_input beyond what any stylus lasts; conflict when it was counted elsewhere meanwhile
 */
export function addHours({ db, actor }: Context, { cartridgeId, hours, counted }: AddHoursInput): { id: string } {
  return db.transaction((tx) => {
    const cartridge = permit(actor, 'cartridge:change', cartridgeById(tx, cartridgeId))
    const total = inTenths((counted ?? 0) + hours)
    if (cartridge.stylusHours === total && total !== counted) return { id: cartridge.id }
    if (cartridge.stylusHours !== counted) throw new Fault('conflict', 'The hours were changed in another window. Look at them, then add yours.')
    if (total > MAX_STYLUS_HOURS) {
      const words = `That comes to ${total} hours, and no stylus lasts that long.`
      throw new Fault('bad_input', words, { fields: { hours: words } })
    }
    tx.update(ownedCartridges).set({ stylusHours: total }).where(eq(ownedCartridges.id, cartridge.id)).run()
    return { id: cartridge.id }
  })
}
