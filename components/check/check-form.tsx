'use client'

import { useRouter, useSearchParams } from 'next/navigation'
import { useState, useTransition } from 'react'
import { SubmitButton } from '@/components/forms/submit-button'
import { PlaceLink } from '@/components/shell/place-link'
import type { PreampView } from '@/lib/catalogue/views'
import { Answers, fromQuery, toQuery, type AnswersInput } from '@/lib/setups/schema'
import { STEP_KEYS, type AnswerKey, type Step } from '@/lib/setups/terms'
import { pickPreamp } from '@/lib/setups/views-preamp'
import { nextStep, readForm, STEP_NAMES, STEP_PATHS, stepBefore, stepOf } from '@/lib/setups/views-steps'
import { CheckForm, type CheckFormContext } from './form-context'
import { LostConnection } from './lost-connection'
import { OtherAnswers } from './other-answers'
import { SoFar } from './so-far'
import { SoFarStrip } from './so-far-strip'
import { Stepper } from './stepper'
import { useAddress } from './use-address'
import { useCheckAnswers } from './use-check-answers'
import { canReachUs } from './reach'
import { useSoFar, type SoFarMade } from './use-so-far'

export interface CheckFormProps {
  step: Step
  heading: string
  lead: string
  next: string
  /** Every preamp of the maker, with its boards. */
  models: readonly PreampView[]
  /** What the server made of the answers in the address. */
  made: SoFarMade
  /** True when the server was asked to go on and could not: everything wrong is shown at once. */
  showAll: boolean
  /** True when more sheets came from here in a minute than are made. */
  mustWait: boolean
  /** Where the form goes without script; on the last step the verb that saves the sheet. */
  send: string | ((answers: FormData) => Promise<void>)
  /** Stays the same for one filled-in form, so that pressing twice makes one sheet. */
  sendKey?: string
  children: React.ReactNode
}

export function CheckFormPage({ step, heading, lead, next, models, made, showAll, mustWait, send, sendKey, children }: CheckFormProps) {
  const router = useRouter()
  const address = useSearchParams()
  const [initial] = useState(() => fromQuery(address.toString()))
  const { form, raw, apply } = useCheckAnswers(step, initial)
  useAddress(raw)
  const { model, board } = pickPreamp(models, raw)
  const { view, meaningMatters } = useSoFar(raw, board?.preamp ?? null, made)
  const [lost, setLost] = useState(false)
  const [waiting, startWaiting] = useTransition()
  const { touchedFields, isSubmitted } = form.formState
  const { answers, type, troubles } = readForm(raw)

  const showsTrouble = (keys: readonly AnswerKey[]) => showAll || isSubmitted || keys.some((key) => touchedFields[key])
  const { register } = form
  const context: CheckFormContext = {
    initial,
    raw,
    answers,
    type,
    field: (key) => register(key),
    showsTrouble,
    apply,
    meaningMatters,
  }

  const goOn = (all: AnswersInput, data: FormData) =>
    startWaiting(async () => {
      setLost(false)
      if (!(await canReachUs())) return setLost(true)
      const following = nextStep(step)
      if (following) return router.push(`${STEP_PATHS[following]}?${toQuery(all)}`)
      try {
        if (typeof send === 'function') await send(data)
      } catch (trouble) {
        // Only a request that got no answer: going to the sheet works by throwing as well.
        if (!(trouble instanceof TypeError)) throw trouble
        setLost(true)
      }
    })

  const elsewhere = troubles.filter((trouble) => stepOf(trouble) !== step)
  const before = stepBefore(step)
  const onLast = nextStep(step) === null
  return (
    <CheckForm value={context}>
      <Stepper step={step} raw={raw} modelName={model?.name ?? null} />
      <div className="flow">
        <div>
          <h1>{heading}</h1>
          <p>{lead}</p>
          <form
            {...(typeof send === 'string' ? { method: 'post', action: send } : { action: send })}
            noValidate
            onSubmit={(event) => {
              event.preventDefault()
              const data = new FormData(event.currentTarget)
              if (onLast && !Answers.safeParse(raw).success && elsewhere.length > 0) {
                router.push(`${STEP_PATHS[stepOf(elsewhere[0])]}?${toQuery(raw)}&show=all`)
                return
              }
              void form.handleSubmit(() => goOn(raw, data))(event)
            }}
          >
            {/* The first button of a form is what Enter presses: without this it would be the first fix. */}
            <button className="vh" type="submit" name="go" value="next" tabIndex={-1} aria-hidden="true">
              {next}
            </button>
            <input type="hidden" name="step" value={step} />
            {sendKey && <input type="hidden" name="key" value={sendKey} />}
            <OtherAnswers raw={raw} here={STEP_KEYS[step]} />
            {children}
            {onLast && elsewhere.length > 0 && (
              <p className="note" role="status">
                {STEP_NAMES[stepOf(elsewhere[0])]} has a value to put right before the sheet can be made.
              </p>
            )}
            {mustWait && (
              <p className="note" role="alert">
                That is more than we answer in a minute. Wait a minute, then send again.
              </p>
            )}
            <LostConnection lost={lost} again={next} />
            <div className="nav">
              <SubmitButton waiting={waiting}>{next}</SubmitButton>
              {before && (
                <PlaceLink href={`${STEP_PATHS[before]}?${toQuery(raw)}`}>Back to {STEP_NAMES[before].toLowerCase()}</PlaceLink>
              )}
            </div>
            <SoFarStrip view={view} first={made.view} />
          </form>
        </div>
        <SoFar view={view} />
      </div>
    </CheckForm>
  )
}
