import { parseNumber, NUMBER } from './numerals'
import { factorOf, unitSign, type Dimension, type Unit } from './units'

/**
 * Reads what people write for a value: "4,5", "4.5mV", "47k", "400-550", "2.5 mV ±2 dB", "100 Ω or more".
 * Pure: text in, figures out, in the unit asked for. Whether a figure is plausible is for `fields.ts` to say.
 */
export interface Figure {
  low: number
  nominal: number
  high: number
  /** "or more", "up to". The open end is then Infinity or 0. */
  open: 'above' | 'below' | null
  /** True when the writer named the unit. */
  unitSaid: boolean
  /** Size of the unit as written, in the base of the dimension. */
  unitSize: number
}

export type ReadText =
  | { kind: 'nothing' }
  | { kind: 'figure'; figure: Figure }
  | { kind: 'reversed'; first: string; second: string }
  | { kind: 'not-positive' }
  /** `inside` is a number with its unit that stands somewhere in the text. */
  | { kind: 'unreadable'; inside: string | null }

const WORDS_AROUND =
  /\b(?:dc|typ(?:ical)?\.?|approx(?:\.|imately)?|about|ca\.?|circa|total|per channel|each|rms|(?:at |@ ?)?1 ?khz)\b|\/ch(?:annel)?\b|~(?=\s*[\d.,])|[()]/g
const ABOVE_BEFORE = /^(?:>=?|≥|over|above|at least|more than|min\.?|minimum|from)\s*/
const BELOW_BEFORE = /^(?:<=?|≤|up to|under|below|at most|less than|max\.?|maximum)\s*/
const ABOVE_AFTER = /\s*(?:or more|and more|or above|and above|and up|or higher|min\.?|minimum|\+)$/
const BELOW_AFTER = /\s*(?:or less|or below|or lower|max\.?|maximum)$/
const FRACTIONS: Record<string, string> = { '½': '.5', '¼': '.25', '¾': '.75' }

const UNIT = '[a-zμ%][a-zμ%]*(?:/[a-z]+)*'
const RANGE = new RegExp(
  `^(${NUMBER})\\s*(${UNIT})?\\s*(?:-|to|and|~)\\s*(${NUMBER})\\s*(${UNIT})?$`,
)
const SPREAD = new RegExp(`^(${NUMBER})\\s*(${UNIT})?\\s*±\\s*(${NUMBER})\\s*(${UNIT})?$`)
const ONE = new RegExp(`^(${NUMBER})\\s*(${UNIT})?$`)
const SIGNED_LEVEL = new RegExp(`^([+-]?)\\s*(${NUMBER})\\s*(dbv|dbu)$`)
const ANYWHERE = new RegExp(`(${NUMBER})\\s*(${UNIT})?`)

/** One spelling for each sign, unit letter and dash. */
function normalised(text: string): string {
  return text
    .replace(/(\d?)\s*([½¼¾])/g, (_, whole: string, part: string) => `${whole || '0'}${FRACTIONS[part]}`)
    .replace(/[\u2126\u03a9]/g, 'ohm')
    .replace(/…|\.{2,}/g, ' to ')
    .normalize('NFKC')
    .toLowerCase()
    .replace(/µ/g, 'μ')
    .replace(/ω/g, 'ohm')
    .replace(/[‐‑‒–—−]/g, '-')
    .replace(/\+\/-|\+-/g, '±')
    // Compliance: 1e-6 cm/dyn, 1 µm/mN and 1 "cu" are the same number.
    .replace(/\s*[x×*·]\s*10\s*\^?\s*-\s*6\s*(?:cm\s*\/\s*dyne?)?/g, ' cu')
    .replace(/ohms\b/g, 'ohm')
    .replace(/([kmg])\s+ohm/g, '$1ohm')
    .replace(/\s*\/\s*/g, '/')
    .replace(/(\d)([kr])(\d)/g, '$1.$3$2')
    .replace(WORDS_AROUND, ' ')
    .replace(/(m|μ|u)vrms/g, '$1v')
    .replace(/\s+/g, ' ')
    .trim()
}

interface Asked {
  dimension: Dimension
  /** Unit of the figures that come back. */
  unit: Unit
  /** Unit of a number written without one. */
  bare?: Unit
  /** Zero is an answer here (screws that weigh nothing). */
  zero?: boolean
}

/**
 * Reads one text.
 * @returns low, nominal and high in `asked.unit`; or why there is none. Never throws.
 */
export function readText(text: string, asked: Asked): ReadText {
  let rest = normalised(text)
  if (rest === '') return { kind: 'nothing' }
  const level = readLevel(rest, asked)
  if (level) return level

  let open: Figure['open'] = null
  if (ABOVE_BEFORE.test(rest) || ABOVE_AFTER.test(rest)) open = 'above'
  else if (BELOW_BEFORE.test(rest) || BELOW_AFTER.test(rest)) open = 'below'
  rest = rest.replace(open === 'above' ? ABOVE_BEFORE : BELOW_BEFORE, '').replace(open === 'above' ? ABOVE_AFTER : BELOW_AFTER, '')

  const one = ONE.exec(rest)
  if (one) {
    const value = valueOf(one[1], one[2], asked)
    if (value === null) return { kind: 'unreadable', inside: null }
    if (!(value > 0 || (asked.zero && value === 0))) return { kind: 'not-positive' }
    const figure = { low: value, nominal: value, high: value, open, ...unitOf(one[2], asked) }
    if (open === 'above') figure.high = Infinity
    if (open === 'below') figure.low = 0
    return { kind: 'figure', figure }
  }
  const range = RANGE.exec(rest)
  if (range) return readRange(range, asked)
  const spread = SPREAD.exec(rest)
  if (spread) return readSpread(spread, asked)
  if (/^-\s*[\d.,]/.test(rest)) return { kind: 'not-positive' }
  const inside = ANYWHERE.exec(rest)
  if (!inside) return { kind: 'unreadable', inside: null }
  const size = inside[2] === undefined ? null : factorOf(asked.dimension, inside[2])
  const sign = size && unitSign(size, asked.dimension)
  return { kind: 'unreadable', inside: sign ? `${inside[1]} ${sign}` : null }
}

function unitOf(unit: string | undefined, asked: Asked): Pick<Figure, 'unitSaid' | 'unitSize'> {
  return { unitSaid: unit !== undefined, unitSize: factorOf(asked.dimension, unit ?? asked.bare ?? asked.unit) ?? 1 }
}

/** A value in the asked unit, free of the last bits that a division of binary fractions leaves behind. */
function valueOf(token: string, unit: string | undefined, asked: Asked): number | null {
  const factor = factorOf(asked.dimension, unit ?? asked.bare ?? asked.unit)
  const out = factorOf(asked.dimension, asked.unit)
  const number = parseNumber(token, asked.dimension)
  if (factor === null || out === null || number === null) return null
  return tidy((number * factor) / out)
}

function readRange([, first, firstUnit, second, secondUnit]: RegExpExecArray, asked: Asked): ReadText {
  const high = valueOf(second, secondUnit ?? firstUnit, asked)
  let low = valueOf(first, firstUnit ?? secondUnit, asked)
  if (low === null || high === null) return { kind: 'unreadable', inside: null }
  // "100-1k": the second unit is not meant for the first number when it would turn the range round.
  const plain = firstUnit === undefined ? valueOf(first, asked.dimension === 'ohms' ? 'ohm' : undefined, asked) : null
  if (low > high && plain !== null && plain <= high && secondUnit !== undefined) low = plain
  if (!(low >= 0) || !(high > 0)) return { kind: 'not-positive' }
  if (low > high) return { kind: 'reversed', first: joined(first, firstUnit ?? secondUnit), second: joined(second, secondUnit ?? firstUnit) }
  const unit = unitOf(secondUnit ?? firstUnit, asked)
  return { kind: 'figure', figure: { low, nominal: middle(low, high), high, open: null, ...unit } }
}

const joined = (number: string, unit: string | undefined) => (unit ? `${number} ${unit}` : number)

/** Geometric where it can be: these quantities span decades. */
export const middle = (low: number, high: number) => (low > 0 ? Math.sqrt(low * high) : (low + high) / 2)

function readSpread([, first, unit, by, byUnit]: RegExpExecArray, asked: Asked): ReadText {
  const relative = byUnit === '%' || byUnit === 'db'
  const own = unit ?? (relative ? undefined : byUnit)
  const nominal = valueOf(first, own, asked)
  const amount = parseNumber(by, asked.dimension)
  if (nominal === null || amount === null) return { kind: 'unreadable', inside: null }
  if (!(nominal > 0)) return { kind: 'not-positive' }
  const figure = (low: number, high: number): ReadText =>
    low > 0
      ? { kind: 'figure', figure: { low: tidy(low), nominal, high: tidy(high), open: null, ...unitOf(own, asked) } }
      : { kind: 'unreadable', inside: null }
  if (byUnit === '%') return figure(nominal * (1 - amount / 100), nominal * (1 + amount / 100))
  if (byUnit === 'db') return figure(nominal * 10 ** (-amount / 20), nominal * 10 ** (amount / 20))
  const absolute = valueOf(by, byUnit ?? unit, asked)
  return absolute === null ? { kind: 'unreadable', inside: null } : figure(nominal - absolute, nominal + absolute)
}

const tidy = (value: number) => Number(value.toPrecision(12))

/** Decibels over a volt or over 0.775 V. */
function readLevel(text: string, asked: Asked): ReadText | null {
  const level = asked.dimension === 'volts' ? SIGNED_LEVEL.exec(text) : null
  const number = level && parseNumber(level[2], 'decibels')
  const out = factorOf('volts', asked.unit)
  if (!level || number === null || out === null) return null
  const reference = level[3] === 'dbu' ? Math.sqrt(0.6) : 1
  const value = (reference * 10 ** ((level[1] === '-' ? -number : number) / 20)) / out
  return { kind: 'figure', figure: { low: value, nominal: value, high: value, open: null, unitSaid: true, unitSize: out } }
}
