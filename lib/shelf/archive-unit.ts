import 'server-only'
import { and, eq, isNull } from 'drizzle-orm'
import { units } from '@/db/schema/shelf'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { unitById } from './rows'
import type { UnitInput } from './schema'

/** Puts a unit away: it is offered nowhere any more, and its sheets stay. @throws Fault not_found */
export function archiveUnit({ db, actor, now }: Context, { unitId }: UnitInput): { id: string } {
  return db.transaction((tx) => {
    const unit = permit(actor, 'unit:remove', unitById(tx, unitId))
    tx.update(units).set({ archivedAt: now }).where(and(eq(units.id, unit.id), isNull(units.archivedAt))).run()
    return { id: unit.id }
  })
}
