import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { countAttempt, LIMITS } from './attempts'
import type { Origin } from './origin'
import { insertPerson, mustBeOpen, personByAddress } from './people'
import type { LinkInput } from './schema'
import { openSession, type OpenedSession } from './sessions'
import { takeLink, voidLinks } from './tokens'

/**
 * Opens a session for whoever holds a link, and makes the account where there was none. Once it has one, what others may
 * have asked for in the name of this address is void, a password chosen while joining included.
 * @throws Fault conflict for a link that is used or has run out, not_found, too_many; not_allowed for a closed account
 */
export function signInWithLink({ db, now }: Context, { token }: LinkInput, origin: Origin): OpenedSession {
  countAttempt(db, LIMITS.tokenFromOrigin, origin.address, now)
  return db.transaction(
    (tx) => {
      const { email } = takeLink(tx, 'link', token, now)
      const known = personByAddress(tx, email)
      if (known) mustBeOpen(known)
      voidLinks(tx, known ? ['link'] : ['link', 'confirm'], email, now)
      const person = known ?? insertPerson(tx, { email, name: nameFrom(email), role: 'owner', passwordHash: null }, now)
      return openSession(tx, person, { way: 'link', origin }, now)
    },
    { behavior: 'immediate' },
  )
}

/** Something to be called by until they say: the part before the @. */
function nameFrom(email: string): string {
  return email.split('@')[0]
}
