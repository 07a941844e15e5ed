import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { EntryPage } from '@/components/accounts/entry-page'
import { ChangeAddress } from '@/components/accounts/link-forms'
import { LinkTrouble } from '@/components/accounts/link-trouble'
import { getLink } from '@/lib/accounts/queries'
import { requestContext } from '@/lib/server/request-context'
import { oneParam, type SearchParams } from '@/lib/server/search-params'
import { confirmFromNewAction, confirmFromOldAction } from './actions'

export const metadata: Metadata = { title: 'Change your mail address' }

interface Props {
  params: Promise<{ end: string }>
  searchParams: SearchParams
}

export default async function ChangeAddressPage({ params, searchParams }: Props) {
  const { end } = await params
  if (end !== 'old' && end !== 'new') notFound()
  const token = await oneParam(searchParams, 'token')
  const link = getLink(await requestContext(), `change-address-${end}`, token)
  const action = end === 'old' ? confirmFromOldAction : confirmFromNewAction
  return (
    <EntryPage>
      {link.state === 'open' ? (
        <ChangeAddress action={action} token={token} email={link.email} end={end} />
      ) : (
        <LinkTrouble state={link.state} purpose={`change-address-${end}`} />
      )}
    </EntryPage>
  )
}
