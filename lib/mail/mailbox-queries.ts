import 'server-only'
import { count, desc, eq } from 'drizzle-orm'
import { mailboxMessages } from '@/db/schema/mail'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { env } from '@/lib/server/env'
import { pageOf } from './pages'
import type { MailboxMessageView, MailboxView } from './views'

const NO_SUCH_MAIL = 'There is no such mail here.'

/** The mailbox stands in for a mail server; where there is one, there is no mailbox. */
function mustBeOpen({ actor }: Pick<Context, 'actor'>) {
  permit(actor, 'mailbox:read')
  if (env().mail.smtp) throw new Fault('not_found', 'Mail goes to a mail server: there is no local mailbox.')
}

/** What came into the local mailbox, newest first; to one recipient only where one is named. @throws Fault sign_in, not_found */
export function listMailbox(context: Context, { to, page }: { to: string | null; page: number }): MailboxView {
  mustBeOpen(context)
  const { db } = context
  const narrowed = to === null ? undefined : eq(mailboxMessages.recipient, to)
  const total = db.select({ mails: count() }).from(mailboxMessages).where(narrowed).get()?.mails ?? 0
  const { id, recipient, subject, receivedAt } = mailboxMessages
  const rows = (limit: number, offset: number) =>
    db
      .select({ id, recipient, subject, receivedAt })
      .from(mailboxMessages)
      .where(narrowed)
      .orderBy(desc(receivedAt), desc(id))
      .limit(limit)
      .offset(offset)
      .all()
  return { ...pageOf(page, total, rows), to }
}

/** One mail of the local mailbox. @throws Fault sign_in, not_found */
export function getMailboxMessage(context: Context, messageId: string): MailboxMessageView {
  const { id, recipient, subject, receivedAt, plain, raw } = rowOf(context, messageId)
  return { id, recipient, subject, receivedAt, plain, raw }
}

/** A mail's HTML as it came. It goes into a frame of its own, never into a page of ours. @throws Fault sign_in, not_found */
export function getMailboxHtml(context: Context, messageId: string): string {
  return rowOf(context, messageId).html
}

function rowOf(context: Context, messageId: string) {
  mustBeOpen(context)
  const row = context.db.select().from(mailboxMessages).where(eq(mailboxMessages.id, messageId)).get()
  if (!row) throw new Fault('not_found', NO_SUCH_MAIL)
  return row
}
