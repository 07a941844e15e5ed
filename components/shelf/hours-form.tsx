'use client'

import { FormWords } from '@/components/forms/form-words'
import { TextField } from '@/components/forms/text-field'
import { useActionForm } from '@/components/forms/use-action-form'
import type { FormAction } from '@/lib/forms/terms'
import { AddHoursInput } from '@/lib/shelf/schema'

/** Adds playing hours to what was counted so far. */
export function HoursForm({ action, cartridgeId, counted }: { action: FormAction; cartridgeId: string; counted: number | null }) {
  const { state, pending, form, field } = useActionForm(AddHoursInput, action)
  return (
    <form {...form} className="shf">
      <input type="hidden" {...field('cartridgeId').field} defaultValue={cartridgeId} />
      <input type="hidden" {...field('counted').field} defaultValue={counted ?? ''} />
      <TextField wiring={field('hours')} label="Hours played since" autoComplete="off" />
      <FormWords words={state.words} />
      <button className="b" type="submit" disabled={pending}>
        Add them
      </button>
    </form>
  )
}
