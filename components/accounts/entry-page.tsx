import type { ReactNode } from 'react'

/** A page on the way in: what is asked on the left, what it is for on the right. */
export function EntryPage({ children, aside }: { children: ReactNode; aside?: ReactNode }) {
  return (
    <main id="main" className="w">
      <div className={aside ? 'si' : 'si one'}>
        <div>{children}</div>
        {aside && <aside>{aside}</aside>}
      </div>
    </main>
  )
}
