import type { Metadata } from 'next'
import { EntryPage } from '@/components/accounts/entry-page'
import { ResetForm } from '@/components/accounts/reset-form'
import { askForResetAction } from './actions'

export const metadata: Metadata = { title: 'Choose a new password' }

export default function ResetPasswordPage() {
  return (
    <EntryPage>
      <ResetForm action={askForResetAction} />
    </EntryPage>
  )
}
