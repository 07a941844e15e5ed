'use client'

import Link from 'next/link'
import type { ReactNode } from 'react'
import { FormWords } from '@/components/forms/form-words'
import { TextField } from '@/components/forms/text-field'
import { useActionForm } from '@/components/forms/use-action-form'
import { BeginSecondFactorInput, CodeInput, ProofInput } from '@/lib/accounts/schema'
import type { FormAction } from '@/lib/forms/terms'

const PROOF_HINT = 'A code of the authenticator you have now, or one of your recovery codes.'

/** Makes a new secret. Whoever has an authenticator already shows a code of it first. */
export function BeginForm({ action, replaces }: { action: FormAction; replaces: boolean }) {
  const { state, pending, form, field } = useActionForm(BeginSecondFactorInput, action)
  return (
    <form {...form} className="afm">
      {replaces && <TextField wiring={field('code')} label="Code" hint={PROOF_HINT} autoComplete="one-time-code" />}
      <FormWords words={state.words} />
      <button className={replaces ? 'b sm' : 'b pri'} type="submit" disabled={pending}>
        {replaces ? 'Set up another one' : 'Set it up'}
      </button>
    </form>
  )
}

/**
 * Takes the first code of an app. It stays on the page when that is done, with the recovery codes, which are shown this
 * once.
 * @param children how to bring the secret into the app; nothing when none is being set up
 */
export function ConfirmForm({ action, children }: { action: FormAction; children: ReactNode }) {
  const { state, pending, form, field } = useActionForm(CodeInput, action)
  if (state.shown) {
    return (
      <section className="st2" aria-labelledby="kept">
        <h2 id="kept">Keep these ten codes</h2>
        <p role="status">{state.words}</p>
        <ol className="codes">
          {state.shown.map((code) => (
            <li key={code}>{code}</li>
          ))}
        </ol>
        <Link className="b pri" href="/account">
          I have kept them
        </Link>
      </section>
    )
  }
  if (!children) return null
  return (
    <form {...form} className="st2">
      {children}
      <TextField wiring={field('code')} label="Six figures that the app shows now" inputMode="numeric" autoComplete="one-time-code" />
      <FormWords words={state.words} />
      <button className="b pri" type="submit" disabled={pending}>
        Go on
      </button>
    </form>
  )
}

/** Takes the authenticator off. */
export function RemoveForm({ action }: { action: FormAction }) {
  const { state, pending, form, field } = useActionForm(ProofInput, action)
  return (
    <form {...form} className="afm">
      <TextField wiring={field('code')} label="Code" hint={PROOF_HINT} autoComplete="one-time-code" />
      <FormWords words={state.words} />
      <button className="b sm" type="submit" disabled={pending}>
        Take it off
      </button>
    </form>
  )
}
