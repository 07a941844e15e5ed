import type { ButtonRow } from '@/lib/match'
import { textWidth } from '../plots/text-width'
import { MoveMark } from './case-parts'
import { FlipRow, FlipTarget } from './flip-target'
import type { SideView } from './panel-view'
import { px, type Hand, type Piece } from './piece'

const TOP = 50
const BUTTON = 44

export interface ButtonForm {
  /** Least width of a button. */
  least: number
  apart: number
  /** Wide drawings name the row under a bracket, narrow ones above it. */
  name: 'bracket' | 'heading'
}

interface ButtonsProps {
  row: ButtonRow
  view: SideView
  form: ButtonForm
  hand: Hand
  focused: boolean
}

const isIn = (row: ButtonRow, stand: string, index: number) =>
  row.latch === 'each' ? stand[index] === '1' : stand === row.buttons[index].id

/** A row of push buttons: in is a solid bar, out is empty with a lip. */
export function buttonPiece({ row, view, form, hand, focused }: ButtonsProps): Piece {
  const each = Math.max(form.least, ...row.buttons.map(({ label }) => Math.ceil(textWidth(label, { size: 14, bold: true })) + 4))
  const pitch = each + form.apart
  const width = row.buttons.length * pitch - form.apart
  const stand = view.shown[row.id]
  const was = view.was[row.id]
  const nameWidth = textWidth(row.label, { size: 15, bold: true })
  return {
    width: form.name === 'heading' ? Math.max(width, nameWidth) : width,
    height: form.name === 'heading' ? 128 : 186,
    drawing: (
      <>
        {form.name === 'heading' && (
          <text className="pl" x="0" y="11">
            {row.label}
          </text>
        )}
        {row.buttons.map(({ id, label }, index) => (
          <Button key={id} x={index * pitch} width={each} label={label} pressed={isIn(row, stand, index)} before={isIn(row, was, index)} />
        ))}
        {form.name === 'bracket' && (
          <>
            <path className="br strong" d={`M0 160v6H${width}v-6`} />
            <text className="gl" x={px(width / 2)} y="182" textAnchor="middle">
              {row.label}
            </text>
          </>
        )}
        {focused && <rect className="ring on" x="-6" y={TOP - 24} width={width + 12} height={BUTTON + 46} />}
      </>
    ),
    targets: hand && (
      <FlipRow label={row.label} choice={row.latch === 'one-in'}>
        {row.buttons.map(({ id, label }, index) => (
          <FlipTarget
            key={id}
            label={`${row.label}, ${label}`}
            choice={row.latch === 'one-in'}
            on={isIn(row, stand, index)}
            box={{ x: index * pitch - 2, y: TOP - 22, width: each + 4, height: BUTTON + 40 }}
            slot={{ x: index * pitch, y: TOP, width: each, height: BUTTON }}
            onPress={() => hand({ control: row.id, to: id })}
          />
        ))}
      </FlipRow>
    ),
  }
}

function Button({ x, width, label, pressed, before }: { x: number; width: number; label: string; pressed: boolean; before: boolean }) {
  const moved = pressed !== before
  const middle = px(x + width / 2)
  const bar = { x: x + 7, y: TOP + 14, width: width - 14, height: 23 }
  return (
    <>
      <rect className={moved && pressed ? 'slot thick chg' : 'slot thick'} x={x} y={TOP} width={width} height={BUTTON} />
      {pressed ? <rect className="tab" {...bar} /> : <path className="hair" d={`M${x} ${TOP + 37}h${width}`} />}
      {moved && !pressed && <rect className="was" {...bar} />}
      <text className={moved ? 'swn c' : 'swn'} x={middle} y={TOP - 8} textAnchor="middle">
        {label}
      </text>
      <text className="onoff" x={middle} y={TOP + 60} textAnchor="middle">
        {pressed ? 'in' : 'out'}
      </text>
      {moved && <MoveMark x={middle} y={TOP + 68} up={!pressed} />}
    </>
  )
}
