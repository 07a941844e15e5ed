import type { ReactNode } from 'react'
import type { SheetAct } from '@/lib/setups/terms-sheet'

interface Props {
  act: SheetAct
  code: string
  /** Class of its one button. */
  button: string
  children: ReactNode
}

/**
 * One button that does one thing to a sheet. A plain form to its own address, so it works without script. Holding the
 * code is what allows it: a page elsewhere that does not know the code cannot send it.
 */
export function SheetForm({ act, code, button, children }: Props) {
  return (
    <form action={`/sheets/${code}/${act}`} method="post">
      <button type="submit" className={button}>
        {children}
      </button>
    </form>
  )
}
