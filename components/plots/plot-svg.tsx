import type { ReactNode } from 'react'

/** The outer element of every drawing: one picture to a screen reader, with its finding as a sentence. */
export function PlotSvg({
  kind,
  width,
  height,
  label,
  children,
}: {
  kind: string
  width: number
  height: number
  label: string
  children: ReactNode
}) {
  return (
    <svg
      className={`plot ${kind}`}
      role="img"
      aria-label={label}
      viewBox={`0 0 ${width} ${height}`}
      width={width}
      height={height}
    >
      {children}
    </svg>
  )
}
