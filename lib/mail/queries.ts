import 'server-only'
import { count, desc, eq } from 'drizzle-orm'
import { outbox } from '@/db/schema/mail'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { env } from '@/lib/server/env'
import { pageOf } from './pages'
import { whyNotAgain } from './send-again'
import type { OutboxStatus } from './terms'
import type { OutboxMailView, OutboxView } from './views'

interface Asked {
  status: OutboxStatus
  page: number
}

/** The outbox: the mails of one status, newest first, and how many there are of each. @throws Fault sign_in, not_found */
export function listOutbox({ db, actor, now }: Context, { status, page }: Asked): OutboxView {
  permit(actor, 'outbox:read')
  const counted = db.select({ status: outbox.status, mails: count() }).from(outbox).groupBy(outbox.status).all()
  const counts = { queued: 0, sending: 0, sent: 0, given_up: 0, ...Object.fromEntries(counted.map((row) => [row.status, row.mails])) }
  const rows = (limit: number, offset: number) =>
    db
      .select()
      .from(outbox)
      .where(eq(outbox.status, status))
      .orderBy(desc(outbox.createdAt), desc(outbox.id))
      .limit(limit)
      .offset(offset)
      .all()
      .map((row) => toOutboxMailView(row, now))
  return { ...pageOf(page, counts[status], rows), status, counts, server: env().mail.smtp?.host ?? null }
}

function toOutboxMailView(row: typeof outbox.$inferSelect, now: number): OutboxMailView {
  const { id, template, recipient, attempts, createdAt, lastAnswer } = row
  const at = { queued: row.nextTryAt, sending: row.claimedAt, sent: row.sentAt, given_up: row.givenUpAt }[row.status]
  return { id, template, recipient, attempts, createdAt, lastAnswer, at: at ?? createdAt, canSendAgain: whyNotAgain(row, now) === null }
}
