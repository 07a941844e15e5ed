import type { Role } from '@/lib/accounts/terms'

/** Someone who is not signed in, or whose session no longer counts. */
export interface Visitor {
  kind: 'visitor'
  /** Gave a password or a link that was right, and still owes the code from the authenticator. Counts for nothing else. */
  awaitsCode?: { personId: string; sessionId: string }
}

/** Someone who is signed in, as the session's row and the person's row say at this moment. */
export interface SignedIn {
  kind: 'person'
  id: string
  role: Role
  name: string
  sessionId: string
  /** A disabled person's sessions end at once; where one slips through, the rules still refuse it. */
  disabled: boolean
  /** An admin without a second factor may set one up and do nothing else before. */
  mustSetUpSecondFactor: boolean
}

export type Actor = Visitor | SignedIn

export const VISITOR: Visitor = { kind: 'visitor' }
