import type { Metadata } from 'next'
import { AccountPart } from '@/components/accounts/account-part'
import { ChangeAddressForm } from '@/components/accounts/change-address-form'
import { ChangePasswordForm } from '@/components/accounts/change-password-form'
import { Deletion } from '@/components/accounts/deletion'
import { NameForm } from '@/components/accounts/name-form'
import { SecondFactorNote } from '@/components/accounts/second-factor-note'
import { SessionList } from '@/components/accounts/session-list'
import { PressForm } from '@/components/forms/press-form'
import { getAccount, listSessions } from '@/lib/accounts/queries'
import { ownContext } from '@/lib/server/enter'
import {
  askForDeletionAction,
  changeAddressAction,
  changeNameAction,
  changePasswordAction,
  endAllSessionsAction,
  endSessionAction,
  signOutAction,
  takeBackDeletionAction,
} from './actions'

export const metadata: Metadata = { title: 'Your account' }

export default async function AccountPage() {
  const context = await ownContext('/account')
  const account = getAccount(context)
  return (
    <main id="main" className="w pg acct">
      <h1>Your account</h1>
      <div className="row">
        <p className="lead">{account.name}</p>
        <PressForm action={signOutAction}>Sign out</PressForm>
      </div>
      <AccountPart id="who" title="Name and address">
        <NameForm action={changeNameAction} name={account.name} />
        <ChangeAddressForm action={changeAddressAction} email={account.email} />
      </AccountPart>
      <AccountPart
        id="password"
        title="Password"
        words={account.hasPassword ? 'A new one signs you out everywhere else.' : 'You have none: you sign in with a link by mail. With a password you can do either.'}
      >
        <ChangePasswordForm action={changePasswordAction} hasPassword={account.hasPassword} />
      </AccountPart>
      {account.role !== 'owner' && (
        <AccountPart id="second" title="Code from an authenticator">
          <SecondFactorNote secondFactor={account.secondFactor} />
        </AccountPart>
      )}
      <AccountPart id="sessions" title="Where you are signed in" words="Something here that you do not know? Sign it out, and set a new password.">
        <SessionList sessions={listSessions(context)} endSession={endSessionAction} endAll={endAllSessionsAction} />
      </AccountPart>
      <AccountPart id="all" title="Everything we have of you" words="One archive: files you can open, and the same again for programs.">
        <a className="b sm" href="/api/account/export" download>
          Download everything
        </a>
      </AccountPart>
      <AccountPart id="delete" title="Delete your account">
        <Deletion deletesAt={account.deletesAt} ask={askForDeletionAction} takeBack={takeBackDeletionAction} />
      </AccountPart>
    </main>
  )
}
