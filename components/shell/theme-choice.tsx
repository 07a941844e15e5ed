'use client'

import { usePathname, useSearchParams } from 'next/navigation'
import { useState, type FormEvent } from 'react'
import { THEMES, THEME_WORDS, toTheme, type Theme } from '@/lib/appearance/terms'

/** Light, dark or as the system. A plain form; with script it changes the page in place, so nothing typed is lost. */
export function ThemeChoice({ chosen }: { chosen: Theme }) {
  const [theme, setTheme] = useState(chosen)
  const path = usePathname()
  const query = useSearchParams().toString()

  function choose(event: FormEvent<HTMLFormElement>) {
    const { submitter } = event.nativeEvent as SubmitEvent
    if (!(submitter instanceof HTMLButtonElement)) return
    event.preventDefault()
    const next = toTheme(submitter.value)
    const page = document.documentElement
    if (next === 'system') delete page.dataset.theme
    else page.dataset.theme = next
    setTheme(next)
    const body = new URLSearchParams({ theme: next })
    // If this does not arrive the page still looks as chosen; only the next visit will not.
    fetch('/theme', { method: 'POST', body, redirect: 'manual' }).catch(() => undefined)
  }

  return (
    <form className="theme" action="/theme" method="post" onSubmit={choose} aria-label="Look of the pages">
      <input type="hidden" name="back" value={query ? `${path}?${query}` : path} />
      {THEMES.map((each) => (
        <button key={each} type="submit" name="theme" value={each} aria-pressed={each === theme}>
          {THEME_WORDS[each]}
        </button>
      ))}
    </form>
  )
}
