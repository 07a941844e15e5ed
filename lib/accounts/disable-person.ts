import 'server-only'
import { eq } from 'drizzle-orm'
import { people } from '@/db/schema/accounts'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { mustBePerson } from './people'
import type { PersonInput } from './schema'
import { endSessionsOf } from './sessions'
import { voidLinksOf, voidLinks } from './tokens'

/**
 * Closes someone's account at once: their sessions end, and no link on its way opens anything. What they own stays.
 * @throws Fault sign_in, not_found, not_allowed
 */
export function disablePerson({ db, actor, now }: Context, { personId }: PersonInput) {
  permit(actor, 'people:read')
  db.transaction(
    (tx) => {
      const person = permit(actor, 'person:disable', mustBePerson(tx, personId))
      tx.update(people).set({ disabledAt: person.disabledAt ?? now }).where(eq(people.id, person.id)).run()
      endSessionsOf(tx, person.id, now)
      voidLinksOf(tx, person.id, now)
      voidLinks(tx, ['link'], person.email, now)
    },
    { behavior: 'immediate' },
  )
}
