import { FIELDS } from './fields'
import { exampleOf, figureWords, nounOf, printedText, usualSentence } from './field-words'
import { readRatio } from './ratio-reading'
import { middle, readText, type Figure, type ReadText } from './reading'
import { slipIn, speedInOutput } from './slips'
import { isValueField, type AnswerKey, type CartridgeChoice, type NumberField } from './terms'
import type { Given, RawAnswers, Trouble } from './trouble'

export interface FieldRead {
  given: Given | null
  trouble: Trouble | null
  /** What was understood, in words ("400 to 550 mH"). Null when nothing was. */
  understood: string | null
}

const NOTHING: FieldRead = { given: null, trouble: null, understood: null }

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

function conclude({ field, raw, type, second }: Boxes, read: ReadText, text: string, box: 'first' | 'second' = 'first'): FieldRead {
  const key = (box === 'second' ? `${field}To` : field) as AnswerKey
  const giveUp = isValueField(field)
    ? { label: "Choose Don't know", set: { [`${field}How`]: 'unknown' } }
    : { label: 'Leave it empty', set: { [field]: '' } }
  switch (read.kind) {
    case 'nothing':
      return NOTHING
    case 'reversed':
      return trouble(reversed(field, { [field]: `${read.second} to ${read.first}` }))
    case 'not-positive':
      return trouble({ key, sentence: `${nounOf(field)} is always above zero. ${usualSentence(field, type)}`, fix: giveUp })
    case 'unreadable': {
      const speed = field === 'output' ? speedInOutput(text, key) : null
      const { inside } = read
      const sentence = `We cannot read a number out of “${text.trim()}”. Write it like ${exampleOf(field, type)}.`
      return trouble(speed ?? { key, sentence, fix: inside ? { label: `Use ${inside}`, set: { [key]: inside } } : giveUp })
    }
    case 'figure': {
      const { figure } = read
      const inductance = field === 'coil' ? readField('inductance', raw, type).given : null
      const found = slipIn({ field, type, key, figure, twoBoxes: second !== null, inductanceMillihenries: inductance?.nominal ?? null, giveUp })
      if (found) return trouble(found)
      const { low, nominal, high } = figure
      return { given: { low, nominal, high, text: printedText(field, text, figure, type) }, trouble: null, understood: figureWords(field, figure) }
    }
  }
}
