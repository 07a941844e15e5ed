import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { newId } from '@/lib/kernel/ids'
import { enqueue } from '@/lib/mail/enqueue'
import { countAttempt, LIMITS } from './attempts'
import type { Origin } from './origin'
import { addressKey } from './people'
import type { AddressInput } from './schema'
import { mustBeSelf } from './self'
import { issueLink } from './tokens'

/**
 * Sends a link to the old address and one to the new. Both have to be followed: whoever sits at someone else's open
 * session cannot take the account away, and nobody moves it to a mailbox that is not theirs.
 * Whether the new address has an account is not said here, only to whoever follows the link in its mailbox.
 * @throws Fault bad_input for the present address, too_many, sign_in, not_allowed
 */
export function askToChangeAddress({ db, actor, now }: Context, { email }: AddressInput, origin: Origin) {
  const { emailKey } = mustBeSelf(db, actor, 'account:change')
  if (emailKey === addressKey(email)) {
    const sentence = 'That is your address already.'
    throw new Fault('bad_input', sentence, { fields: { email: sentence } })
  }
  countAttempt(db, LIMITS.mailFromOrigin, origin.address, now)
  countAttempt(db, LIMITS.mailToAddress, addressKey(email), now)
  countAttempt(db, LIMITS.mailToAddress, emailKey, now)
  db.transaction((tx) => {
    const person = mustBeSelf(tx, actor, 'account:change')
    const shared = { email, personId: person.id, pair: newId('pair') }
    const addresses = { oldAddress: person.email, newAddress: email }
    for (const end of ['old', 'new'] as const) {
      const { goodUntil, ...link } = issueLink(tx, { purpose: `change-address-${end}`, ...shared }, now)
      const to = end === 'old' ? person.email : email
      enqueue(tx, { template: 'change-address', to, now, goodUntil, props: { end, ...addresses, ...link } })
    }
  })
}
