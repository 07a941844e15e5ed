import type { CSSProperties } from 'react'
import { LIGHT, ON_SPOT } from './inks'

/** Fonts that every reader has: a mail fetches none. */
const TEXT = 'Arial, Helvetica, sans-serif'
const NARROW = "'Arial Narrow', Arial, Helvetica, sans-serif"

export const text = (fontSize: number, lineHeight: number, color: string = LIGHT.ink): CSSProperties => ({
  margin: 0,
  fontFamily: TEXT,
  fontSize: `${fontSize}px`,
  lineHeight: `${lineHeight}px`,
  fontWeight: 400,
  color,
})

export const narrow = (fontSize: number, lineHeight: number, color: string = LIGHT.ink): CSSProperties => ({
  ...text(fontSize, lineHeight, color),
  fontFamily: NARROW,
  fontWeight: 700,
})

/** Padding of a row: so much above, none below. */
export const row = (above: number, below = 0): CSSProperties => ({ padding: `${above}px 30px ${below}px` })

export const button: CSSProperties = {
  ...text(17, 20, LIGHT.paper),
  fontWeight: 700,
  backgroundColor: LIGHT.ink,
  padding: '16px 26px',
}

export const link: CSSProperties = { color: LIGHT.act, textDecorationLine: 'underline' }

export const caution = (fontSize: number, lineHeight: number): CSSProperties => text(fontSize, lineHeight, ON_SPOT)
