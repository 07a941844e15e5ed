import 'server-only'
import { createHmac } from 'node:crypto'
import { RateLimiterRes, RateLimiterSQLite } from 'rate-limiter-flexible'
import type { Database } from '@/db/client'
import { Fault } from '@/lib/kernel/errors'

export interface Limit {
  /** What is counted, as it stands in the table. */
  name: string
  /** So many from one address, and from everyone together, in so many seconds. */
  perAddress: number
  together: number
  seconds: number
}

const TABLE = 'rate_limits'
const limiters = new WeakMap<Database, Map<string, RateLimiterSQLite>>()

function limiterFor(db: Database, name: string, points: number, seconds: number): RateLimiterSQLite {
  const known = limiters.get(db) ?? new Map<string, RateLimiterSQLite>()
  limiters.set(db, known)
  const made =
    known.get(name) ??
    new RateLimiterSQLite({
      storeClient: db.$client,
      storeType: 'better-sqlite3',
      tableName: TABLE,
      // The table comes with the migrations.
      tableCreated: true,
      keyPrefix: name,
      points,
      duration: seconds,
      clearExpiredByTimeout: true,
    })
  known.set(name, made)
  return made
}

/**
 * Counts one request. The count together bounds those who make addresses up.
 * @param address from `addressOf`; it is kept under a short name only
 * @throws Fault too_many, with when to ask again
 */
export async function countRequest(db: Database, limit: Limit, { address, secret }: { address: string; secret: string }) {
  const asker = createHmac('sha256', secret).update(address).digest('hex').slice(0, 24)
  await take(limiterFor(db, limit.name, limit.perAddress, limit.seconds), asker)
  await take(limiterFor(db, `${limit.name}-together`, limit.together, limit.seconds), 'all')
}

async function take(limiter: RateLimiterSQLite, key: string) {
  try {
    await limiter.consume(key)
  } catch (refusal) {
    if (!(refusal instanceof RateLimiterRes)) throw refusal
    const seconds = Math.max(1, Math.ceil(refusal.msBeforeNext / 1000))
    throw new Fault('too_many', `That is more than we answer in a minute. Ask again in ${seconds} s.`, { retryAfterSeconds: seconds })
  }
}

/** Where a request came from: what the nearest proxy, or the server itself, put last. */
export function addressOf(headers: Headers): string {
  return headers.get('x-forwarded-for')?.split(',').at(-1)?.trim() || 'unknown'
}
