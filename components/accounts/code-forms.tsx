'use client'

import Link from 'next/link'
import { FormWords } from '@/components/forms/form-words'
import { TextField } from '@/components/forms/text-field'
import { useActionForm } from '@/components/forms/use-action-form'
import { CodeInput, RecoveryCodeInput } from '@/lib/accounts/schema'
import type { FormAction } from '@/lib/forms/terms'

interface Props {
  action: FormAction
  next: string
  /** The page with the other kind of code. */
  other: string
}

/** The second half of a sign-in: what the authenticator shows now. */
export function CodeForm({ action, next, other }: Props) {
  const { state, pending, form, field } = useActionForm(CodeInput, action)
  return (
    <form {...form} className="st2">
      <h1>Code from your authenticator</h1>
      <input type="hidden" name="next" value={next} />
      <TextField wiring={field('code')} label="Six figures" inputMode="numeric" autoComplete="one-time-code" />
      <FormWords words={state.words}>
        <Link href="/sign-in">Sign in</Link>
      </FormWords>
      <button className="b pri" type="submit" disabled={pending}>
        Go on
      </button>
      <p className="note">
        <Link href={other}>Use a recovery code</Link>
      </p>
    </form>
  )
}

/** The same with a code that was kept for the day the phone is gone. */
export function RecoveryForm({ action, next, other }: Props) {
  const { state, pending, form, field } = useActionForm(RecoveryCodeInput, action)
  return (
    <form {...form} className="st2">
      <h1>Recovery code</h1>
      <input type="hidden" name="next" value={next} />
      <TextField wiring={field('code')} label="One of the ten" hint="Two groups of five, such as k7m2w-9qdh4. Each works once." autoComplete="off" />
      <FormWords words={state.words}>
        <Link href="/sign-in">Sign in</Link>
      </FormWords>
      <button className="b pri" type="submit" disabled={pending}>
        Go on
      </button>
      <p className="note">
        <Link href={other}>Use the authenticator</Link>
      </p>
    </form>
  )
}
