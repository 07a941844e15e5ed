'use client'

import { useEffect, useRef } from 'react'
import { toQuery, type AnswersInput } from '@/lib/setups/schema'
import { keepAnswers } from './kept-answers'

/** Long enough that a word in the making is not written letter by letter, short enough to be there at a reload. */
const SETTLED_MILLISECONDS = 200

/** Keeps the address and the device in step with what was typed, right or wrong, so that nothing is lost. */
export function useAddress(answers: AnswersInput): void {
  const query = toQuery(answers)
  const latest = useRef(answers)
  useEffect(() => {
    latest.current = answers
  })
  useEffect(() => {
    const write = () => {
      if (window.location.search.slice(1) === query) return
      keepAnswers(latest.current)
      window.history.replaceState(null, '', `${window.location.pathname}${query && `?${query}`}`)
    }
    const timer = window.setTimeout(write, SETTLED_MILLISECONDS)
    window.addEventListener('pagehide', write)
    return () => {
      window.clearTimeout(timer)
      window.removeEventListener('pagehide', write)
    }
  }, [query])
}
