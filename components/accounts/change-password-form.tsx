'use client'

import { FormWords } from '@/components/forms/form-words'
import { TextField } from '@/components/forms/text-field'
import { useActionForm } from '@/components/forms/use-action-form'
import { ChangePasswordInput } from '@/lib/accounts/schema'
import type { FormAction } from '@/lib/forms/terms'
import { PasswordField } from './password-field'
import { Said } from './said'

/** Another password, or a first one for someone who signs in by link. */
export function ChangePasswordForm({ action, hasPassword }: { action: FormAction; hasPassword: boolean }) {
  const { state, pending, form, field } = useActionForm(ChangePasswordInput, action)
  return (
    <form {...form} className="afm">
      {hasPassword && <TextField wiring={field('present')} label="Present password" type="password" autoComplete="current-password" />}
      <PasswordField wiring={field('password')} label="New password" />
      <FormWords words={state.done ? null : state.words} />
      <button className="b sm" type="submit" disabled={pending}>
        Set the new password
      </button>
      <Said words={state.done ? state.words : null} />
    </form>
  )
}
