import { join } from 'node:path'
import { openDatabase, type Database } from '@/db/client'

let opened: Database | undefined

/** The database of the server that the browser talks to. */
export function pagesDatabase(): Database {
  opened ??= openDatabase(join(needed('PAGES_DATA_DIR'), 'setdown.db'))
  return opened
}

/** The secret of that server. */
export function pagesSecret(): string {
  return needed('PAGES_APP_SECRET')
}

function needed(name: string): string {
  const value = process.env[name]
  if (!value) throw new Error(`${name} is missing: browser tests run through playwright.config.ts.`)
  return value
}
