import type { Metadata } from 'next'
import { AccountPart } from '@/components/accounts/account-part'
import { BringSecret } from '@/components/accounts/bring-secret'
import { BeginForm, ConfirmForm, RemoveForm } from '@/components/accounts/set-up-forms'
import { can } from '@/lib/access/permit'
import { dayWords } from '@/lib/accounts/format'
import { getAccount, getPendingSecondFactor } from '@/lib/accounts/queries'
import { ownContext, SET_UP_PAGE } from '@/lib/server/enter'
import { beginSecondFactorAction, confirmSecondFactorAction, removeSecondFactorAction } from './actions'

export const metadata: Metadata = { title: 'Code from an authenticator' }

export default async function SecondFactorPage() {
  const context = await ownContext(SET_UP_PAGE)
  const { secondFactor, role } = getAccount(context)
  const pending = getPendingSecondFactor(context)
  const mayRemove = secondFactor && context.actor.kind === 'person' && can(context.actor, 'account:remove-second-factor', context.actor)
  return (
    <main id="main" className="w pg acct">
      <h1>Code from an authenticator</h1>
      <p className="lead">
        {secondFactor
          ? `Asked for since ${dayWords(secondFactor.since)}. ${secondFactor.codesLeft} of 10 recovery codes are left.`
          : role === 'admin'
            ? 'Admins let other people in, so a password alone is not enough. Set this up first; everything else comes after.'
            : 'After your password or link, a code from an app on your phone. A password that got out then opens nothing.'}
      </p>
      <ConfirmForm action={confirmSecondFactorAction}>{pending && <BringSecret {...pending} />}</ConfirmForm>
      {!pending && (
        <AccountPart id="begin" title={secondFactor ? 'A new phone, or new recovery codes' : 'Set it up'}>
          <BeginForm action={beginSecondFactorAction} replaces={secondFactor !== null} />
        </AccountPart>
      )}
      {mayRemove && (
        <AccountPart id="remove" title="Take it off">
          <RemoveForm action={removeSecondFactorAction} />
        </AccountPart>
      )}
    </main>
  )
}
