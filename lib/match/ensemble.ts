import { newFloats } from './arrays'
import { UNKNOWNS, type UnknownName } from './inputs'
import { isExact, type Quantity, type Range } from './quantity'

/**
 * The ensemble: one fixed set of draws over everything that is not known exactly. Every figure is computed for
 * every draw, so ranges, weights and the verdict of a setting all rest on the same draws, and results that are not
 * monotone in their inputs (a resonance peak is not) need no special care.
 *
 * Draws are a Latin hypercube (McKay, Beckman and Conover 1979) on Chebyshev-Lobatto levels: in each unknown the
 * levels crowd at the ends and contain both of them. With one unknown the range is therefore exact; with many, the
 * draws reach past what as many plain draws would, which is what a range may claim without adding up corners that
 * never meet. Draw 0 holds the middle values.
 */
export interface Ensemble {
  count: number
  /** Level of each unknown that is in doubt, 0 (low) to 1 (high), one per draw. Entry 0 is not used. */
  levels: Partial<Record<UnknownName, Float64Array>>
  names: UnknownName[]
}

/** Deterministic generator (mulberry32), so that the same answers always give the same sheet. */
function generator(seed: number): () => number {
  let state = seed >>> 0
  return () => {
    state = (state + 0x6d2b79f5) >>> 0
    let t = state
    t = Math.imul(t ^ (t >>> 15), t | 1)
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61)
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296
  }
}

const columns = new Map<string, Float64Array>()

/** One unknown's levels in shuffled order. The order belongs to the unknown's name, so it never changes. */
function column(name: UnknownName, count: number): Float64Array {
  const key = `${name} ${count}`
  const known = columns.get(key)
  if (known) return known
  const random = generator(0x5e7d0 + UNKNOWNS.indexOf(name) * 7919 + count)
  const draws = count - 1
  const levels = new Float64Array(count)
  for (let k = 0; k < draws; k++) levels[k + 1] = draws === 1 ? 0.5 : (1 - Math.cos((Math.PI * k) / (draws - 1))) / 2
  for (let k = draws; k > 1; k--) {
    const other = 1 + Math.floor(random() * k)
    const held = levels[k]
    levels[k] = levels[other]
    levels[other] = held
  }
  columns.set(key, levels)
  return levels
}

/** An ensemble of `count` draws (the first holds the middle values) over the named unknowns. */
export function drawEnsemble(names: UnknownName[], count: number): Ensemble {
  const levels: Ensemble['levels'] = {}
  for (const name of names) levels[name] = column(name, count)
  return { count, levels, names }
}

/** Ranges wider than this ratio are spread evenly in proportion, narrower ones evenly in value. */
const PROPORTIONAL_FROM = 1.5

/** The value of a quantity at a level between 0 (low) and 1 (high). */
export function valueAtLevel({ low, high }: Range, level: number): number {
  return low > 0 && high / low > PROPORTIONAL_FROM ? low * (high / low) ** level : low + (high - low) * level
}

/** The values of one quantity over the ensemble; entry 0 is its middle. */
export function spread(quantity: Quantity, name: UnknownName, ensemble: Ensemble): Float64Array {
  const values = newFloats(ensemble.count)
  const levels = ensemble.levels[name]
  if (!levels || isExact(quantity)) return values.fill(quantity.nominal)
  const { low, high } = quantity
  if (low > 0 && high / low > PROPORTIONAL_FROM) {
    const logLow = Math.log(low)
    const span = Math.log(high) - logLow
    for (let i = 1; i < values.length; i++) values[i] = Math.exp(logLow + span * levels[i])
  } else {
    for (let i = 1; i < values.length; i++) values[i] = low + (high - low) * levels[i]
  }
  values[0] = quantity.nominal
  return values
}

/** Lowest, middle and highest of a figure over the ensemble. */
export function rangeOf(values: Float64Array): Range {
  let low = values[0]
  let high = values[0]
  for (let i = 1; i < values.length; i++) {
    const value = values[i]
    if (value < low) low = value
    else if (value > high) high = value
  }
  return { low, nominal: values[0], high }
}
