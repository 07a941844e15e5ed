'use client'

import { startTransition, useEffect, useState } from 'react'
import type { Preamp } from '@/lib/match'
import { fromQuery, toQuery, type AnswersInput } from '@/lib/setups/schema'
import type { SoFarView } from '@/lib/setups/views-so-far'

/** After this long without a keystroke the check is reckoned anew. */
const STILL_MILLISECONDS = 250

/** What can be said so far: first as the server made it, then anew after each pause in typing. */
export function useSoFar(answers: AnswersInput, preamp: Preamp | null, made: { query: string; view: SoFarView }): SoFarView {
  const [last, setLast] = useState(made)
  // The board is among the answers, so a query stands for the preamp as well.
  const query = toQuery(answers)
  useEffect(() => {
    if (query === last.query) return
    let stale = false
    const timer = window.setTimeout(async () => {
      // The engine comes when it is first needed: the page is there before it.
      const { soFar } = await import('@/lib/setups/views-so-far')
      if (stale) return
      const view = soFar(fromQuery(query), preamp)
      startTransition(() => setLast({ query, view }))
    }, STILL_MILLISECONDS)
    return () => {
      stale = true
      window.clearTimeout(timer)
    }
  }, [query, last.query, preamp])
  return last.view
}
