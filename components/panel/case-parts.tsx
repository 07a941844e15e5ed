import { px } from './piece'

/** Line drawings of what stands on every case. */

export function CaseBox({ width, height }: { width: number; height: number }) {
  return (
    <>
      <rect className="case" x="1" y="1" width={width - 2} height={height - 2} />
      <path className="hair" d={`M1 8H${width - 1}M1 ${height - 8}H${width - 1}`} />
    </>
  )
}

/** A pair of sockets with the legend over it. */
export function Sockets({ x, apart, y, radius = 19, legend }: { x: number; apart: number; y: number; radius?: number; legend: string }) {
  return (
    <>
      <text className="pl" x={x - radius - 1} y={y - radius - 28}>
        {legend}
      </text>
      <Socket x={x} y={y} radius={radius} name="Left" />
      <Socket x={x + apart} y={y} radius={radius} name="Right" />
    </>
  )
}

function Socket({ x, y, radius, name }: { x: number; y: number; radius: number; name: string }) {
  return (
    <>
      <circle className="ol" cx={x} cy={y} r={radius} />
      <circle className="ol" cx={x} cy={y} r={px(radius * 0.58)} />
      <circle className="hole" cx={x} cy={y} r={px(radius * 0.21)} />
      <text className="swn" x={x} y={y + radius + 19} textAnchor="middle">
        {name}
      </text>
    </>
  )
}

/** The ground post, its name beside or under it. */
export function GroundPost({ x, y, under = false }: { x: number; y: number; under?: boolean }) {
  return (
    <>
      <circle className="ol" cx={x} cy={y} r="15" />
      <path className="hair" d={`M${x - 10} ${y - 7}l20 14M${x - 10} ${y + 7}l20 -14`} />
      {under ? (
        <text className="swn" x={x} y={y + 35} textAnchor="middle">
          Ground
        </text>
      ) : (
        <text className="swn" x={x + 24} y={y + 5}>
          Ground
        </text>
      )}
    </>
  )
}

/** The knob that every front has. */
export function PowerKnob({ x, y }: { x: number; y: number }) {
  return (
    <>
      <circle className="ol" cx={x} cy={y} r="22" />
      <circle className="hole" cx={x} cy={y} r="3" />
      <text className="swn" x={x} y={y + 44} textAnchor="middle">
        Power
      </text>
    </>
  )
}

/** The lead colours of a channel with its word. `text` may say more than the side. */
export function SideChip({ side, x, y, text }: { side: 'left' | 'right'; x: number; y: number; text?: string }) {
  const [signal, back] = side === 'left' ? ['lw', 'lb'] : ['lr', 'lg']
  return (
    <>
      <rect className={`ld ${signal}`} x={x} y={y} width="11" height="11" />
      <rect className={`ld ${back}`} x={x + 11} y={y} width="11" height="11" />
      <text className="pl" x={x + 29} y={y + 11}>
        {text ?? (side === 'left' ? 'Left' : 'Right')}
      </text>
    </>
  )
}

/** A small triangle at a control that is to be moved. `y` is its upper edge. */
export function MoveMark({ x, y, up }: { x: number; y: number; up: boolean }) {
  return <path className="mv" d={up ? `M${x} ${y}l-6 9h12z` : `M${x} ${y + 9}l-6 -9h12z`} />
}
