import 'server-only'
import { eq } from 'drizzle-orm'
import { people } from '@/db/schema/accounts'
import type { Context } from '@/lib/kernel/context'
import { mustBeSelf } from './self'
import type { ChangeNameInput } from './schema'

/** What someone is called. @throws Fault sign_in, not_allowed */
export function changeName({ db, actor }: Context, { name }: ChangeNameInput) {
  db.transaction((tx) => {
    const person = mustBeSelf(tx, actor, 'account:change')
    tx.update(people).set({ name }).where(eq(people.id, person.id)).run()
  })
}
