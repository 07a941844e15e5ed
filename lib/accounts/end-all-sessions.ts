import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { mustBeSelf } from './self'
import { endSessionsOf } from './sessions'

/** Signs someone out everywhere, here as well. @throws Fault sign_in */
export function endAllSessions({ db, actor, now }: Context) {
  db.transaction((tx) => endSessionsOf(tx, mustBeSelf(tx, actor, 'account:end-sessions').id, now))
}
