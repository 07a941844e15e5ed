'use client'

import { FormWords } from '@/components/forms/form-words'
import { TextField } from '@/components/forms/text-field'
import { useActionForm } from '@/components/forms/use-action-form'
import type { FormAction } from '@/lib/forms/terms'
import { ClaimSheetInput } from '@/lib/shelf/schema'

/** Puts a sheet that was made before on the shelf, by its code. */
export function ClaimForm({ action, code }: { action: FormAction; code: string }) {
  const { state, pending, form, field } = useActionForm(ClaimSheetInput, action)
  return (
    <form {...form} className="shf">
      <TextField wiring={field('sheet')} label="The code on the sheet" hint="It stands at the foot of the printed page, in four groups of four." autoComplete="off" begin={code} />
      <FormWords words={state.words} />
      <button className="b pri" type="submit" disabled={pending}>
        Put it on my shelf
      </button>
    </form>
  )
}
