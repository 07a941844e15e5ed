import 'server-only'
import { and, eq, ne } from 'drizzle-orm'
import { secondFactors } from '@/db/schema/accounts'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { countAttempt, forgetAttempts, LIMITS } from './attempts'
import { renewRecoveryCodes } from './recovery-codes'
import type { CodeInput } from './schema'
import { pendingFactor, takeCode } from './second-factor'
import { mustBeSelf } from './self'
import { endSessionsOf } from './sessions'

const WRONG = 'That code does not fit. The app shows a new one every half minute; its clock has to be right.'

/**
 * Takes the first code of an authenticator app: from now on it is asked for. Sessions that began without it end.
 * @returns new recovery codes, shown this once
 * @throws Fault sign_in, not_allowed, bad_input, too_many; conflict when none is being set up
 */
export function confirmSecondFactor({ db, actor, now }: Context, { code }: CodeInput): { recoveryCodes: string[] } {
  const { id } = mustBeSelf(db, actor, 'account:set-up-second-factor')
  countAttempt(db, LIMITS.codeForAccount, id, now)
  return db.transaction(
    (tx) => {
      const person = mustBeSelf(tx, actor, 'account:set-up-second-factor')
      const pending = pendingFactor(tx, person.id)
      if (!pending) throw new Fault('conflict', 'Begin again: no authenticator is being set up in this account.')
      if (!takeCode(tx, pending, code, now)) throw new Fault('bad_input', WRONG, { fields: { code: WRONG } })
      tx.delete(secondFactors).where(and(eq(secondFactors.personId, person.id), ne(secondFactors.id, pending.id))).run()
      tx.update(secondFactors).set({ confirmedAt: now }).where(eq(secondFactors.id, pending.id)).run()
      endSessionsOf(tx, person.id, now, { except: actor.kind === 'person' ? actor.sessionId : undefined })
      forgetAttempts(tx, LIMITS.codeForAccount, person.id)
      return { recoveryCodes: renewRecoveryCodes(tx, person.id, now) }
    },
    { behavior: 'immediate' },
  )
}
