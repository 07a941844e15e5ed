import 'server-only'
import type { Database, Transaction } from '@/db/client'
import { outbox } from '@/db/schema/mail'
import type { Milliseconds } from '@/lib/kernel/clock'
import { newId } from '@/lib/kernel/ids'
import { env } from '@/lib/server/env'
import { isOneAddress } from './address'
import { TEMPLATE_PROPS, type MailWords } from './templates'

type NewMail = MailWords & {
  /** One address. */
  to: string
  now: Milliseconds
  /** When the mail stops being worth delivering, such as the end of its link. */
  goodUntil?: Milliseconds
}

/**
 * Puts a mail into the outbox. Hand it the caller's transaction: the mail then exists exactly when the change does.
 * It is rendered later, by the worker: rendering waits for things, and a transaction here cannot.
 * @returns the row's id
 * @throws Error when the address is none, ZodError when props are missing or wrong: both are the caller's mistake
 */
export function enqueue(tx: Database | Transaction, mail: NewMail): string {
  if (!isOneAddress(mail.to)) throw new Error(`The mail "${mail.template}" has no address it can go to.`)
  const props = TEMPLATE_PROPS[mail.template].parse(mail.props)
  const id = newId('out')
  tx.insert(outbox)
    .values({
      id,
      messageId: `${id}@${new URL(env().publicAddress).hostname}`,
      template: mail.template,
      props: JSON.stringify(props),
      recipient: mail.to,
      status: 'queued',
      nextTryAt: mail.now,
      goodUntil: mail.goodUntil ?? null,
      createdAt: mail.now,
    })
    .run()
  return id
}
