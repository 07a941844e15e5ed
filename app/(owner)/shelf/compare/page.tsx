import type { Metadata } from 'next'
import Link from 'next/link'
import { ChooseTwo } from '@/components/shelf/compare/choose-two'
import { Comparison } from '@/components/shelf/compare/comparison'
import { comparisonTitle } from '@/components/shelf/compare/labels'
import { NoSheets } from '@/components/shelf/no-sheets'
import { Fault } from '@/lib/kernel/errors'
import type { Context } from '@/lib/kernel/context'
import { ownContext } from '@/lib/server/enter'
import { oneParam, type SearchParams } from '@/lib/server/search-params'
import { getComparison } from '@/lib/shelf/compare'
import { findSheets } from '@/lib/shelf/find-sheets'
import { SheetSearch } from '@/lib/shelf/schema'
import type { Compared, ComparisonView } from '@/lib/shelf/views-compare'

export const metadata: Metadata = { title: 'Side by side', referrer: 'no-referrer' }

const shownOf = (text: string): Compared | null => (text === 'advised' || text === 'stood' ? text : null)

function found(context: Context, asked: { a: string; b: string; shown: Compared | null }): ComparisonView | null {
  if (!asked.a || !asked.b) return null
  try {
    return getComparison(context, asked)
  } catch (trouble) {
    if (trouble instanceof Fault && trouble.code === 'not_found') return null
    throw trouble
  }
}

export default async function ComparePage({ searchParams }: { searchParams: SearchParams }) {
  const [a, b, as] = [await oneParam(searchParams, 'a'), await oneParam(searchParams, 'b'), await oneParam(searchParams, 'as')]
  const context = await ownContext(a && b ? `/shelf/compare?a=${encodeURIComponent(a)}&b=${encodeURIComponent(b)}` : '/shelf/compare')
  const comparison = found(context, { a, b, shown: shownOf(as) })
  const { sheets } = comparison ? { sheets: [] } : findSheets(context, SheetSearch.parse({}))
  return (
    <main id="main" className="w pg shelf cmp-p">
      <p className="crumb">
        <Link href="/shelf">My sheets</Link> /{' '}
        {comparison?.sameSheet ? <Link href={`/shelf/sheets/${comparison.a.number}`}>Sheet {comparison.a.number}</Link> : <Link href="/shelf/compare">Side by side</Link>}
      </p>
      <h1>{comparison ? comparisonTitle(comparison) : 'Compare two revisions'}</h1>
      {comparison ? (
        <Comparison comparison={comparison} now={context.now} />
      ) : sheets.length > 0 ? (
        <ChooseTwo sheets={sheets} a={a} b={b} refused={a !== '' && b !== ''} />
      ) : (
        <NoSheets q="" show="kept" />
      )}
    </main>
  )
}
