import 'server-only'
import { VISITOR, type Actor } from '@/lib/access/actor'
import { actorOfSession } from '@/lib/accounts/actor-of-session'
import { currentTime } from '@/lib/kernel/clock'
import type { Context } from '@/lib/kernel/context'
import { database } from './database'
import { nobodysContext } from './nobodys-context'
import { readSessionCookie } from './session-cookie'

/** The context of the request at hand: who asks is looked up anew each time. */
export async function requestContext(): Promise<Context> {
  const context = nobodysContext()
  const sessionId = await readSessionCookie()
  return sessionId ? { ...context, actor: actorOfSession(context.db, sessionId, context.now) } : context
}

/** Who asks, for pages that show it and need nothing else. Without a cookie the database is not even opened. */
export async function requestActor(): Promise<Actor> {
  const sessionId = await readSessionCookie()
  return sessionId ? actorOfSession(database(), sessionId, currentTime()) : VISITOR
}
