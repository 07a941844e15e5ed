import { FIELDS, type FieldSpec } from './fields'
import { middle, type Figure } from './reading'
import type { CartridgeChoice, NumberField } from './terms'
import { factorOf, shortNumber, unitSign, written, writtenRange } from './units'

/** What a field's figures are called in sentences. A ratio is the one figure without a unit. */

/** Size of the field's unit in the base of its dimension. */
export const baseOf = (spec: FieldSpec) => factorOf(spec.dimension, spec.unit) ?? 1

export const nounOf = (field: NumberField) => (field === 'ratio' ? 'A ratio' : FIELDS[field].noun)

/** "400 to 550 mH", "1:10". */
export function figureWords(field: NumberField, { low, high }: Pick<Figure, 'low' | 'high'>): string {
  if (field === 'ratio') return low === high ? `1:${shortNumber(low)}` : `1:${shortNumber(low)} to 1:${shortNumber(high)}`
  const base = baseOf(FIELDS[field])
  return writtenRange(low * base, high * base, FIELDS[field].dimension)
}

/** Text as it stood, with the unit of the box where none was written and it can simply follow. */
export function printedText(field: NumberField, text: string, figure: Figure, type: CartridgeChoice): string {
  if (figure.unitSaid || field === 'ratio') return text.trim()
  if (!/\d$/.test(text.trim())) return figureWords(field, figure)
  const { dimension, unit, bare } = FIELDS[field]
  const size = factorOf(dimension, bare?.(type) ?? unit)
  return `${text.trim()} ${(size && unitSign(size, dimension)) ?? ''}`.trim()
}

/** "Most moving magnets are 200 to 900 mH." */
export function usualSentence(field: NumberField, type: CartridgeChoice): string {
  if (field === 'ratio') return 'Most transformers are 1:5 to 1:40.'
  const spec = FIELDS[field]
  const [low, high] = spec.usual(type).map((value) => value * baseOf(spec))
  return `${spec.most(type)} ${writtenRange(low, high, spec.dimension)}.`
}

/** A value to write it like. */
export function exampleOf(field: NumberField, type: CartridgeChoice): string {
  if (field === 'ratio') return '1:10 or 150 : 50k'
  const spec = FIELDS[field]
  const [low, high] = spec.usual(type)
  return written(Number(middle(low, high).toPrecision(2)) * baseOf(spec), spec.dimension)
}
