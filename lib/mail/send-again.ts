import 'server-only'
import { and, eq, gt, isNull, or } from 'drizzle-orm'
import { outbox } from '@/db/schema/mail'
import { permit } from '@/lib/access/permit'
import type { Milliseconds } from '@/lib/kernel/clock'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import type { SendAgainInput, SendAllAgainInput } from './schema'

/** Why a mail cannot be tried now; null when it can. */
export function whyNotAgain({ status, goodUntil }: typeof outbox.$inferSelect, now: Milliseconds): string | null {
  if (status === 'sent') return 'It was sent already.'
  if (status === 'sending') return 'It is on its way at this moment.'
  if (goodUntil !== null && goodUntil <= now) return 'What it says has run out. Ask for it anew where it came from.'
  return null
}

/** Due at once, and with all attempts before it again: whoever asks has mended something. */
const dueAt = (now: Milliseconds) => ({ status: 'queued', nextTryAt: now, attempts: 0, givenUpAt: null }) as const

/** Has a waiting or a given up mail tried now. @throws Fault sign_in, not_allowed, not_found, conflict */
export function sendAgain({ db, actor, now }: Context, { mailId }: SendAgainInput) {
  permit(actor, 'outbox:send-again')
  db.transaction(
    (tx) => {
      const row = tx.select().from(outbox).where(eq(outbox.id, mailId)).get()
      if (!row) throw new Fault('not_found', 'There is no such mail any more.')
      const why = whyNotAgain(row, now)
      if (why) throw new Fault('conflict', why, { detail: { mailId } })
      tx.update(outbox).set(dueAt(now)).where(eq(outbox.id, mailId)).run()
    },
    { behavior: 'immediate' },
  )
}

/** Has every mail that waits, or was given up, tried now, save those that have run out. @returns how many */
export function sendAllAgain({ db, actor, now }: Context, { status }: SendAllAgainInput): number {
  permit(actor, 'outbox:send-again')
  const stillGood = or(isNull(outbox.goodUntil), gt(outbox.goodUntil, now))
  return db.update(outbox).set(dueAt(now)).where(and(eq(outbox.status, status), stillGood)).run().changes
}
