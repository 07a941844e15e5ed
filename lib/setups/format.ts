import { isExact, type Origin, type Range } from '../match/quantity'
import { writtenRange, written, type Dimension } from './units'

/**
 * How figures are written for people: a number, a space, a unit. Two figures unless a third changes the answer,
 * ranges with "to", room instead of a negative margin.
 */

const NUMBER_WORDS = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten']

/** Counts in words up to ten: "two", "14". */
export function countWord(count: number): string {
  return NUMBER_WORDS[count] ?? String(count)
}

/** "one switch", "two switches". */
export function counted(count: number, one: string, many: string): string {
  return `${countWord(count)} ${count === 1 ? one : many}`
}

/** The first letter as a capital, the rest as it is. */
export function sentenceCase(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1)
}

/** "a", "a and b", "a, b and c". */
export function listed(parts: readonly string[]): string {
  if (parts.length < 2) return parts[0] ?? ''
  return `${parts.slice(0, -1).join(', ')} and ${parts[parts.length - 1]}`
}

/** Rounded to so many figures, as a plain number. */
export function rounded(value: number, figures: number): number {
  return value === 0 ? 0 : Number(value.toPrecision(figures))
}

/** Ends nearer than this are one value with a tolerance: a resistor of ±1 % reads as one. */
const ONE_VALUE_RATIO = 1.03

/** Bounds rounded to two figures, or to three where two would make one number of both. */
function roundedRange({ low, high }: Range, figures: number): { low: number; high: number } {
  const two = { low: rounded(low, figures), high: rounded(high, figures) }
  return two.low === two.high && figures < 3 && high / low > ONE_VALUE_RATIO
    ? { low: rounded(low, 3), high: rounded(high, 3) }
    : two
}

const KNOWN: ReadonlySet<Origin> = new Set(['printed', 'measured', 'owner'])

/** A reckoned figure over all that is not known: "4.9 to 5.4 mV", "0.34 V". */
export function figureText(range: Range, dimension: Dimension): string {
  const { low, high } = roundedRange(range, 2)
  return writtenRange(low, high, dimension)
}

/** True where three figures say the number whole, as people give it. */
const isShort = (value: number) => !Number.isFinite(value) || Math.abs(rounded(value, 3) - value) <= 1e-9 * Math.abs(value)

/** A value that went in: as it was given where someone gave it, two figures for an estimate or what was worked out. */
export function valueText(quantity: Range & { origin: Origin }, dimension: Dimension): string {
  const { low, high, origin } = quantity
  const given = KNOWN.has(origin) && isShort(low) && isShort(high)
  const ends = roundedRange({ low, nominal: high, high }, given || isExact(quantity) ? 3 : 2)
  return isExact(quantity) ? written(ends.high, dimension) : writtenRange(ends.low, ends.high, dimension)
}

const WEAKEST_FIRST: Origin[] = ['unknown', 'typical', 'owner', 'printed', 'measured']

/** Quantities that add up, ends with ends; as firm as the weakest part. */
export function added(parts: readonly (Range & { origin: Origin })[]): Range & { origin: Origin } {
  const sum = (end: keyof Range) => parts.reduce((total, part) => total + part[end], 0)
  const origin = WEAKEST_FIRST.find((weak) => parts.some((part) => part.origin === weak)) ?? 'unknown'
  return { low: sum('low'), nominal: sum('nominal'), high: sum('high'), origin }
}

/** One reckoned value: "46 kΩ". */
export function amount(value: number, dimension: Dimension): string {
  return written(rounded(value, 2), dimension)
}

/** Output of a preamp, in volts from a tenth on: "0.34 V", "0.49 to 0.69 V", "36 mV". */
export function voltsText(range: Range): string {
  const { low, high } = roundedRange(range, 2)
  if (high < 0.1) return writtenRange(low, high, 'volts')
  const [from, to] = [plain(low), plain(high)]
  return from === to ? `${from} V` : `${from} to ${to} V`
}

function plain(value: number): string {
  return String(rounded(value, 3))
}

/** Always positive here: below 20 dB one decimal, from there on whole. */
export function decibels(value: number): string {
  const size = Math.abs(value)
  return `${size < 19.95 ? size.toFixed(1) : size.toFixed(0)} dB`
}

/** "9.4 Hz", "1.2 kHz", "13 kHz". */
export function hertz(value: number): string {
  if (value >= 999.5) return `${plain(rounded(value / 1000, 2))} kHz`
  return `${value < 19.95 ? value.toFixed(1) : plain(rounded(value, 2))} Hz`
}

/** "9.4 to 10.8 Hz", or one value where both ends print alike. */
export function hertzRange({ low, high }: Range): string {
  const [from, to] = [hertz(low), hertz(high)]
  if (from === to) return to
  const [, unit] = to.split(' ')
  return from.endsWith(` ${unit}`) ? `${from.split(' ')[0]} to ${to}` : `${from} to ${to}`
}

/** What a setting's gain reads: "36 dB". Whole, since that is what stands on the panel. */
export function gainText(value: number): string {
  return `${rounded(value, 3)} dB`
}

/** A margin as owners read it: "3.1 dB of room", "over by 2.9 dB", never below zero. */
export function roomText(marginDecibels: number): string {
  const tenths = Math.round(marginDecibels * 10)
  if (tenths === 0) return 'no room left'
  return tenths > 0 ? `${decibels(marginDecibels)} of room` : `over by ${decibels(marginDecibels)}`
}

/** Two figures as near as this are one, the worse, dB. */
const ALIKE_DECIBELS = 0.25

/** Worst and middle: "at worst over by 0.9 dB, in the middle 0.6 dB of room"; one of them where they print alike. */
export function roomRange({ low, nominal }: Range): string {
  if (Math.abs(low - nominal) < ALIKE_DECIBELS) return roomText(low)
  const [worst, middle] = [roomText(low), roomText(nominal)]
  return worst === middle ? worst : `at worst ${worst}, in the middle ${middle}`
}

/** Sizes, signs left out: "1.8 dB at worst, 0.9 dB in the middle"; one of them where they print alike. */
export function worstThenMiddle(worst: number, middle: number): string {
  if (Math.abs(worst - middle) < ALIKE_DECIBELS) return decibels(worst)
  const [a, b] = [decibels(worst), decibels(middle)]
  return a === b ? a : `${a} at worst, ${b} in the middle`
}

const DAYS = ['Sunday', 'Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday']
const MONTHS = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
]

/** "Wednesday 11 March 2026", in UTC so that paper and screen say the same everywhere. */
export function dayText(milliseconds: number): string {
  const day = new Date(milliseconds)
  return `${DAYS[day.getUTCDay()]} ${day.getUTCDate()} ${MONTHS[day.getUTCMonth()]} ${day.getUTCFullYear()}`
}

const UNIT_AFTER = /(\d) (?=(?:to \d|dB|m?V\b|µV|[kM]?Ω|[pn]F|µF|[mµ]?H\b|k?Hz|g\b|cm\/s|µm))/g

/** "Tarn 2", "Switch 7", "Figure 1", "No. 3": a name and its number. */
const NAMED_NUMBER = /\b(\p{Lu}\p{Ll}+\.?) (?=\d{1,2}\b)/gu

/** The same text with numbers tied to their units and names, so that a line never breaks between them. */
export function tied(text: string): string {
  return text.replace(UNIT_AFTER, '$1\u00a0').replace(NAMED_NUMBER, '$1\u00a0')
}
