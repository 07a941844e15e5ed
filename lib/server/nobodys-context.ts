import 'server-only'
import { VISITOR } from '@/lib/access/actor'
import { currentTime } from '@/lib/kernel/clock'
import type { Context } from '@/lib/kernel/context'
import { database } from './database'

/** The context of work that nobody in particular asked for: a health check, a script, a worker. */
export function nobodysContext(): Context {
  return { db: database(), actor: VISITOR, now: currentTime() }
}
