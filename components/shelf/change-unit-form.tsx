'use client'

import { FormWords } from '@/components/forms/form-words'
import { useActionForm } from '@/components/forms/use-action-form'
import type { FormAction } from '@/lib/forms/terms'
import { ChangeUnitInput } from '@/lib/shelf/schema'
import type { UnitView } from '@/lib/shelf/views'
import { UnitFields } from './unit-fields'

/** Changes what is kept of a unit. */
export function ChangeUnitForm({ action, unit }: { action: FormAction; unit: Omit<UnitView, 'preamp'> }) {
  const { state, pending, form, field } = useActionForm(ChangeUnitInput, action)
  const { id, model, board, boards, name, boughtOn, boughtFrom, secondHand, serialEnding } = unit
  return (
    <form {...form} className="shf">
      <input type="hidden" {...field('unitId').field} defaultValue={id} />
      <UnitFields
        field={field}
        modelName={model.name}
        boards={boards}
        begin={{ board: board?.id ?? '', name: name ?? '', boughtOn: boughtOn ?? '', boughtFrom: boughtFrom ?? '', secondHand, serialEnding }}
      />
      <FormWords words={state.words ?? state.fields.model ?? null} />
      <button className="b" type="submit" disabled={pending}>
        Keep the changes
      </button>
    </form>
  )
}
