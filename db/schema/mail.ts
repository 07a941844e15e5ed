import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import { OUTBOX_STATUSES, TEMPLATE_NAMES } from '../../lib/mail/terms'
import { milliseconds } from './columns'

/** Mail on its way out, one row a mail and a recipient. Written with the change that it reports. */
export const outbox = sqliteTable(
  'outbox',
  {
    id: text('id').primaryKey(),
    /** The Message-ID, without its brackets: the same at every attempt, so that a receiver can drop a double. */
    messageId: text('message_id').notNull().unique(),
    template: text('template', { enum: TEMPLATE_NAMES }).notNull(),
    /** JSON. May hold a link that signs someone in, so it is emptied once the mail is sent. */
    props: text('props').notNull(),
    recipient: text('recipient').notNull(),
    /** Rendered at the first attempt and the same at every later one; bodies are emptied once the mail is sent. */
    subject: text('subject'),
    html: text('html'),
    plain: text('plain'),
    status: text('status', { enum: OUTBOX_STATUSES }).notNull(),
    attempts: integer('attempts').notNull().default(0),
    nextTryAt: milliseconds('next_try_at').notNull(),
    /** After this the mail says nothing useful any more, such as a link that ran out; null when it always does. */
    goodUntil: milliseconds('good_until'),
    /** What the other server, or the network, said last. */
    lastAnswer: text('last_answer'),
    /** Short name of the attempt under way: only the attempt that holds the row may write its outcome. */
    claim: text('claim'),
    claimedAt: milliseconds('claimed_at'),
    /** After this the attempt is taken to have died, and the row is free again. */
    claimedUntil: milliseconds('claimed_until'),
    createdAt: milliseconds('created_at').notNull(),
    sentAt: milliseconds('sent_at'),
    givenUpAt: milliseconds('given_up_at'),
  },
  (table) => [
    // The worker's question: which queued row is due first?
    index('outbox_due').on(table.status, table.nextTryAt),
    // The worker's other question: whose attempt has died?
    index('outbox_claimed').on(table.status, table.claimedUntil),
    // The outbox page: one status, newest first.
    index('outbox_status_created').on(table.status, table.createdAt, table.id),
  ],
)

/** The local mailbox: what would have gone out, kept here while no mail server is set. */
export const mailboxMessages = sqliteTable(
  'mailbox_messages',
  {
    id: text('id').primaryKey(),
    /** Unique: a mail that comes twice is kept once. */
    messageId: text('message_id').notNull().unique(),
    recipient: text('recipient').notNull(),
    subject: text('subject').notNull(),
    html: text('html').notNull(),
    plain: text('plain').notNull(),
    /** The whole message as it would have travelled. */
    raw: text('raw').notNull(),
    receivedAt: milliseconds('received_at').notNull(),
  },
  (table) => [
    // The mailbox page: newest first.
    index('mailbox_messages_received').on(table.receivedAt, table.id),
    // The newest mail to someone, and the page narrowed to one recipient.
    index('mailbox_messages_recipient').on(table.recipient, table.receivedAt),
  ],
)
