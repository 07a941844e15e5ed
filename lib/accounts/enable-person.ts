import 'server-only'
import { eq } from 'drizzle-orm'
import { people } from '@/db/schema/accounts'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { mustBePerson } from './people'
import type { PersonInput } from './schema'

/** Opens a closed account again. They sign in anew. @throws Fault sign_in, not_found, not_allowed */
export function enablePerson({ db, actor }: Context, { personId }: PersonInput) {
  permit(actor, 'people:read')
  db.transaction((tx) => {
    const person = permit(actor, 'person:enable', mustBePerson(tx, personId))
    tx.update(people).set({ disabledAt: null }).where(eq(people.id, person.id)).run()
  })
}
