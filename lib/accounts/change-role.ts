import 'server-only'
import { eq } from 'drizzle-orm'
import { people } from '@/db/schema/accounts'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { mustBePerson } from './people'
import type { ChangeRoleInput } from './schema'
import { endSessionsOf } from './sessions'
import { voidLinksOf } from './tokens'

/**
 * Makes someone owner, staff or admin. Their sessions end, since a session lasts as long as the role it began with
 * allows; invitations they sent as an admin do not hold any more.
 * @throws Fault sign_in, not_found, not_allowed
 */
export function changeRole({ db, actor, now }: Context, { personId, role }: ChangeRoleInput) {
  permit(actor, 'people:read')
  db.transaction(
    (tx) => {
      const person = permit(actor, 'person:change-role', mustBePerson(tx, personId))
      if (person.role === role) return
      tx.update(people).set({ role }).where(eq(people.id, person.id)).run()
      endSessionsOf(tx, person.id, now)
      voidLinksOf(tx, person.id, now)
    },
    { behavior: 'immediate' },
  )
}
