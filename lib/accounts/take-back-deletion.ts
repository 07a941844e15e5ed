import 'server-only'
import { eq } from 'drizzle-orm'
import { people } from '@/db/schema/accounts'
import type { Context } from '@/lib/kernel/context'
import { mustBeSelf } from './self'

/** Keeps an account that was to be deleted. @throws Fault sign_in, not_allowed */
export function takeBackDeletion({ db, actor }: Context) {
  db.transaction((tx) => {
    const person = mustBeSelf(tx, actor, 'account:delete')
    tx.update(people).set({ deletionAskedAt: null }).where(eq(people.id, person.id)).run()
  })
}
