import { oneOf, FIELDS, type FieldSpec } from './fields'
import { readRatio } from './ratio-reading'
import { middle, readText, type Figure, type ReadText } from './reading'
import type { AnswerKey, CartridgeChoice, NumberField, PlainField, ValueField } from './terms'
import { factorOf, shortNumber, unitSign, written, writtenRange } from './units'

/** Answers as typed, by key. */
export type RawAnswers = Partial<Record<AnswerKey, string>>

/** A value that was read, in the field's own unit. `text` is what stood in the boxes. */
export interface Given {
  low: number
  nominal: number
  high: number
  text: string
}

/** What is wrong with one answer, and a way out: answers that put it right, under a short label. */
export interface Trouble {
  key: AnswerKey
  sentence: string
  fix: { label: string; set: RawAnswers } | null
}

export interface FieldRead {
  given: Given | null
  trouble: Trouble | null
  /** What was understood, in words ("400 to 550 mH"). Null when nothing was. */
  understood: string | null
}

const NOTHING: FieldRead = { given: null, trouble: null, understood: null }
const DONT_KNOW = "Choose Don't know"

/** Reads one value out of its one or two boxes. Never throws; a value under "Don't know" is not looked at. */
export function readField(field: NumberField, raw: RawAnswers, type: CartridgeChoice): FieldRead {
  if (!isValueField(field)) return readBoxes({ field, raw, type, first: raw[field] ?? '', second: null })
  const how = raw[`${field}How`] ?? 'one'
  if (how === 'unknown') return NOTHING
  const first = raw[field] ?? ''
  if (how !== 'between') {
    const text = how === 'above' && first.trim() !== '' ? `${first} or more` : first
    return readBoxes({ field, raw, type, first: text, second: null })
  }
  return readBoxes({ field, raw, type, first, second: raw[`${field}To`] ?? '' })
}

function isValueField(field: NumberField): field is ValueField {
  return !PLAIN.has(field)
}
const PLAIN: ReadonlySet<NumberField> = new Set<PlainField>([
  'velocityOther',
  'lead',
  'leadMetres',
  'leadPerMetre',
  'cable',
  'cableMetres',
  'cablePerMetre',
  'alsoAmplifier',
  'alsoRecorder',
  'alsoSubwoofer',
  'wish',
])

interface Boxes {
  field: NumberField
  raw: RawAnswers
  type: CartridgeChoice
  first: string
  /** Null where only one box is shown. */
  second: string | null
}

function readBoxes(boxes: Boxes): FieldRead {
  const { field, type, first, second } = boxes
  const blank = (text: string | null) => text === null || text.trim() === ''
  if (blank(first) && blank(second)) return NOTHING
  const one = readOne(field, first, type)
  if (second === null || (blank(second) && one.kind === 'figure' && one.figure.low < one.figure.high)) {
    return conclude(boxes, one, first)
  }
  if (blank(second)) return trouble(missing(field, 'second', boxes))
  if (blank(first)) return trouble(missing(field, 'first', boxes))
  const two = readOne(field, second, type)
  if (one.kind !== 'figure') return conclude(boxes, one, first)
  if (two.kind !== 'figure') return conclude(boxes, two, second, 'second')
  if (two.figure.high < one.figure.low) return trouble(reversed(field, { [field]: second, [`${field}To`]: first }))
  const figure: Figure = {
    ...two.figure,
    low: one.figure.low,
    nominal: middle(one.figure.low, two.figure.high),
    unitSaid: one.figure.unitSaid || two.figure.unitSaid,
  }
  return conclude(boxes, { kind: 'figure', figure }, `${first.trim()} to ${second.trim()}`)
}

function readOne(field: NumberField, text: string, type: CartridgeChoice): ReadText {
  if (field === 'ratio') return readRatio(text)
  const { dimension, unit, bare, zero } = FIELDS[field]
  return readText(text, { dimension, unit, bare: bare?.(type), zero })
}

const trouble = (found: Trouble): FieldRead => ({ ...NOTHING, trouble: found })

function missing(field: NumberField, which: 'first' | 'second', { first, second }: Boxes): Trouble {
  const set: RawAnswers = { [field]: which === 'second' ? first : (second ?? ''), [`${field}To`]: '', [`${field}How`]: 'one' }
  const key = (which === 'second' ? `${field}To` : field) as AnswerKey
  return { key, sentence: `Write the ${which} value too, or keep to one.`, fix: { label: 'One value', set } }
}

function reversed(field: NumberField, set: RawAnswers): Trouble {
  const key = (`${field}To` in set ? `${field}To` : field) as AnswerKey
  return { key, sentence: 'The second value is lower than the first. Swap them?', fix: { label: 'Swap', set } }
}

function conclude(boxes: Boxes, read: ReadText, text: string, box: 'first' | 'second' = 'first'): FieldRead {
  const { field, type } = boxes
  const key = (box === 'second' ? `${field}To` : field) as AnswerKey
  const giveUp = isValueField(field)
    ? { label: DONT_KNOW, set: { [`${field}How`]: 'unknown' } }
    : { label: 'Leave it empty', set: { [field]: '' } }
  if (read.kind === 'nothing') return NOTHING
  if (read.kind === 'reversed') return trouble(reversed(field, { [field]: `${read.second} to ${read.first}` }))
  if (read.kind === 'not-positive') {
    return trouble({ key, sentence: `${nounOf(field)} is always above zero. ${usualSentence(field, type)}`, fix: giveUp })
  }
  if (read.kind === 'unreadable') {
    const asked = field === 'output' ? askedSpeed(text, key) : null
    if (asked) return trouble(asked)
    const { inside } = read
    const fix = inside ? { label: `Use ${inside}`, set: { [key]: inside } } : giveUp
    return trouble({ key, sentence: `We cannot read a number out of “${text.trim()}”. Write it like ${example(field, type)}.`, fix })
  }
  const found = implausible(boxes, read.figure, key, text, giveUp)
  if (found) return trouble(found)
  const { low, nominal, high } = read.figure
  return { given: { low, nominal, high, text: printed(field, text, read.figure, type) }, trouble: null, understood: words(field, read.figure) }
}

/** Text as it stood, with the unit of the box where none was written and it can simply follow. */
function printed(field: NumberField, text: string, figure: Figure, type: CartridgeChoice): string {
  if (figure.unitSaid || field === 'ratio') return text.trim()
  if (!/\d$/.test(text.trim())) return words(field, figure)
  const spec = FIELDS[field]
  const size = factorOf(spec.dimension, spec.bare?.(type) ?? spec.unit)
  return `${text.trim()} ${(size && unitSign(size, spec.dimension)) ?? ''}`.trim()
}

function words(field: NumberField, { low, high }: Figure): string {
  if (field === 'ratio') return low === high ? `1:${shortNumber(low)}` : `1:${shortNumber(low)} to 1:${shortNumber(high)}`
  const base = baseOf(FIELDS[field])
  return writtenRange(low * base, high * base, FIELDS[field].dimension)
}

const baseOf = (spec: FieldSpec) => factorOf(spec.dimension, spec.unit) ?? 1
const nounOf = (field: NumberField) => (field === 'ratio' ? 'A ratio' : FIELDS[field].noun)

/** "Most moving magnets are 200 to 900 mH." */
export function usualSentence(field: NumberField, type: CartridgeChoice): string {
  if (field === 'ratio') return 'Most transformers are 1:5 to 1:40.'
  const spec = FIELDS[field]
  const [low, high] = spec.usual(type).map((value) => value * baseOf(spec))
  return `${spec.most(type)} ${writtenRange(low, high, spec.dimension)}.`
}

function example(field: NumberField, type: CartridgeChoice): string {
  if (field === 'ratio') return '1:10 or 150 : 50k'
  const spec = FIELDS[field]
  const [low, high] = spec.usual(type)
  return written(Number(middle(low, high).toPrecision(2)) * baseOf(spec), spec.dimension)
}

/** A groove speed typed into the output's box belongs into the row beside it. */
function askedSpeed(text: string, key: AnswerKey): Trouble | null {
  const per = /^(.*?\d)\s*(m|µ|μ|u)?v?\s*(?:\/|per|s\s*\/\s*)\s*\(?cm\s*(?:\/\s*s(?:ec)?)?\)?\s*$/i.exec(text)
  if (per && !/cm\s*\/\s*s/i.test(per[1])) {
    const output = `${per[1].trim()} ${per[2] ?? 'm'}V`
    const set: RawAnswers = { [key]: output, velocity: 'per-cm' }
    return { key, sentence: 'That is an output for each cm/s. The row beside it has a place for this.', fix: { label: `Use ${output} per cm/s`, set } }
  }
  const at = /^(.*?m?v[a-z]*(?:\/ch)?)\W.*?(\d+(?:[.,]\d+)?)\s*cm\s*\/\s*s/i.exec(text)
  if (!at) return null
  const speed = at[2].replace(',', '.')
  const known = Number(speed) === 5 || Number(speed) === 3.54
  const set: RawAnswers = known
    ? { [key]: at[1].trim(), velocity: String(Number(speed)) }
    : { [key]: at[1].trim(), velocity: 'other', velocityOther: speed }
  return { key, sentence: 'The groove speed goes into the row beside the value.', fix: { label: `Use ${at[1].trim()} at ${speed} cm/s`, set } }
}

const TIMES: [number, string][] = [
  [10, 'ten times'],
  [100, 'a hundred times'],
  [1e3, 'a thousand times'],
  [1e6, 'a million times'],
]
const SLIPS = [1e-3, 1e3, 1e-1, 10, 1e-2, 100, 1e-6, 1e6]

/** A figure beyond what there is: most often another prefix or a lost decimal point. */
function implausible(boxes: Boxes, figure: Figure, key: AnswerKey, text: string, giveUp: NonNullable<Trouble['fix']>): Trouble | null {
  const { field, type, second } = boxes
  const open = field === 'ratio' ? undefined : FIELDS[field].opens
  if (figure.open && figure.open !== open) {
    const end = figure.open === 'above' ? figure.low : figure.high
    const value = words(field, { ...figure, low: end, high: end })
    return { key, sentence: 'That leaves one end open. Write both ends, or the one value you know.', fix: { label: `Use ${value}`, set: { [key]: value } } }
  }
  const [least, largest] = field === 'ratio' ? [1, 100] : FIELDS[field].limits(type)
  const low = figure.open === 'below' ? figure.high : figure.low
  const high = figure.open === 'above' ? figure.low : figure.high
  if (low >= least && high <= largest) return null
  if (field === 'ratio') return { key, sentence: `A ratio of ${words(field, figure)} is not one that is made. ${usualSentence(field, type)}`, fix: giveUp }
  const impedance = field === 'coil' && high > largest ? asImpedance(boxes, high) : null
  if (impedance) return impedance

  const spec = FIELDS[field]
  const tooMuch = high > largest
  const asTyped = (size: number) => `${span(figure, (v) => shortNumber((v * baseOf(spec)) / size))} ${unitSign(size, spec.dimension) ?? ''}`.trim()
  const typed = unitSign(figure.unitSize, spec.dimension) ? asTyped(figure.unitSize) : words(field, figure)
  const [usualLow, usualHigh] = spec.usual(type)
  const factors = spec.dimension === 'force' ? [figure.unitSize === 1e-3 ? 9.80665 : 1 / 9.80665, ...SLIPS] : SLIPS
  const factor =
    factors.find((by) => low * by >= usualLow * 0.99 && high * by <= usualHigh * 1.01) ??
    [1e-3, 1e3].find((by) => low * by >= least && high * by <= largest)
  const [much, little] = spec.slip(type)
  const badly = tooMuch ? much : little
  if (factor === undefined) return { key, sentence: `${typed} ${spec.verb} ${badly}. ${usualSentence(field, type)}`, fix: giveUp }

  const size = figure.unitSize * factor
  // The same digits under another prefix, unless they are as odd there.
  const digits = (low * baseOf(spec)) / figure.unitSize
  const meant = unitSign(size, spec.dimension) && digits >= 0.1 && digits < 10_000
    ? `${span(figure, (v) => shortNumber((v * baseOf(spec)) / figure.unitSize))} ${unitSign(size, spec.dimension)}`
    : writtenRange(low * factor * baseOf(spec), high * factor * baseOf(spec), spec.dimension)
  const ratio = factor < 1 ? 1 / factor : factor
  const times = TIMES.reduce((best, next) => (Math.abs(Math.log(next[0] / ratio)) < Math.abs(Math.log(best[0] / ratio)) ? next : best))[1]
  const set: RawAnswers = second === null ? { [field]: openAs(figure, meant) } : { [field]: meant, [`${field}To`]: '', [`${field}How`]: 'one' }
  return { key, sentence: `${typed} ${spec.verb} ${times} ${badly}. Did you mean ${meant}?`, fix: { label: `Use ${meant}`, set } }
}

const span = ({ low, high, open }: Figure, say: (value: number) => string) => {
  if (open) return say(open === 'above' ? low : high)
  return low === high ? say(low) : `${say(low)} to ${say(high)}`
}
const openAs = ({ open }: Figure, text: string) => (open === 'above' ? `${text} or more` : open === 'below' ? `up to ${text}` : text)

/**
 * Leaflets of magnets often print the impedance at 1 kHz, |Z| = √(R² + (2π·1000 Hz·L)²), which is far more than the
 * resistance. With the inductance the resistance follows; without it there is nothing to use.
 */
function asImpedance({ field, raw, type }: Boxes, ohms: number): Trouble | null {
  if (type === 'moving-coil' || ohms > 15_000) return null
  const inductance = readField('inductance', raw, type).given
  const reactance = inductance && 2 * Math.PI * inductance.nominal
  const resistance = reactance && ohms > reactance ? Math.sqrt(ohms ** 2 - reactance ** 2) : null
  const [least, largest] = FIELDS.coil.limits(type)
  const start = `${written(ohms, 'ohms')} looks like the impedance at 1 kHz, which is more than the resistance of ${oneOf(type)}.`
  if (resistance !== null && resistance >= least && resistance <= largest) {
    const value = written(Number(resistance.toPrecision(2)), 'ohms')
    return { key: field, sentence: `${start} With this inductance it leaves ${value}.`, fix: { label: `Use ${value}`, set: { coil: value, coilTo: '', coilHow: 'one' } } }
  }
  return { key: field, sentence: start, fix: { label: DONT_KNOW, set: { coilHow: 'unknown' } } }
}
