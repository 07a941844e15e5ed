import type { Candidate } from './candidates'
import { findableQuantities, type Draws } from './draws'
import { correlation } from './judgement'
import type { Doubt } from './result'

/** How much a figure's own spread counts beside a spread of its weight: enough to order unknowns that settle nothing. */
const FIGURE_SHARE = 0.02

/**
 * What each unknown contributes to the doubt about a setting, largest first. First-order shares of variance: the
 * squared correlation of the unknown with each rule's weight over the draws, times how much that weight varies
 * (McKay 1995 uses the same ratio). Shares are of what the owner can find out, and add up to 1.
 */
export function doubtsOf({ judgements }: Candidate, draws: Draws): Doubt[] {
  const findable = findableQuantities(draws.inputs)
  const scored = findable.map(({ name, quantity }) => {
    const levels = draws.ensemble.levels[name] as Float64Array
    let score = 0
    for (const { orders, values, byMiddle } of judgements) {
      const weight = byMiddle ? 0.1 : 1
      const asNumbers = Float64Array.from(orders)
      score += weight * variance(asNumbers) * correlation(asNumbers, levels) ** 2
      if (values) score += weight * FIGURE_SHARE * relativeVariance(values) * correlation(values, levels) ** 2
    }
    return { unknown: name, low: quantity.low, nominal: quantity.nominal, high: quantity.high, origin: quantity.origin, score }
  })
  const total = scored.reduce((sum, { score }) => sum + score, 0)
  return scored
    .map(({ score, ...doubt }) => ({ ...doubt, share: total > 0 ? score / total : 0 }))
    .sort((a, b) => b.share - a.share)
}

function variance(values: Float64Array): number {
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length
  return values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / values.length
}

/** Variance over the squared middle, at most 1, so that figures in volts and in decibels can stand side by side. */
function relativeVariance(values: Float64Array): number {
  const scale = Math.max(Math.abs(values[0]), 1e-15)
  return Math.min(1, variance(values) / (scale * scale))
}
