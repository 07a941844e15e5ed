import { migrateDatabase } from '@/db/migrate'
import { loadDemoPeople } from '@/lib/accounts/load-demo'
import { loadDemoCatalogue } from '@/lib/catalogue/load-demo'
import { nobodysContext } from '@/lib/server/nobodys-context'
import { loadDemoShelf } from '@/lib/shelf/load-demo'
import { settingsOrExit } from './support/settings-or-exit'

// Brings the database up to the present schema and the demo in it up to date. Safe to run at every start.
async function main() {
  settingsOrExit()
  const context = nobodysContext()
  migrateDatabase(context.db)
  const { added, updated, unchanged, leftAlone } = loadDemoCatalogue(context)
  console.log(`Demo catalogue: ${added} added, ${updated} updated, ${unchanged} unchanged, ${leftAlone} left as edited.`)
  await loadDemoPeople(context)
  if (loadDemoShelf(context)) console.log('Demo shelf: filled.')
}

void main()
