import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { countAttempt, LIMITS } from './attempts'
import type { Origin } from './origin'
import { passwordIs } from './passwords'
import { insertPerson, personByAddress } from './people'
import type { ConfirmAddressInput } from './schema'
import { openSession, type OpenedSession } from './sessions'
import { readLink, takeLink, voidLinks } from './tokens'

const WRONG = 'That is not the password you chose when you joined. If you did not join, close this page.'

/**
 * Makes the account that someone asked for, once the address has shown to be theirs, and signs them in.
 * @throws Fault bad_input for another password, conflict for a link that is used or has run out, not_found, too_many
 */
export async function confirmAddress({ db, now }: Context, { token, password }: ConfirmAddressInput, origin: Origin): Promise<OpenedSession> {
  countAttempt(db, LIMITS.tokenFromOrigin, origin.address, now)
  const { row } = readLink(db, 'confirm', token, now)
  if (row) countAttempt(db, LIMITS.passwordForAccount, row.emailKey, now)
  const right = await passwordIs(row?.passwordHash, password)
  return db.transaction(
    (tx) => {
      // First what is wrong with the link: with a link that opens nothing, no password is right.
      const used = takeLink(tx, 'confirm', token, now)
      if (!right) throw new Fault('bad_input', WRONG, { fields: { password: WRONG } })
      if (personByAddress(tx, used.email)) throw new Fault('conflict', 'This address has an account already. Sign in.')
      voidLinks(tx, ['confirm', 'link'], used.email, now)
      const person = insertPerson(tx, { email: used.email, name: used.name ?? used.email, role: 'owner', passwordHash: used.passwordHash }, now)
      return openSession(tx, person, { way: 'password', origin }, now)
    },
    { behavior: 'immediate' },
  )
}
