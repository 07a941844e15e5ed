import type { Metadata } from 'next'
import { redirect } from 'next/navigation'
import { CodeForm } from '@/components/accounts/code-forms'
import { EntryPage } from '@/components/accounts/entry-page'
import { pathWithin } from '@/lib/kernel/path-within'
import { FIRST_PAGE } from '@/lib/server/enter'
import { requestActor } from '@/lib/server/request-context'
import { oneParam, type SearchParams } from '@/lib/server/search-params'
import { checkSecondFactorAction } from './actions'

export const metadata: Metadata = { title: 'Code from your authenticator' }

export default async function SecondFactorPage({ searchParams }: { searchParams: SearchParams }) {
  const next = pathWithin(await oneParam(searchParams, 'next'), FIRST_PAGE)
  const actor = await requestActor()
  if (actor.kind === 'person') redirect(next)
  if (!actor.awaitsCode) redirect('/sign-in')
  return (
    <EntryPage>
      <CodeForm action={checkSecondFactorAction} next={next} other={`/second-factor/recovery?next=${encodeURIComponent(next)}`} />
    </EntryPage>
  )
}
