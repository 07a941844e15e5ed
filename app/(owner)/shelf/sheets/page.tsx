import type { Metadata } from 'next'
import Link from 'next/link'
import { NoSheets } from '@/components/shelf/no-sheets'
import { Pager } from '@/components/shelf/pager'
import { SheetsFilter } from '@/components/shelf/sheets-filter'
import { SheetsTable } from '@/components/shelf/sheets-table'
import { ownContext } from '@/lib/server/enter'
import type { SearchParams } from '@/lib/server/search-params'
import { findSheets } from '@/lib/shelf/find-sheets'
import { sheetsPath } from '@/lib/shelf/format'
import { SheetSearch } from '@/lib/shelf/schema'

export const metadata: Metadata = { title: 'All sheets' }

export default async function SheetsPage({ searchParams }: { searchParams: SearchParams }) {
  const search = SheetSearch.parse(await searchParams)
  const context = await ownContext(sheetsPath(search))
  const found = findSheets(context, search)
  return (
    <main id="main" className="w pg shelf">
      <p className="crumb">
        <Link href="/shelf">My sheets</Link> / All sheets
      </p>
      <h1>All sheets</h1>
      <SheetsFilter {...found} />
      <p role="status" className="note">
        {found.total === 1 ? 'One sheet.' : `${found.total} sheets.`}
      </p>
      {found.total > 0 ? <SheetsTable sheets={found.sheets} now={context.now} /> : <NoSheets {...found} />}
      <Pager {...found} pathOf={(page) => sheetsPath({ ...found, page })} />
    </main>
  )
}
