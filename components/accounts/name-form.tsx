'use client'

import { FormWords } from '@/components/forms/form-words'
import { TextField } from '@/components/forms/text-field'
import { useActionForm } from '@/components/forms/use-action-form'
import { ChangeNameInput } from '@/lib/accounts/schema'
import type { FormAction } from '@/lib/forms/terms'
import { Said } from './said'

/** What someone is called. */
export function NameForm({ action, name }: { action: FormAction; name: string }) {
  const { state, pending, form, field } = useActionForm(ChangeNameInput, action)
  return (
    <form {...form} className="afm">
      <TextField wiring={field('name')} label="What may we call you?" autoComplete="name" begin={name} />
      <FormWords words={state.done ? null : state.words} />
      <button className="b sm" type="submit" disabled={pending}>
        Keep this name
      </button>
      <Said words={state.done ? state.words : null} />
    </form>
  )
}
