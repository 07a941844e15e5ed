import type { ReactNode } from 'react'

interface Props {
  /** Its place in the address, for linking to it. */
  id: string
  title: string
  children: ReactNode
}

/** One subject of a page of words: what it is about on the left, the words beside it. */
export function Part({ id, title, children }: Props) {
  return (
    <section className="two wds" aria-labelledby={id}>
      <h2 id={id}>{title}</h2>
      <div>{children}</div>
    </section>
  )
}
