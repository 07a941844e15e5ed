import 'server-only'
import { eq } from 'drizzle-orm'
import type { Database } from '@/db/client'
import { people, sessions } from '@/db/schema/accounts'
import { VISITOR, type Actor } from '@/lib/access/actor'
import type { Milliseconds } from '@/lib/kernel/clock'
import { hasSecondFactor } from './second-factor'
import { SECOND_FACTOR_WAITS_MS } from './terms'

/** Being seen is written down at most this often. */
const SEEN_EVERY_MS = 5 * 60_000

/**
 * Who a session says someone is, at this moment: asked anew with every request, so that ending it, disabling its person
 * or changing their role works at once.
 */
export function actorOfSession(db: Database, sessionId: string, now: Milliseconds): Actor {
  const found = db.select().from(sessions).innerJoin(people, eq(people.id, sessions.personId)).where(eq(sessions.id, sessionId)).get()
  if (!found) return VISITOR
  const { sessions: session, people: person } = found
  if (session.endedAt !== null || session.expiresAt <= now || person.disabledAt !== null) return VISITOR
  if (session.completedAt === null) {
    const waits = session.createdAt + SECOND_FACTOR_WAITS_MS > now
    return waits ? { ...VISITOR, awaitsCode: { personId: person.id, sessionId } } : VISITOR
  }
  if (session.lastSeenAt + SEEN_EVERY_MS <= now) db.update(sessions).set({ lastSeenAt: now }).where(eq(sessions.id, sessionId)).run()
  return {
    kind: 'person',
    id: person.id,
    role: person.role,
    name: person.name,
    sessionId,
    disabled: false,
    mustSetUpSecondFactor: person.role === 'admin' && !hasSecondFactor(db, person.id),
  }
}
