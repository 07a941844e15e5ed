import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { enqueue } from '@/lib/mail/enqueue'
import { env } from '@/lib/server/env'
import { countAttempt, LIMITS } from './attempts'
import type { Origin } from './origin'
import { hashPassword, judgePassword } from './passwords'
import { addressKey, personByAddress } from './people'
import type { JoinInput } from './schema'
import { issueLink } from './tokens'

/**
 * Sends a mail to the address that someone wants to join with. The account is made when that mail's link is followed
 * and the password typed once more, so nobody can take an address that is not theirs, nor put a password on an account
 * that somebody else then confirms. An address that has an account gets a mail that says so: the answer here is the same.
 * @throws Fault bad_input for a password that is too common; too_many
 */
export async function join({ db, now }: Context, { name, email, password }: JoinInput, origin: Origin) {
  countAttempt(db, LIMITS.mailFromOrigin, origin.address, now)
  judgePassword(password, { email, name })
  countAttempt(db, LIMITS.mailToAddress, addressKey(email), now)
  // Hashed before it is known whether it will be kept, so that both ways take as long.
  const passwordHash = await hashPassword(password)
  db.transaction((tx) => {
    const known = personByAddress(tx, email)
    if (known) {
      const props = { link: `${env().publicAddress}/sign-in`, resetLink: `${env().publicAddress}/reset-password` }
      enqueue(tx, { template: 'already-joined', to: known.email, now, props })
    } else {
      const { goodUntil, ...props } = issueLink(tx, { purpose: 'confirm', email, name, passwordHash }, now)
      enqueue(tx, { template: 'confirm', to: email, now, goodUntil, props })
    }
  })
}
