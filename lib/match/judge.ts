import { newBytes } from './arrays'
import type { Draws } from './draws'
import type { FigureDraws } from './figure-draws'
import type { UnknownName } from './inputs'
import type { Setting } from './preamp'
import type { Finding, FindingCode, FigureName } from './result'
import { rangeOf } from './ensemble'
import {
  AT_LEAST,
  BASS_CORNER_HERTZ,
  CAPACITANCE_OUTSIDE_FARADS,
  INSIDE,
  LOAD_OUTSIDE_RATIO,
  SHARE_THAT_COUNTS,
  STANDARD_MAGNET_LOAD_OHMS,
  orderAtLeast,
  orderInside,
  weightOf,
} from './rules'

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

function judged(code: FindingCode, figure: FigureName, values: Float64Array, order: (value: number) => number, rule: Rule = {}): Judgement {
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

function always(code: FindingCode, count: number, order: number): Judgement {
  return { code, figure: null, orders: newBytes(count).fill(order), counts: order, values: null, limit: null, byMiddle: false, mustHold: true }
}

export const isMagnet = (type: string): boolean => type === 'moving-magnet' || type === 'moving-iron'

/** Coils with so little inductance that no capacitance met in practice reaches the audio band, henries. */
const CAPACITANCE_MATTERS_FROM_HENRIES = 0.02

/** The recommended load: printed, or the standard one for a magnet; null for a moving coil that prints none. */
export function recommendedLoad({ cartridge }: Draws['inputs']): { low: number; high: number | null } | null {
  if (cartridge.recommendedLoadOhms) return cartridge.recommendedLoadOhms
  return isMagnet(cartridge.type) ? STANDARD_MAGNET_LOAD_OHMS : null
}

/** Every rule against every draw of a setting. */
export function judge(draws: Draws, setting: Setting, figures: FigureDraws): Judgement[] {
  const { inputs } = draws
  const some = (name: FigureName) => figures[name] as Float64Array
  const judgements: Judgement[] = [
    judged('headroom-tight', 'overloadMarginDecibels', some('overloadMarginDecibels'), (v) => orderAtLeast(v, AT_LEAST.overloadMarginDecibels), { mustHold: true, limit: AT_LEAST.overloadMarginDecibels.fine }),
    judged('headroom-loud-records', 'worstMarginDecibels', some('worstMarginDecibels'), (v) => orderAtLeast(v, AT_LEAST.worstMarginDecibels), { mustHold: true, limit: 0 }),
    judged('next-input-tight', 'nextMarginDecibels', some('nextMarginDecibels'), (v) => orderAtLeast(v, AT_LEAST.nextMarginDecibels), { mustHold: true, limit: 0 }),
    ...levels(draws, figures),
    ...loads(draws, figures),
    ...treble(draws, figures),
    judged('hiss', 'snrWeightedDecibels', some('snrWeightedDecibels'), (v) => orderAtLeast(v, AT_LEAST.snrWeightedDecibels), { limit: AT_LEAST.snrWeightedDecibels.fine }),
    ...arm(figures),
    judged('cable-loss', 'cableLossAt20kHzDecibels', some('cableLossAt20kHzDecibels'), (v) => orderAtLeast(v, AT_LEAST.cableLossAt20kHzDecibels), { limit: AT_LEAST.cableLossAt20kHzDecibels.fine }),
    ...bass(figures),
    ...wiring(draws, setting),
  ]
  return judgements
}

/** Nominal output against the usual band, or against the level wished for. */
function levels({ inputs }: Draws, figures: FigureDraws): Judgement[] {
  const values = figures.outputVolts
  const wish = inputs.wishedVolts
  const order = (value: number) => {
    const usual = orderInside(value, INSIDE.outputVolts)
    if (!wish || usual === 3) return usual
    if (value >= wish.low && value <= wish.high) return 0
    return value >= wish.low / 2 && value <= wish.high * 2 ? 1 : 2
  }
  const middle = wish ? Math.sqrt(wish.low * wish.high) : Math.sqrt(INSIDE.outputVolts.fine[0] * INSIDE.outputVolts.fine[1])
  const low = judged('level-low', 'outputVolts', values, (v) => (v < middle ? order(v) : 0), { limit: wish?.low ?? INSIDE.outputVolts.fine[0] })
  const high = judged('level-high', 'outputVolts', values, (v) => (v >= middle ? order(v) : 0), { limit: wish?.high ?? INSIDE.outputVolts.fine[1] })
  return [low, high]
}

/** The load against the maker's range; where none is printed, against the coil. */
function loads({ inputs }: Draws, figures: FigureDraws): Judgement[] {
  const range = recommendedLoad(inputs)
  const load = figures.cartridgeLoadOhms as Float64Array
  if (!range) {
    return [judged('load-near-coil', 'loadRatio', figures.loadRatio as Float64Array, (v) => orderAtLeast(v, AT_LEAST.loadRatio), { mustHold: true, limit: AT_LEAST.loadRatio.fine })]
  }
  const steps = LOAD_OUTSIDE_RATIO
  const below = (value: number) => {
    const ratio = range.low / value
    if (ratio <= steps.inside) return 0
    if (ratio <= steps.worthKnowing) return 1
    return ratio <= steps.limit ? 2 : 3
  }
  // A load above the range costs damping, not level: for a moving coil the electrical harm is small.
  const heaviestAbove = isMagnet(inputs.cartridge.type) ? 2 : 1
  const above = (value: number) => {
    const ratio = range.high === null ? 0 : value / range.high
    if (ratio <= steps.inside) return 0
    return Math.min(ratio <= steps.limit ? 1 : 2, heaviestAbove)
  }
  return [
    judged('load-below-recommended', 'cartridgeLoadOhms', load, below, { mustHold: true, limit: range.low }),
    judged('load-above-recommended', 'cartridgeLoadOhms', load, above, { limit: range.high }),
  ]
}

/** Capacitance against the printed range; where none is printed, the tilt it makes. */
function treble(draws: Draws, figures: FigureDraws): Judgement[] {
  const { cartridge, stepUp } = draws.inputs
  const lift = figures.liftDecibels as Float64Array
  const fall = figures.fallDecibels as Float64Array
  const matters = cartridge.coilHenries.high >= CAPACITANCE_MATTERS_FROM_HENRIES
  const range = matters && !stepUp ? cartridge.recommendedFarads : null
  const tiltOrder = (v: number) => {
    const order = orderInside(v, INSIDE.treble)
    return range ? Math.min(order, 1) : order
  }
  const tilts = [
    judged('treble-lift', 'liftDecibels', lift, tiltOrder, { limit: INSIDE.treble.fine[1] }),
    judged('treble-fall', 'fallDecibels', fall, tiltOrder, { limit: INSIDE.treble.fine[0] }),
  ]
  if (!range) return tilts
  const outside = (distance: number) => {
    if (distance <= 0) return 0
    if (distance <= CAPACITANCE_OUTSIDE_FARADS.worthKnowing) return 1
    return distance <= CAPACITANCE_OUTSIDE_FARADS.limit ? 2 : 3
  }
  const total = figures.totalFarads as Float64Array
  return [
    judged('capacitance-low', 'totalFarads', total, (v) => outside(range.low - v), { limit: range.low }),
    judged('capacitance-high', 'totalFarads', total, (v) => outside(v - range.high), { limit: range.high }),
    ...tilts,
  ]
}

function arm(figures: FigureDraws): Judgement[] {
  const values = figures.armResonanceHertz as Float64Array
  // A limit of the pairing, not of the preamp: never heavier than that.
  const order = (v: number) => Math.min(orderInside(v, INSIDE.armResonanceHertz), 2)
  return [
    judged('arm-resonance-low', 'armResonanceHertz', values, (v) => (v < 10 ? order(v) : 0), { byMiddle: true, limit: INSIDE.armResonanceHertz.fine[0] }),
    judged('arm-resonance-high', 'armResonanceHertz', values, (v) => (v >= 10 ? order(v) : 0), { byMiddle: true, limit: INSIDE.armResonanceHertz.fine[1] }),
  ]
}

function bass(figures: FigureDraws): Judgement[] {
  const corners = (['bassCornerHertz', 'stepUpBassCornerHertz'] as const).flatMap((name) => {
    const values = figures[name]
    return values ? [{ name, values }] : []
  })
  const order = (v: number) => (v <= BASS_CORNER_HERTZ.fine ? 0 : v <= BASS_CORNER_HERTZ.worthKnowing ? 1 : v <= BASS_CORNER_HERTZ.limit ? 2 : 3)
  return corners.map(({ name, values }) => judged('bass-loss', name, values, order, { limit: BASS_CORNER_HERTZ.fine }))
}

/** What no figure shows: two transformers, a transformer into an MC input, two phono stages, a mono's coils joined. */
function wiring({ inputs, ensemble }: Draws, setting: Setting): Judgement[] {
  const found: Judgement[] = []
  const add = (code: FindingCode, order: number) => found.push(always(code, ensemble.count, order))
  if (inputs.stepUp && setting.path.stepUp) add('double-step-up', 3)
  else if (inputs.stepUp && setting.path.id === 'mc') add('step-up-into-mc', 3)
  if (isMagnet(inputs.cartridge.type) && setting.path.stepUp) add('magnet-into-mc', 3)
  if (inputs.next.kind === 'phono') add('two-phono-stages', 3)
  if (inputs.cartridge.channels === 'mono') found.push({ ...always('strapped-mono', ensemble.count, 1), mustHold: false })
  return found
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
