'use client'

import { useLayoutEffect, useRef, useState } from 'react'

/**
 * The width a drawing has. Until the box was measured it is `initialWidth`, on the server and in the first
 * client drawing alike, so that both give the same markup.
 * @returns `measured` turns true with the first measurement; until then the drawing is scaled down by CSS
 */
export function useContainerWidth<E extends HTMLElement>(initialWidth: number) {
  const ref = useRef<E>(null)
  const [width, setWidth] = useState<number | null>(null)
  useLayoutEffect(() => {
    const box = ref.current
    if (!box) return
    const measure = () => {
      const now = Math.floor(box.clientWidth)
      // A box that is not shown has no width; it keeps its last drawing.
      if (now > 0) setWidth(now)
    }
    measure()
    if (typeof ResizeObserver === 'undefined') return
    const observer = new ResizeObserver(measure)
    observer.observe(box)
    return () => observer.disconnect()
  }, [])
  return { ref, width: width ?? initialWidth, measured: width !== null }
}
