import type { Candidate } from './candidates'
import { SHARE_THAT_COUNTS } from './rules'
import type { VerdictKind } from './result'

/**
 * The verdict of a setting. `reachable` is the share of the draws in which some setting fits: when hardly any does,
 * it does not suit; when the advised setting is ruled out in more than a tenth of the draws although others fit
 * there, it cannot be said yet.
 */
export function verdictOf(candidate: Candidate, reachable: number, toMove: boolean): VerdictKind {
  if (candidate.shareRuledOut > SHARE_THAT_COUNTS) return reachable <= SHARE_THAT_COUNTS ? 'does-not-suit' : 'cannot-say'
  const heaviest = Math.max(0, ...candidate.judgements.map(({ counts }) => counts))
  if (heaviest >= 2) return 'suits-with-a-limit'
  return toMove ? 'suits-with-changes' : 'suits'
}

/** Share of the draws in which at least one candidate is not ruled out. */
export function reachableShare(candidates: Candidate[]): number {
  const count = candidates[0].orders.length
  let reached = 0
  for (let i = 0; i < count; i++) if (candidates.some(({ orders }) => orders[i] < 3)) reached++
  return reached / count
}
