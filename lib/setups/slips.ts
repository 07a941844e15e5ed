import { FIELDS, oneOf, type FieldSpec } from './fields'
import { baseOf, figureWords, usualSentence } from './field-words'
import type { Figure } from './reading'
import type { AnswerKey, CartridgeChoice, NumberField } from './terms'
import type { RawAnswers, Trouble } from './trouble'
import { shortNumber, unitSign, written, writtenRange } from './units'

/** Slips of the pen in figures that could be read: an open end, another prefix, a lost point, another quantity. */

export interface ReadFigure {
  field: NumberField
  type: CartridgeChoice
  /** The box it stands in. */
  key: AnswerKey
  figure: Figure
  twoBoxes: boolean
  /** For telling an impedance from a resistance; null where it is not known. */
  inductanceMillihenries: number | null
  /** The way out where nothing better offers itself. */
  giveUp: NonNullable<Trouble['fix']>
}

/** @returns null for a figure that can be meant */
export function slipIn(read: ReadFigure): Trouble | null {
  const { field, type, key, figure, giveUp } = read
  if (figure.open && figure.open !== (field === 'ratio' ? undefined : FIELDS[field].opens)) return openEnd(read)
  const [least, largest] = field === 'ratio' ? RATIO_LIMITS : FIELDS[field].limits(type)
  const { low, high } = closed(figure)
  if (low >= least && high <= largest) return null
  if (field === 'ratio') {
    return { key, sentence: `A ratio of ${figureWords(field, figure)} is not one that is made. ${usualSentence(field, type)}`, fix: giveUp }
  }
  return (field === 'coil' && high > largest ? impedance(read, high) : null) ?? wrongSize(read, FIELDS[field])
}

const RATIO_LIMITS = [1, 100]

/** The ends that were written; an end left open is no figure to judge. */
const closed = ({ low, high, open }: Figure) => ({ low: open === 'below' ? high : low, high: open === 'above' ? low : high })

function openEnd({ field, key, figure }: ReadFigure): Trouble {
  const value = figureWords(field, closed(figure))
  return {
    key,
    sentence: 'That leaves one end open. Write both ends, or the one value you know.',
    fix: { label: `Use ${value}`, set: { [key]: value } },
  }
}

/**
 * Leaflets of magnets often print the impedance at 1 kHz, |Z| = √(R² + (2π·1000 Hz·L)²), which is far more than the
 * resistance. With the inductance the resistance follows; without it there is nothing to use.
 */
function impedance({ key, type, inductanceMillihenries, giveUp }: ReadFigure, ohms: number): Trouble | null {
  if (type === 'moving-coil' || ohms > LARGEST_IMPEDANCE_OHMS) return null
  const reactance = inductanceMillihenries && 2 * Math.PI * inductanceMillihenries
  const resistance = reactance && ohms > reactance ? Math.sqrt(ohms ** 2 - reactance ** 2) : null
  const [least, largest] = FIELDS.coil.limits(type)
  const start = `${written(ohms, 'ohms')} looks like the impedance at 1 kHz, which is more than the resistance of ${oneOf(type)}.`
  if (resistance === null || resistance < least || resistance > largest) return { key, sentence: start, fix: giveUp }
  const value = written(Number(resistance.toPrecision(2)), 'ohms')
  const set: RawAnswers = { coil: value, coilTo: '', coilHow: 'one' }
  return { key, sentence: `${start} With this inductance it leaves ${value}.`, fix: { label: `Use ${value}`, set } }
}

/** 2π·1 kHz times the largest inductance there is. */
const LARGEST_IMPEDANCE_OHMS = 15_000

const TIMES: [number, string][] = [
  [10, 'ten times'],
  [100, 'a hundred times'],
  [1e3, 'a thousand times'],
  [1e6, 'a million times'],
]
const PREFIXES = [1e-3, 1e3]
const SLIPS = [...PREFIXES, 1e-1, 10, 1e-2, 100, 1e-6, 1e6]
const GRAMS_PER_MILLINEWTON = 1 / 9.80665

/** What it would have to be multiplied by to be usual, or at least possible. */
function factorMeant({ type, figure }: ReadFigure, spec: FieldSpec): number | undefined {
  const { low, high } = closed(figure)
  const inside = ([least, largest]: [number, number], by: number) => low * by >= least * 0.99 && high * by <= largest * 1.01
  const isMillinewtons = figure.unitSize === 1e-3
  const otherUnit = spec.dimension === 'force' ? [isMillinewtons ? 1 / GRAMS_PER_MILLINEWTON : GRAMS_PER_MILLINEWTON] : []
  return [...otherUnit, ...SLIPS].find((by) => inside(spec.usual(type), by)) ?? PREFIXES.find((by) => inside(spec.limits(type), by))
}

/** "0.5 mH is a thousand times too little for a moving magnet. Did you mean 0.5 H?" */
function wrongSize(read: ReadFigure, spec: FieldSpec): Trouble {
  const { field, type, key, figure, twoBoxes, giveUp } = read
  const { low, high } = closed(figure)
  const [much, little] = spec.slip(type)
  const badly = high > spec.limits(type)[1] ? much : little
  const typed = inUnit(read, spec, figure.unitSize) ?? figureWords(field, figure)
  const factor = factorMeant(read, spec)
  if (factor === undefined) return { key, sentence: `${typed} ${spec.verb} ${badly}. ${usualSentence(field, type)}`, fix: giveUp }

  // The same digits under another prefix, unless they are as odd there.
  const digits = (low * baseOf(spec)) / figure.unitSize
  const sameDigits = digits >= 0.1 && digits < 10_000 ? inUnit(read, spec, figure.unitSize, figure.unitSize * factor) : null
  const meant = sameDigits ?? writtenRange(low * factor * baseOf(spec), high * factor * baseOf(spec), spec.dimension)
  const set: RawAnswers = twoBoxes
    ? { [field]: meant, [`${field}To`]: '', [`${field}How`]: 'one' }
    : { [field]: withOpenEnd(figure, meant) }
  return { key, sentence: `${typed} ${spec.verb} ${timesWords(factor)} ${badly}. Did you mean ${meant}?`, fix: { label: `Use ${meant}`, set } }
}

/** The figure's digits as they stand in one unit, with the sign of that unit or another; null where it has no sign. */
function inUnit({ figure }: ReadFigure, spec: FieldSpec, size: number, signOf = size): string | null {
  const sign = unitSign(signOf, spec.dimension)
  if (sign === null) return null
  const { low, high } = closed(figure)
  const digits = (value: number) => shortNumber((value * baseOf(spec)) / size)
  return `${low === high ? digits(low) : `${digits(low)} to ${digits(high)}`} ${sign}`
}

function timesWords(factor: number): string {
  const distance = ([times]: [number, string]) => Math.abs(Math.log(times) - Math.abs(Math.log(factor)))
  return TIMES.reduce((best, next) => (distance(next) < distance(best) ? next : best))[1]
}

function withOpenEnd({ open }: Figure, text: string): string {
  if (open === 'above') return `${text} or more`
  return open === 'below' ? `up to ${text}` : text
}

/** A groove speed typed into the output's box belongs into the row beside it. */
export function speedInOutput(text: string, key: AnswerKey): Trouble | null {
  const per = /^(.*?\d)\s*(m|µ|μ|u)?v?\s*(?:\/|per|s\s*\/\s*)\s*\(?cm\s*(?:\/\s*s(?:ec)?)?\)?\s*$/i.exec(text)
  if (per && !/cm\s*\/\s*s/i.test(per[1])) {
    const output = `${per[1].trim()} ${per[2] ?? 'm'}V`
    const set: RawAnswers = { [key]: output, velocity: 'per-cm' }
    return { key, sentence: 'That is an output for each cm/s. The row beside it has a place for this.', fix: { label: `Use ${output} per cm/s`, set } }
  }
  const at = /^(.*?m?v[a-z]*(?:\/ch)?)\W.*?(\d+(?:[.,]\d+)?)\s*cm\s*\/\s*s/i.exec(text)
  if (!at) return null
  const [output, speed] = [at[1].trim(), Number(at[2].replace(',', '.'))]
  const known = speed === 5 || speed === 3.54
  const set: RawAnswers = { [key]: output, ...(known ? { velocity: String(speed) } : { velocity: 'other', velocityOther: String(speed) }) }
  return { key, sentence: 'The groove speed goes into the row beside the value.', fix: { label: `Use ${output} at ${speed} cm/s`, set } }
}
