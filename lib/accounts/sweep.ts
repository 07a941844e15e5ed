import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { sweepAttempts } from './attempts'
import { sweepSessions } from './sessions'
import { sweepLinks } from './tokens'

const DAY = 24 * 60 * 60_000
/** So long a used link still says that it was used, and not that there never was one. */
const LINKS_STAY_MS = 30 * DAY
/** So long a device that was signed in from is remembered, and its next sign-in is no news. */
const SESSIONS_STAY_MS = 90 * DAY

/** Throws out what nobody needs any more: old links, sessions long over, counts that ran out. */
export function sweepAccounts({ db, now }: Pick<Context, 'db' | 'now'>) {
  sweepLinks(db, now - LINKS_STAY_MS)
  sweepSessions(db, now - SESSIONS_STAY_MS)
  sweepAttempts(db, now)
}
