import type { Preamp, SwitchBank } from '@/lib/match'
import { MoveMark, SideChip } from './case-parts'
import { bracketLabels, SMALL_LABEL_UNDER, type BracketLabel } from './bracket-labels'
import { FlipRow, FlipTarget } from './flip-target'
import type { SideView } from './panel-view'
import { px, type Hand, type Piece } from './piece'
import { inSentence } from './words'

export interface BankForm {
  switchWidth: number
  /** Height of the body. */
  bodyHeight: number
  /** From the top of the side's chip to the top of the numbers. */
  chipHeight: number
}

/** Room for ON and OFF beside a bank. */
export const BESIDE_BANK = 38
const NUMBERS = 22
const TIER = 38

interface BankProps {
  preamp: Preamp
  bank: SwitchBank
  view: SideView
  form: BankForm
  chips: { side: 'left' | 'right'; text?: string; x: number }[]
  focusGroup?: string
  hand: Hand
  /** The second of two banks that move together: pressed, but named only once. */
  double: boolean
}

/** A bank of small switches: tab up is ON. What is to be moved is mustard, with a dashed tab where it was. */
export function bankPiece({ preamp, bank, view, form, chips, focusGroup, hand, double }: BankProps): Piece {
  const { switchWidth, bodyHeight, chipHeight } = form
  const labels = bracketLabels(preamp, bank, view.shown, switchWidth)
  const tiers = Math.max(0, ...labels.map(({ tier }) => tier + 1))
  const stand = view.shown[bank.id]
  const was = view.was[bank.id]
  const width = bank.switchCount * switchWidth + 2
  const bracketTop = NUMBERS + bodyHeight + 30
  const numbers = Array.from(stand, (_, index) => index)
  const shift = `translate(0,${chipHeight})`
  return {
    width: width + BESIDE_BANK - 2,
    height: chipHeight + bracketTop + (tiers > 0 ? tiers * TIER : -12),
    drawing: (
      <>
        {chips.map((chip) => (
          <SideChip key={chip.side} side={chip.side} text={chip.text} x={chip.x} y={0} />
        ))}
        <g transform={shift}>
          <rect className="body" x="1" y={NUMBERS} width={width - 2} height={bodyHeight} />
          {numbers.map((index) => (
            <Switch key={index} index={index} on={stand[index] === '1'} moved={stand[index] !== was[index]} form={form} />
          ))}
          {labels.map((label) => (
            <Bracket key={label.id} {...label} y={bracketTop} small={switchWidth < SMALL_LABEL_UNDER} />
          ))}
          <text className="onoff" x={width + 6} y={NUMBERS + 20}>
            ON
          </text>
          <text className="onoff" x={width + 6} y={NUMBERS + bodyHeight - 11}>
            OFF
          </text>
          {focusRings(preamp, bank, focusGroup).map(([first, last]) => (
            <rect
              key={first}
              className="ring on"
              x={(first - 1) * switchWidth - 1}
              y="-3"
              width={(last - first + 1) * switchWidth + 4}
              height={NUMBERS + bodyHeight + 10}
            />
          ))}
        </g>
      </>
    ),
    targets: hand && (
      <g transform={shift}>
        <SwitchTargets preamp={preamp} bank={bank} stand={stand} form={form} hand={hand} double={double} />
      </g>
    ),
  }
}

/** Spans of switches that belong to the group in focus. */
function focusRings(preamp: Preamp, bank: SwitchBank, focusGroup: string | undefined): [number, number][] {
  const group = preamp.groups.find(({ id, control }) => id === focusGroup && control === bank.id)
  if (!group) return []
  const members = group.members ?? Array.from({ length: bank.switchCount }, (_, index) => index + 1)
  return [[Math.min(...members), Math.max(...members)]]
}

function Switch({ index, on, moved, form }: { index: number; on: boolean; moved: boolean; form: BankForm }) {
  const { switchWidth, bodyHeight } = form
  const x = index * switchWidth + 1
  const middle = x + switchWidth / 2
  const tab = { x: x + 8.5, width: switchWidth - 17, height: bodyHeight / 2 - 8 }
  const up = NUMBERS + 7.5
  const down = NUMBERS + bodyHeight / 2 + 0.5
  return (
    <>
      <text className={moved ? 'swn c' : 'swn'} x={middle} y="15" textAnchor="middle">
        {index + 1}
      </text>
      <rect className={moved ? 'slot chg' : 'slot'} x={x + 7} y={NUMBERS + 6} width={switchWidth - 14} height={bodyHeight - 12} />
      <rect className="tab" {...tab} y={on ? up : down} />
      {moved && (
        <>
          <rect className="was" x={tab.x + 1} y={(on ? down : up) + 1} width={tab.width - 2} height={tab.height - 2} />
          <MoveMark x={middle} y={NUMBERS + bodyHeight + 7} up={on} />
        </>
      )}
    </>
  )
}

function Bracket({ from, to, middle, label, value, tier, y, small }: BracketLabel & { y: number; small: boolean }) {
  const lower = tier * TIER
  return (
    <>
      <path className="br" d={`M${px(from)} ${y - 7}v6H${px(to)}v-6`} />
      {tier > 0 && <path className="hair" d={`M${px(middle)} ${y - 1}V${y + lower + 2}`} />}
      <text className={small ? 'gl sm' : 'gl'} x={px(middle)} y={y + lower + 14} textAnchor="middle">
        {label}
      </text>
      <text className="gv" x={px(middle)} y={y + lower + 33} textAnchor="middle">
        {value}
      </text>
    </>
  )
}

interface TargetsProps {
  preamp: Preamp
  bank: SwitchBank
  stand: string
  form: BankForm
  hand: NonNullable<Hand>
  double: boolean
}

function SwitchTargets({ preamp, bank, stand, form: { switchWidth, bodyHeight }, hand, double }: TargetsProps) {
  const groupOf = (member: number) =>
    preamp.groups.find(({ control, members }) => control === bank.id && (members === null || members.includes(member)))
  const targets = Array.from(stand, (bit, index) => {
    const group = groupOf(index + 1)
    return (
      <FlipTarget
        key={index}
        label={[`Switch ${index + 1}`, ...(group ? [inSentence(group.label)] : []), 'both sides'].join(', ')}
        choice={false}
        on={bit === '1'}
        box={{ x: index * switchWidth + 1, y: 1, width: switchWidth, height: NUMBERS + bodyHeight + 4 }}
        slot={{ x: index * switchWidth + 8, y: NUMBERS + 6, width: switchWidth - 14, height: bodyHeight - 12 }}
        double={double}
        onPress={() => hand({ control: bank.id, to: index + 1 })}
      />
    )
  })
  if (double) return <>{targets}</>
  return (
    <FlipRow label={bank.label} choice={false}>
      {targets}
    </FlipRow>
  )
}
