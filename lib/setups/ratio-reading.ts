import { turnsRatioOfImpedances } from '../match/physics/step-up'
import { middle, readText, type ReadText } from './reading'

const PAIR = /^([\d.,]+\s*(?:k|kΩ|k ?ohms?|Ω|ohms?)?)\s*(?::|to|\/|-)\s*([\d.,]+\s*(?:k|kΩ|k ?ohms?|Ω|ohms?)?)$/i

/**
 * Reads the ratio of a step-up transformer: "10", "1:10", "10:1", "x20", "26 dB", or a label of two impedances such
 * as "150 : 50k", whose ratio is the root of theirs.
 * @returns secondary over primary turns
 */
export function readRatio(text: string): ReadText {
  const rest = text.trim().replace(/[×]/g, 'x').replace(/[–—−]/g, '-')
  if (rest === '') return { kind: 'nothing' }
  const figure = (value: number): ReadText =>
    value > 0
      ? { kind: 'figure', figure: { low: value, nominal: value, high: value, open: null, unitSaid: true, unitSize: 1 } }
      : { kind: 'not-positive' }

  const decibels = /^([\d.,]+)\s*db$/i.exec(rest)
  if (decibels) return figure(Number((10 ** (Number(decibels[1].replace(',', '.')) / 20)).toPrecision(6)))

  const bare = /^(?:x\s*)?([\d.,]+)(?:\s*x)?$/i.exec(rest)
  if (bare) return figure(Number(bare[1].replace(',', '.')) || 0)

  const pair = PAIR.exec(rest)
  const [first, second] = (pair ?? []).slice(1).map(ohms)
  if (first === undefined || second === undefined || !(first > 0) || !(second > 0)) {
    return { kind: 'unreadable', inside: null }
  }
  if (first === 1 || second === 1) return figure(Math.max(first, second))
  const isLabel = /[kΩ]|ohm/i.test(rest)
  // "3 Ω / 40 Ω" names cartridges that suit, not windings: a secondary is never under a kilohm.
  if (isLabel && Math.max(first, second) < 1000) return { kind: 'unreadable', inside: null }
  if (!isLabel && /-|to/i.test(rest)) {
    if (first > second) return { kind: 'reversed', first: String(first), second: String(second) }
    const figure = { low: first, nominal: middle(first, second), high: second, open: null, unitSaid: true, unitSize: 1 }
    return { kind: 'figure', figure }
  }
  const [primaryOhms, secondaryOhms] = first < second ? [first, second] : [second, first]
  const ratio = isLabel ? turnsRatioOfImpedances({ primaryOhms, secondaryOhms }) : secondaryOhms / primaryOhms
  return figure(Number(ratio.toPrecision(6)))
}

function ohms(text: string): number | undefined {
  const read = readText(text, { dimension: 'ohms', unit: 'ohm' })
  return read.kind === 'figure' ? read.figure.nominal : undefined
}
