'use client'

import { useState, useSyncExternalStore } from 'react'
import type { Control, Positions, Preamp } from '@/lib/match'
import { flip, isPerSide, sidesDiffer } from '@/lib/match/moves'
import { describeSetting } from '@/lib/match/setting-words'
import { SIDES_FIELD, type Side } from '@/lib/match/state-fields'
import { encodeState, parseState } from '@/lib/match/states'
import { VerdictMark } from '../ui/verdict-mark'
import { SideChip } from './case-parts'
import { clashInWords } from './move-words'
import { BankPart, ButtonsPart, PlugsPart, SlidePart } from './picker-parts'

interface PositionTexts {
  left: string
  right: string
}

interface PanelPickerProps {
  preamp: Preamp
  legend: string
  /** The short texts of both sides; what does not fit this board counts as delivered. */
  value?: PositionTexts
  onChange?: (value: PositionTexts) => void
  /** Names of the hidden fields that carry the short texts. */
  names?: PositionTexts
}

const subscribeToNothing = () => () => undefined

function positionsFrom(preamp: Preamp, value: PositionTexts | undefined): Positions {
  const left = value && parseState(preamp, value.left)
  const right = value && parseState(preamp, value.right)
  return left && right ? { left, right } : { left: preamp.asDelivered, right: preamp.asDelivered }
}

/**
 * The panel as a form control, to tell how the unit stands now. Every drawn switch is a checkbox or a radio, so it
 * works without script too: the server then reads those instead of the two hidden fields.
 */
export function PanelPicker({ preamp, legend, value, onChange, names = { left: 'left', right: 'right' } }: PanelPickerProps) {
  const [own, setOwn] = useState(() => positionsFrom(preamp, value))
  const positions = value && onChange ? positionsFrom(preamp, value) : own
  const [each, setEach] = useState(() => sidesDiffer(positions))
  const [clash, setClash] = useState('')
  const scripted = useSyncExternalStore(subscribeToNothing, () => true, () => false)

  const put = (next: Positions) => {
    setOwn(next)
    onChange?.({ left: encodeState(preamp, next.left), right: encodeState(preamp, next.right) })
  }
  const choose = (apart: boolean) => {
    setEach(apart)
    if (!apart) put({ left: positions.left, right: positions.left })
  }
  const set = (side: Side, control: Control, to: number | string) => {
    const moved = flip(preamp, positions[side], control.id, to)
    if ('clash' in moved) {
      setClash(clashInWords(preamp, moved.clash, typeof to === 'number' ? to : undefined))
      return
    }
    setClash('')
    const stand = moved.state[control.id]
    const reaches = (one: Side) => one === side || !each || !isPerSide(control)
    const after = (one: Side) => (reaches(one) ? { ...positions[one], [control.id]: stand } : positions[one])
    put({ left: after('left'), right: after('right') })
  }

  const perSide = preamp.controls.filter(isPerSide)
  const shared = preamp.controls.filter((control) => !isPerSide(control))
  const part = (control: Control, side: Side) => (
    <ControlPart key={control.id} preamp={preamp} control={control} side={side} spoken={each && isPerSide(control) ? spokenSide(side) : ''} positions={positions} onSet={(to) => set(side, control, to)} />
  )
  return (
    <fieldset className="pick">
      <legend className="q">{legend}</legend>
      {perSide.length > 0 ? <SidesChoice each={each} onChoose={choose} /> : <input type="hidden" name={SIDES_FIELD} value="alike" />}
      <div className="pick-sides">
        {perSide.length > 0 && (
          <div className="pick-side">
            <SideTitle side="left" className="pick-apart" />
            <SideTitle side="left" className="pick-alike" alike />
            {perSide.map((control) => part(control, 'left'))}
          </div>
        )}
        {perSide.length > 0 && (
          <div className="pick-side pick-right">
            <SideTitle side="right" />
            {perSide.map((control) => part(control, 'right'))}
          </div>
        )}
        {shared.length > 0 && <div className="pick-side pick-shared">{shared.map((control) => part(control, 'left'))}</div>}
      </div>
      {clash !== '' && (
        <p className="err" role="alert">
          <VerdictMark mark="error" />
          <span>{clash}</span>
        </p>
      )}
      {scripted && <p className="note">{comesTo(preamp, positions)}</p>}
      <input type="hidden" name={names.left} value={encodeState(preamp, positions.left)} />
      <input type="hidden" name={names.right} value={encodeState(preamp, positions.right)} />
    </fieldset>
  )
}

const spokenSide = (side: Side) => (side === 'left' ? 'Left, ' : 'Right, ')

function SidesChoice({ each, onChoose }: { each: boolean; onChoose: (apart: boolean) => void }) {
  return (
    <div className="seg" role="radiogroup" aria-label="The two sides">
      <label>
        <input type="radio" name={SIDES_FIELD} value="alike" checked={!each} onChange={() => onChoose(false)} />
        Both sides alike
      </label>
      <label>
        <input className="pick-each" type="radio" name={SIDES_FIELD} value="each" checked={each} onChange={() => onChoose(true)} />
        Each side by itself
      </label>
    </div>
  )
}

/** Which side the switches under it are. Both forms are there, so that the choice above works without script. */
function SideTitle({ side, alike = false, className = '' }: { side: Side; alike?: boolean; className?: string }) {
  const width = alike ? 220 : 90
  const label = alike ? 'Left and right' : side === 'left' ? 'Left' : 'Right'
  return (
    <svg className={`plot ${className}`} viewBox={`0 0 ${width} 16`} width={width} height="16" role="img" aria-label={label}>
      <SideChip side={side} x={1} y={2} />
      {alike && <SideChip side="right" x={80} y={2} text="Right, set the same" />}
    </svg>
  )
}

function ControlPart({
  preamp,
  control,
  side,
  spoken,
  positions,
  onSet,
}: {
  preamp: Preamp
  control: Control
  side: Side
  spoken: string
  positions: Positions
  onSet: (to: number | string) => void
}) {
  const shared = { state: positions[side], side, spoken, onSet }
  switch (control.kind) {
    case 'bank':
      return <BankPart preamp={preamp} control={control} {...shared} />
    case 'slide':
      return <SlidePart control={control} {...shared} />
    case 'plugs':
      return <PlugsPart control={control} {...shared} />
    case 'buttons':
      return <ButtonsPart control={control} {...shared} />
  }
}

/** "That is gain 42 dB, load 47 kΩ": lets the owner see whether it fits what they believe they have. */
function comesTo(preamp: Preamp, positions: Positions): string {
  const words = (side: Side) =>
    describeSetting(preamp, positions[side])
      .map(({ label, value }) => `${label} ${value}`)
      .join(', ')
  return sidesDiffer(positions) ? `Left: ${words('left')}. Right: ${words('right')}.` : `That is: ${words('left')}.`
}
