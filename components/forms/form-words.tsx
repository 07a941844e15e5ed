import type { ReactNode } from 'react'
import { VerdictMark } from '@/components/ui/verdict-mark'

/** What is wrong with the whole of a form, and the way on. The region is always there, so that it is read out. */
export function FormWords({ words, children }: { words: string | null; children?: ReactNode }) {
  return (
    <div role="alert">
      {words !== null && (
        <p className="err">
          <VerdictMark mark="error" />
          <span>
            {words} {children}
          </span>
        </p>
      )}
    </div>
  )
}
