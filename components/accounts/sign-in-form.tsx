'use client'

import Link from 'next/link'
import { FormWords } from '@/components/forms/form-words'
import { TextField } from '@/components/forms/text-field'
import { useActionForm } from '@/components/forms/use-action-form'
import { EnterInput } from '@/lib/accounts/schema'
import type { FormAction } from '@/lib/forms/terms'
import { Done } from './done'

interface Props {
  action: FormAction
  /** Where to go afterwards. */
  next: string
  /** Something that just happened, such as a new password. */
  note?: string
}

/** One address, two ways in: with a password, or with a link by mail. */
export function SignInForm({ action, next, note }: Props) {
  const { state, pending, form, field } = useActionForm(EnterInput, action)
  if (state.done) return <Done title="Look in your mail" words={state.words} />
  return (
    <form {...form}>
      <h1>Sign in</h1>
      <p>With your password, or with a link we send you by mail.</p>
      {note && (
        <p className="said" role="status">
          {note}
        </p>
      )}
      <input type="hidden" name="next" value={next} />
      <TextField wiring={field('email')} label="Mail address" type="email" autoComplete="username" />
      <TextField wiring={field('password')} label="Password" type="password" autoComplete="current-password" />
      <FormWords words={state.words} />
      <button className="b pri" type="submit" name="how" value="password" disabled={pending}>
        Sign in
      </button>
      <p className="alt">
        <b>No password, or forgotten?</b> The link opens once, and lasts twenty minutes. Or{' '}
        <Link href="/reset-password">choose a new password</Link>.
      </p>
      <button className="b" type="submit" name="how" value="link" disabled={pending}>
        Send me a link
      </button>
      <p className="alt">
        New here? The link makes your account too. Or <Link href="/join">join with a password</Link>.
      </p>
    </form>
  )
}
