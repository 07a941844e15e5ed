import type { Slide } from '@/lib/match'
import { textWidth } from '../plots/text-width'
import { FlipRow, FlipTarget } from './flip-target'
import type { SideView } from './panel-view'
import { px, type Hand, type Piece } from './piece'
import { sharedUnit } from './words'

const TOP = 25
const SLOT = 30
/** Kept free at its right, so that it does not touch what is printed next to it. */
const AIR = 12

interface SlideProps {
  slide: Slide
  view: SideView
  placeWidth: number
  /** Width left for a hint beside it; no hint where it does not fit. */
  hintWidth?: number
  hand: Hand
  focused: boolean
}

/** A slide: the tab at its place; the new place is mustard, the old one dashed. */
export function slidePiece({ slide, view, placeWidth, hintWidth = 0, hand, focused }: SlideProps): Piece {
  const { unit, short } = sharedUnit(slide.positions.map(({ label }) => label))
  const each = Math.max(placeWidth, ...short.map((label) => textWidth(label, { size: 14, bold: true }) + 12))
  const width = each * short.length
  const heading = unit ? `${slide.label.toUpperCase()}, ${unit}` : slide.label.toUpperCase()
  const at = slide.positions.findIndex(({ id }) => id === view.shown[slide.id])
  const before = slide.positions.findIndex(({ id }) => id === view.was[slide.id])
  const hint = at === before ? '' : 'Move to the filled place'
  return {
    width: Math.max(width, textWidth(heading, { size: 15, bold: true })) + AIR,
    height: TOP + SLOT + 22,
    low: true,
    drawing: (
      <>
        <text className="pl" x="0" y="11">
          {heading}
        </text>
        {short.map((label, index) => (
          <Place key={label} x={px(index * each)} width={px(each)} label={label} here={index === at} was={index === before && at !== before} moved={at !== before} />
        ))}
        {textWidth(hint, { size: 14 }) <= hintWidth - width - 20 && (
          <text className="swn tk" x={px(width + 20)} y={TOP + 20}>
            {hint}
          </text>
        )}
        {focused && <rect className="ring on" x="-5" y={TOP - 5} width={px(width + 10)} height={SLOT + 30} />}
      </>
    ),
    targets: hand && (
      <FlipRow label={slide.label} choice>
        {slide.positions.map(({ id, label }, index) => (
          <FlipTarget
            key={id}
            label={`${slide.label}, ${label}`}
            choice
            on={index === at}
            box={{ x: px(index * each) + 1, y: TOP - 2, width: px(each) - 2, height: SLOT + 24 }}
            slot={{ x: px(index * each), y: TOP, width: px(each), height: SLOT }}
            onPress={() => hand({ control: slide.id, to: id })}
          />
        ))}
      </FlipRow>
    ),
  }
}

interface PlaceProps {
  x: number
  width: number
  label: string
  here: boolean
  was: boolean
  moved: boolean
}

function Place({ x, width, label, here, was, moved }: PlaceProps) {
  const tab = { x: x + 5, y: TOP + 5, width: width - 10, height: SLOT - 10 }
  return (
    <>
      <rect className={here && moved ? 'slot chg' : 'slot'} x={x} y={TOP} width={width} height={SLOT} />
      {here && <rect className="tab" {...tab} />}
      {was && <rect className="was" {...tab} />}
      <text className={here && moved ? 'swn c' : 'swn'} x={px(x + width / 2)} y={TOP + SLOT + 17} textAnchor="middle">
        {label}
      </text>
    </>
  )
}
