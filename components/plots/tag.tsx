import { px } from './geometry'
import type { Box, PlacedText } from './placement'
import { textWidth } from './text-width'

const PADDING = 6
const HEIGHT = 20

export interface PlacedTag {
  text: string
  /** Left edge and middle height. */
  x: number
  y: number
  box: Box
}

export function placeTag(text: string, x: number, y: number): PlacedTag {
  const width = textWidth(text, { bold: true }) + PADDING * 2
  return { text, x, y, box: { x, y: y - HEIGHT / 2, width, height: HEIGHT } }
}

/** A figure on its own ground: reversed out for the one that counts, quiet for the others. */
export function Tag({ tag, reversed = false }: { tag: PlacedTag; reversed?: boolean }) {
  return (
    <>
      <rect
        className={reversed ? 'tagt' : 'tag'}
        x={px(tag.x)}
        y={px(tag.y - HEIGHT / 2)}
        width={px(tag.box.width)}
        height={HEIGHT}
      />
      <text className={reversed ? 'mgt' : 'mg'} x={px(tag.x + PADDING)} y={px(tag.y + 5)}>
        {tag.text}
      </text>
    </>
  )
}

/** Words beside a curve, with their leader. */
export function Label({ label, className = 'an' }: { label: PlacedText; className?: string }) {
  return (
    <>
      {label.leader && <path className="ldr" d={label.leader} />}
      <text
        className={`${className}${label.bold ? ' b' : ''} halo`}
        textAnchor={label.anchor}
        x={px(label.x)}
        y={px(label.y)}
      >
        {label.text}
      </text>
    </>
  )
}
