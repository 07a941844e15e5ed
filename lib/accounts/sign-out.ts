import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { endSessionRow } from './sessions'

/** Ends the session that asks, whether it counts already or still waits for its code. Nobody's session: nothing to do. */
export function signOut({ db, actor, now }: Context) {
  const sessionId = actor.kind === 'person' ? actor.sessionId : actor.awaitsCode?.sessionId
  if (sessionId) endSessionRow(db, sessionId, now)
}
