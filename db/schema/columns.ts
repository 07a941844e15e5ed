import { integer } from 'drizzle-orm/sqlite-core'

/** Times are whole milliseconds since 1970, UTC, as the clock gives them. */
export const milliseconds = (name: string) => integer(name, { mode: 'number' })
