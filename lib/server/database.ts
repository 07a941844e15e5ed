import 'server-only'
import { mkdirSync } from 'node:fs'
import { openDatabase, type Database } from '@/db/client'
import { env } from './env'

let opened: Database | undefined

/** This process's database, opened on first use: building must not need one. */
export function database(): Database {
  if (!opened) {
    const { dataFolder, databaseFile } = env()
    mkdirSync(dataFolder, { recursive: true })
    opened = openDatabase(databaseFile)
  }
  return opened
}
