'use client'

import { zodResolver } from '@hookform/resolvers/zod'
import { useCallback, useEffect, useMemo, useRef } from 'react'
import { useForm, useWatch, type Resolver, type UseFormReturn } from 'react-hook-form'
import { Answers, answersFrom, type AnswersInput } from '@/lib/setups/schema'
import { DEFAULT_ANSWERS, STEP_KEYS, type AnswerKey, type Step } from '@/lib/setups/terms'
import { answersBeyond, keptAnswers } from './kept-answers'

export const NO_PREAMP = 'Choose your preamp first: everything else is held against it.'
const readAll = zodResolver(Answers)

/** The one schema, held against the answers of this step only: an older slip elsewhere must not hold anyone up here. */
function resolverOf(step: Step): Resolver<AnswersInput> {
  return async (values, context, options) => {
    const typed = answersFrom(values)
    const { errors } = await readAll(typed, context, options as Parameters<typeof readAll>[2])
    const own = Object.entries(errors).filter(([key]) => STEP_KEYS[step].some((each) => each === key))
    // Every answer may be left open but this one: there is nothing to hold the others against.
    if (step === 'preamp' && !typed.preamp) own.push(['preamp', { type: 'required', message: NO_PREAMP }])
    return own.length > 0 ? { values: {}, errors: Object.fromEntries(own) } : { values: typed, errors: {} }
  }
}

export interface CheckAnswers {
  form: UseFormReturn<AnswersInput>
  /** Everything as it stands now, this step's and all others'. */
  raw: AnswersInput
  apply: (answers: AnswersInput, focus?: AnswerKey) => void
}

/** The answers of the check as one form, begun with what the address says. */
export function useCheckAnswers(step: Step, initial: AnswersInput): CheckAnswers {
  const resolver = useMemo(() => resolverOf(step), [step])
  const form = useForm<AnswersInput>({ defaultValues: { ...DEFAULT_ANSWERS, ...initial }, resolver })
  const { control, setValue, setFocus } = form
  const raw = answersFrom(useWatch({ control }))

  const apply = useCallback(
    (answers: AnswersInput, focus?: AnswerKey) => {
      for (const [key, text] of Object.entries(answers)) setValue(key as AnswerKey, text, { shouldDirty: true, shouldTouch: true })
      if (focus) setFocus(focus)
    },
    [setValue, setFocus],
  )

  // Once, after the page came alive: text typed before that, and answers of later steps that this address, gone back
  // to, does not know yet.
  const begun = useRef(false)
  useEffect(() => {
    if (begun.current) return
    begun.current = true
    apply(answersBeyond(step, initial, keptAnswers()))
    apply(typedAlready(STEP_KEYS[step], initial))
  }, [apply, initial, step])

  return { form, raw, apply }
}

/** Text that stands in the page's boxes and not in the form's state. */
function typedAlready(keys: readonly AnswerKey[], initial: AnswersInput): AnswersInput {
  const found: AnswersInput = {}
  for (const key of keys) {
    for (const box of document.getElementsByName(key)) {
      if (!(box instanceof HTMLInputElement) || box.type === 'hidden') continue
      if (box.type === 'radio' && !box.checked) continue
      if (box.value !== (initial[key] ?? DEFAULT_ANSWERS[key] ?? '')) found[key] = box.value
    }
  }
  return found
}
