'use client'

import { useEffect } from 'react'
import { fromQuery, toQuery, type AnswersInput } from '@/lib/setups/schema'
import { keepAnswers } from './kept-answers'

/** Long enough that a word in the making is not written letter by letter, short enough to be there at a reload. */
const SETTLED_MILLISECONDS = 200

/**
 * Keeps the address and the device in step with what was typed, right or wrong, so that nothing is lost.
 * Whatever leaves the page is preceded by a click, a key or a hidden page, and what is still waiting is written then:
 * to write once the router is on its way would call it back.
 */
export function useAddress(answers: AnswersInput): void {
  const query = toQuery(answers)
  useEffect(() => {
    if (toQuery(fromQuery(window.location.search)) === query) return
    const write = () => {
      stop()
      keepAnswers(fromQuery(query))
      window.history.replaceState(null, '', `${window.location.pathname}${query && `?${query}`}`)
    }
    const timer = window.setTimeout(write, SETTLED_MILLISECONDS)
    const leaving = ['click', 'submit', 'pagehide'] as const
    const stop = () => {
      window.clearTimeout(timer)
      for (const event of leaving) window.removeEventListener(event, write, true)
    }
    for (const event of leaving) window.addEventListener(event, write, true)
    return stop
  }, [query])
}
