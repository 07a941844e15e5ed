import 'server-only'
import { eq } from 'drizzle-orm'
import { sheets } from '@/db/schema/setups'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { ownSheet } from './rows'
import type { NameSheetInput } from './schema'

/** Gives a sheet a name, or takes it away. Only its owner sees it. @throws Fault not_found */
export function nameSheet({ db, actor }: Context, { number, name }: NameSheetInput): { number: number } {
  return db.transaction((tx) => {
    const sheet = permit(actor, 'sheet:name', ownSheet(tx, actor, number))
    tx.update(sheets).set({ name: name || null }).where(eq(sheets.id, sheet.id)).run()
    return { number }
  })
}
