import { GIVEN_UP_STAYS_DAYS, SENT_STAYS_DAYS, type OutboxStatus, type TemplateName } from './terms'

export const STATUS_WORDS: Record<OutboxStatus, string> = {
  queued: 'Queued',
  sending: 'Sending',
  sent: 'Sent',
  given_up: 'Given up',
}

export const NONE_WORDS: Record<OutboxStatus, string> = {
  queued: 'Nothing waits to be sent.',
  sending: 'Nothing is on its way at this moment.',
  sent: `Nothing was sent in the last ${SENT_STAYS_DAYS} days.`,
  given_up: `Nothing was given up in the last ${GIVEN_UP_STAYS_DAYS} days.`,
}

/** What each mail is about, for a list. */
export const TEMPLATE_WORDS: Record<TemplateName, string> = {
  confirm: 'Confirm an address',
  link: 'Link to sign in',
  reset: 'Choose a new password',
  invitation: 'Invitation to the workshop',
  'change-address': 'Change of address, to be confirmed',
  'address-changed': 'Address changed',
  'new-sign-in': 'New sign-in',
  'already-joined': 'Has an account already',
  'deletion-asked': 'Deletion asked for',
}
