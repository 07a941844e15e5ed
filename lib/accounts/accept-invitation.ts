import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { countAttempt, LIMITS } from './attempts'
import type { Origin } from './origin'
import { hashPassword, judgePassword } from './passwords'
import { insertPerson, personByAddress, personById } from './people'
import type { AcceptInvitationInput } from './schema'
import { openSession, type OpenedSession } from './sessions'
import { readLink, takeLink, voidLinks } from './tokens'

/**
 * Makes the account that an admin invited someone to, and signs them in.
 * @throws Fault bad_input for a password that is too common; conflict for a link that is used or has run out, an address
 *   that has an account by now, and an invitation whose admin is none any more; not_found, too_many
 */
export async function acceptInvitation({ db, now }: Context, { token, name, password }: AcceptInvitationInput, origin: Origin): Promise<OpenedSession> {
  countAttempt(db, LIMITS.tokenFromOrigin, origin.address, now)
  const { state, row } = readLink(db, 'invite', token, now)
  if (row && state === 'open') judgePassword(password, { email: row.email, name })
  const passwordHash = await hashPassword(password)
  return db.transaction(
    (tx) => {
      const { email, role, personId } = takeLink(tx, 'invite', token, now)
      const inviter = personId ? personById(tx, personId) : undefined
      if (!role || inviter?.role !== 'admin' || inviter.disabledAt !== null) {
        throw new Fault('conflict', 'This invitation does not hold any more. Ask the workshop for a new one.')
      }
      if (personByAddress(tx, email)) {
        throw new Fault('conflict', 'This address has an account already. Ask whoever invited you to change its role.')
      }
      voidLinks(tx, ['link', 'confirm'], email, now)
      return openSession(tx, insertPerson(tx, { email, name, role, passwordHash }, now), { way: 'invitation', origin }, now)
    },
    { behavior: 'immediate' },
  )
}
