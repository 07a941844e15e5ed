import 'server-only'
import { eq } from 'drizzle-orm'
import { people } from '@/db/schema/accounts'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { countAttempt, forgetAttempts, LIMITS } from './attempts'
import type { Origin } from './origin'
import { hashPassword, judgePassword } from './passwords'
import { mustBeOpen, personByAddress } from './people'
import type { ResetPasswordInput } from './schema'
import { endSessionsOf } from './sessions'
import { readLink, takeLink, voidLinks } from './tokens'

/**
 * Puts a new password on the account that a link was sent to, and ends all of its sessions: whoever was in may have been
 * someone else. Signing in comes after, with the second factor where there is one.
 * @throws Fault bad_input for a password that is too common; conflict, not_found for the link; not_allowed, too_many
 */
export async function resetPassword({ db, now }: Context, { token, password }: ResetPasswordInput, origin: Origin) {
  countAttempt(db, LIMITS.tokenFromOrigin, origin.address, now)
  const { state, row } = readLink(db, 'reset', token, now)
  const person = row && state === 'open' ? personByAddress(db, row.email) : undefined
  if (person) judgePassword(password, person)
  const passwordHash = await hashPassword(password)
  db.transaction(
    (tx) => {
      const used = takeLink(tx, 'reset', token, now)
      const known = personByAddress(tx, used.email)
      // The account went, or its address now belongs to another one.
      if (!known || known.id !== used.personId) throw new Fault('not_found', 'The account that this link was for is gone.')
      mustBeOpen(known)
      voidLinks(tx, ['reset', 'link'], used.email, now)
      tx.update(people).set({ passwordHash }).where(eq(people.id, known.id)).run()
      endSessionsOf(tx, known.id, now)
      forgetAttempts(tx, LIMITS.passwordForAccount, known.emailKey)
    },
    { behavior: 'immediate' },
  )
}
