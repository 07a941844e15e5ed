'use client'

import { useEffect, useState } from 'react'
import { useReducedMotion } from './use-reduced-motion'

/** How long a curve takes to follow a switch. */
const MILLISECONDS = 180

const easeOut = (part: number) => 1 - (1 - part) ** 3

/**
 * Every number of `to`, moved back towards the same number of `from`. Words, and whatever has another shape
 * (a curve that was not there, another number of points), are already those of `to`.
 * @param part 0 gives `from`, 1 gives `to`
 */
export function blend<T>(from: T, to: T, part: number): T {
  return part === 1 ? to : (blendAny(from, to, part) as T)
}

function blendAny(from: unknown, to: unknown, part: number): unknown {
  if (typeof from === 'number' && typeof to === 'number') {
    return Number.isFinite(from) && Number.isFinite(to) ? from + (to - from) * part : to
  }
  if (Array.isArray(from) && Array.isArray(to)) {
    return from.length === to.length ? to.map((value, i) => blendAny(from[i], value, part)) : to
  }
  if (isRecord(from) && isRecord(to)) {
    return Object.fromEntries(Object.entries(to).map(([key, value]) => [key, blendAny(from[key], value, part)]))
  }
  return to
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value)
}

/** What to draw while `target` changes: the numbers ease over, or jump where less motion was asked for. */
export function useTween<T extends object>(target: T): T {
  const still = useReducedMotion()
  const [move, setMove] = useState({ from: target, to: target, part: 1 })
  if (move.to !== target) {
    setMove({ from: blend(move.from, move.to, easeOut(move.part)), to: target, part: still ? 1 : 0 })
  }
  const { to, part } = move
  const moving = part < 1
  useEffect(() => {
    if (!moving) return
    let frame = 0
    let begun: number | null = null
    const step = (now: number) => {
      begun ??= now
      const reached = Math.min(1, (now - begun) / MILLISECONDS)
      setMove((last) => (last.to === to ? { ...last, part: reached } : last))
      if (reached < 1) frame = requestAnimationFrame(step)
    }
    frame = requestAnimationFrame(step)
    return () => cancelAnimationFrame(frame)
  }, [moving, to])
  return moving && !still ? blend(move.from, to, easeOut(part)) : to
}
