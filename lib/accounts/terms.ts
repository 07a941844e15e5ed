/** Who someone is to the maker. Everyone who signs in has a shelf of their own; staff and admins have more besides. */
export const ROLES = ['owner', 'staff', 'admin'] as const
export type Role = (typeof ROLES)[number]

/** Whom an admin may invite. Owners come by themselves. */
export const INVITED_ROLES = ['staff', 'admin'] as const satisfies readonly Role[]

/** What a link in a mail is for. */
export const TOKEN_PURPOSES = ['confirm', 'link', 'reset', 'change-address-old', 'change-address-new', 'invite'] as const
export type TokenPurpose = (typeof TOKEN_PURPOSES)[number]

const MINUTE = 60_000
const HOUR = 60 * MINUTE
const DAY = 24 * HOUR

/** How long each kind of link opens. The pages and mails say these times in words. */
export const TOKEN_LASTS_MS: Record<TokenPurpose, number> = {
  confirm: 2 * DAY,
  link: 20 * MINUTE,
  reset: 60 * MINUTE,
  'change-address-old': 2 * DAY,
  'change-address-new': 2 * DAY,
  invite: 7 * DAY,
}

/** The page that each link opens. It shows a button: opening a page must not use a link up. */
export const TOKEN_PATHS: Record<TokenPurpose, string> = {
  confirm: '/confirm-email',
  link: '/link',
  reset: '/reset-password/new',
  'change-address-old': '/change-address/old',
  'change-address-new': '/change-address/new',
  invite: '/invitation',
}

/** How someone came in. */
export const SIGN_IN_WAYS = ['password', 'link', 'invitation'] as const
export type SignInWay = (typeof SIGN_IN_WAYS)[number]

/** After this a session ends, however much it was used. Staff see other people's mail, so theirs is shorter. */
export const SESSION_LASTS_MS: Record<Role, number> = { owner: 30 * DAY, staff: 7 * DAY, admin: 7 * DAY }

/** Between a password and the code that belongs to it. */
export const SECOND_FACTOR_WAITS_MS = 10 * MINUTE

/** From asking for an account's deletion until it is deleted. */
export const DELETION_WAITS_MS = 7 * DAY

/** Length alone, and that it is none of the common ones: long and plain is better than short and clever. */
export const PASSWORD_LENGTH = { min: 10, max: 200 } as const

export const MAX_NAME_LENGTH = 80
/** The longest address that mail can carry. RFC 5321, 4.5.3.1.3: a path of 256 with its two brackets. */
export const MAX_ADDRESS_LENGTH = 254

export const RECOVERY_CODE_COUNT = 10
