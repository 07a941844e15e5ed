import { candidateOf, rankStates, type Candidate, type DistanceTo } from './candidates'
import type { ControlState } from './controls'
import { curvesOf } from './curves'
import { doubtsOf } from './doubts'
import { drawInputs } from './draws'
import { FigureBench, rangesOf } from './figure-draws'
import { gateOf } from './gate'
import type { MatchInputs } from './inputs'
import { toFinding } from './judgement'
import { levelStages } from './level-stages'
import { numberToFindNext } from './next-number'
import { otherSettings } from './others'
import type { Preamp } from './preamp'
import { remediesFor } from './remedies'
import type { Curves, Evaluation, LevelStage, MatchResult, VerdictKind } from './result'
import { ENGINE_VERSION, RULES_VERSION, SHARE_THAT_COUNTS, WEIGHT_ORDER, weightOf } from './rules'
import { movesBetween, sidesDiffer } from './moves'
import { summaryOf } from './settings'
import { enumerateStates, statesEqual } from './states'
import { reachableShare, verdictOf } from './verdict'

/** Draws that rank every combination, that judge the neighbours of the advice, and behind a shown setting's figures. */
const RANKING_DRAWS = 33
const NEIGHBOUR_DRAWS = 129
const FULL_DRAWS = 257
/** States that may win somewhere in the doubt and are followed along the number to find next. */
const MOST_CONTENDERS = 6

/**
 * Checks a cartridge against a preamp over everything that is not known: evaluates every real combination of its
 * controls, advises one, says how sure that is and which number would settle it.
 * Pure and repeatable: the same inputs give the same result.
 * @throws Error when the preamp's data name a control, path or gain that does not exist
 */
export function match(inputs: MatchInputs): MatchResult {
  const gate = gateOf(inputs)
  if (gate) return { ...closed(inputs), gate }
  const { preamp, present } = inputs
  const states = enumerateStates(preamp, present?.left)
  const distance = distanceFrom(inputs)
  const quick = rankStates(inputs, states, { count: RANKING_DRAWS, depth: 'quick', distance })
  const bench = new FigureBench(drawInputs(inputs, FULL_DRAWS), 'full')
  const chosen = candidateOf(bench, quick.candidates[0].state, distance)
  const standing = present && !sidesDiffer(present) ? candidateOf(bench, present.left, distance) : null
  const isWhereItStands = (state: ControlState) =>
    states.length === 1 || (present !== null && !sidesDiffer(present) && statesEqual(present.left, state))
  const reachable = reachableShare(quick.candidates)
  const verdict = verdictOf(chosen, reachable, !isWhereItStands(chosen.state))
  const doubts = doubtsOf(chosen, bench.draws)
  const fits = verdict === 'suits' || verdict === 'suits-with-changes'
  return {
    rulesVersion: RULES_VERSION,
    engineVersion: ENGINE_VERSION,
    gate: null,
    verdict,
    verdictShare: shareOfVerdict(verdict, chosen, reachable),
    chosen: evaluationOf(chosen, bench),
    present: standing ? evaluationOf(standing, bench) : null,
    moves: present ? movesBetween(preamp, present, chosen.state) : states.length === 1 ? [] : null,
    presentSidesDiffer: present ? sidesDiffer(present) : false,
    combinations: states.length,
    others: otherSettings(quick.candidates, new FigureBench(drawInputs(inputs, NEIGHBOUR_DRAWS), 'quick')),
    remedies: fits ? [] : remediesFor(chosen, bench.draws),
    next: numberToFindNext(inputs, doubts, contenders(quick.candidates), { distance, isWhereItStands }),
    doubts,
    tonight: verdict === 'cannot-say' ? summaryFrom(gentlest(quick.candidates)) : null,
    curves: curvesOf(bench, chosen.setting, chosen.figures),
    presentCurves: standing && !statesEqual(standing.state, chosen.state) ? curvesOf(bench, standing.setting, standing.figures) : null,
    stages: levelStages(bench, chosen.setting, chosen.figures),
  }
}

/** What flipping the drawn switches comes to, with everything that follows it. The same figures as a check's. */
export function tryOut(inputs: MatchInputs, state: ControlState): {
  evaluation: Evaluation
  verdict: VerdictKind
  curves: Curves
  stages: LevelStage[]
} {
  const bench = new FigureBench(drawInputs(inputs, FULL_DRAWS), 'full')
  const candidate = candidateOf(bench, state, () => 0)
  const reachable = candidate.orders.filter((order) => order < 3).length / candidate.orders.length
  return {
    evaluation: evaluationOf(candidate, bench),
    verdict: verdictOf(candidate, reachable, false),
    curves: curvesOf(bench, candidate.setting, candidate.figures),
    stages: levelStages(bench, candidate.setting, candidate.figures),
  }
}

function evaluationOf(candidate: Candidate, bench: FigureBench): Evaluation {
  const findings = candidate.judgements
    .map((judgement) => ({ finding: toFinding(judgement, bench.draws), counts: judgement.counts }))
    .filter(({ finding }) => finding.worst !== 'fine')
    .sort((a, b) => b.counts - a.counts || WEIGHT_ORDER[b.finding.worst] - WEIGHT_ORDER[a.finding.worst])
    .map(({ finding }) => finding)
  return {
    setting: summaryFrom(candidate),
    figures: rangesOf(candidate.figures),
    findings,
    worst: weightOf(candidate.orders.reduce((a, b) => Math.max(a, b), 0)),
    middle: weightOf(candidate.orders[0]),
    shareRuledOut: candidate.shareRuledOut,
  }
}

/** Differing switches, plugs and buttons on both sides; 0 everywhere when the present positions are not known. */
function distanceFrom({ present, preamp }: MatchInputs): DistanceTo {
  if (!present) return () => 0
  return (state) => differences(preamp, present.left, state) + differences(preamp, present.right, state)
}

function differences({ controls }: Preamp, a: ControlState, b: ControlState): number {
  let total = 0
  for (const control of controls) {
    const [left, right] = [a[control.id], b[control.id]]
    const memberwise = control.kind === 'bank' || (control.kind === 'buttons' && control.latch === 'each')
    if (memberwise) for (let k = 0; k < left.length; k++) total += left[k] === right[k] ? 0 : 1
    else total += left === right ? 0 : 1
  }
  return total
}

/** The candidates that are best in some draw; in each, the least weight first and the rank among equals. */
function contenders(candidates: Candidate[]): ControlState[] {
  const wins = new Map<Candidate, number>()
  for (let i = 0; i < candidates[0].orders.length; i++) {
    let best = candidates[0]
    for (const candidate of candidates) if (harm(candidate.orders[i]) < harm(best.orders[i])) best = candidate
    wins.set(best, (wins.get(best) ?? 0) + 1)
  }
  const ordered = [...wins.entries()].sort((a, b) => b[1] - a[1]).map(([candidate]) => candidate)
  return [...new Set([candidates[0], ...ordered])].slice(0, MOST_CONTENDERS).map(({ state }) => state)
}
const summaryFrom = ({ setting, state }: Candidate) => summaryOf(setting, state)
const harm = (order: number): number => (order <= 1 ? 0 : order)

/** Lowest gain first: the setting that can do least harm while the level is not known. */
function gentlest(candidates: Candidate[]): Candidate {
  return candidates.reduce((best, candidate) =>
    candidate.setting.gain.gainDecibels.nominal < best.setting.gain.gainDecibels.nominal ? candidate : best,
  )
}

function shareOfVerdict(verdict: VerdictKind, chosen: Candidate, reachable: number): number {
  if (verdict === 'does-not-suit') return 1 - reachable
  if (verdict === 'cannot-say') return 1
  return Math.max(1 - chosen.shareRuledOut, 1 - SHARE_THAT_COUNTS)
}

/** A result without arithmetic, for cartridges and inputs that it would be wrong for. */
function closed(inputs: MatchInputs): Omit<MatchResult, 'gate'> {
  return {
    rulesVersion: RULES_VERSION,
    engineVersion: ENGINE_VERSION,
    verdict: 'does-not-suit',
    verdictShare: 1,
    chosen: null,
    present: null,
    moves: null,
    presentSidesDiffer: inputs.present ? sidesDiffer(inputs.present) : false,
    combinations: 0,
    others: [],
    remedies: [],
    next: null,
    doubts: [],
    tonight: null,
    curves: null,
    presentCurves: null,
    stages: [],
  }
}
