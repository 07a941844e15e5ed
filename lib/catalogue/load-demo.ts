import 'server-only'
import { eq } from 'drizzle-orm'
import { catalogueEntries } from '@/db/schema/catalogue'
import type { Context } from '../kernel/context'
import { DEMO_ENTRIES } from './demo'
import { hashOf, toColumns } from './rows'
import { CATALOGUE_KINDS, type CatalogueKind } from './terms'

export interface LoadedDemo {
  added: number
  updated: number
  unchanged: number
  /** Rows that people made or edited: left as they are. */
  leftAlone: number
}

/**
 * Brings the demo's entries up to date, all or none. Running it again changes nothing. An entry that someone edited
 * is theirs from then on; one that the demo no longer holds stays, since saved sheets may name it.
 *
 * @throws ZodError when the demo describes something impossible
 */
export function loadDemoCatalogue({ db, now }: Context, entries: { [Kind in CatalogueKind]: unknown[] } = DEMO_ENTRIES): LoadedDemo {
  const rows = CATALOGUE_KINDS.flatMap((kind) => entries[kind].map((entry) => toColumns(kind, entry)))
  return db.transaction((tx) => {
    const count: LoadedDemo = { added: 0, updated: 0, unchanged: 0, leftAlone: 0 }
    for (const row of rows) {
      const demoHash = hashOf(row.data)
      const known = tx
        .select({ data: catalogueEntries.data, demoHash: catalogueEntries.demoHash })
        .from(catalogueEntries)
        .where(eq(catalogueEntries.id, row.id))
        .get()
      if (!known) {
        tx.insert(catalogueEntries).values({ ...row, demoHash, createdAt: now, updatedAt: now }).run()
        count.added += 1
      } else if (known.demoHash !== hashOf(known.data)) {
        count.leftAlone += 1
      } else if (known.demoHash === demoHash) {
        count.unchanged += 1
      } else {
        tx.update(catalogueEntries).set({ ...row, demoHash, updatedAt: now }).where(eq(catalogueEntries.id, row.id)).run()
        count.updated += 1
      }
    }
    return count
  })
}
