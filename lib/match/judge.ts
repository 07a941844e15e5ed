import type { Draws } from './draws'
import type { FigureDraws } from './figure-draws'
import { always, judged, type Judgement } from './judgement'
import type { Setting } from './preamp'
import type { FindingCode } from './result'
import {
  AT_LEAST,
  BASS_CORNER_HERTZ,
  CAPACITANCE_OUTSIDE_FARADS,
  INSIDE,
  LOAD_OUTSIDE_RATIO,
  STANDARD_MAGNET_LOAD_OHMS,
  orderAtLeast,
  orderInside,
} from './rules'

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
  return [
    atLeast('headroom-tight', 'overloadMarginDecibels', figures, { mustHold: true }),
    atLeast('headroom-loud-records', 'worstMarginDecibels', figures, { mustHold: true, limit: 0 }),
    atLeast('next-input-tight', 'nextMarginDecibels', figures, { mustHold: true, limit: 0 }),
    ...levels(draws, figures),
    ...loads(draws, figures),
    ...treble(draws, figures),
    atLeast('hiss', 'snrWeightedDecibels', figures),
    ...arm(figures),
    atLeast('cable-loss', 'cableLossAt20kHzDecibels', figures),
    ...bass(figures),
    ...wiring(draws, setting),
  ]
}

/** A rule whose figure is better the higher it is. The limit told is where it stops being fine, unless another is named. */
function atLeast(code: FindingCode, figure: keyof typeof AT_LEAST, figures: FigureDraws, rule: { mustHold?: boolean; limit?: number } = {}): Judgement {
  const thresholds = AT_LEAST[figure]
  return judged(code, figure, figures[figure] as Float64Array, (value) => orderAtLeast(value, thresholds), { limit: thresholds.fine, ...rule })
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
    return [atLeast('load-near-coil', 'loadRatio', figures, { mustHold: true })]
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
