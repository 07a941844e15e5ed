'use client'

import { FormWords } from '@/components/forms/form-words'
import { TextField } from '@/components/forms/text-field'
import { useActionForm } from '@/components/forms/use-action-form'
import { AddressInput } from '@/lib/accounts/schema'
import type { FormAction } from '@/lib/forms/terms'
import { Done } from './done'

/** Asks for a link to choose a new password. */
export function ResetForm({ action }: { action: FormAction }) {
  const { state, pending, form, field } = useActionForm(AddressInput, action)
  if (state.done) return <Done title="Look in your mail" words={state.words} />
  return (
    <form {...form}>
      <h1>Choose a new password</h1>
      <p>We send a link to your mail address. With it you choose another password.</p>
      <TextField wiring={field('email')} label="Mail address" type="email" autoComplete="username" />
      <FormWords words={state.words} />
      <button className="b pri" type="submit" disabled={pending}>
        Send me a link
      </button>
    </form>
  )
}
