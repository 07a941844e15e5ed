'use client'

import { FormWords } from '@/components/forms/form-words'
import { PressForm } from '@/components/forms/press-form'
import { useActionForm } from '@/components/forms/use-action-form'
import { VerdictMark } from '@/components/ui/verdict-mark'
import { timeWords } from '@/lib/accounts/format'
import { AskForDeletionInput } from '@/lib/accounts/schema'
import type { FormAction } from '@/lib/forms/terms'

interface Props {
  /** When it goes; null while nobody asked. */
  deletesAt: number | null
  ask: FormAction
  takeBack: FormAction
}

/** Deleting an account: what goes, what stays and why, and a week to change one's mind. */
export function Deletion({ deletesAt, ask, takeBack }: Props) {
  if (deletesAt !== null) {
    return (
      <div className="mnote">
        <p>
          <b>Your account goes on {timeWords(deletesAt)}.</b> Until then everything works as before.
        </p>
        <PressForm action={takeBack}>Keep my account</PressForm>
      </div>
    )
  }
  return (
    <>
      <dl className="what">
        <dt>What goes</dt>
        <dd>Your name and address, your password and authenticator, the list of sessions, and what is on your shelf.</dd>
        <dt>What stays</dt>
        <dd>Your sheets, under their codes, without your name: a printed one has to open for whoever holds it.</dd>
        <dt>When</dt>
        <dd>A week from now. We send you a mail, and until then you can take it back here.</dd>
      </dl>
      <DeletionForm action={ask} />
    </>
  )
}

function DeletionForm({ action }: { action: FormAction }) {
  const { state, pending, form, field } = useActionForm(AskForDeletionInput, action)
  const { id, field: wired, error } = field('understood')
  return (
    <form {...form} className="afm">
      <label className="tick" htmlFor={id}>
        <input {...wired} id={id} type="checkbox" value="yes" aria-invalid={error ? true : undefined} aria-describedby={error ? `${id}-error` : undefined} />
        Delete my account in a week
      </label>
      {error && (
        <p className="err" id={`${id}-error`}>
          <VerdictMark mark="error" />
          <span>{error}</span>
        </p>
      )}
      <FormWords words={state.words} />
      <button className="b sm" type="submit" disabled={pending}>
        Delete my account
      </button>
    </form>
  )
}
