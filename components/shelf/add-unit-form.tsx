'use client'

import { FormWords } from '@/components/forms/form-words'
import { useActionForm } from '@/components/forms/use-action-form'
import type { FormAction } from '@/lib/forms/terms'
import { AddUnitInput } from '@/lib/shelf/schema'
import { UnitFields } from './unit-fields'

interface Props {
  action: FormAction
  model: { id: string; name: string }
  boards: readonly { id: string; name: string }[]
}

/** Puts a preamp of a model on the shelf. */
export function AddUnitForm({ action, model, boards }: Props) {
  const { state, pending, form, field } = useActionForm(AddUnitInput, action)
  return (
    <form {...form} className="shf">
      <input type="hidden" {...field('model').field} defaultValue={model.id} />
      <UnitFields field={field} modelName={model.name} boards={boards} />
      <FormWords words={state.words ?? state.fields.model ?? null} />
      <button className="b pri" type="submit" disabled={pending}>
        Put it on my shelf
      </button>
    </form>
  )
}
