import type { Figure, LeafletField } from '../catalogue/schema'
import { FIELDS } from './fields'
import { readField } from './field-reading'
import type { RawAnswers } from './trouble'
import { middle } from './reading'
import { isValueField, type CartridgeChoice, type NumberField } from './terms'
import { factorOf, shortNumber, unitSign } from './units'

/** How a figure of the catalogue stands in the boxes of the form, so that reading them gives that figure again. */
export type Filled = RawAnswers

const close = (a: number, b: number) => a === b || Math.abs(a / b - 1) < 1e-4

interface Ends {
  low: number
  nominal: number | null
  high: number
}

function readsAs(field: NumberField, answers: RawAnswers, { low, nominal, high }: Ends, type: CartridgeChoice): boolean {
  const { given } = readField(field, answers, type)
  return !!given && close(given.low, low) && close(given.high, high) && (nominal === null || close(given.nominal, nominal))
}

/** "5.4 mV" stands as "5.4" in a box that says mV; "70 µH" in a box of mH keeps its unit. */
function withoutBoxUnit(field: Exclude<NumberField, 'ratio'>, printed: string, type: CartridgeChoice): string {
  const { dimension, unit, bare } = FIELDS[field]
  const size = factorOf(dimension, bare?.(type) ?? unit)
  const sign = size && unitSign(size, dimension)
  const number = sign && /^[\d.,]+(?=\s*(\S+)$)/.exec(printed)
  return number && number[1] === sign ? number[0] : printed
}

/** The number as it stands in this field's box. */
function inBox(field: NumberField, value: number, type: CartridgeChoice): string {
  if (field === 'ratio') return shortNumber(value)
  const { dimension, unit, bare } = FIELDS[field]
  const [own, box] = [factorOf(dimension, unit) ?? 1, factorOf(dimension, bare?.(type) ?? unit) ?? 1]
  return String(Number(((value * own) / box).toPrecision(6)))
}

function boxes(field: NumberField, { low, nominal, high }: Ends, type: CartridgeChoice): Filled {
  if (close(low, high)) return { [field]: inBox(field, low, type), [`${field}How`]: 'one' }
  const spread = nominal !== null && nominal - low
  if (nominal !== null && spread && close(high - nominal, spread) && field !== 'ratio') {
    const text = `${inBox(field, nominal, type)} ± ${inBox(field, spread, type)}`
    if (readsAs(field, { [field]: text }, { low, nominal, high }, type)) return { [field]: text, [`${field}How`]: 'one' }
  }
  const [from, to] = [inBox(field, low, type), inBox(field, high, type)]
  if (!isValueField(field)) return { [field]: `${from} to ${to}` }
  return { [field]: from, [`${field}To`]: to, [`${field}How`]: 'between' }
}

/**
 * A line of a leaflet. The leaflet's own text stands wherever it reads as what was meant; an end that it leaves open,
 * and that the form cannot, is closed by what is usual.
 */
export function leafletAnswers(
  field: Exclude<NumberField, 'ratio'>,
  leaflet: LeafletField | null,
  { type, ends }: { type: CartridgeChoice; ends: { low: number; high: number } },
): Filled | null {
  if (!leaflet) return null
  const opens = FIELDS[field].opens
  const low = leaflet.low ?? (opens === 'below' ? 0 : Math.min(ends.low, (leaflet.high ?? 0) / 2))
  const high = leaflet.high ?? (opens === 'above' ? Infinity : Math.max(ends.high, low * 2))
  const meant: Ends = { low, nominal: leaflet.low === null || leaflet.high === null ? null : leaflet.nominal, high }
  const own = withoutBoxUnit(field, leaflet.printed, type)
  const isPair = !close(low, high) && meant.nominal === null && low > 0 && high < Infinity
  if (!isPair && readsAs(field, { [field]: own }, meant, type)) return { [field]: own, [`${field}How`]: 'one' }
  if (high === Infinity) return { [field]: inBox(field, low, type), [`${field}How`]: 'above' }
  if (low === 0) return { [field]: `up to ${inBox(field, high, type)}`, [`${field}How`]: 'one' }
  return boxes(field, { ...meant, nominal: meant.nominal ?? middle(low, high) }, type)
}

/** A figure of the catalogue with its tolerance. */
export function figureAnswers(field: NumberField, { low, nominal, high }: Figure): Filled {
  return boxes(field, { low, nominal, high }, 'unknown')
}
