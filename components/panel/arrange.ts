import type { Piece } from './piece'

/** A piece with its place on the drawing. */
export interface Placed {
  piece: Piece
  x: number
  y: number
}

export interface Arrangement {
  placed: Placed[]
  /** Where lines part one column from the next. */
  lines: number[]
  height: number
}

interface Region {
  x: number
  y: number
  width: number
  /** Columns start at the left, or share the width evenly. */
  spread: 'start' | 'even'
  /** Widest gap between two columns. */
  widestGap: number
}

const LEAST_GAP = 24
const UNDER = 24
/** Low pieces share a column up to this height. */
const COLUMN_HEIGHT = 210

interface Column {
  pieces: Piece[]
  width: number
  height: number
  low: boolean
  lineAfter: boolean
}

/** Low pieces stand under each other where that makes no column taller than the tallest piece needs. */
function columnsOf(pieces: Piece[]): Column[] {
  const limit = Math.max(COLUMN_HEIGHT, ...pieces.map(({ height }) => height))
  const columns: Column[] = []
  for (const piece of pieces) {
    const last = columns.at(-1)
    if (piece.low && last?.low && last.height + UNDER + piece.height <= limit) {
      last.pieces.push(piece)
      last.width = Math.max(last.width, piece.width)
      last.height += UNDER + piece.height
    } else {
      const { width, height } = piece
      columns.push({ pieces: [piece], width, height, low: piece.low === true, lineAfter: piece.lineAfter === true })
    }
  }
  return columns
}

const needed = (columns: Column[]) => columns.reduce((sum, { width }) => sum + width, 0) + LEAST_GAP * (columns.length - 1)

function rowsOf(columns: Column[], width: number): Column[][] {
  const rows: Column[][] = []
  for (const column of columns) {
    const last = rows.at(-1)
    if (last && needed([...last, column]) <= width) last.push(column)
    else rows.push([column])
  }
  return rows
}

/** Pieces side by side in a region, in as many rows as they need. */
export function arrange(pieces: Piece[], region: Region): Arrangement {
  const rows = rowsOf(columnsOf(pieces), region.width)
  const placed: Placed[] = []
  const lines: number[] = []
  let top = region.y
  for (const row of rows) {
    const free = region.width - row.reduce((sum, { width }) => sum + width, 0)
    const share = region.spread === 'even' ? free / (row.length + 1) : free / Math.max(1, row.length - 1)
    const gap = Math.max(Math.min(share, region.widestGap), Math.min(LEAST_GAP, share))
    let x = region.spread === 'even' ? region.x + (free - gap * (row.length - 1)) / 2 : region.x
    row.forEach((column, index) => {
      let y = top
      for (const piece of column.pieces) {
        placed.push({ piece, x: Math.round(x), y })
        y += piece.height + UNDER
      }
      x += column.width + gap
      if (column.lineAfter && index < row.length - 1 && rows.length === 1) lines.push(Math.round(x - gap / 2))
    })
    top += Math.max(...row.map(({ height }) => height)) + UNDER
  }
  return { placed, lines, height: top - UNDER - region.y }
}

/** Pieces under each other; those that fit stand beside the one before, where `beside` says so. */
export function stack(pieces: Piece[], width: number, beside: (piece: Piece, before: Piece) => boolean): Arrangement & { rules: number[] } {
  const placed: Placed[] = []
  const rules: number[] = []
  let y = 0
  let x = 0
  let rowHeight = 0
  pieces.forEach((piece, index) => {
    const before = pieces[index - 1]
    if (before && beside(piece, before) && x + 30 + piece.width <= width) x += 30
    else if (before) {
      const ruled = !beside(piece, before)
      if (ruled) rules.push(y + rowHeight + 16)
      y += rowHeight + (ruled ? 28 : 24)
      x = 0
      rowHeight = 0
    }
    placed.push({ piece, x, y })
    x += piece.width
    rowHeight = Math.max(rowHeight, piece.height)
  })
  return { placed, lines: [], rules, height: y + rowHeight }
}
