'use client'

import Link from 'next/link'
import { useState, useSyncExternalStore } from 'react'
import { toQuery } from '@/lib/setups/schema'
import { forgetAnswers, keptAnswers } from './kept-answers'

const noChanges = () => () => {}
const keptQuery = () => toQuery(keptAnswers())

/** Answers that were begun on this device and not finished, offered where a new check begins. */
export function CarryOn() {
  const [gone, setGone] = useState(false)
  // What the device holds is known in the browser only; the page arrives without it.
  const [query] = useState(() => ({ current: null as string | null }))
  const kept = useSyncExternalStore(
    noChanges,
    () => (query.current ??= keptQuery()),
    () => '',
  )
  if (gone || kept === '') return null
  return (
    <p className="note cry">
      Your last answers are kept on this device.{' '}
      <Link href={`/check/cartridge?${kept}`} prefetch={false}>
        Carry on with them
      </Link>{' '}
      <button
        className="lnk"
        type="button"
        onClick={() => {
          forgetAnswers()
          setGone(true)
        }}
      >
        Forget them
      </button>
    </p>
  )
}
