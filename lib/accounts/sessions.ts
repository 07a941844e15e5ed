import 'server-only'
import { and, eq, isNotNull, isNull, lt, ne } from 'drizzle-orm'
import type { Database, Transaction } from '@/db/client'
import { sessions } from '@/db/schema/accounts'
import type { Milliseconds } from '@/lib/kernel/clock'
import { newId } from '@/lib/kernel/ids'
import { enqueue } from '@/lib/mail/enqueue'
import { env } from '@/lib/server/env'
import { deviceWords, shortOrigin, type Origin } from './origin'
import type { Person } from './people'
import { hasSecondFactor } from './second-factor'
import { SESSION_LASTS_MS, type SignInWay } from './terms'

export type SessionRow = typeof sessions.$inferSelect

/** What the cookie and the next page need of a session that was just opened. */
export interface OpenedSession {
  sessionId: string
  expiresAt: Milliseconds
  /** It counts only once the code from the authenticator has come. */
  codeAwaited: boolean
}

/** Opens a session for someone who proved who they are. With a second factor it waits for the code. */
export function openSession(tx: Transaction, person: Person, { way, origin }: { way: SignInWay; origin: Origin }, now: Milliseconds): OpenedSession {
  const codeAwaited = hasSecondFactor(tx, person.id)
  const row = tx
    .insert(sessions)
    .values({
      id: newId('ses'),
      personId: person.id,
      completedAt: codeAwaited ? null : now,
      lastSeenAt: now,
      expiresAt: now + SESSION_LASTS_MS[person.role],
      way,
      device: deviceWords(origin.userAgent),
      origin: shortOrigin(origin.address),
      createdAt: now,
    })
    .returning()
    .get()
  if (!codeAwaited) tellOfNewDevice(tx, person, row, now)
  return { sessionId: row.id, expiresAt: row.expiresAt, codeAwaited }
}

/** The code has come: from now on the session counts. */
export function completeSession(tx: Transaction, person: Person, session: SessionRow, now: Milliseconds) {
  tx.update(sessions).set({ completedAt: now, lastSeenAt: now }).where(eq(sessions.id, session.id)).run()
  tellOfNewDevice(tx, person, session, now)
}

/** A mail when someone comes from a browser that none of their sessions came from. Nobody is told of their first. */
function tellOfNewDevice(tx: Transaction, person: Person, session: SessionRow, now: Milliseconds) {
  const before = tx
    .select({ device: sessions.device })
    .from(sessions)
    .where(and(eq(sessions.personId, person.id), ne(sessions.id, session.id), isNotNull(sessions.completedAt)))
    .all()
  if (session.way === 'invitation' || before.length === 0 || before.some(({ device }) => device === session.device)) return
  const link = `${env().publicAddress}/account`
  enqueue(tx, { template: 'new-sign-in', to: person.email, now, props: { link, at: now, browser: session.device, way: session.way } })
}

export function sessionById(db: Pick<Database, 'select'>, id: string): SessionRow | undefined {
  return db.select().from(sessions).where(eq(sessions.id, id)).get()
}

export function endSessionRow(db: Pick<Database, 'update'>, id: string, now: Milliseconds) {
  db.update(sessions).set({ endedAt: now }).where(and(eq(sessions.id, id), isNull(sessions.endedAt))).run()
}

/** Ends all of someone's sessions, or all but one. */
export function endSessionsOf(db: Pick<Database, 'update'>, personId: string, now: Milliseconds, { except }: { except?: string } = {}) {
  const others = except ? ne(sessions.id, except) : undefined
  db.update(sessions).set({ endedAt: now }).where(and(eq(sessions.personId, personId), isNull(sessions.endedAt), others)).run()
}

/** Throws out sessions that were over before a time. */
export function sweepSessions(db: Pick<Database, 'delete'>, before: Milliseconds) {
  db.delete(sessions).where(lt(sessions.expiresAt, before)).run()
}
