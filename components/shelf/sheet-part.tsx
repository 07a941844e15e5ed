import type { ReactNode } from 'react'

/** One thing that can be done with a sheet: its words on the left, how on the right. */
export function SheetPart({ id, title, words, children }: { id: string; title: string; words: ReactNode; children: ReactNode }) {
  return (
    <section className="two part" aria-labelledby={id}>
      <div>
        <h2 id={id}>{title}</h2>
        {words}
      </div>
      <div>{children}</div>
    </section>
  )
}
