import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import type { SessionInput } from './schema'
import { mustBeSelf } from './self'
import { endSessionRow, sessionById } from './sessions'

/** Ends one of one's own sessions, the present one included. @throws Fault sign_in; not_found for a session of someone else */
export function endSession({ db, actor, now }: Context, { sessionId }: SessionInput) {
  db.transaction((tx) => {
    const person = mustBeSelf(tx, actor, 'account:end-sessions')
    if (sessionById(tx, sessionId)?.personId !== person.id) throw new Fault('not_found', 'There is no such session.')
    endSessionRow(tx, sessionId, now)
  })
}
