import 'server-only'
import { eq } from 'drizzle-orm'
import { people } from '@/db/schema/accounts'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { countAttempt, forgetAttempts, LIMITS } from './attempts'
import { hashPassword, judgePassword, passwordIs } from './passwords'
import type { ChangePasswordInput } from './schema'
import { mustBeSelf } from './self'
import { endSessionsOf } from './sessions'
import { voidLinks } from './tokens'

const WRONG = 'That is not your present password.'

/**
 * Another password, or a first one for someone who signs in by link. All other sessions end, and links on their way too.
 * @throws Fault bad_input, too_many, sign_in, not_allowed; conflict when it was changed elsewhere at the same time
 */
export async function changePassword({ db, actor, now }: Context, { present, password }: ChangePasswordInput) {
  const person = mustBeSelf(db, actor, 'account:change')
  if (person.passwordHash !== null) {
    countAttempt(db, LIMITS.passwordForAccount, person.emailKey, now)
    if (!(await passwordIs(person.passwordHash, present))) throw new Fault('bad_input', WRONG, { fields: { present: WRONG } })
  }
  judgePassword(password, person)
  const passwordHash = await hashPassword(password)
  db.transaction(
    (tx) => {
      const known = mustBeSelf(tx, actor, 'account:change')
      if (known.passwordHash !== person.passwordHash) {
        throw new Fault('conflict', 'Your password was changed in another window meanwhile. Start again with that one.')
      }
      tx.update(people).set({ passwordHash }).where(eq(people.id, known.id)).run()
      voidLinks(tx, ['reset', 'link'], known.email, now)
      forgetAttempts(tx, LIMITS.passwordForAccount, known.emailKey)
      endSessionsOf(tx, known.id, now, { except: actor.kind === 'person' ? actor.sessionId : undefined })
    },
    { behavior: 'immediate' },
  )
}
