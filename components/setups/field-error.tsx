import type { ReactNode } from 'react'
import { VerdictMark } from '../ui/verdict-mark'

/** What is wrong and what to do, with the error mark. Read out as it appears. */
export function FieldError({ id, children }: { id?: string; children: ReactNode }) {
  return (
    <p className="err" id={id} role="alert">
      <VerdictMark mark="error" />
      <span>{children}</span>
    </p>
  )
}
