import 'server-only'
import { and, asc, eq, lte } from 'drizzle-orm'
import type { Database, Transaction } from '@/db/client'
import { outbox } from '@/db/schema/mail'
import type { Milliseconds } from '@/lib/kernel/clock'
import { randomLetters } from '@/lib/kernel/ids'
import { MOST_ATTEMPTS } from './back-off'

/** So long an attempt may hold its row; twice what the most patient delivery takes. */
export const CLAIM_LASTS_MS = 180_000

type OutboxRow = typeof outbox.$inferSelect

/** A row that one attempt holds. */
export type ClaimedMail = OutboxRow & { claim: string }

/**
 * Takes the next mail that is due, for one attempt. No two attempts get the same row, in one process or in several;
 * a row whose attempt died comes back when its claim runs out. Rows that are of no use any more are given up on the
 * way.
 * @returns nothing when nothing is due
 */
export function claimNext(db: Database, now: Milliseconds): ClaimedMail | undefined {
  // Looking costs nothing; only taking locks out other writers.
  while (findNext(db, now)) {
    const claimed = db.transaction((tx) => takeNext(tx, now), { behavior: 'immediate' })
    if (claimed) return claimed
  }
  return undefined
}

function findNext(db: Database | Transaction, now: Milliseconds): OutboxRow | undefined {
  const diedUnderWay = and(eq(outbox.status, 'sending'), lte(outbox.claimedUntil, now))
  const due = and(eq(outbox.status, 'queued'), lte(outbox.nextTryAt, now))
  return (
    db.select().from(outbox).where(diedUnderWay).orderBy(asc(outbox.claimedUntil)).limit(1).get() ??
    db.select().from(outbox).where(due).orderBy(asc(outbox.nextTryAt)).limit(1).get()
  )
}

function takeNext(tx: Transaction, now: Milliseconds): ClaimedMail | undefined {
  const row = findNext(tx, now)
  if (!row) return undefined
  const reason = uselessBecause(row, now)
  if (reason) {
    tx.update(outbox).set(givenUp(row, reason, now)).where(eq(outbox.id, row.id)).run()
    return undefined
  }
  const claim = {
    status: 'sending',
    claim: randomLetters(12),
    claimedAt: now,
    claimedUntil: now + CLAIM_LASTS_MS,
    // Counted here and not at the end: a mail that ends the process each time must end as well.
    attempts: row.attempts + 1,
  } as const
  tx.update(outbox).set(claim).where(eq(outbox.id, row.id)).run()
  return { ...row, ...claim }
}

function uselessBecause(row: OutboxRow, now: Milliseconds): string | undefined {
  if (hasRunOut(row, now)) return 'What it says ran out before it could be delivered.'
  // Only a row whose last attempt died can come here with all of its attempts used.
  if (row.attempts >= MOST_ATTEMPTS) return 'The last attempt never ended.'
  return undefined
}

const hasRunOut = (row: OutboxRow, now: Milliseconds) => row.goodUntil !== null && row.goodUntil <= now

/** Nobody holds it now. */
export const UNCLAIMED = { claim: null, claimedAt: null, claimedUntil: null } as const

/** What is emptied once nothing will be sent again: a mail may hold a link that signs someone in. */
export const EMPTIED = { props: '{}', html: null, plain: null } as const

/** A row that is given up. It keeps its words, so that it can be sent again, unless they are of no use any more. */
export function givenUp(row: OutboxRow, lastAnswer: string, now: Milliseconds) {
  return {
    status: 'given_up',
    givenUpAt: now,
    lastAnswer,
    ...UNCLAIMED,
    ...(hasRunOut(row, now) ? EMPTIED : {}),
  } as const
}
