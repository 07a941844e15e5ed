import { newBytes } from './arrays'
import type { ControlState } from './controls'
import { drawInputs } from './draws'
import { FigureBench, type Depth, type FigureDraws } from './figure-draws'
import type { MatchInputs } from './inputs'
import { judge, recommendedLoad } from './judge'
import { shareFrom, type Judgement } from './judgement'
import type { Setting } from './preamp'
import { SHARE_THAT_COUNTS } from './rules'
import { resolveSetting } from './settings'

/** One real combination of positions, judged. */
export interface Candidate {
  state: ControlState
  setting: Setting
  figures: FigureDraws
  judgements: Judgement[]
  /** Heaviest order in each draw; the arm counts by its middle. */
  orders: Uint8Array
  shareRuledOut: number
  /** Compared left to right, lower is better. */
  rank: number[]
}

/** Which groups stand otherwise, counted. Lower means fewer moves. */
export type DistanceTo = (state: ControlState) => number

/** Evaluates states on one ensemble and orders them, best first. */
export function rankStates(
  inputs: MatchInputs,
  states: ControlState[],
  options: { count: number; depth: Depth; distance: DistanceTo },
): { bench: FigureBench; candidates: Candidate[] } {
  const bench = new FigureBench(drawInputs(inputs, options.count), options.depth)
  const candidates = states.map((state) => candidateOf(bench, state, options.distance))
  return { bench, candidates: candidates.sort(byRank) }
}

export function candidateOf(bench: FigureBench, state: ControlState, distance: DistanceTo): Candidate {
  const setting = resolveSetting(bench.draws.inputs.preamp, state)
  if ('clash' in setting) throw new Error('A state whose switches exclude each other cannot be evaluated.')
  const figures = bench.figures(setting)
  const judgements = judge(bench.draws, setting, figures)
  const orders = worstOrders(judgements, bench.draws.ensemble.count)
  const shareRuledOut = shareFrom(orders, 3)
  const candidate = { state, setting, figures, judgements, orders, shareRuledOut, rank: [] as number[] }
  candidate.rank = rankOf(candidate, bench, distance(state))
  return candidate
}

function worstOrders(judgements: Judgement[], count: number): Uint8Array {
  const orders = newBytes(count)
  for (const judgement of judgements) {
    const fixed = judgement.byMiddle ? judgement.orders[0] : -1
    for (let i = 0; i < count; i++) orders[i] = Math.max(orders[i], fixed >= 0 ? fixed : judgement.orders[i])
  }
  return orders
}

/**
 * First what must hold, then the level, then treble and capacitance, then hiss and the rest; among equals the
 * fewest moves; then what is nicest. Weights, not decimals, decide before the moves do: good enough is left alone.
 */
function rankOf(candidate: Candidate, bench: FigureBench, distance: number): number[] {
  const { judgements, setting, shareRuledOut } = candidate
  const counts = (wanted: (judgement: Judgement) => boolean) => {
    const orders = judgements.filter(wanted).map((judgement) => judgement.counts)
    return Math.max(0, ...orders) * 10 + orders.reduce((sum, order) => sum + order, 0)
  }
  const isLevel = ({ code }: Judgement) => code === 'level-low' || code === 'level-high'
  const isTreble = ({ code }: Judgement) => /^(capacitance|treble|load-above)/.test(code)
  const armLow = judgements.some((judgement) => judgement.code === 'arm-resonance-low' && judgement.orders[0] > 0)
  return [
    shareRuledOut <= SHARE_THAT_COUNTS ? 0 : Math.round(shareRuledOut * 20),
    counts((judgement) => judgement.mustHold),
    counts(isLevel),
    counts(isTreble),
    counts((judgement) => !judgement.mustHold && !isLevel(judgement) && !isTreble(judgement)),
    armLow && !setting.filter && bench.draws.inputs.preamp.groups.some((group) => group.sets === 'filter') ? 1 : 0,
    distance,
    niceness(candidate, bench),
  ]
}

/** Level near the middle of its band, room, load near what is asked, little tilt, quiet; in rough decibels, lower is better. */
function niceness({ figures, setting }: Candidate, { draws }: FigureBench): number {
  const { inputs } = draws
  const wish = inputs.wishedVolts
  const middle = wish ? Math.sqrt(wish.low * wish.high) : Math.sqrt(0.3 * 1)
  const level = Math.abs(20 * Math.log10(figures.outputVolts[0] / middle))
  const room = Math.max(0, 6 - lowest(figures.nextMarginDecibels)) + Math.max(0, 6 - lowest(figures.worstMarginDecibels))
  const hiss = Math.max(0, 76 - lowest(figures.snrWeightedDecibels))
  const tilt = highest(figures.liftDecibels) - lowest(figures.fallDecibels)
  return level * 0.3 + room + loadDistance(figures, draws.inputs) + tilt + hiss * 0.3 + (setting.filter ? 0.5 : 0)
}

/** Load from what the maker asks, or from ten times the coil, in decibels of ratio. */
function loadDistance(figures: FigureDraws, inputs: MatchInputs): number {
  const load = (figures.cartridgeLoadOhms as Float64Array)[0]
  const range = recommendedLoad(inputs)
  const wanted = range
    ? Math.sqrt(range.low * (range.high ?? range.low))
    : inputs.cartridge.coilOhms.nominal * 10
  return Math.abs(20 * Math.log10(load / wanted)) * 0.3
}

const lowest = (values: Float64Array | null): number => (values ? values.reduce((a, b) => Math.min(a, b)) : 0)
const highest = (values: Float64Array | null): number => (values ? values.reduce((a, b) => Math.max(a, b)) : 0)

function byRank(a: Candidate, b: Candidate): number {
  for (let k = 0; k < a.rank.length; k++) if (a.rank[k] !== b.rank[k]) return a.rank[k] - b.rank[k]
  return 0
}
