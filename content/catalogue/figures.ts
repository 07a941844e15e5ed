import type { Figure } from '@/lib/catalogue/schema'

/** Short ways to write a figure with its tolerance and origin. The unit stands in the key it is given to. */

type Origin = Figure['origin']

/** Rounds away binary dust, so that 47 ± 1 % reads 46.53 and not 46.530000000000001. */
const tidy = (value: number) => Number(value.toPrecision(9))

/** A value without a tolerance. */
export function plain(value: number, origin: Origin = 'printed'): Figure {
  return { low: value, nominal: value, high: value, origin }
}

/** A value within so many per cent either way. */
export function percent(value: number, tolerance: number, origin: Origin = 'printed'): Figure {
  return { low: tidy(value * (1 - tolerance / 100)), nominal: value, high: tidy(value * (1 + tolerance / 100)), origin }
}

/** A value give or take so much in its own unit. */
export function plusMinus(value: number, tolerance: number, origin: Origin = 'printed'): Figure {
  return { low: tidy(value - tolerance), nominal: value, high: tidy(value + tolerance), origin }
}

/** Anywhere between two values; the middle is geometric, as everywhere in a check. */
export function span(low: number, high: number, origin: Origin = 'printed'): Figure {
  return { low, nominal: tidy(Math.sqrt(low * high)), high, origin }
}

/** The same figure with the maker's own words kept beside it. */
export function asPrinted(printed: string, figure: Figure): Figure {
  return { ...figure, printed }
}
