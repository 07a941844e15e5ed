import { clamp } from './numbers'
import { Patterns, screenFill } from './patterns'
import { usePlotId } from './plot-id'
import { PlotSvg } from './plot-svg'

const HEIGHT = 16

/** "about 9 in 10", "less than 1 in 20": shares are said in tenths and twentieths. */
export function shareText(share: number): string {
  const known = clamp(Number.isFinite(share) ? share : 0, 0, 1)
  if (known < 0.025) return 'next to none'
  if (known < 0.075) return 'about 1 in 20'
  return known > 0.95 ? 'nearly all' : `about ${Math.min(9, Math.max(1, Math.round(known * 10)))} in 10`
}

/** How much of the doubt one unknown makes, as a length; `share` from 0 to 1. */
export function DoubtBar({ share, width = 170, print = false }: { share: number; width?: number; print?: boolean }) {
  const id = usePlotId()
  // Next to nothing is still an edge to see.
  const length = Math.max(1.5, (width - 1) * clamp(Number.isFinite(share) ? share : 0, 0, 1))
  const words = shareText(share)
  return (
    <PlotSvg kind="share" width={width} height={HEIGHT} label={`${words[0]?.toUpperCase()}${words.slice(1)} of the doubt`}>
      <Patterns id={id} print={print} />
      <rect fill={screenFill(id)} x={0} y={1} width={length.toFixed(1)} height={HEIGHT - 2} />
      <path className="edge" d={`M0 1h${length.toFixed(1)}M0 ${HEIGHT - 1}h${length.toFixed(1)}`} />
    </PlotSvg>
  )
}
