import 'server-only'
import type { Database, Transaction } from '@/db/client'
import type { Actor } from '@/lib/access/actor'
import { Fault } from '@/lib/kernel/errors'
import { countAttempt, forgetAttempts, LIMITS } from './attempts'
import { mustBeOpen, mustBePerson, type Person } from './people'
import { completeSession, sessionById, type OpenedSession } from './sessions'

const LOST = 'Sign in again first: the code has to come within ten minutes.'

/**
 * Finishes a sign-in that still owes its second half.
 * @param prove whether what was typed is right; runs inside the transaction, so that a code is used up or not at all
 * @throws Fault sign_in when no sign-in waits for a code; bad_input when it is not right; too_many
 */
export function finishSignIn(
  { db, actor, now }: { db: Database; actor: Actor; now: number },
  { prove, wrong }: { prove: (tx: Transaction, person: Person) => boolean; wrong: string },
): OpenedSession {
  const waiting = actor.kind === 'visitor' ? actor.awaitsCode : undefined
  if (!waiting) throw new Fault('sign_in', LOST)
  countAttempt(db, LIMITS.codeForAccount, waiting.personId, now)
  return db.transaction(
    (tx) => {
      const session = sessionById(tx, waiting.sessionId)
      if (!session || session.endedAt !== null || session.completedAt !== null) throw new Fault('sign_in', LOST)
      const person = mustBePerson(tx, session.personId)
      mustBeOpen(person)
      if (!prove(tx, person)) throw new Fault('bad_input', wrong, { fields: { code: wrong } })
      completeSession(tx, person, session, now)
      forgetAttempts(tx, LIMITS.codeForAccount, person.id)
      return { sessionId: session.id, expiresAt: session.expiresAt, codeAwaited: false }
    },
    { behavior: 'immediate' },
  )
}
