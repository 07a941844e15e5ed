'use client'

import { useSyncExternalStore } from 'react'

const query = '(prefers-reduced-motion: reduce)'
const list = () => (typeof window.matchMedia === 'function' ? window.matchMedia(query) : null)

function subscribe(onChange: () => void) {
  const preference = list()
  preference?.addEventListener('change', onChange)
  return () => preference?.removeEventListener('change', onChange)
}

/** True when the person asked for less motion. The server, which moves nothing, says true. */
export function useReducedMotion(): boolean {
  return useSyncExternalStore(
    subscribe,
    () => list()?.matches ?? true,
    () => true,
  )
}
