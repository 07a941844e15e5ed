'use client'

import { startTransition, useEffect, useState } from 'react'
import type { Preamp } from '@/lib/match'
import { fromQuery, toQuery, type AnswersInput } from '@/lib/setups/schema'
import type { SoFarView } from '@/lib/setups/views-so-far'

export interface SoFarMade {
  /** The answers it was made from. The board is among them, so they stand for the preamp as well. */
  query: string
  view: SoFarView
  /** Whether what the groove speed means could turn the advice. */
  meaningMatters: boolean
}

/** After this long without a keystroke the check is reckoned anew. */
const STILL_MILLISECONDS = 250

/** What can be said so far: first as the server made it, then anew after each pause in typing. */
export function useSoFar(answers: AnswersInput, preamp: Preamp | null, made: SoFarMade): Omit<SoFarMade, 'query'> {
  const [last, setLast] = useState(made)
  const query = toQuery(answers)
  useEffect(() => {
    if (query === last.query) return
    let stale = false
    const timer = window.setTimeout(async () => {
      // The engine comes when it is first needed: the page is there before it.
      const { soFar, meaningMatters } = await import('@/lib/setups/views-so-far')
      if (stale) return
      const now = fromQuery(query)
      const view = soFar(now, preamp)
      // A key pressed meanwhile goes first, and makes the rest of no use.
      await new Promise((resolve) => setTimeout(resolve))
      if (stale) return
      const matters = meaningMatters(now, preamp)
      startTransition(() => setLast({ query, view, meaningMatters: matters }))
    }, STILL_MILLISECONDS)
    return () => {
      stale = true
      window.clearTimeout(timer)
    }
  }, [query, last.query, preamp])
  return last
}
