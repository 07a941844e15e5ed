/** Words for the numbers on a drawing. A true minus sign, a space before the unit, no "−0". */

/** Beyond this a number is no level and no frequency, and sums of such would overflow. */
const LARGEST = 1e9

/** The value when it can be drawn, else null. */
export function finite(value: number | null | undefined): number | null {
  return typeof value === 'number' && Math.abs(value) <= LARGEST ? value : null
}

/** The range when all three of its values can be drawn, else null. */
export function finiteRange(range: { low: number; nominal: number; high: number } | null) {
  return range && [range.low, range.nominal, range.high].every((value) => finite(value) !== null) ? range : null
}

export function clamp(value: number, low: number, high: number): number {
  return Math.max(low, Math.min(high, value))
}

/** "3.1", "−6.0"; a value that rounds to nothing loses its sign. */
export function fixed(value: number, decimals = 1): string {
  const text = Math.abs(value).toFixed(decimals)
  return value < 0 && Number(text) !== 0 ? `−${text}` : text
}

/** "+3", "0", "−6". */
export function signed(value: number, decimals = 0): string {
  const text = fixed(value, decimals)
  return Number(text.replace('−', '-')) > 0 ? `+${text}` : text
}

/** True when a room is under 0 even after it was rounded for showing. */
export function isOver(decibels: number): boolean {
  return Number(decibels.toFixed(1)) < 0
}

/** Owners read room: "3.1", "over by 2.9"; never a negative number. `over` may be shortened where there is little place. */
export function roomText(decibels: number, over = 'over by '): string {
  return `${isOver(decibels) ? over : ''}${Math.abs(decibels).toFixed(1)}`
}

/** "50 Hz", "1.2 kHz", "12 kHz". Two figures, as no more are known. */
export function hertzText(hertz: number): string {
  if (hertz >= 9500) return `${Math.round(hertz / 1000)} kHz`
  if (hertz >= 995) return `${(hertz / 1000).toFixed(1).replace('.0', '')} kHz`
  if (hertz >= 99.5) return `${Math.round(hertz / 10) * 10} Hz`
  return hertz >= 20 ? `${Math.round(hertz)} Hz` : `${Number(hertz.toFixed(1))} Hz`
}

/** A frequency under an axis: "500", "2k". */
export function axisHertz(hertz: number): string {
  return hertz >= 1000 ? `${hertz / 1000}k` : String(hertz)
}

/** "7.8 to 11.0", or one value where both ends read alike. */
export function spanText(low: number, high: number, decimals = 1): string {
  const [from, to] = [fixed(low, decimals), fixed(high, decimals)]
  return from === to ? from : `${from} to ${to}`
}

/** A display number as it stands on an axis: thousands set apart from 10 000 up, no trailing noise. */
export function plainNumber(value: number): string {
  // Rounding the largest numbers there are would make them infinite.
  const rounded = Math.abs(value) < 1e15 ? Number(value.toPrecision(4)) : value
  const [whole = '0', part] = String(Math.abs(rounded)).split('.')
  const spaced = whole.length > 4 && !whole.includes('e') ? whole.replace(/\B(?=(\d{3})+$)/g, '\u00a0') : whole
  return `${rounded < 0 ? '−' : ''}${spaced}${part ? `.${part}` : ''}`
}
