'use client'

import { useOpenOnce } from './use-open-once'

/** Rare answers, folded away; opened where one of them is given. */
export function More({ filled, title = 'More, if you have it', children }: { filled: boolean; title?: string; children: React.ReactNode }) {
  const open = useOpenOnce(filled)
  return (
    <details className="more" open={open}>
      <summary>{title}</summary>
      {children}
    </details>
  )
}
