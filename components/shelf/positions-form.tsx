'use client'

import { useActionState } from 'react'
import { FormWords } from '@/components/forms/form-words'
import { sendForm } from '@/components/forms/send-form'
import { PanelPicker } from '@/components/panel/panel-picker'
import { UNTOUCHED, type FormAction } from '@/lib/forms/terms'
import type { Preamp } from '@/lib/match'
import type { StandingView } from '@/lib/shelf/views'

interface Props {
  action: FormAction
  unitId: string
  preamp: Preamp
  standing: StandingView | null
}

/** How a unit stands now, by its owner's eye. */
export function PositionsForm({ action, unitId, preamp, standing }: Props) {
  const [{ words, fields }, send, pending] = useActionState(action, UNTOUCHED)
  return (
    <form action={send} onSubmit={sendForm(send)} className="stands">
      <input type="hidden" name="unitId" value={unitId} />
      <PanelPicker preamp={preamp} legend="The switches as they stand" value={standing ?? undefined} />
      <FormWords words={words ?? fields.positions ?? null} />
      <p className="row">
        <button className="b pri" type="submit" name="known" value="yes" disabled={pending}>
          It stands like this
        </button>
        <button className="b" type="submit" name="known" value="no" disabled={pending}>
          I do not know any more
        </button>
      </p>
    </form>
  )
}
