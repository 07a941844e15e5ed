/** Where a mail on its way out stands. */
export const OUTBOX_STATUSES = ['queued', 'sending', 'sent', 'given_up'] as const
export type OutboxStatus = (typeof OUTBOX_STATUSES)[number]

/** Every mail there is. What each one needs stands in templates.ts, its words in emails/. */
export const TEMPLATE_NAMES = [
  'confirm',
  'link',
  'reset',
  'invitation',
  'change-address',
  'address-changed',
  'new-sign-in',
  'already-joined',
  'deletion-asked',
] as const
export type TemplateName = (typeof TEMPLATE_NAMES)[number]

/** How long the outbox remembers a mail, counted from when it was asked for. */
export const SENT_STAYS_DAYS = 30
export const GIVEN_UP_STAYS_DAYS = 90
