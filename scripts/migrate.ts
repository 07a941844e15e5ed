import { migrateDatabase } from '@/db/migrate'
import { database } from '@/lib/server/database'
import { settingsOrExit } from './support/settings-or-exit'

const { databaseFile } = settingsOrExit()
migrateDatabase(database())
console.log(`The database ${databaseFile} is up to date.`)
