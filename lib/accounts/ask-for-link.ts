import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { enqueue } from '@/lib/mail/enqueue'
import { countAttempt, LIMITS } from './attempts'
import type { Origin } from './origin'
import { addressKey } from './people'
import type { AddressInput } from './schema'
import { issueLink } from './tokens'

/**
 * Sends a link that signs in whoever has the mailbox. It is sent to every address alike: where there is no account yet,
 * following it makes one.
 * @throws Fault too_many
 */
export function askForLink({ db, now }: Context, { email }: AddressInput, origin: Origin) {
  countAttempt(db, LIMITS.mailFromOrigin, origin.address, now)
  countAttempt(db, LIMITS.mailToAddress, addressKey(email), now)
  db.transaction((tx) => {
    const { goodUntil, ...props } = issueLink(tx, { purpose: 'link', email }, now)
    enqueue(tx, { template: 'link', to: email, now, goodUntil, props })
  })
}
