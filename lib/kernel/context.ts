import type { Database } from '@/db/client'
import type { Actor } from '@/lib/access/actor'
import type { Milliseconds } from './clock'

/** What every verb and query receives first: where things are kept, who asks, and what time it is. */
export interface Context {
  db: Database
  actor: Actor
  now: Milliseconds
}
