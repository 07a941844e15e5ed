import type { Metadata } from 'next'
import { EntryPage } from '@/components/accounts/entry-page'
import { NewPassword } from '@/components/accounts/link-forms'
import { LinkTrouble } from '@/components/accounts/link-trouble'
import { getLink } from '@/lib/accounts/queries'
import { requestContext } from '@/lib/server/request-context'
import { oneParam, type SearchParams } from '@/lib/server/search-params'
import { resetPasswordAction } from './actions'

export const metadata: Metadata = { title: 'Choose a new password' }

/** Where the link of a mail leads. Opening it changes nothing; its button does. */
export default async function NewPasswordPage({ searchParams }: { searchParams: SearchParams }) {
  const token = await oneParam(searchParams, 'token')
  const link = getLink(await requestContext(), 'reset', token)
  return (
    <EntryPage>
      {link.state === 'open' ? (
        <NewPassword action={resetPasswordAction} token={token} email={link.email} />
      ) : (
        <LinkTrouble state={link.state} purpose="reset" />
      )}
    </EntryPage>
  )
}
