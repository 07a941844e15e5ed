import Link from 'next/link'
import { dayWords } from '@/lib/accounts/format'
import type { AccountView } from '@/lib/accounts/views'

/** Whether a code is asked for, and the page to set that up. */
export function SecondFactorNote({ secondFactor }: Pick<AccountView, 'secondFactor'>) {
  return (
    <>
      <p>
        {secondFactor
          ? `Since ${dayWords(secondFactor.since)} a code from your authenticator is asked for. ${secondFactor.codesLeft} of 10 recovery codes are left.`
          : 'With an authenticator app, a password or a mailbox alone does not open your account.'}
      </p>
      <Link className="b sm" href="/account/second-factor">
        {secondFactor ? 'Change it' : 'Set it up'}
      </Link>
    </>
  )
}
