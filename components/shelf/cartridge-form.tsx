'use client'

import { useActionState, useState } from 'react'
import { CartridgeFields } from '@/components/check/cartridge-fields'
import { CheckForm, type CheckFormContext } from '@/components/check/form-context'
import { OtherAnswers } from '@/components/check/other-answers'
import { useCheckAnswers } from '@/components/check/use-check-answers'
import { FieldRow } from '@/components/forms/field-row'
import { FormWords } from '@/components/forms/form-words'
import { sendForm } from '@/components/forms/send-form'
import { UNTOUCHED, type FormAction } from '@/lib/forms/terms'
import { answersFrom, type AnswersInput } from '@/lib/setups/schema'
import { STEP_KEYS } from '@/lib/setups/terms'
import { readForm } from '@/lib/setups/views-steps'

interface Props {
  action: FormAction
  /** As it stands when the page arrives. */
  answers: AnswersInput
  begin: { hours: string; notes: string }
  /** What the form is about, beside its boxes. */
  values: Record<string, string>
  button: string
}

/** A cartridge as a check asks for it, with what an owner keeps of it besides. */
export function CartridgeForm({ action, answers: given, begin, values, button }: Props) {
  const [state, send, pending] = useActionState(action, UNTOUCHED)
  // Without script a refused form comes back as a page of its own, with what was typed.
  const [initial] = useState(() => (Object.keys(state.values).length > 0 ? answersFrom(state.values) : given))
  const { form, raw, apply } = useCheckAnswers('cartridge', initial)
  const { answers, type } = readForm(raw)
  const { touchedFields } = form.formState
  const refused = Object.keys(state.fields).length > 0
  const context: CheckFormContext = {
    initial,
    raw,
    answers,
    type,
    field: (key) => form.register(key),
    showsTrouble: (keys) => refused || keys.some((key) => touchedFields[key]),
    apply,
    // Nothing is reckoned here, so what a groove speed means is asked wherever one is given.
    meaningMatters: true,
  }
  const wrong = state.fields.name ?? state.words ?? (refused ? 'Something has to be put right before it can be kept.' : null)
  return (
    <CheckForm value={context}>
      <form action={send} onSubmit={sendForm(send)} className="shf flow-in" noValidate>
        {Object.entries(values).map(([name, value]) => (
          <input key={name} type="hidden" name={name} value={value} />
        ))}
        {/* The first button of a form is what Enter presses: without this it would be the first fix. */}
        <button className="vh" type="submit" tabIndex={-1} aria-hidden="true">
          {button}
        </button>
        <OtherAnswers raw={{ leaflet: raw.leaflet, cart: raw.cart }} here={STEP_KEYS.cartridge} />
        <CartridgeFields />
        <FieldRow id="hours" question="Stylus hours" help="How long its stylus has played. Leave it empty if nobody counts.">
          <span className={state.fields.hours ? 'in bad' : 'in'}>
            <input name="hours" type="text" inputMode="decimal" autoComplete="off" aria-label="Stylus hours" defaultValue={state.values.hours ?? begin.hours} aria-describedby={state.fields.hours ? 'hours-e' : undefined} />
            <span className="u" aria-hidden="true">
              h
            </span>
          </span>
          {state.fields.hours && (
            <p className="err" id="hours-e">
              {state.fields.hours}
            </p>
          )}
        </FieldRow>
        <FieldRow id="notes" question="Notes" help="For yourself: which arm, which shim, what is on the box.">
          <textarea name="notes" rows={3} aria-label="Notes" defaultValue={state.values.notes ?? begin.notes} aria-describedby={state.fields.notes ? 'notes-e' : undefined} />
          {state.fields.notes && (
            <p className="err" id="notes-e">
              {state.fields.notes}
            </p>
          )}
        </FieldRow>
        <FormWords words={wrong} />
        <button className="b pri" type="submit" disabled={pending}>
          {button}
        </button>
      </form>
    </CheckForm>
  )
}
