import type { ReactNode } from 'react'

/** One subject of the account page: its words on the left, what can be done on the right. */
export function AccountPart({ id, title, words, children }: { id: string; title: string; words?: string; children: ReactNode }) {
  return (
    <section className="two apt" aria-labelledby={id}>
      <div>
        <h2 id={id}>{title}</h2>
        {words && <p>{words}</p>}
      </div>
      <div>{children}</div>
    </section>
  )
}
