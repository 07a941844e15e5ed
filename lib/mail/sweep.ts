import 'server-only'
import { and, eq, lt, or } from 'drizzle-orm'
import { outbox } from '@/db/schema/mail'
import type { Context } from '@/lib/kernel/context'
import { GIVEN_UP_STAYS_DAYS, SENT_STAYS_DAYS } from './terms'

const DAY_MS = 24 * 60 * 60_000

/** Throws out of the outbox what is long done. The local mailbox keeps everything. @returns how many rows went */
export function sweepOutbox({ db, now }: Pick<Context, 'db' | 'now'>): number {
  const longSent = and(eq(outbox.status, 'sent'), lt(outbox.createdAt, now - SENT_STAYS_DAYS * DAY_MS))
  const longGivenUp = and(eq(outbox.status, 'given_up'), lt(outbox.createdAt, now - GIVEN_UP_STAYS_DAYS * DAY_MS))
  return db.delete(outbox).where(or(longSent, longGivenUp)).run().changes
}
