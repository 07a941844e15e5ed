import type { OutboxStatus, TemplateName } from './terms'

/** One mail as the outbox shows it: never its words, which may sign someone in. */
export interface OutboxMailView {
  id: string
  template: TemplateName
  recipient: string
  attempts: number
  createdAt: number
  /** When the next attempt is due, the present one began, it was sent, or it was given up. */
  at: number
  lastAnswer: string | null
  /** Whether it can be tried now: not while it is on its way, once it was sent, or when what it says has run out. */
  canSendAgain: boolean
}

/** A page of a list: which one, of how many, and what stands on it. */
export interface PageOf<Row> {
  rows: Row[]
  /** From 1. */
  page: number
  pages: number
  total: number
}

export interface OutboxView extends PageOf<OutboxMailView> {
  status: OutboxStatus
  counts: Record<OutboxStatus, number>
  /** The mail server's name, or null where mail is kept in the local mailbox. */
  server: string | null
}

export interface MailboxRowView {
  id: string
  recipient: string
  subject: string
  receivedAt: number
}

export interface MailboxView extends PageOf<MailboxRowView> {
  /** The one recipient that the list is narrowed to. */
  to: string | null
}

export interface MailboxMessageView extends MailboxRowView {
  plain: string
  raw: string
}
