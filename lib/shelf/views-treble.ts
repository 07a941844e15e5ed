import type { Curves, Figures } from '../match/result'

/** Two treble responses held against each other. Pure. */

export interface Response {
  hertz: number[]
  low: number[]
  nominal: number[]
  high: number[]
}

/**
 * A response at other frequencies, read off between its own along the logarithmic axis: revisions that were reckoned by
 * different versions may be drawn on different ones.
 */
export function responseOn(hertz: readonly number[], { hertz: own, low, nominal, high }: Curves['loading']): Response {
  const same = own.length === hertz.length && own.every((value, index) => value === hertz[index])
  const on = (values: number[]) => (same ? values : hertz.map((at) => readAt(own, values, at)))
  return { hertz: [...hertz], low: on(low), nominal: on(nominal), high: on(high) }
}

function readAt(hertz: readonly number[], values: readonly number[], at: number): number {
  const after = hertz.findIndex((value) => value >= at)
  if (after === 0) return values[0]
  if (after < 0) return values[values.length - 1]
  const part = Math.log(at / hertz[after - 1]) / Math.log(hertz[after] / hertz[after - 1])
  return values[after - 1] + part * (values[after] - values[after - 1])
}

/** Less than this nobody would call another treble, dB. */
const ALIKE_DECIBELS = 0.3
/** A doubt narrower than this share of the other is better known. */
const CLEARLY_NARROWER = 0.7

/** What the second does to the treble beside the first: "Lower, and better known". */
export function trebleHeading(a: Figures, b: Figures): string {
  const known = narrower(a, b) ? 'better known' : narrower(b, a) ? 'less well known' : ''
  const how = byLift(a, b) ?? byFall(a, b)
  if (!how) return known ? `Much the same, and ${known}` : 'Much the same'
  return known ? `${how}, and ${known}` : how
}

const lift = ({ liftDecibels }: Figures) => Math.max(0, liftDecibels.nominal)

function byLift(a: Figures, b: Figures): string | null {
  const more = lift(b) - lift(a)
  if (Math.abs(more) < ALIKE_DECIBELS) return null
  return more < 0 ? 'Lower' : 'Higher'
}

function byFall(a: Figures, b: Figures): string | null {
  const more = b.at15kHzDecibels.nominal - a.at15kHzDecibels.nominal
  if (Math.abs(more) < ALIKE_DECIBELS) return null
  return more < 0 ? 'It falls more' : 'It falls less'
}

/** How far the doubt reaches where the treble ends, dB. */
const spread = ({ at15kHzDecibels, liftDecibels }: Figures) =>
  Math.max(at15kHzDecibels.high - at15kHzDecibels.low, liftDecibels.high - liftDecibels.low)

function narrower(wide: Figures, narrow: Figures): boolean {
  return spread(wide) > ALIKE_DECIBELS && spread(narrow) < spread(wide) * CLEARLY_NARROWER
}
