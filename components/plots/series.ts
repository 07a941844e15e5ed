import type { Spot } from './geometry'
import { finite } from './numbers'

/** Reading values off a curve given as arrays. */

/**
 * The value at a frequency, read along the logarithmic axis between the two neighbours.
 * @returns null outside the data, or where a neighbour is not finite
 */
export function valueAt(hertz: readonly number[], values: readonly number[] | null, at: number): number | null {
  if (!values) return null
  for (let i = 0; i < hertz.length; i++) {
    const [f, value] = [hertz[i], values[i]]
    if (f === undefined || value === undefined || !(f > 0) || !Number.isFinite(value)) continue
    if (f === at) return finite(value)
    const [f0, value0] = [hertz[i - 1], values[i - 1]]
    if (f0 === undefined || value0 === undefined || !(f0 > 0) || !Number.isFinite(value0)) continue
    if (f0 < at && at < f) {
      const part = Math.log(at / f0) / Math.log(f / f0)
      return finite(value0 + (value - value0) * part)
    }
  }
  return null
}

export interface Extreme {
  hertz: number
  value: number
}

/** The highest point of a curve inside a stretch of frequencies; `sign` −1 finds the lowest. */
export function extreme(
  hertz: readonly number[],
  values: readonly number[] | null,
  from: number,
  to: number,
  sign: 1 | -1 = 1,
): Extreme | null {
  let found: Extreme | null = null
  hertz.forEach((f, i) => {
    const value = values?.[i]
    if (value === undefined || !Number.isFinite(value) || !(f >= from && f <= to)) return
    if (!found || value * sign > found.value * sign) found = { hertz: f, value }
  })
  return found
}

/** The frequencies of an axis that the data reaches. */
export function covered(hertz: readonly number[], axis: readonly number[]): number[] {
  const usable = hertz.filter((f) => Number.isFinite(f) && f > 0)
  const [first, last] = [Math.min(...usable), Math.max(...usable)]
  return axis.filter((f) => f >= first && f <= last)
}

/** The spot of a curve nearest to a height across, if it can be seen in the frame. */
export function spotNear(
  spots: readonly Spot[],
  x: number,
  { left, right, top, bottom }: { left: number; right: number; top: number; bottom: number },
): readonly [number, number] | null {
  let nearest: readonly [number, number] | null = null
  for (const spot of spots) {
    if (!spot || spot[0] < left || spot[0] > right || spot[1] < top || spot[1] > bottom) continue
    if (!nearest || Math.abs(spot[0] - x) < Math.abs(nearest[0] - x)) nearest = spot
  }
  return nearest
}
