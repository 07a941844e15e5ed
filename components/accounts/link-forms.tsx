'use client'

import { TextField } from '@/components/forms/text-field'
import { ROLE_WORDS } from '@/lib/accounts/format'
import { AcceptInvitationInput, ConfirmAddressInput, LinkInput, ResetPasswordInput } from '@/lib/accounts/schema'
import type { Role } from '@/lib/accounts/terms'
import type { FormAction } from '@/lib/forms/terms'
import { AGAIN } from './link-trouble'
import { PasswordField } from './password-field'
import { TokenForm } from './token-form'

interface Props {
  action: FormAction
  token: string
  /** The address that the link was sent to. */
  email: string
}

export function SignInByLink({ action, token, email }: Props) {
  return (
    <TokenForm
      schema={LinkInput}
      action={action}
      token={token}
      title="Sign in"
      words={
        <>
          As <b>{email}</b>. If this is not your address, close this page.
        </>
      }
      button="Sign in"
      again={AGAIN.link}
    />
  )
}

export function ConfirmAddress({ action, token, email }: Props) {
  return (
    <TokenForm
      schema={ConfirmAddressInput}
      action={action}
      token={token}
      title="Confirm your address"
      words={
        <>
          Somebody joined with <b>{email}</b>. If that was you, type the password you chose. If it was not, close this page: no account is made.
        </>
      }
      button="Confirm"
      again={AGAIN.confirm}
      fields={(field) => <TextField wiring={field('password')} label="Password" type="password" autoComplete="current-password" />}
    />
  )
}

export function NewPassword({ action, token, email }: Props) {
  return (
    <TokenForm
      schema={ResetPasswordInput}
      action={action}
      token={token}
      title="Choose a new password"
      words={
        <>
          For <b>{email}</b>. Everywhere this account is signed in, it is signed out.
        </>
      }
      button="Set the new password"
      again={AGAIN.reset}
      fields={(field) => <PasswordField wiring={field('password')} label="New password" />}
    />
  )
}

export function AcceptInvitation({ action, token, email, role }: Props & { role: Role }) {
  return (
    <TokenForm
      schema={AcceptInvitationInput}
      action={action}
      token={token}
      title="Join the workshop"
      words={
        <>
          {ROLE_WORDS[role]}, with the address <b>{email}</b>.
          {role === 'admin' && ' After this you set up an authenticator app: admins sign in with a code as well.'}
        </>
      }
      button="Join the workshop"
      again={AGAIN.invite}
      fields={(field) => (
        <>
          <TextField wiring={field('name')} label="What may we call you?" autoComplete="name" />
          <PasswordField wiring={field('password')} />
        </>
      )}
    />
  )
}

export function ChangeAddress({ action, token, email, end }: Props & { end: 'old' | 'new' }) {
  return (
    <TokenForm
      schema={LinkInput}
      action={action}
      token={token}
      title="Change your mail address"
      words={
        <>
          To <b>{email}</b>. {end === 'old' ? 'You say yes from the old address here;' : 'You say yes from the new address here;'} the change is made once
          both have said yes.
        </>
      }
      button="Yes, change it"
      again={AGAIN['change-address-old']}
      doneTitle="Noted"
    />
  )
}
