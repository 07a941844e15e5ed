import type { Metadata } from 'next'
import Link from 'next/link'
import { ClaimForm } from '@/components/shelf/claim-form'
import { ownContext } from '@/lib/server/enter'
import { oneParam, type SearchParams } from '@/lib/server/search-params'
import { claimSheetAction } from '../actions'

export const metadata: Metadata = { title: 'Add a sheet' }

export default async function AddSheetPage({ searchParams }: { searchParams: SearchParams }) {
  const code = await oneParam(searchParams, 'sheet')
  await ownContext(code ? `/shelf/sheets/add?sheet=${encodeURIComponent(code)}` : '/shelf/sheets/add')
  return (
    <main id="main" className="w pg shelf">
      <p className="crumb">
        <Link href="/shelf">My sheets</Link> / Add a sheet
      </p>
      <h1>Put a sheet on your shelf</h1>
      <p className="lead">One that you made before you signed in. From then on only you can change it; whoever has its code can still open it.</p>
      <ClaimForm action={claimSheetAction} code={code} />
    </main>
  )
}
