import 'server-only'
import { and, eq, isNull } from 'drizzle-orm'
import { sheets } from '@/db/schema/setups'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { ownSheet } from './rows'
import type { SheetInput } from './schema'

/** Puts a sheet away. Its code, and every link and print with it, opens nothing until it is brought back. @throws Fault not_found */
export function archiveSheet({ db, actor, now }: Context, { number }: SheetInput): { number: number } {
  return db.transaction((tx) => {
    const { id } = permit(actor, 'sheet:archive', ownSheet(tx, actor, number))
    tx.update(sheets).set({ archivedAt: now }).where(and(eq(sheets.id, id), isNull(sheets.archivedAt))).run()
    return { number }
  })
}
