import type { Database } from '@/db/client'
import type { Milliseconds } from './clock'

/** What every verb and query receives first: where things are kept, and what time it is. */
export interface Context {
  db: Database
  now: Milliseconds
}
