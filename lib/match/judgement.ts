import { newBytes } from './arrays'
import type { Draws } from './draws'
import { rangeOf } from './ensemble'
import type { UnknownName } from './inputs'
import type { Finding, FindingCode, FigureName } from './result'
import { SHARE_THAT_COUNTS, weightOf } from './rules'

/** One rule held against every draw: 0 fine, 1 worth knowing, 2 limit, 3 rules it out. */
export interface Judgement {
  code: FindingCode
  figure: FigureName | null
  orders: Uint8Array
  /** The order that counts for the verdict, see `orderThatCounts`. */
  counts: number
  values: Float64Array | null
  limit: number | null
  /** True for the arm, which is judged by its middle: a limit of the pairing, never of the preamp. */
  byMiddle: boolean
  /** True for what must hold before anything else is weighed. */
  mustHold: boolean
}

type Rule = Partial<Pick<Judgement, 'byMiddle' | 'mustHold' | 'limit'>>

/**
 * Settings share the arrays of their figures, and with them their judgements: all rules of one check depend on its
 * inputs only, and an array of figures belongs to one check.
 */
const known = new WeakMap<Float64Array, Map<FindingCode, Judgement>>()

export function judged(code: FindingCode, figure: FigureName, values: Float64Array, order: (value: number) => number, rule: Rule = {}): Judgement {
  let ofValues = known.get(values)
  if (!ofValues) {
    ofValues = new Map()
    known.set(values, ofValues)
  }
  let judgement = ofValues.get(code)
  if (!judgement) {
    const orders = newBytes(values.length)
    for (let i = 0; i < values.length; i++) orders[i] = order(values[i])
    const byMiddle = rule.byMiddle ?? false
    judgement = { code, figure, orders, counts: orderThatCounts(orders, byMiddle), values, limit: rule.limit ?? null, byMiddle, mustHold: rule.mustHold ?? false }
    ofValues.set(code, judgement)
  }
  return judgement
}

export function always(code: FindingCode, count: number, order: number): Judgement {
  return { code, figure: null, orders: newBytes(count).fill(order), counts: order, values: null, limit: null, byMiddle: false, mustHold: true }
}

/** Share of the draws in which an order is reached, the middle draw included. */
export function shareFrom(orders: Uint8Array, order: number): number {
  let reached = 0
  for (let i = 0; i < orders.length; i++) if (orders[i] >= order) reached++
  return reached / orders.length
}

/**
 * The order that counts for the verdict: the heaviest that more than a tenth of the draws reach. What only the
 * outermost draws reach is told, with where it turns, but does not decide.
 */
function orderThatCounts(orders: Uint8Array, byMiddle: boolean): number {
  if (byMiddle) return orders[0]
  for (let order = 3; order > 0; order--) if (shareFrom(orders, order) > SHARE_THAT_COUNTS) return order
  return 0
}

/** A judgement as a finding; with the draws given, also the unknown that its doubt comes from most. */
export function toFinding(judgement: Judgement, draws: Draws | null): Finding {
  const { orders, values } = judgement
  let worst = 0
  let best = 3
  for (let i = 0; i < orders.length; i++) {
    worst = Math.max(worst, orders[i])
    best = Math.min(best, orders[i])
  }
  return {
    code: judgement.code,
    worst: weightOf(worst),
    middle: weightOf(orders[0]),
    best: weightOf(best),
    figure: judgement.figure,
    range: values ? rangeOf(values) : null,
    limit: judgement.limit,
    doubt: values && draws ? leadingUnknown(values, draws) : null,
  }
}

/** The unknown whose level goes most nearly with the figure, by rank-free correlation over the draws. */
function leadingUnknown(values: Float64Array, { ensemble }: Draws): UnknownName | null {
  let leading: UnknownName | null = null
  let strongest = 0.2
  for (const name of ensemble.names) {
    const strength = Math.abs(correlation(values, ensemble.levels[name] as Float64Array))
    if (strength > strongest) {
      strongest = strength
      leading = name
    }
  }
  return leading
}

/** Pearson correlation over draws 1… (draw 0 is the middle). 0 where either does not vary. */
export function correlation(a: Float64Array, b: Float64Array): number {
  const n = a.length - 1
  let sumA = 0
  let sumB = 0
  for (let i = 1; i <= n; i++) {
    sumA += a[i]
    sumB += b[i]
  }
  const meanA = sumA / n
  const meanB = sumB / n
  let ab = 0
  let aa = 0
  let bb = 0
  for (let i = 1; i <= n; i++) {
    const da = a[i] - meanA
    const db = b[i] - meanB
    ab += da * db
    aa += da * da
    bb += db * db
  }
  return aa > 0 && bb > 0 ? ab / Math.sqrt(aa * bb) : 0
}
