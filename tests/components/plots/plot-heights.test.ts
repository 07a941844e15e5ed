import { readFileSync } from 'node:fs'
import { expect, test } from 'vitest'
import { PLOT_HEIGHTS } from '@/components/plots/plot-heights'

const css = readFileSync('components/plots/fit.css', 'utf8')

test.each(Object.entries(PLOT_HEIGHTS))('the height kept free for %s is the height it is drawn at', (kind, heights) => {
  const kept = new RegExp(`\\.kept-${kind} \\{\\s*min-height: (\\d+)px`).exec(css)?.[1]
  expect(Number(kept)).toBe(heights.full)
})
