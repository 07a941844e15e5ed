import { migrateDatabase } from '@/db/migrate'
import { loadDemoCatalogue } from '@/lib/catalogue/load-demo'
import { currentTime } from '@/lib/kernel/clock'
import { database } from '@/lib/server/database'
import { settingsOrExit } from './support/settings-or-exit'

// Brings the database up to the present schema and the demo in it up to date. Safe to run at every start.
settingsOrExit()
const db = database()
migrateDatabase(db)
const { added, updated, unchanged, leftAlone } = loadDemoCatalogue({ db, now: currentTime() })
console.log(`Demo catalogue: ${added} added, ${updated} updated, ${unchanged} unchanged, ${leftAlone} left as edited.`)
