import 'server-only'
import { and, eq } from 'drizzle-orm'
import type { Database } from '@/db/client'
import { outbox } from '@/db/schema/mail'
import type { Milliseconds } from '@/lib/kernel/clock'
import { log } from '@/lib/server/log'
import type { Sender } from '@/lib/server/env-mail'
import { MOST_ATTEMPTS, waitAfter } from './back-off'
import { EMPTIED, givenUp, UNCLAIMED, type ClaimedMail } from './claim'
import { renderMail, type RenderedMail } from './render'
import { DeliveryFailure, type Transport } from './transport'

/** What delivering needs: where the mail is kept, the way out, whom it is from, and the clock. */
export interface Delivery {
  db: Database
  transport: Transport
  from: Sender
  /** Scheme, host and port that the mails' own links lead to. */
  site: string
  clock: () => Milliseconds
  /** From 0 up to 1. */
  random: () => number
}

/** One attempt with a claimed mail, and its outcome written. Never throws for what happens to the mail. */
export async function deliver(delivery: Delivery, mail: ClaimedMail): Promise<void> {
  const { db, transport, from, clock } = delivery
  try {
    const { subject, html, plain } = await sealed(delivery, mail)
    const { messageId, recipient, createdAt } = mail
    const answer = await transport.deliver({ messageId, from, to: recipient, subject, html, plain, date: createdAt })
    settle(db, mail, { status: 'sent', sentAt: clock(), lastAnswer: answer, ...UNCLAIMED, ...EMPTIED })
    log().info({ mail: mail.id, template: mail.template, attempt: mail.attempts }, 'A mail was sent.')
  } catch (trouble) {
    fail(delivery, mail, trouble)
  }
}

/** The mail's words: written at the first attempt, and the very same at each later one. */
async function sealed({ db, site }: Delivery, mail: ClaimedMail): Promise<RenderedMail> {
  const { subject, html, plain } = mail
  if (subject !== null && html !== null && plain !== null) return { subject, html, plain }
  const rendered = await renderMail(mail.template, mail.props, site)
  settle(db, mail, rendered)
  return rendered
}

function fail({ db, clock, random }: Delivery, mail: ClaimedMail, trouble: unknown) {
  const now = clock()
  const known = trouble instanceof DeliveryFailure
  const answer = known ? trouble.message : 'The mail could not be written. The log says why.'
  const line = { mail: mail.id, template: mail.template, attempt: mail.attempts }
  // What a server answers may name the recipient, so it stays in the table.
  if (!known) log().error({ ...line, err: trouble }, 'A mail could not be written.')
  if ((known && trouble.permanent) || mail.attempts >= MOST_ATTEMPTS) {
    settle(db, mail, givenUp(mail, answer, now))
    log().error(line, 'A mail was given up.')
  } else {
    settle(db, mail, { status: 'queued', nextTryAt: now + waitAfter(mail.attempts, random()), lastAnswer: answer, ...UNCLAIMED })
    log().warn(line, 'A mail was not taken and is tried again.')
  }
}

/** Writes an outcome, if the attempt still holds the row: another may have taken over when its claim ran out. */
function settle(db: Database, { id, claim }: ClaimedMail, outcome: Partial<typeof outbox.$inferInsert>) {
  db.update(outbox).set(outcome).where(and(eq(outbox.id, id), eq(outbox.claim, claim))).run()
}

/** Puts back a mail whose attempt is cut short, so that it need not wait for its claim to run out. */
export function putBack({ db, clock }: Pick<Delivery, 'db' | 'clock'>, mail: ClaimedMail) {
  settle(db, mail, { status: 'queued', nextTryAt: clock(), lastAnswer: 'Cut short: the service was stopped.', ...UNCLAIMED })
}
