'use client'

import { FormWords } from '@/components/forms/form-words'
import { TextField } from '@/components/forms/text-field'
import { useActionForm } from '@/components/forms/use-action-form'
import { AddressInput } from '@/lib/accounts/schema'
import type { FormAction } from '@/lib/forms/terms'
import { Said } from './said'

/** Another mail address. It counts once both the old and the new one have said yes. */
export function ChangeAddressForm({ action, email }: { action: FormAction; email: string }) {
  const { state, pending, form, field } = useActionForm(AddressInput, action)
  return (
    <form {...form} className="afm">
      <p>
        Your mail address is <b>{email}</b>.
      </p>
      <TextField
        wiring={field('email')}
        label="New mail address"
        hint="We send a mail to both. The change is made once you have followed both links."
        type="email"
        autoComplete="email"
      />
      <FormWords words={state.done ? null : state.words} />
      <button className="b sm" type="submit" disabled={pending}>
        Send both mails
      </button>
      <Said words={state.done ? state.words : null} />
    </form>
  )
}
