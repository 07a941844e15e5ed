import 'server-only'
import { eq } from 'drizzle-orm'
import { meta } from '@/db/schema/meta'
import type { Context } from '@/lib/kernel/context'

const KEY = 'heartbeat'

/**
 * Writes the present time into the database and reads it back.
 * @throws when the database cannot be written or read, or gives back something else
 */
export function beat({ db, now }: Context) {
  const value = String(now)
  db.insert(meta)
    .values({ key: KEY, value, updatedAt: now })
    .onConflictDoUpdate({ target: meta.key, set: { value, updatedAt: now } })
    .run()
  const row = db.select().from(meta).where(eq(meta.key, KEY)).get()
  // Another request may have written a later beat in between; an earlier one means the write was lost.
  if (!row || Number(row.value) < now) throw new Error('The heartbeat was written and did not come back.')
}
