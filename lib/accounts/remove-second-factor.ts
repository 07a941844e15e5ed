import 'server-only'
import { eq } from 'drizzle-orm'
import { secondFactors } from '@/db/schema/accounts'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { countAttempt, forgetAttempts, LIMITS } from './attempts'
import { dropRecoveryCodes } from './recovery-codes'
import { proveSecondFactor } from './prove-second-factor'
import type { ProofInput } from './schema'
import { confirmedFactor } from './second-factor'
import { mustBeSelf } from './self'

const WRONG = 'That code does not fit, or was used already.'

/** Takes the authenticator off one's account, with a code of it. Admins keep theirs. @throws Fault sign_in, not_allowed, bad_input, conflict, too_many */
export function removeSecondFactor({ db, actor, now }: Context, { code }: ProofInput) {
  const { id } = mustBeSelf(db, actor, 'account:remove-second-factor')
  countAttempt(db, LIMITS.codeForAccount, id, now)
  db.transaction(
    (tx) => {
      const person = mustBeSelf(tx, actor, 'account:remove-second-factor')
      const factor = confirmedFactor(tx, person.id)
      if (!factor) throw new Fault('conflict', 'There is no authenticator on this account.')
      if (!proveSecondFactor(tx, factor, code, now)) throw new Fault('bad_input', WRONG, { fields: { code: WRONG } })
      tx.delete(secondFactors).where(eq(secondFactors.personId, person.id)).run()
      dropRecoveryCodes(tx, person.id)
      forgetAttempts(tx, LIMITS.codeForAccount, person.id)
    },
    { behavior: 'immediate' },
  )
}
