/**
 * Every input is a quantity with doubt, every figure a range.
 * All numbers are SI: volts, ohms, henries, farads, hertz, kilograms, metres per newton.
 */

export const ORIGINS = ['printed', 'measured', 'typical', 'owner', 'unknown'] as const

/**
 * Where a value came from. `typical` means the type's usual range stepped in because nothing was said;
 * `unknown` means that not even the type is known, so the widest range in use stepped in.
 */
export type Origin = (typeof ORIGINS)[number]

/** A figure that comes out: lowest, middle and highest value over everything that is not known exactly. */
export interface Range {
  low: number
  nominal: number
  high: number
}

/** An input. `printed` and `condition` keep the leaflet's own text beside the value. */
export interface Quantity extends Range {
  origin: Origin
  printed?: string
  condition?: string
}

/** A value known exactly, as far as this check goes. */
export function exactly(value: number, origin: Origin = 'printed'): Quantity {
  return { low: value, nominal: value, high: value, origin }
}

/**
 * A value that lies anywhere from `low` to `high`; the middle is geometric, since these quantities span decades,
 * and arithmetic where the range touches zero.
 */
export function between(low: number, high: number, origin: Origin = 'owner'): Quantity {
  const nominal = low > 0 ? Math.sqrt(low * high) : (low + high) / 2
  return { low, nominal, high, origin }
}

/** A value with a relative tolerance, such as a resistor of ±1 %. */
export function within(value: number, relativeTolerance: number, origin: Origin = 'printed'): Quantity {
  return { low: value * (1 - relativeTolerance), nominal: value, high: value * (1 + relativeTolerance), origin }
}

/** True when the range is a single point. */
export function isExact({ low, high }: Range): boolean {
  return low === high
}

/** The same quantity in another unit or after a known factor. `factor` must be positive. */
export function scaled<T extends Range>(quantity: T, factor: number): T {
  return { ...quantity, low: quantity.low * factor, nominal: quantity.nominal * factor, high: quantity.high * factor }
}
