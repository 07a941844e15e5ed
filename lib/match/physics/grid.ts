/**
 * Frequencies spaced evenly in the logarithm, and Gauss–Legendre points for integrals over frequency.
 *
 * | symbol | name                        | unit | source                                            |
 * |--------|-----------------------------|------|---------------------------------------------------|
 * | f      | frequency                   | Hz   |                                                   |
 * | x_i,w_i | Legendre nodes and weights | 1    | Newton's method on the Legendre recurrence (textbook) |
 */

/** `count` frequencies from `low` to `high`, ends included, in equal ratios. @throws RangeError unless 0 < low < high and count ≥ 2 */
export function logSpacedHertz({ low, high, count }: { low: number; high: number; count: number }): Float64Array {
  if (!(low > 0) || !(high > low) || !(count >= 2)) throw new RangeError('A log grid needs 0 < low < high and two points or more.')
  const grid = new Float64Array(count)
  const step = Math.log(high / low) / (count - 1)
  for (let i = 0; i < count; i += 1) grid[i] = low * Math.exp(step * i)
  grid[count - 1] = high
  return grid
}

export interface Quadrature {
  readonly hertz: Float64Array
  /** Weight of each point for ∫ g(f) df, the Jacobian f of the logarithm already inside, in hertz. */
  readonly weightHertz: Float64Array
}

/**
 * Gauss–Legendre points in ln f, so that ∫ g(f) df from low to high ≈ Σ weightHertz[i]·g(hertz[i]).
 * The error falls as ρ^(−2n), ρ being the ellipse of the nearest pole of g in the plane of ln f.
 */
export function logQuadrature({ low, high, count }: { low: number; high: number; count: number }): Quadrature {
  const hertz = new Float64Array(count)
  const weightHertz = new Float64Array(count)
  const middle = Math.log(low * high) / 2
  const half = Math.log(high / low) / 2
  for (let i = 0; i < count; i += 1) {
    const { node, weight } = legendreNode(i, count)
    const f = Math.exp(middle + half * node)
    hertz[i] = f
    weightHertz[i] = half * weight * f
  }
  return { hertz, weightHertz }
}

function legendreNode(index: number, count: number): { node: number; weight: number } {
  let x = -Math.cos((Math.PI * (index + 0.75)) / (count + 0.5))
  let slope = 1
  // Newton from this start doubles its digits each round; eight rounds are well past double precision.
  for (let round = 0; round < 8; round += 1) {
    let previous = 1
    let current = x
    for (let k = 2; k <= count; k += 1) {
      const next = ((2 * k - 1) * x * current - (k - 1) * previous) / k
      previous = current
      current = next
    }
    slope = (count * (x * current - previous)) / (x * x - 1)
    x -= current / slope
  }
  return { node: x, weight: 2 / ((1 - x * x) * slope * slope) }
}
