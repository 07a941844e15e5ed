'use client'

import { startTransition, useActionState, useEffect, useMemo, type FormEvent } from 'react'
import { useForm, type FieldErrors, type Resolver, type UseFormRegisterReturn } from 'react-hook-form'
import type { z } from 'zod'
import { UNTOUCHED, type FormAction, type FormState } from '@/lib/forms/terms'

type Texts = Record<string, string>

/** What a field needs to be part of a form. */
export interface FieldWiring {
  id: string
  field: UseFormRegisterReturn
  /** What stands in it when the page arrives. */
  value: string | undefined
  error: string | undefined
}

export interface ActionForm {
  state: FormState
  pending: boolean
  /** For the form element. Without script the browser sends it, with script the schema looks first. */
  form: { action: (form: FormData) => void; onSubmit: (event: FormEvent<HTMLFormElement>) => void; noValidate: true }
  /** Ties a box to the form; hidden ones too. */
  field: (name: string) => FieldWiring
}

const toErrors = (fields: Record<string, string>): FieldErrors<Texts> =>
  Object.fromEntries(Object.entries(fields).map(([name, message]) => [name, { type: 'answer', message }]))

/** Holds what is typed against the schema that the server holds it against, so that the sentences are the same. */
function resolverOf(schema: z.ZodType): Resolver<Texts> {
  return (values) => {
    const read = schema.safeParse(values)
    if (read.success) return { values, errors: {} }
    const fields: Record<string, string> = {}
    for (const { path, message } of read.error.issues) fields[path.map(String).join('.')] ??= message
    return { values: {}, errors: toErrors(fields) }
  }
}

/**
 * A form with one schema for both sides and a server action behind it. Fields keep what is typed in them, and each shows
 * its own sentence.
 */
export function useActionForm(schema: z.ZodType, action: FormAction): ActionForm {
  const [state, send, pending] = useActionState(action, UNTOUCHED)
  const resolver = useMemo(() => resolverOf(schema), [schema])
  const answered = useMemo(() => toErrors(state.fields), [state])
  const { register, handleSubmit, setFocus, setValue, formState } = useForm<Texts>({ resolver, errors: answered })
  // Read in rendering: the form keeps track only of what is read.
  const { errors } = formState

  useEffect(() => {
    const first = Object.keys(state.fields)[0]
    if (first) setFocus(first)
  }, [state, setFocus])

  function onSubmit(event: FormEvent<HTMLFormElement>) {
    const form = event.currentTarget
    const { submitter } = event.nativeEvent as SubmitEvent
    // Of several buttons, the schema has to know which one was pressed.
    if (submitter instanceof HTMLButtonElement && submitter.name) setValue(submitter.name, submitter.value)
    void handleSubmit(() => startTransition(() => send(new FormData(form, submitter))))(event)
  }

  const field = (name: string): FieldWiring => ({
    id: `field-${name}`,
    field: register(name),
    value: state.values[name],
    error: errors[name]?.message,
  })
  return { state, pending, form: { action: send, onSubmit, noValidate: true }, field }
}
