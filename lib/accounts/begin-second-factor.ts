import 'server-only'
import { and, eq, isNull } from 'drizzle-orm'
import { secondFactors } from '@/db/schema/accounts'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { newId } from '@/lib/kernel/ids'
import { countAttempt, LIMITS } from './attempts'
import { proveSecondFactor } from './prove-second-factor'
import type { BeginSecondFactorInput } from './schema'
import { confirmedFactor, newSecret, sealSecret } from './second-factor'
import { mustBeSelf } from './self'

const NEEDED = 'Type a new code of the authenticator you have now, or one of your recovery codes.'

/**
 * Makes a secret for an authenticator app. It counts once a code of it has come back; until then the present one does.
 * @throws Fault sign_in, not_allowed; bad_input when the present one's code is wrong or missing; too_many
 */
export function beginSecondFactor({ db, actor, now }: Context, { code }: BeginSecondFactorInput) {
  const { id } = mustBeSelf(db, actor, 'account:set-up-second-factor')
  if (confirmedFactor(db, id)) countAttempt(db, LIMITS.codeForAccount, id, now)
  db.transaction(
    (tx) => {
      const person = mustBeSelf(tx, actor, 'account:set-up-second-factor')
      const present = confirmedFactor(tx, person.id)
      if (present && !(code && proveSecondFactor(tx, present, code, now))) {
        throw new Fault('bad_input', NEEDED, { fields: { code: NEEDED } })
      }
      tx.delete(secondFactors).where(and(eq(secondFactors.personId, person.id), isNull(secondFactors.confirmedAt))).run()
      const sealedSecret = sealSecret(newSecret(), person.id)
      tx.insert(secondFactors).values({ id: newId('fac'), personId: person.id, sealedSecret, lastCounter: 0, createdAt: now }).run()
    },
    { behavior: 'immediate' },
  )
}
