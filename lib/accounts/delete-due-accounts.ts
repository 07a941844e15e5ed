import 'server-only'
import { and, eq, lte } from 'drizzle-orm'
import { oneTimeTokens, people } from '@/db/schema/accounts'
import { sheets } from '@/db/schema/setups'
import type { Context } from '@/lib/kernel/context'
import { DELETION_WAITS_MS } from './terms'

/**
 * Deletes the accounts whose week is over, each in a transaction of its own. Sessions, links, authenticators and recovery
 * codes go with the row. Sheets stay under their codes, with no name and nobody's: a printed one still opens.
 * @returns how many went
 */
export function deleteDueAccounts({ db, now }: Pick<Context, 'db' | 'now'>): number {
  const due = () => lte(people.deletionAskedAt, now - DELETION_WAITS_MS)
  const ids = db.select({ id: people.id }).from(people).where(due()).all()
  return ids.filter(({ id }) =>
    db.transaction(
      (tx) => {
        // Asked for again inside: it may have been taken back a moment ago.
        const person = tx.select().from(people).where(and(eq(people.id, id), due())).get()
        if (!person) return false
        tx.update(sheets).set({ ownerId: null, name: null }).where(eq(sheets.ownerId, id)).run()
        tx.delete(oneTimeTokens).where(eq(oneTimeTokens.emailKey, person.emailKey)).run()
        tx.delete(people).where(eq(people.id, id)).run()
        return true
      },
      { behavior: 'immediate' },
    ),
  ).length
}
