'use client'

import Link from 'next/link'
import { FormWords } from '@/components/forms/form-words'
import { TextField } from '@/components/forms/text-field'
import { useActionForm } from '@/components/forms/use-action-form'
import { JoinInput } from '@/lib/accounts/schema'
import type { FormAction } from '@/lib/forms/terms'
import { Done } from './done'
import { PasswordField } from './password-field'

/** A new account. It is made once its address has shown to be its owner's. */
export function JoinForm({ action }: { action: FormAction }) {
  const { state, pending, form, field } = useActionForm(JoinInput, action)
  if (state.done) return <Done title="Look in your mail" words={state.words} />
  return (
    <form {...form}>
      <h1>Join</h1>
      <p>We send a mail to your address first, so that nobody joins in your name.</p>
      <TextField wiring={field('name')} label="What may we call you?" autoComplete="name" />
      <TextField wiring={field('email')} label="Mail address" type="email" autoComplete="username" />
      <PasswordField wiring={field('password')} />
      <FormWords words={state.words} />
      <button className="b pri" type="submit" disabled={pending}>
        Join
      </button>
      <p className="alt">
        Here before? <Link href="/sign-in">Sign in</Link>
      </p>
    </form>
  )
}
