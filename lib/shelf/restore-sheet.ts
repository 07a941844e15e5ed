import 'server-only'
import { eq } from 'drizzle-orm'
import { sheets } from '@/db/schema/setups'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { ownSheet } from './rows'
import type { SheetInput } from './schema'

/** Brings back a sheet that was put away; its code opens it again. @throws Fault not_found */
export function restoreSheet({ db, actor }: Context, { number }: SheetInput): { number: number } {
  return db.transaction((tx) => {
    const { id } = permit(actor, 'sheet:archive', ownSheet(tx, actor, number))
    tx.update(sheets).set({ archivedAt: null }).where(eq(sheets.id, id)).run()
    return { number }
  })
}
