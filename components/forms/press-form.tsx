'use client'

import { useActionState, type ReactNode } from 'react'
import { UNTOUCHED, type FormAction } from '@/lib/forms/terms'
import { FormWords } from './form-words'

interface Props {
  action: FormAction
  /** What the press is about, such as which session. */
  values?: Record<string, string>
  className?: string
  /** The button's own class. */
  button?: string
  /** For those who cannot see what it stands beside. */
  label?: string
  children: ReactNode
}

/** One button that does one thing. It works before and without script. */
export function PressForm({ action, values = {}, className, button = 'b sm', label, children }: Props) {
  const [{ words, done, fields }, send, pending] = useActionState(action, UNTOUCHED)
  const wrong = words ?? Object.values(fields)[0] ?? null
  return (
    <form action={send} className={className}>
      {Object.entries(values).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      <button type="submit" className={button} disabled={pending} aria-label={label}>
        {pending ? 'One moment' : children}
      </button>
      <FormWords words={done ? null : wrong} />
    </form>
  )
}
