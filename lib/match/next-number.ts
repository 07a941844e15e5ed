import { rankStates, type Candidate, type DistanceTo } from './candidates'
import type { ControlState } from './controls'
import { valueAtLevel } from './ensemble'
import type { MatchInputs } from './inputs'
import { withKnown } from './known-value'
import type { Doubt, FindingCode, NumberToFindNext, Stretch, VerdictKind } from './result'
import { summaryOf } from './settings'
import { reachableShare, verdictOf } from './verdict'

/** Values of the unknown that are tried, and draws of everything else at each. */
const STEPS = 17
const DRAWS = 24
/** More stretches than this cannot be read at a glance: the small ones join their neighbour. */
const MOST_STRETCHES = 4

interface Step {
  value: number
  verdict: VerdictKind
  candidate: Candidate
}

/**
 * The unknown that would do most to settle the verdict, cut where the advice changes. The unknown is settled at each
 * of a row of values, everything else keeps its doubt, and the states that could win are judged again.
 * @returns null when nothing that an owner could find out is in doubt
 */
export function numberToFindNext(
  inputs: MatchInputs,
  doubts: Doubt[],
  contenders: ControlState[],
  moves: { distance: DistanceTo; isWhereItStands: (state: ControlState) => boolean },
): NumberToFindNext | null {
  const leading = doubts[0]
  if (!leading || leading.share === 0) return null
  const steps: Step[] = []
  for (let k = 0; k < STEPS; k++) {
    const value = valueAtLevel(leading, k / (STEPS - 1))
    const settled = withKnown(inputs, leading.unknown, value)
    const { candidates } = rankStates(settled, contenders, { count: DRAWS, depth: 'quick', distance: moves.distance })
    const best = candidates[0]
    steps.push({ value, candidate: best, verdict: verdictOf(best, reachableShare(candidates), !moves.isWhereItStands(best.state)) })
  }
  const stretches = joinSmall(cut(steps))
  return { unknown: leading.unknown, low: leading.low, nominal: leading.nominal, high: leading.high, share: leading.share, stretches }
}

const key = ({ verdict, candidate }: Step) => `${verdict} ${verdict === 'does-not-suit' ? '' : JSON.stringify(candidate.state)}`

/** Neighbouring values with the same advice become one stretch; a turn lies midway between two values, in proportion. */
function cut(steps: Step[]): Stretch[] {
  const stretches: Stretch[] = []
  steps.forEach((step, k) => {
    const previous = steps[k - 1]
    if (previous && key(previous) === key(step)) {
      stretches[stretches.length - 1].to = step.value
      return
    }
    const from = previous ? (previous.value > 0 ? Math.sqrt(previous.value * step.value) : (previous.value + step.value) / 2) : step.value
    if (previous) stretches[stretches.length - 1].to = from
    const fits = step.verdict !== 'does-not-suit'
    stretches.push({
      from,
      to: step.value,
      verdict: step.verdict,
      setting: fits ? summaryOf(step.candidate.setting, step.candidate.state) : null,
      finding: heaviestFinding(step.candidate),
    })
  })
  return stretches
}

function heaviestFinding({ judgements }: Candidate): FindingCode | null {
  let heaviest: FindingCode | null = null
  let most = 1
  for (const judgement of judgements) {
    const order = judgement.counts
    if (order > most) {
      most = order
      heaviest = judgement.code
    }
  }
  return heaviest
}

/** Joins the smallest stretch to the neighbour with the same verdict, else to its smaller one, until few enough remain. */
function joinSmall(stretches: Stretch[]): Stretch[] {
  const joined = [...stretches]
  const size = ({ from, to }: Stretch) => (from > 0 ? Math.log(to / from) : to - from)
  while (joined.length > MOST_STRETCHES) {
    const alike = joined.findIndex((stretch, k) => k > 0 && joined[k - 1].verdict === stretch.verdict)
    const smallest = joined.reduce((best, stretch, k) => (size(stretch) < size(joined[best]) ? k : best), 0)
    const at = alike > 0 ? alike : Math.max(1, smallest)
    const [left, right] = [joined[at - 1], joined[at]]
    const kept = size(left) >= size(right) ? left : right
    joined.splice(at - 1, 2, { ...kept, from: left.from, to: right.to })
  }
  return joined
}
