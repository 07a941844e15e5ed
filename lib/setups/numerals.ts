import type { Dimension } from './units'

/** Digits with points, commas, apostrophes or thin gaps between, as people and leaflets write them. */
export const NUMBER = "(?:\\d{1,3}(?: \\d{3})+(?:[.,]\\d+)?|\\d+(?:[.,']\\d+)*|[.,]\\d+)(?:e[+-]?\\d+)?"

/** Quantities whose usual values run into thousands in their usual unit, so that "1,400" is fourteen hundred. */
const IN_THOUSANDS: ReadonlySet<Dimension> = new Set(['ohms', 'farads'])

/**
 * The number that a text of digits says.
 * A single comma is a decimal comma, except before exactly three digits in a quantity that runs into thousands
 * ("1,400" ohms); a single point is always decimal; where both stand, the last is the decimal one; repeated ones,
 * gaps and apostrophes part thousands.
 * @returns null when the digits make no number
 */
export function parseNumber(token: string, dimension: Dimension): number | null {
  const [mantissa, exponent] = token.replace(/[ ']/g, '').split('e')
  const points = mantissa.split('.').length - 1
  const commas = mantissa.split(',').length - 1
  let digits = mantissa
  if (points > 0 && commas > 0) {
    const decimal = mantissa.lastIndexOf('.') > mantissa.lastIndexOf(',') ? '.' : ','
    const thousands = decimal === '.' ? ',' : '.'
    digits = digits.replaceAll(thousands, '').replace(decimal, '.')
  } else if (points > 1 || commas > 1) {
    if (!/^\d{1,3}(?:[.,]\d{3})+$/.test(mantissa)) return null
    digits = digits.replace(/[.,]/g, '')
  } else if (commas === 1) {
    const grouped = IN_THOUSANDS.has(dimension) && /^[1-9]\d{0,2},\d{3}$/.test(mantissa)
    digits = digits.replace(',', grouped ? '' : '.')
  }
  const number = Number(exponent === undefined ? digits : `${digits}e${exponent}`)
  return Number.isFinite(number) ? number : null
}
