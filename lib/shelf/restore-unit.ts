import 'server-only'
import { eq } from 'drizzle-orm'
import { units } from '@/db/schema/shelf'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { unitById } from './rows'
import type { UnitInput } from './schema'

/** Brings back a unit that was put away. @throws Fault not_found */
export function restoreUnit({ db, actor }: Context, { unitId }: UnitInput): { id: string } {
  return db.transaction((tx) => {
    const unit = permit(actor, 'unit:remove', unitById(tx, unitId))
    tx.update(units).set({ archivedAt: null }).where(eq(units.id, unit.id)).run()
    return { id: unit.id }
  })
}
