import 'server-only'
import { currentTime } from '@/lib/kernel/clock'
import type { Context } from '@/lib/kernel/context'
import { database } from './database'

/** The context of the request at hand. */
export function requestContext(): Context {
  return { db: database(), now: currentTime() }
}
