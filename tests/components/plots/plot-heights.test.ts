import { readFileSync } from 'node:fs'
import { expect, test } from 'vitest'
import { PLOT_HEIGHTS } from '@/components/plots/plot-heights'

const css = readFileSync('components/plots/fit.css', 'utf8')
const [wide = '', phone = ''] = css.split('@container (max-width: 479.98px)')
const kept = (part: string, kind: string) =>
  Number(new RegExp(`\\.kept-${kind} \\{\\s*min-height: (\\d+)px`).exec(part)?.[1])

test.each(Object.entries(PLOT_HEIGHTS))('the height kept free for %s is the height it is drawn at', (kind, heights) => {
  expect(kept(wide, kind)).toBe(heights.full)
  expect(kept(phone, kind)).toBe(heights.phone)
})
