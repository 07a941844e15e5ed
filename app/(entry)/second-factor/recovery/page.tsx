import type { Metadata } from 'next'
import { redirect } from 'next/navigation'
import { RecoveryForm } from '@/components/accounts/code-forms'
import { EntryPage } from '@/components/accounts/entry-page'
import { pathWithin } from '@/lib/kernel/path-within'
import { FIRST_PAGE } from '@/lib/server/enter'
import { requestActor } from '@/lib/server/request-context'
import { oneParam, type SearchParams } from '@/lib/server/search-params'
import { recoveryCodeAction } from '../actions'

export const metadata: Metadata = { title: 'Recovery code' }

export default async function RecoveryPage({ searchParams }: { searchParams: SearchParams }) {
  const next = pathWithin(await oneParam(searchParams, 'next'), FIRST_PAGE)
  const actor = await requestActor()
  if (actor.kind === 'person') redirect(next)
  if (!actor.awaitsCode) redirect('/sign-in')
  return (
    <EntryPage>
      <RecoveryForm action={recoveryCodeAction} next={next} other={`/second-factor?next=${encodeURIComponent(next)}`} />
    </EntryPage>
  )
}
