import type { Frame } from './geometry'
import type { LevelPicture, LevelStageDrawn } from './level-facts'
import { grooveFloor } from './level-facts'
import type { LevelScale } from './level-scale'
import type { Column } from './level-stage'
import { limitHeights } from './level-stage'
import { finite } from './numbers'
import type { Box, PlacedText, Surroundings } from './placement'
import { bestPlace, placeText } from './placement'
import { textWidth } from './text-width'

/** A hatch lower than this holds no words. */
const LEAST_HATCH = 15

const SHORT_TITLES: Record<LevelStageDrawn['key'], string> = {
  record: 'Record',
  'into-preamp': 'Into preamp',
  'out-of-preamp': 'Out of preamp',
  'into-next': 'Into next input',
}

/** A stage's name, in two lines on a phone, or a shorter name where it does not fit. */
export function titleLines({ title, key }: LevelStageDrawn, width: number, small: boolean): string[] {
  const fits = (text: string) => textWidth(text, { size: 16, bold: true }) <= width
  if (!small) return [fits(title) ? title : SHORT_TITLES[key]]
  for (const name of [title, SHORT_TITLES[key]]) {
    const words = name.split(' ')
    if (words.length === 1 && fits(name)) return [name]
    for (let split = words.length - 1; split > 0; split--) {
      const lines = [words.slice(0, split).join(' '), words.slice(split).join(' ')]
      if (lines.every(fits)) return lines
    }
  }
  const words = SHORT_TITLES[key].split(' ')
  return words.length > 1 ? [words.slice(0, -1).join(' '), words.at(-1) ?? ''] : words
}

/** "4.9 to 6.9 mV RMS" where there is place, else without RMS, else, and always on a phone, "to 6.9 mV". */
export function valueText(words: string, width: number, { volts, bold, small }: { volts: boolean; bold: boolean; small: boolean }) {
  const fits = (text: string) => textWidth(text, { bold }) <= width
  const full = volts && !small ? `${words} RMS` : words
  if (!small && fits(full)) return full
  return !small && fits(words) ? words : words.replace(/^\S+ to /, 'to ')
}

/** What the grounds are called, each where it is still free. `taken` are the figures, which come first. */
export function groundLabels(
  { stages, peaks }: LevelPicture,
  columns: readonly Column[],
  { frame, scale, small, taken }: { frame: Frame; scale: LevelScale; small: boolean; taken: readonly Box[] },
): PlacedText[] {
  const [first, second] = columns
  if (!first) return []
  const inset = small ? 7 : 12
  const narrow = first.width < 170
  const labels: PlacedText[] = []
  const around = (): Surroundings => ({ frame, taken: [...taken, ...labels.map(({ box }) => box)] })
  const at = (column: Column, text: string, y: number, side: 'start' | 'end' = 'start') =>
    placeText(text, side === 'start' ? column.x + inset : column.x + column.width - 6, y, side)

  const peakText = small ? 'Peaks' : narrow ? 'Record peaks' : 'Peaks, ordinary to loud'
  labels.push(at(first, peakText, scale.y(peaks.loud) - 7))
  if (!small) labels.push(at(first, narrow ? 'Usual level' : 'Usual music level', scale.y(0) - 6))
  const groove = grooveFloor(stages)
  if (groove !== null) {
    const y = scale.y(groove)
    const text = small ? 'Groove' : 'Groove noise'
    labels.push(bestPlace([at(first, text, y + 19), at(first, text, y - 7, 'end')], around()))
  }

  const hissOf = second && finite(second.stage.floor.high)
  if (second && hissOf !== null && hissOf !== undefined) {
    const y = scale.y(hissOf)
    const texts = small ? ['Hiss'] : ['Preamp hiss', 'Hiss']
    labels.push(
      bestPlace(
        [
          at(second, texts[0] ?? 'Hiss', y + 17),
          ...texts.flatMap((text) => [at(second, text, y + 17, 'end'), at(second, text, y - 7, 'end'), at(second, text, y - 7)]),
        ],
        around(),
      ),
    )
  }

  const hatched = columns.filter((column) => {
    const heights = limitHeights(column, scale)
    return heights !== null && heights.best - frame.top >= LEAST_HATCH
  })
  const candidates = hatched.flatMap((column) => {
    const texts = ['Distorts above this line', 'Distorts'].filter(
      (text) => textWidth(text) < column.width - inset - 6 && !(small && text !== 'Distorts'),
    )
    const bottom = limitHeights(column, scale)?.best ?? frame.top
    const y = Math.min(frame.top + 17, (frame.top + bottom) / 2 + 5)
    return texts.flatMap((text) => [at(column, text, y), at(column, text, y, 'end'), at(column, text, bottom - 7, 'end')])
  })
  const [nearest, ...others] = candidates
  if (nearest) labels.push(bestPlace([nearest, ...others], around()))
  return labels
}
