import type { Frame } from './geometry'
import { px } from './geometry'
import type { PlacedText } from './placement'
import { overlap, placeText } from './placement'

/** A line across the noise bar that needs its name over it. */
export interface Mark {
  x: number
  long: string
  short: string
  bold: boolean
}

interface Rows {
  /** Baselines, the one next to the bar first. */
  baselines: number[]
  /** Where the lines down from the words end. */
  foot: number
}
const PHONE_ROWS: Rows = { baselines: [36, 18], foot: 48 }
const ONE_ROW: Rows = { baselines: [18], foot: 36 }
const TWO_ROWS: Rows = { baselines: [32, 15], foot: 36 }

type Option = PlacedText & { markX: number; cost: number }

/** Words over their marks: in one row if they keep apart there, else in two. Every arrangement is weighed. */
export function namesOver(marks: readonly Mark[], { small, frame }: { small: boolean; frame: Frame }): PlacedText[] {
  if (small) return withLines(arranged(marks, PHONE_ROWS, true, frame).options, PHONE_ROWS)
  const one = arranged(marks, ONE_ROW, false, frame)
  return one.touching ? withLines(arranged(marks, TWO_ROWS, false, frame).options, TWO_ROWS) : withLines(one.options, ONE_ROW)
}

function withLines(options: readonly Option[], { foot }: Rows): PlacedText[] {
  return options.map(({ markX, cost: _cost, ...label }) => ({
    ...label,
    leader: label.y + 6 < foot ? `M${px(markX)} ${label.y + 6}V${foot}` : '',
  }))
}

function optionsFor({ x, long, short, bold }: Mark, { baselines }: Rows, small: boolean): Option[] {
  return (small ? [short] : [long, short]).flatMap((text, brevity) =>
    baselines.flatMap((y, height) => {
      const cost = brevity * 4 + height * 2
      return [
        { ...placeText(text, x, y, 'middle', bold), markX: x, cost },
        { ...placeText(text, x + 4, y, 'start', bold), markX: x, cost: cost + 1 },
        { ...placeText(text, x - 4, y, 'end', bold), markX: x, cost: cost + 1 },
      ]
    }),
  )
}

const TOUCHING = 1000

/** The cheapest of all arrangements; `touching` when even that one has words on words or outside the drawing. */
function arranged(marks: readonly Mark[], rows: Rows, small: boolean, frame: Frame) {
  let best: { options: Option[]; cost: number } = { options: [], cost: Infinity }
  const extend = (chosen: Option[], cost: number) => {
    if (cost >= best.cost) return
    const mark = marks[chosen.length]
    if (!mark) {
      best = { options: chosen, cost }
      return
    }
    for (const option of optionsFor(mark, rows, small)) {
      const clashes = chosen.filter((other) => clash(option, other)).length + (inside(option, frame) ? 0 : 1)
      extend([...chosen, option], cost + option.cost + clashes * TOUCHING)
    }
  }
  extend([], 0)
  return { options: best.options, touching: best.cost >= TOUCHING }
}

const inside = ({ box }: Option, { left, right }: Frame) => box.x >= left - 6 && box.x + box.width <= right + 8

/** Words on words, or the line down from the upper words through the lower ones. */
function clash(a: Option, b: Option): boolean {
  if (overlap({ ...a.box, x: a.box.x - 5, width: a.box.width + 10 }, b.box) > 0) return true
  if (a.y === b.y) return false
  const [lower, upper] = a.y > b.y ? [a, b] : [b, a]
  return upper.markX > lower.box.x - 3 && upper.markX < lower.box.x + lower.box.width + 3
}
