/**
 * How wide words come out in Sofia Sans Condensed, so that a tag fits its text and labels keep apart
 * on the server too, where nothing can be measured. Advance widths in 1/1000 em at weight 700,
 * read from the font in steps of 20.
 */
const ADVANCES: [number, string][] = [
  [160, ' \u00a0'],
  [180, "'"],
  [200, 'ijl'],
  [220, '.IJ:;'],
  [240, ',()’'],
  [300, 'r'],
  [320, 'f'],
  [340, 't'],
  [380, 'sz-'],
  [400, '1aL'],
  [420, 'cegkvxyF'],
  [440, '2357bdhnopquETZμ'],
  [460, '4PSXY'],
  [480, '0689−+AB'],
  [500, 'KRV'],
  [520, 'CDGOQUΩ'],
  [540, 'HN'],
  [600, 'w'],
  [640, 'M'],
  [660, 'm'],
  [700, 'W'],
  [760, '%'],
]
const WIDTH_OF = new Map(ADVANCES.flatMap(([width, glyphs]) => [...glyphs].map((glyph) => [glyph, width] as const)))
const OTHER_GLYPH = 520
const REGULAR_TO_BOLD = 0.965

export const PLOT_TEXT = 14.5

/** @returns pixels */
export function textWidth(text: string, { size = PLOT_TEXT, bold = false } = {}): number {
  const thousandths = [...text].reduce((sum, glyph) => sum + (WIDTH_OF.get(glyph) ?? OTHER_GLYPH), 0)
  return (thousandths / 1000) * size * (bold ? 1 : REGULAR_TO_BOLD)
}

/** Breaks a text into lines of at most `width` pixels; a single word longer than that keeps its line. */
export function wrapText(text: string, width: number, size = PLOT_TEXT): string[] {
  const lines: string[] = []
  for (const word of text.split(' ').filter(Boolean)) {
    const last = lines.at(-1)
    const longer = last === undefined ? word : `${last} ${word}`
    if (last !== undefined && textWidth(longer, { size }) <= width) lines[lines.length - 1] = longer
    else lines.push(word)
  }
  return lines
}
