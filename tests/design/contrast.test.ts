import { expect, test } from 'vitest'
import { darkInks, lightInks, ON_SPOT, printInks } from '@/tailwind.config'

/** Relative luminance of an sRGB colour. Source: WCAG 2.2, "relative luminance". */
function luminance(hex: string): number {
  const [red, green, blue] = [1, 3, 5].map((at) => {
    const share = parseInt(hex.slice(at, at + 2), 16) / 255
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4
  })
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue
}

/** Source: WCAG 2.2, "contrast ratio". */
function contrast(one: string, other: string): number {
  const [darker, lighter] = [luminance(one), luminance(other)].sort((a, b) => a - b)
  return (lighter + 0.05) / (darker + 0.05)
}

// Least ratios: 4.5 for text (WCAG 2.2, 1.4.3), 3 for what a control or drawing needs (1.4.11).
const PAIRS: [string, string, number][] = [
  ['--ink', '--paper', 4.5],
  ['--ink', '--plot', 4.5],
  ['--ink', '--tint', 4.5],
  ['--ink', '--sunk', 4.5],
  ['--ink2', '--paper', 4.5],
  ['--ink2', '--plot', 4.5],
  ['--act', '--paper', 4.5],
  ['--act', '--plot', 4.5],
  ['--warn', '--paper', 4.5],
  ['--warn', '--plot', 4.5],
  ['--rule', '--paper', 3],
  ['--rule', '--plot', 3],
  ['--spotd', '--plot', 3],
  ['--spotd', '--tint', 3],
  ['--lb', '--plot', 3],
  ['--lr', '--plot', 3],
  ['--lg', '--plot', 3],
]

const themes = { light: lightInks, dark: darkInks, print: printInks }

test.each(Object.entries(themes))('every pair of the %s inks that carries meaning can be told apart', (_name, inks) => {
  const faint = PAIRS.filter(([front, ground, least]) => contrast(inks[front], inks[ground]) < least)
  expect(faint).toEqual([])
})

test.each(Object.entries(themes))('words on solid mustard can be read in %s', (_name, inks) => {
  expect(contrast(ON_SPOT, inks['--spot'])).toBeGreaterThan(4.5)
})
