import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { onTestFinished } from 'vitest'
import { openDatabase, type Database } from '@/db/client'
import { migrateDatabase } from '@/db/migrate'

export interface TwoDoors {
  /** Two connections to one file, as two processes would have. */
  one: Database
  other: Database
  /** Closes the first connection and opens the file anew, as a restart would. */
  reopen: () => Database
}

/** A migrated database in a file that goes away with the test. */
export function twoDoors(): TwoDoors {
  const folder = mkdtempSync(join(tmpdir(), 'setdown-test-'))
  const open: Database[] = []
  const door = () => {
    const db = openDatabase(join(folder, 'setdown.db'))
    open.push(db)
    return db
  }
  const one = door()
  migrateDatabase(one)
  onTestFinished(() => {
    for (const db of open) db.$client.close()
    rmSync(folder, { recursive: true, force: true })
  })
  const reopen = () => {
    one.$client.close()
    return door()
  }
  return { one, other: door(), reopen }
}
