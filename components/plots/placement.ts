import type { Frame, Spot } from './geometry'
import { PLOT_TEXT, textWidth } from './text-width'

/** Where labels stand: each has a few places it may take, and takes the first that is free. */
export interface Box {
  x: number
  y: number
  width: number
  height: number
}
export type Anchor = 'start' | 'middle' | 'end'

export interface PlacedText {
  text: string
  x: number
  /** The baseline. */
  y: number
  anchor: Anchor
  bold: boolean
  /** A line from the thing named to the words; empty when there is none. */
  leader: string
  box: Box
}

export interface Surroundings {
  frame: Frame
  /** What stands there already. */
  taken: readonly Box[]
  /** Curves that should stay readable. */
  curves?: readonly (readonly Spot[])[]
}

/** The box of a text whose baseline is at `y`. */
export function textBox(text: string, x: number, y: number, anchor: Anchor, bold: boolean, size = PLOT_TEXT): Box {
  const width = textWidth(text, { size, bold })
  const left = anchor === 'start' ? x : anchor === 'end' ? x - width : x - width / 2
  return { x: left, y: y - size * 0.78, width, height: size }
}

export function placeText(text: string, x: number, y: number, anchor: Anchor = 'start', bold = false): PlacedText {
  return { text, x, y, anchor, bold, leader: '', box: textBox(text, x, y, anchor, bold) }
}

/** A label beside a spot, at the end of a bent leader; to the left when `dx` is negative. */
export function ledText(text: string, [x, y]: readonly [number, number], [dx, dy]: readonly [number, number], bold = false) {
  const way = dx < 0 ? -1 : 1
  const placed = placeText(text, x + dx + way * 11, y + dy + 5, way < 0 ? 'end' : 'start', bold)
  return { ...placed, leader: `M${x.toFixed(1)} ${y.toFixed(1)}l${dx} ${dy}h${way * 6}` }
}

/** Area that two boxes share, in square pixels. */
export function overlap(a: Box, b: Box): number {
  const width = Math.min(a.x + a.width, b.x + b.width) - Math.max(a.x, b.x)
  const height = Math.min(a.y + a.height, b.y + b.height) - Math.max(a.y, b.y)
  return width > 0 && height > 0 ? width * height : 0
}

/** Keeps a few pixels clear around a box. */
export function padded({ x, y, width, height }: Box, by: number): Box {
  return { x: x - by, y: y - by, width: width + by * 2, height: height + by * 2 }
}

/** Area of the box outside the frame, less a breath of 3 px inside it. */
function outside(box: Box, { left, top, width, height }: Frame): number {
  const inner = { x: left + 3, y: top + 2, width: width - 6, height: height - 4 }
  const area = box.width * box.height - overlap(box, inner)
  // Less than this is rounding.
  return area < 0.5 ? 0 : area
}

/** How much of a curve's length runs through the box, in pixels. */
function crossed(box: Box, curve: readonly Spot[]): number {
  let length = 0
  for (let i = 1; i < curve.length; i++) {
    const [from, to] = [curve[i - 1], curve[i]]
    if (!from || !to || Math.max(from[0], to[0]) < box.x || Math.min(from[0], to[0]) > box.x + box.width) continue
    const steps = Math.min(40, Math.max(1, Math.ceil(Math.hypot(to[0] - from[0], to[1] - from[1]) / 3)))
    for (let k = 0; k < steps; k++) {
      const x = from[0] + ((to[0] - from[0]) * k) / steps
      const y = from[1] + ((to[1] - from[1]) * k) / steps
      if (x > box.x && x < box.x + box.width && y > box.y && y < box.y + box.height) length += 3
    }
  }
  return length
}

/** Outside the frame a label is lost, on another label both are, on a curve it can still be read by its halo. */
function harm(box: Box, { frame, taken, curves = [] }: Surroundings): number {
  const clear = padded(box, 2)
  return (
    outside(box, frame) * 20 +
    taken.reduce((sum, other) => sum + overlap(clear, other) * 8, 0) +
    curves.reduce((sum, curve) => sum + crossed(clear, curve) * 2, 0)
  )
}

/** The first candidate that stands free, else the one that does least harm. `candidates` must not be empty. */
export function bestPlace<T extends { box: Box }>(candidates: readonly [T, ...T[]], around: Surroundings): T {
  let best = candidates[0]
  let least = Infinity
  for (const candidate of candidates) {
    const cost = harm(candidate.box, around)
    if (cost < least) [best, least] = [candidate, cost]
    if (least === 0) break
  }
  return best
}
