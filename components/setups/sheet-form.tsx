'use client'

import { useActionState, type ReactNode } from 'react'
import { FieldError } from './field-error'
import { UNTOUCHED, type SheetAction } from './sheet-actions'

interface Props {
  action: SheetAction
  code: string
  className?: string
  /** Class and words of its one button. */
  button: string
  children: ReactNode
}

/** One button that does one thing to a sheet. It works before and without script. */
export function SheetForm({ action, code, className, button, children }: Props) {
  const [{ sentence }, act, pending] = useActionState(action, UNTOUCHED)
  return (
    <form action={act} className={className}>
      <input type="hidden" name="code" value={code} />
      <button type="submit" className={button} disabled={pending}>
        {pending ? 'One moment' : children}
      </button>
      {sentence && <FieldError>{sentence}</FieldError>}
    </form>
  )
}
