import type { Metadata } from 'next'
import { EntryPage } from '@/components/accounts/entry-page'
import { AcceptInvitation } from '@/components/accounts/link-forms'
import { LinkTrouble } from '@/components/accounts/link-trouble'
import { getLink } from '@/lib/accounts/queries'
import { requestContext } from '@/lib/server/request-context'
import { oneParam, type SearchParams } from '@/lib/server/search-params'
import { acceptInvitationAction } from './actions'

export const metadata: Metadata = { title: 'Join the workshop' }

export default async function InvitationPage({ searchParams }: { searchParams: SearchParams }) {
  const token = await oneParam(searchParams, 'token')
  const link = getLink(await requestContext(), 'invite', token)
  return (
    <EntryPage>
      {link.state === 'open' && link.role ? (
        <AcceptInvitation action={acceptInvitationAction} token={token} email={link.email} role={link.role} />
      ) : (
        <LinkTrouble state={link.state === 'open' ? 'unknown' : link.state} purpose="invite" />
      )}
    </EntryPage>
  )
}
