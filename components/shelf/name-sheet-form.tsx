'use client'

import { FormWords } from '@/components/forms/form-words'
import { TextField } from '@/components/forms/text-field'
import { useActionForm } from '@/components/forms/use-action-form'
import type { FormAction } from '@/lib/forms/terms'
import { NameSheetInput } from '@/lib/shelf/schema'

/** What its owner calls a sheet. */
export function NameSheetForm({ action, number, name }: { action: FormAction; number: number; name: string | null }) {
  const { state, pending, form, field } = useActionForm(NameSheetInput, action)
  return (
    <form {...form} className="shf">
      <input type="hidden" {...field('number').field} defaultValue={number} />
      <TextField wiring={field('name')} label="Name" hint="For yourself. It stands on no page that others see." autoComplete="off" begin={name ?? ''} />
      <FormWords words={state.words} />
      <button className="b" type="submit" disabled={pending}>
        Keep the name
      </button>
    </form>
  )
}
