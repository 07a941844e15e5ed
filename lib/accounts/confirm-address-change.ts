import 'server-only'
import { and, eq, inArray, isNull, ne } from 'drizzle-orm'
import type { Transaction } from '@/db/client'
import { oneTimeTokens, people } from '@/db/schema/accounts'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { enqueue } from '@/lib/mail/enqueue'
import { countAttempt, LIMITS } from './attempts'
import type { Origin } from './origin'
import { addressKey, mustBeOpen, personByAddress, personById } from './people'
import type { LinkInput } from './schema'
import { takeLink, voidLinks, type TokenRow } from './tokens'

export interface AddressChange {
  /** False while the other end has yet to say yes. */
  done: boolean
  newAddress: string
}

/**
 * Says yes at one end of a change of address. The second yes makes the change and tells both ends.
 * @throws Fault conflict for a link that is used or has run out, and for an address that has an account; not_found, too_many
 */
export function confirmAddressChange({ db, now }: Context, { end, token }: LinkInput & { end: 'old' | 'new' }, origin: Origin): AddressChange {
  countAttempt(db, LIMITS.tokenFromOrigin, origin.address, now)
  return db.transaction(
    (tx) => {
      const used = takeLink(tx, `change-address-${end}`, token, now)
      if (otherEndWaits(tx, used)) return { done: false, newAddress: used.email }
      const person = used.personId ? personById(tx, used.personId) : undefined
      if (!person) throw new Fault('not_found', 'The account that this link was for is gone.')
      mustBeOpen(person)
      if (personByAddress(tx, used.email)) {
        throw new Fault('conflict', 'The new address has an account of its own. Delete that one first, or choose another address.')
      }
      tx.update(people).set({ email: used.email, emailKey: addressKey(used.email), emailConfirmedAt: now }).where(eq(people.id, person.id)).run()
      // What was sent to the old mailbox must not open the account any more; other changes began from there as well.
      voidLinks(tx, ['link', 'reset'], person.email, now)
      voidOtherChanges(tx, used, now)
      for (const side of ['old', 'new'] as const) {
        const props = { end: side, oldAddress: person.email, newAddress: used.email }
        enqueue(tx, { template: 'address-changed', to: side === 'old' ? person.email : used.email, now, props })
      }
      return { done: true, newAddress: used.email }
    },
    { behavior: 'immediate' },
  )
}

function otherEndWaits(tx: Transaction, { pair, hash }: TokenRow): boolean {
  if (!pair) return false
  const waiting = and(eq(oneTimeTokens.pair, pair), ne(oneTimeTokens.hash, hash), isNull(oneTimeTokens.usedAt))
  return tx.select({ hash: oneTimeTokens.hash }).from(oneTimeTokens).where(waiting).get() !== undefined
}

function voidOtherChanges(tx: Transaction, { personId }: TokenRow, now: number) {
  if (!personId) return
  tx.update(oneTimeTokens)
    .set({ usedAt: now })
    .where(
      and(
        eq(oneTimeTokens.personId, personId),
        inArray(oneTimeTokens.purpose, ['change-address-old', 'change-address-new']),
        isNull(oneTimeTokens.usedAt),
      ),
    )
    .run()
}
