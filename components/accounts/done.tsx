'use client'

import { useEffect, useRef, type ReactNode } from 'react'

/** What stands in place of a form that is done. It takes the focus, since what had it is gone. */
export function Done({ title, words, children }: { title: string; words: string | null; children?: ReactNode }) {
  const heading = useRef<HTMLHeadingElement>(null)
  useEffect(() => heading.current?.focus(), [])
  return (
    <>
      <h1 ref={heading} tabIndex={-1}>
        {title}
      </h1>
      <p role="status">{words}</p>
      {children}
    </>
  )
}
