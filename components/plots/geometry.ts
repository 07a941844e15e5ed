import { area, line } from 'd3-shape'
import { clamp } from './numbers'

/** A place on the drawing in pixels, or null where there is nothing to draw. */
export type Spot = readonly [x: number, y: number] | null

export interface Frame {
  left: number
  top: number
  right: number
  bottom: number
  width: number
  height: number
}

/** Below this width a drawing takes its phone form: short labels, fewer ticks, taller for its width. */
export const PHONE_BELOW = 480

export interface PlotForm {
  /** The width to draw for, in pixels. A drawing is never scaled. */
  width: number
  /** The form for paper: coarser screen and hatch, lower. */
  print?: boolean
}

const [NARROWEST, WIDEST] = [240, 4000]

/** The width a plot is really drawn for: whole pixels, and never so few that the margins meet. */
export function drawnWidth(width: number): number {
  return Number.isFinite(width) ? clamp(Math.floor(width), NARROWEST, WIDEST) : NARROWEST
}

export function plotFrame(
  width: number,
  height: number,
  margin: { left: number; right: number; top: number; bottom: number },
): Frame {
  const [right, bottom] = [width - margin.right, height - margin.bottom]
  return {
    left: margin.left,
    top: margin.top,
    right,
    bottom,
    width: right - margin.left,
    height: bottom - margin.top,
  }
}

/** One decimal is plenty on a screen, and keeps the markup short. */
export function px(value: number): number {
  return Math.round(value * 10) / 10
}

/**
 * A curve in pixels. Values that are not finite become gaps; the others are held a little outside the
 * frame at most, which the clip then hides.
 */
export function curveSpots(
  hertz: readonly number[],
  values: readonly number[] | null,
  x: (hertz: number) => number,
  y: (decibels: number) => number,
  [yMin, yMax]: readonly [number, number],
): Spot[] {
  if (!values) return []
  const beyond = (yMax - yMin) / 4
  return hertz.map((f, i) => {
    const value = values[i]
    if (value === undefined || !Number.isFinite(value) || !Number.isFinite(f) || f <= 0) return null
    return [x(f), y(clamp(value, yMin - beyond, yMax + beyond))] as const
  })
}

const drawLine = line<Spot>()
  .defined((spot) => spot !== null)
  .x((spot) => spot?.[0] ?? 0)
  .y((spot) => spot?.[1] ?? 0)
  .digits(1)

interface Slice {
  x: number
  upper: number
  lower: number
}
const drawArea = area<Slice | null>()
  .defined((slice) => slice !== null)
  .x((slice) => slice?.x ?? 0)
  .y0((slice) => slice?.lower ?? 0)
  .y1((slice) => slice?.upper ?? 0)
  .digits(1)

export function linePath(spots: readonly Spot[]): string {
  return drawLine([...spots]) ?? ''
}

/** The ground between two curves, where both are there. */
export function bandPath(lower: readonly Spot[], upper: readonly Spot[]): string {
  const slices = upper.map((top, i) => {
    const bottom = lower[i]
    return top && bottom ? { x: top[0], upper: top[1], lower: bottom[1] } : null
  })
  return drawArea(slices) ?? ''
}

/** The head of a dimension arrow whose tip is at (x, y) and which points along (dx, dy), one of them 0. */
export function arrowHead(x: number, y: number, dx: number, dy: number): string {
  return dx !== 0
    ? `M${px(x - dx * 7)} ${px(y - 3.5)}L${px(x)} ${px(y)}L${px(x - dx * 7)} ${px(y + 3.5)}`
    : `M${px(x - 3.5)} ${px(y - dy * 7)}L${px(x)} ${px(y)}L${px(x + 3.5)} ${px(y - dy * 7)}`
}

/** An upright dimension between two heights: between them when there is place, else pointing at them from outside. */
export function uprightDimension(x: number, y1: number, y2: number, { roomFor = 20, tail = 20 } = {}): string {
  const [top, bottom] = [Math.min(y1, y2), Math.max(y1, y2)]
  if (bottom - top > roomFor)
    return `M${px(x)} ${px(top)}V${px(bottom)}${arrowHead(x, top, 0, -1)}${arrowHead(x, bottom, 0, 1)}`
  return `M${px(x)} ${px(top - tail)}V${px(top)}${arrowHead(x, top, 0, 1)}M${px(x)} ${px(bottom + tail)}V${px(bottom)}${arrowHead(x, bottom, 0, -1)}`
}
