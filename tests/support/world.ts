import { openDatabase, type Database } from '@/db/client'
import { migrateDatabase } from '@/db/migrate'
import { sessions } from '@/db/schema/accounts'
import { VISITOR } from '@/lib/access/actor'
import { actorOfSession } from '@/lib/accounts/actor-of-session'
import { insertPerson, type Person } from '@/lib/accounts/people'
import type { Role } from '@/lib/accounts/terms'
import type { Context } from '@/lib/kernel/context'
import { newId } from '@/lib/kernel/ids'
import { addSecondFactor } from './second-factor'

/** Friday 6 March 2026, 10:30 UTC: the time it is in every test. */
export const NOW = Date.UTC(2026, 2, 6, 10, 30)

const DAY = 24 * 60 * 60_000

let image: Buffer | undefined

/** A migrated database, made once and then copied: a copy costs a fraction of a millisecond. */
function migratedImage(): Buffer {
  if (!image) {
    const db = openDatabase(':memory:')
    migrateDatabase(db)
    image = db.$client.serialize()
    db.$client.close()
  }
  return image
}

/** The people of the tests. Ann and Bob own things, Ruth answers, Iris lets people in. */
const CAST = {
  ann: { name: 'Ann', role: 'owner' },
  bob: { name: 'Bob', role: 'owner' },
  ruth: { name: 'Ruth', role: 'staff' },
  iris: { name: 'Iris', role: 'admin' },
} as const satisfies Record<string, { name: string; role: Role }>
export type CastName = keyof typeof CAST

export interface World {
  db: Database
  /** A visitor's context at the fixed time, or at another. */
  at: (now?: number) => Context
  /** Someone's row; made on first use, with an address `<name>@brandreth.example` and, for an admin, a second factor. */
  person: (who: CastName) => Person
  /** Someone's context: signed in by a session of their own. */
  as: (who: CastName | Person, now?: number) => Context
}

/** An empty, migrated database of a test's own, in memory; or the one that is given. */
export function world(db: Database = openDatabase(migratedImage())): World {
  const known = new Map<CastName, Person>()

  function person(who: CastName): Person {
    const made = known.get(who) ?? insertPerson(db, { ...CAST[who], email: `${who}@brandreth.example`, passwordHash: null }, NOW - 100 * DAY)
    if (!known.has(who) && made.role === 'admin') addSecondFactor(db, made.id, NOW - 100 * DAY)
    known.set(who, made)
    return made
  }

  function as(who: CastName | Person, now = NOW): Context {
    const { id } = typeof who === 'string' ? person(who) : who
    const session = { id: newId('ses'), personId: id, completedAt: now, lastSeenAt: now, expiresAt: now + DAY, createdAt: now }
    db.insert(sessions).values({ ...session, device: 'Firefox on Linux', origin: '203.0.113.x' }).run()
    return { db, actor: actorOfSession(db, session.id, now), now }
  }

  return { db, at: (now = NOW) => ({ db, actor: VISITOR, now }), person, as }
}
