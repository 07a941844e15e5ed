import type { Role, SignInWay } from './terms'

/** What a link from a mail would do if its button were pressed now. */
export type LinkState = 'open' | 'used' | 'expired' | 'unknown'

/** A link's page before its button is pressed. Whoever holds the link has the mail, so it may name the address. */
export type LinkView = { state: 'open'; email: string; role: Role | null } | { state: Exclude<LinkState, 'open'> }

/** Someone's own account. */
export interface AccountView {
  name: string
  email: string
  role: Role
  hasPassword: boolean
  /** Null without one. */
  secondFactor: { since: number; codesLeft: number } | null
  /** When it will be deleted; null when nobody asked for that. */
  deletesAt: number | null
}

export interface SessionView {
  id: string
  device: string
  origin: string
  way: SignInWay
  since: number
  lastSeenAt: number
  /** The one that asks. */
  present: boolean
}

/** Someone in an admin's list of people. */
export interface PersonView {
  id: string
  name: string
  email: string
  role: Role
  disabled: boolean
  hasSecondFactor: boolean
  lastSeenAt: number | null
  deletesAt: number | null
  /** The admin who looks: nobody disables themselves or changes their own role. */
  self: boolean
}

export interface InvitationView {
  email: string
  role: Role
  expiresAt: number
}

/** An authenticator app being set up: shown until its first code comes back, and never again. */
export interface PendingSecondFactorView {
  /** Base32, for typing in. */
  secret: string
  /** What the square code holds. */
  address: string
}
