import { eq, sql, type SQL } from 'drizzle-orm'
import type { SQLiteColumn } from 'drizzle-orm/sqlite-core'
import type { Actor } from './actor'
import { can } from './permit'

/**
 * Narrows a list to what is on the actor's own shelf; nothing for anyone who has none at this moment.
 * Mirrors `unit:read`, `cartridge:read` and the other rules of what someone owns.
 * @param ownerId the column that names the owner
 */
export function visibleTo(actor: Actor, ownerId: SQLiteColumn): SQL {
  return actor.kind === 'person' && can(actor, 'shelf:read') ? eq(ownerId, actor.id) : sql`0`
}
