import 'server-only'
import { and, eq, isNull, ne } from 'drizzle-orm'
import type { Transaction } from '@/db/client'
import { people } from '@/db/schema/accounts'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { enqueue } from '@/lib/mail/enqueue'
import { env } from '@/lib/server/env'
import { mustBeSelf } from './self'
import { DELETION_WAITS_MS } from './terms'

/**
 * Marks one's account to be deleted in a week, and says so by mail. Until then it works as before, and the mark can be
 * taken back. Asking again changes nothing.
 * @throws Fault sign_in, not_allowed; conflict for the only admin
 */
export function askForDeletion({ db, actor, now }: Context) {
  db.transaction(
    (tx) => {
      const person = mustBeSelf(tx, actor, 'account:delete')
      if (person.deletionAskedAt !== null) return
      if (person.role === 'admin' && !hasOtherAdmin(tx, person.id)) {
        throw new Fault('conflict', 'You are the only admin. Make someone else admin first.')
      }
      tx.update(people).set({ deletionAskedAt: now }).where(eq(people.id, person.id)).run()
      const props = { link: `${env().publicAddress}/account`, deletesAt: now + DELETION_WAITS_MS }
      enqueue(tx, { template: 'deletion-asked', to: person.email, now, props })
    },
    { behavior: 'immediate' },
  )
}

/** One who stays: neither closed nor about to go. */
function hasOtherAdmin(tx: Transaction, id: string): boolean {
  const other = and(eq(people.role, 'admin'), ne(people.id, id), isNull(people.disabledAt), isNull(people.deletionAskedAt))
  return tx.select({ id: people.id }).from(people).where(other).get() !== undefined
}
