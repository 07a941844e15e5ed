import 'server-only'
import { eq, lte } from 'drizzle-orm'
import type { Database } from '@/db/client'
import { attempts } from '@/db/schema/accounts'
import type { Milliseconds } from '@/lib/kernel/clock'
import { Fault } from '@/lib/kernel/errors'
import { keyedHash } from './keys'

export interface AttemptLimit {
  /** What is counted, as it stands in the table. */
  name: string
  most: number
  withinMs: Milliseconds
}

const MINUTE = 60_000

/** An account and an address of origin are counted apart: many accounts from one place, one account from many. */
export const LIMITS = {
  passwordForAccount: { name: 'password, account', most: 10, withinMs: 15 * MINUTE },
  passwordFromOrigin: { name: 'password, origin', most: 50, withinMs: 15 * MINUTE },
  mailToAddress: { name: 'mail, address', most: 5, withinMs: 15 * MINUTE },
  mailFromOrigin: { name: 'mail, origin', most: 30, withinMs: 60 * MINUTE },
  tokenFromOrigin: { name: 'token, origin', most: 60, withinMs: 15 * MINUTE },
  codeForAccount: { name: 'code, account', most: 8, withinMs: 15 * MINUTE },
  invitationsByAdmin: { name: 'invitations, admin', most: 40, withinMs: 60 * MINUTE },
} as const satisfies Record<string, AttemptLimit>

const keyOf = (limit: AttemptLimit, whom: string) => `${limit.name}: ${keyedHash('attempts', whom).slice(0, 32)}`

/**
 * Counts one try, before it is looked at. Kept in the database, so that a restart forgets nothing.
 * @param whom an account or an address of origin; whether it exists makes no difference
 * @throws Fault too_many, with when to try again
 */
export function countAttempt(db: Database, limit: AttemptLimit, whom: string, now: Milliseconds) {
  const key = keyOf(limit, whom)
  const { count, endsAt } = db.transaction(
    (tx) => {
      const known = tx.select().from(attempts).where(eq(attempts.key, key)).get()
      const next = known && known.endsAt > now ? { count: known.count + 1, endsAt: known.endsAt } : { count: 1, endsAt: now + limit.withinMs }
      tx.insert(attempts).values({ key, ...next }).onConflictDoUpdate({ target: attempts.key, set: next }).run()
      return next
    },
    { behavior: 'immediate' },
  )
  if (count <= limit.most) return
  const minutes = Math.ceil((endsAt - now) / MINUTE)
  throw new Fault('too_many', `That was tried too often. Wait ${minutes === 1 ? 'a minute' : `${minutes} minutes`}, then try again.`, {
    retryAfterSeconds: Math.ceil((endsAt - now) / 1000),
    detail: { limit: limit.name },
  })
}

/** After it went well: the tries before it were the person's own. */
export function forgetAttempts(db: Pick<Database, 'delete'>, limit: AttemptLimit, whom: string) {
  db.delete(attempts).where(eq(attempts.key, keyOf(limit, whom))).run()
}

/** Throws out counts that have run out. */
export function sweepAttempts(db: Pick<Database, 'delete'>, now: Milliseconds) {
  db.delete(attempts).where(lte(attempts.endsAt, now)).run()
}
