import type { Metadata } from 'next'
import { EntryPage } from '@/components/accounts/entry-page'
import { ConfirmAddress } from '@/components/accounts/link-forms'
import { LinkTrouble } from '@/components/accounts/link-trouble'
import { getLink } from '@/lib/accounts/queries'
import { requestContext } from '@/lib/server/request-context'
import { oneParam, type SearchParams } from '@/lib/server/search-params'
import { confirmAddressAction } from './actions'

export const metadata: Metadata = { title: 'Confirm your address' }

/** Where the link of a mail leads. Opening it changes nothing; its button does. */
export default async function ConfirmEmailPage({ searchParams }: { searchParams: SearchParams }) {
  const token = await oneParam(searchParams, 'token')
  const link = getLink(await requestContext(), 'confirm', token)
  return (
    <EntryPage>
      {link.state === 'open' ? (
        <ConfirmAddress action={confirmAddressAction} token={token} email={link.email} />
      ) : (
        <LinkTrouble state={link.state} purpose="confirm" />
      )}
    </EntryPage>
  )
}
