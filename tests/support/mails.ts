import { asc, eq } from 'drizzle-orm'
import type { Database } from '@/db/client'
import { outbox } from '@/db/schema/mail'

export interface QueuedMail {
  template: string
  to: string
  props: Record<string, unknown>
}

/** Every mail in the outbox, in order of queueing; to one address, if given. */
export function mails(db: Database, to?: string): QueuedMail[] {
  const rows = db
    .select()
    .from(outbox)
    .where(to ? eq(outbox.recipient, to) : undefined)
    .orderBy(asc(outbox.createdAt), asc(outbox.id))
    .all()
  return rows.map(({ template, recipient, props }) => ({ template, to: recipient, props: JSON.parse(props) as Record<string, unknown> }))
}

/** The token in the newest mail of a kind to someone. Mails queued at one time stand in no order, so ask at different times. */
export function tokenTo(db: Database, to: string, template: string): string {
  const link = mails(db, to).findLast((mail) => mail.template === template)?.props.link
  const token = typeof link === 'string' ? new URL(link).searchParams.get('token') : null
  if (!token) throw new Error(`No mail "${template}" to ${to} holds a link.`)
  return token
}
