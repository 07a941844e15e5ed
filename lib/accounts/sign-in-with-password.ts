import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { countAttempt, forgetAttempts, LIMITS } from './attempts'
import type { Origin } from './origin'
import { passwordIs } from './passwords'
import { addressKey, mustBeOpen, personByAddress } from './people'
import type { SignInInput } from './schema'
import { openSession, type OpenedSession } from './sessions'

const WRONG = 'This address and this password do not belong together. Try again, or have a link sent.'
const wrong = () => new Fault('bad_input', WRONG, { fields: { password: WRONG } })

/**
 * Opens a session for someone who knows their password. Whether there is no such account, none with a password, or
 * another password: the answer is the same and takes as long.
 * @throws Fault bad_input, too_many; not_allowed for someone whose account was closed and who knows its password
 */
export async function signInWithPassword({ db, now }: Context, { email, password }: SignInInput, origin: Origin): Promise<OpenedSession> {
  const whom = addressKey(email)
  countAttempt(db, LIMITS.passwordFromOrigin, origin.address, now)
  countAttempt(db, LIMITS.passwordForAccount, whom, now)
  const hash = personByAddress(db, email)?.passwordHash
  if (!(await passwordIs(hash, password))) throw wrong()
  return db.transaction(
    (tx) => {
      const person = personByAddress(tx, email)
      // Changed or deleted while the password was being looked at.
      if (!person || person.passwordHash !== hash) throw wrong()
      mustBeOpen(person)
      forgetAttempts(tx, LIMITS.passwordForAccount, whom)
      return openSession(tx, person, { way: 'password', origin }, now)
    },
    { behavior: 'immediate' },
  )
}
