import type { Control, Preamp } from '@/lib/match'
import { px } from './piece'

const WIDTH = 236
const HEIGHT = 46
const MIDDLE = 23
/** Parts between the ground post and the output sockets. */
const PART_GAP = 9

/** The panel at the size of a list row: enough to tell the models apart by their backs. Says nothing by itself. */
export function MiniPanel({ preamp }: { preamp: Preamp }) {
  const pairs = preamp.groups.some(({ sets }) => sets === 'input') ? preamp.paths.length : 1
  const inputs = Array.from({ length: pairs }, (_, pair) => (pairs === 1 ? [22, 44] : [18 + pair * 44, 36 + pair * 44])).flat()
  const post = inputs[inputs.length - 1] + 20
  const parts = preamp.controls.flatMap(partsOf)
  const total = parts.reduce((sum, { width }) => sum + width, 0) + PART_GAP * (parts.length - 1)
  const from = post + 12
  const scale = Math.min(1, (WIDTH - 62 - from) / Math.max(1, total))
  const start = from + (WIDTH - 62 - from - total * scale) / 2
  const offsets = parts.map((_, index) => parts.slice(0, index).reduce((sum, { width }) => sum + width + PART_GAP, 0))
  return (
    <svg className="plot mini" viewBox={`0 0 ${WIDTH} ${HEIGHT}`} width={WIDTH} height={HEIGHT} aria-hidden="true">
      <rect className="case" x="1" y="1" width={WIDTH - 2} height={HEIGHT - 2} />
      {[...inputs, WIDTH - 42, WIDTH - 20].map((x) => (
        <MiniSocket key={x} x={x} />
      ))}
      <circle className="ol" cx={post} cy={MIDDLE} r="4.5" />
      {parts.map(({ draw, width }, index) => (
        <g key={index}>{draw(px(start + offsets[index] * scale), px(width * scale))}</g>
      ))}
    </svg>
  )
}

function MiniSocket({ x }: { x: number }) {
  return (
    <>
      <circle className="ol" cx={x} cy={MIDDLE} r="7" />
      <circle className="hole" cx={x} cy={MIDDLE} r="2" />
    </>
  )
}

interface Part {
  width: number
  draw: (x: number, width: number) => React.ReactNode
}

/** What of a control can be told apart at this size. Banks and plugs are there twice. */
function partsOf(control: Control): Part[] {
  if (control.kind === 'bank') {
    const bank: Part = { width: 8 + control.switchCount * 5.3, draw: (x, width) => <MiniBank x={x} width={width} count={control.switchCount} /> }
    return [bank, bank]
  }
  if (control.kind === 'plugs') {
    const plug: Part = { width: 22, draw: (x, width) => <MiniPlug x={x} width={width} /> }
    return [plug, plug]
  }
  const count = control.kind === 'buttons' ? control.buttons.length : control.positions.length
  return [{ width: count * (control.kind === 'buttons' ? 13 : 9), draw: (x, width) => <MiniCells x={x} width={width} count={count} /> }]
}

function MiniBank({ x, width, count }: { x: number; width: number; count: number }) {
  const pitch = (width - 6) / count
  return (
    <>
      <rect className="ol" x={x} y="13" width={width} height="20" />
      {Array.from({ length: count }, (_, index) => (
        <rect key={index} className="hole" x={px(x + 3 + index * pitch + pitch * 0.2)} y={index % 3 === 0 ? 16 : 23} width={px(pitch * 0.6)} height="7" />
      ))}
    </>
  )
}

function MiniPlug({ x, width }: { x: number; width: number }) {
  return (
    <>
      <rect className="ol" x={x} y="14" width={width} height="18" />
      <circle className="hole" cx={px(x + width * 0.32)} cy={MIDDLE} r="2.4" />
      <circle className="hole" cx={px(x + width * 0.68)} cy={MIDDLE} r="2.4" />
    </>
  )
}

function MiniCells({ x, width, count }: { x: number; width: number; count: number }) {
  const lines = Array.from({ length: count - 1 }, (_, index) => `M${px(x + (width * (index + 1)) / count)} 16v14`).join('')
  return <path className="hair" d={`M${x} 16h${width}v14h${-width}z${lines}`} />
}
