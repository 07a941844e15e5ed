import type { Metadata } from 'next'
import { EntryPage } from '@/components/accounts/entry-page'
import { SignInByLink } from '@/components/accounts/link-forms'
import { LinkTrouble } from '@/components/accounts/link-trouble'
import { getLink } from '@/lib/accounts/queries'
import { requestContext } from '@/lib/server/request-context'
import { oneParam, type SearchParams } from '@/lib/server/search-params'
import { signInWithLinkAction } from './actions'

export const metadata: Metadata = { title: 'Sign in' }

/** Where the link of a mail leads. Opening it changes nothing; its button does. */
export default async function LinkPage({ searchParams }: { searchParams: SearchParams }) {
  const token = await oneParam(searchParams, 'token')
  const link = getLink(await requestContext(), 'link', token)
  return (
    <EntryPage>
      {link.state === 'open' ? (
        <SignInByLink action={signInWithLinkAction} token={token} email={link.email} />
      ) : (
        <LinkTrouble state={link.state} purpose="link" />
      )}
    </EntryPage>
  )
}
