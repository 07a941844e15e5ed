import { PHONE_BELOW } from './geometry'

/**
 * How tall each drawing is: on a page, on a phone, on paper. `fit.css` keeps the first free under `.kept-…`
 * before the box was measured, so that nothing below moves; a test holds the two together.
 */
export const PLOT_HEIGHTS = {
  loading: { full: 340, phone: 260, paper: 152 },
  'loading-panel': { full: 230, phone: 220, paper: 152 },
  room: { full: 320, phone: 280, paper: 200 },
  arm: { full: 300, phone: 260, paper: 220 },
  level: { full: 456, phone: 430, paper: 222 },
  noise: { full: 104, phone: 122, paper: 104 },
} as const

export function plotHeight(kind: keyof typeof PLOT_HEIGHTS, width: number, print: boolean): number {
  const { full, phone, paper } = PLOT_HEIGHTS[kind]
  return print ? paper : width < PHONE_BELOW ? phone : full
}
