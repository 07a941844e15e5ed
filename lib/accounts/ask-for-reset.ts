import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { enqueue } from '@/lib/mail/enqueue'
import { countAttempt, LIMITS } from './attempts'
import type { Origin } from './origin'
import { addressKey, personByAddress } from './people'
import type { AddressInput } from './schema'
import { issueLink } from './tokens'

/**
 * Sends a link to choose a new password, where the address has an account that is open. The answer never says whether.
 * @throws Fault too_many
 */
export function askForReset({ db, now }: Context, { email }: AddressInput, origin: Origin) {
  countAttempt(db, LIMITS.mailFromOrigin, origin.address, now)
  countAttempt(db, LIMITS.mailToAddress, addressKey(email), now)
  db.transaction((tx) => {
    const person = personByAddress(tx, email)
    if (!person || person.disabledAt !== null) return
    const { goodUntil, ...props } = issueLink(tx, { purpose: 'reset', email: person.email, personId: person.id }, now)
    enqueue(tx, { template: 'reset', to: person.email, now, goodUntil, props })
  })
}
