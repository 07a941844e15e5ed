import type { Spot } from './geometry'
import { bandPath, linePath } from './geometry'
import { clipTo, screenFill } from './patterns'

/** "Anywhere in here": the screen between two curves, with thin edges. Nothing is drawn while either is missing. */
export function Band({ id, low, high }: { id: string; low: readonly Spot[]; high: readonly Spot[] }) {
  const ground = bandPath(low, high)
  if (!ground) return null
  return (
    <g clipPath={clipTo(id)}>
      <path fill={screenFill(id)} d={ground} />
      <path className="edge" d={linePath(high)} />
      <path className="edge" d={linePath(low)} />
    </g>
  )
}

/** A solid (`c-mid`) or dashed (`c-ref`) curve, held to the frame. */
export function Curve({ id, spots, kind }: { id: string; spots: readonly Spot[]; kind: 'c-mid' | 'c-ref' }) {
  const d = linePath(spots)
  return d ? <path className={kind} clipPath={clipTo(id)} d={d} /> : null
}
