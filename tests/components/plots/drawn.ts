import type { ReactNode } from 'react'
import { renderToStaticMarkup } from 'react-dom/server'

/** A drawing as the server sends it, and as a tree to look things up in. */
export function drawn(node: ReactNode) {
  const markup = renderToStaticMarkup(node)
  const root = document.createElement('div')
  root.innerHTML = markup
  const all = (selector: string) => [...root.querySelectorAll(selector)]
  return {
    markup,
    all,
    label: root.querySelector('svg')?.getAttribute('aria-label') ?? '',
    words: all('svg text').map((text) => text.textContent ?? ''),
    rows: all('tbody tr').map((row) => [...row.children].map((cell) => cell.textContent ?? '')),
    /** Coordinates of a path, as pairs. */
    points: (selector: string) =>
      [...(root.querySelector(selector)?.getAttribute('d') ?? '').matchAll(/[ML](-?[\d.]+)[ ,](-?[\d.]+)/g)].map(
        ([, x, y]) => [Number(x), Number(y)] as const,
      ),
  }
}

/** Frequencies evenly spread on a logarithmic axis, both ends exact. */
export function logSpaced(from: number, to: number, count: number): number[] {
  return Array.from({ length: count }, (_, i) => (i === count - 1 ? to : from * (to / from) ** (i / (count - 1))))
}
