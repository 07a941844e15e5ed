'use client'

import { useEffect, useRef, useState } from 'react'
import useSWR from 'swr'
import { MAX_SEARCH_LETTERS, USUAL_FOUND, type SearchedKind } from '@/lib/catalogue/terms'

/** Pause in typing after which the catalogue is asked. */
const PAUSE_MILLISECONDS = 150

/** Entries whose names hold the words typed; the answer to an older text never takes the place of a newer one. */
export function useLookUp<View>(kind: SearchedKind, text: string, type?: string): { entries: View[]; settled: boolean } {
  const [asked, setAsked] = useState('')
  useEffect(() => {
    const timer = window.setTimeout(() => setAsked(text.trim().slice(0, MAX_SEARCH_LETTERS)), PAUSE_MILLISECONDS)
    return () => window.clearTimeout(timer)
  }, [text])

  const running = useRef<AbortController>(null)
  const fetcher = async (address: string): Promise<View[]> => {
    running.current?.abort()
    running.current = new AbortController()
    const response = await fetch(address, { signal: running.current.signal })
    if (!response.ok) return []
    const found = (await response.json()) as { entries: View[] }
    return found.entries
  }
  const query = new URLSearchParams({ q: asked, limit: String(USUAL_FOUND), ...(type ? { type } : {}) })
  // A request that is broken off or finds no connection leaves the list empty: the box goes on as a text box.
  const { data } = useSWR<View[]>(asked === '' ? null : `/api/catalogue/${kind}?${query}`, fetcher, {
    keepPreviousData: true,
    revalidateOnFocus: false,
    shouldRetryOnError: false,
  })
  return { entries: asked === '' ? [] : (data ?? []), settled: asked === text.trim() }
}
