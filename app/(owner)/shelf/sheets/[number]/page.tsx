import type { Metadata } from 'next'
import Link from 'next/link'
import { notFound } from 'next/navigation'
import { HistoryTable } from '@/components/shelf/history-table'
import { SheetDeeds } from '@/components/shelf/sheet-deeds'
import { VerdictLine } from '@/components/shelf/verdict-line'
import { ownContext } from '@/lib/server/enter'
import { orNotFound } from '@/lib/server/or-not-found'
import { getSheetHistory, listCartridges, listUnits } from '@/lib/shelf/queries'
import { SheetInput } from '@/lib/shelf/schema'
import { archiveSheetAction, copySheetAction, nameSheetAction, placeSheetAction, restoreSheetAction } from '../actions'

export const metadata: Metadata = { title: 'Sheet' }

const ACTIONS = { name: nameSheetAction, place: placeSheetAction, copy: copySheetAction, archive: archiveSheetAction, restore: restoreSheetAction }

export default async function SheetHistoryPage({ params }: { params: Promise<{ number: string }> }) {
  const asked = SheetInput.safeParse(await params)
  if (!asked.success) notFound()
  const { number } = asked.data
  const context = await ownContext(`/shelf/sheets/${number}`)
  const sheet = await orNotFound(() => getSheetHistory(context, number))
  const { name, archived, verdict, code, modelName, cartridgeName } = sheet
  return (
    <main id="main" className="w pg shelf">
      <p className="crumb">
        <Link href="/shelf">My sheets</Link> / <Link href={archived ? '/shelf/sheets?show=put-away' : '/shelf/sheets'}>{archived ? 'Put away' : 'All sheets'}</Link> / Sheet {number}
      </p>
      <h1>{name ?? `Sheet ${number}`}</h1>
      <p className="lead">
        {[name && `Sheet ${number}`, cartridgeName || 'A cartridge with no name', modelName].filter(Boolean).join(', ')}
      </p>
      <div className="row now">
        <VerdictLine verdict={verdict} />
        {archived ? (
          <span className="note">It is put away: its code opens nothing.</span>
        ) : (
          <Link className="b" href={`/sheets/${code}`}>
            Open the sheet
          </Link>
        )}
      </div>
      <HistoryTable sheet={sheet} />
      <SheetDeeds sheet={sheet} units={listUnits(context, { archived: false })} cartridges={listCartridges(context, { archived: false })} actions={ACTIONS} />
    </main>
  )
}
