import type { LoadPlugs } from '@/lib/match'
import { textWidth } from '../plots/text-width'
import { MoveMark, SideChip } from './case-parts'
import { FlipRow, FlipTarget } from './flip-target'
import type { PanelView } from './panel-view'
import { px, type Hand, type Piece } from './piece'

const PLUG = 42
/** From the plug that goes in to the one that comes out. */
const BELOW = 64

type PlugState = 'as-is' | 'in' | 'out'

/** A load plug with its value. To put in: mustard. To take out: dashed. `y` is its middle. */
function Plug({ x, y, width, label, state }: { x: number; y: number; width: number; label: string; state: PlugState }) {
  const left = px(x - width / 2)
  const top = y - PLUG / 2
  return (
    <>
      <rect className={state === 'in' ? 'slot chg' : state === 'out' ? 'case out' : 'case'} x={left} y={top} width={width} height={PLUG} />
      {state !== 'out' && (
        <path className={state === 'in' ? 'hair lit' : 'hair'} d={`M${left + 6} ${top}v${PLUG}M${px(left + width - 6)} ${top}v${PLUG}`} />
      )}
      <text className={`gv ${state}`} x={px(x)} y={y + 5} textAnchor="middle">
        {label}
      </text>
    </>
  )
}

export interface PlugForm {
  /** Where the middle of either plug stands. */
  left: number
  right: number
  /** Middle of the plugs, from the top. */
  middle: number
  width: number
}

/** Wide: beside the heading. Narrow: under it, spread over the width. */
export const PLUGS_WIDE: PlugForm = { left: 84, right: 214, middle: 70, width: 250 }
export const plugsNarrow = (width: number): PlugForm => ({ left: px(width / 4), right: px((width / 4) * 3), middle: 91, width })

interface PlugsProps {
  plugs: LoadPlugs
  view: PanelView
  form: PlugForm
  focused: boolean
}

const labelOf = (plugs: LoadPlugs, id: string) => plugs.positions.find((plug) => plug.id === id)?.label ?? id

function widest(plugs: LoadPlugs, least: number): number {
  return Math.max(least, ...plugs.positions.map(({ label }) => Math.ceil(textWidth(label, { size: 15, bold: true })) + 20))
}

/** The two sockets with what is in them, what goes in and what comes out. */
export function plugSocketsPiece({ plugs, view, form, focused }: PlugsProps): Piece {
  const changes = (['left', 'right'] as const).some((side) => view[side].shown[plugs.id] !== view[side].was[plugs.id])
  const width = widest(plugs, 64)
  const between = px((form.left + form.right) / 2)
  return {
    width: form.width,
    height: form.middle + PLUG / 2 + (changes ? BELOW : 0),
    lineAfter: true,
    drawing: (
      <>
        <text className="pl" x="0" y="11">
          {plugs.label.toUpperCase()}
        </text>
        {(['left', 'right'] as const).map((side) => (
          <PlugSocket key={side} side={side} x={form[side]} y={form.middle} width={width} from={labelOf(plugs, view[side].was[plugs.id])} to={labelOf(plugs, view[side].shown[plugs.id])} />
        ))}
        {changes && (
          <>
            <text className="swn tk pi" x={between} y={form.middle + 5} textAnchor="middle">
              put in
            </text>
            <text className="swn tk po" x={between} y={form.middle + BELOW + 5} textAnchor="middle">
              take out
            </text>
          </>
        )}
        {focused && <rect className="ring on" x={form.left - width / 2 - 6} y={form.middle - 27} width={form.right - form.left + width + 12} height={PLUG + 12} />}
      </>
    ),
    targets: null,
  }
}

function PlugSocket({ side, x, y, width, from, to }: { side: 'left' | 'right'; x: number; y: number; width: number; from: string; to: string }) {
  const changes = from !== to
  return (
    <>
      <SideChip side={side} x={x - 28} y={y - 62} />
      <Plug x={x} y={y} width={width} label={to} state={changes ? 'in' : 'as-is'} />
      {changes && (
        <>
          <MoveMark x={x} y={y + 27} up />
          <Plug x={x} y={y + BELOW} width={width} label={from} state="out" />
        </>
      )}
    </>
  )
}

const BETWEEN_PLUGS = 6
const BOX_TOP = 24
const BOX_ROW = PLUG + 8

/** All plugs that came with it. Where the drawing can be operated, this is where a plug is chosen. */
export function plugBoxPiece({ plugs, view, maxWidth, hand }: { plugs: LoadPlugs; view: PanelView; maxWidth: number; hand: Hand }): Piece {
  const count = plugs.positions.length
  const wished = widest(plugs, 54)
  const fitting = Math.floor((maxWidth + BETWEEN_PLUGS) / count) - BETWEEN_PLUGS
  const width = fitting >= wished - 8 ? Math.min(wished, fitting) : wished
  const perRow = Math.max(1, Math.min(count, Math.floor((maxWidth + BETWEEN_PLUGS) / (width + BETWEEN_PLUGS))))
  const place = (index: number) => ({
    x: (index % perRow) * (width + BETWEEN_PLUGS),
    y: BOX_TOP + Math.floor(index / perRow) * BOX_ROW,
  })
  const goesIn = (id: string) => (['left', 'right'] as const).some((side) => view[side].shown[plugs.id] === id && view[side].was[plugs.id] !== id)
  return {
    width: perRow * (width + BETWEEN_PLUGS) - BETWEEN_PLUGS,
    height: BOX_TOP + Math.ceil(count / perRow) * BOX_ROW - 8,
    low: true,
    drawing: (
      <>
        <text className="pl" x="0" y="11">
          IN THE BOX
        </text>
        {plugs.positions.map(({ id, label }, index) => {
          const { x, y } = place(index)
          return <Plug key={id} x={x + width / 2} y={y + PLUG / 2} width={width} label={label} state={goesIn(id) ? 'in' : 'as-is'} />
        })}
      </>
    ),
    targets: hand && (
      <FlipRow label={`${plugs.label} plugs, both sides`} choice>
        {plugs.positions.map(({ id, label }, index) => {
          const box = { ...place(index), width, height: PLUG }
          return (
            <FlipTarget
              key={id}
              label={`${label} plug, both sides`}
              choice
              on={view.left.shown[plugs.id] === id}
              box={box}
              slot={box}
              onPress={() => hand({ control: plugs.id, to: id })}
            />
          )
        })}
      </FlipRow>
    ),
  }
}
