import type { MatchInputs, UnknownName } from '../../match/inputs'
import type { MatchResult, NumberToFindNext, Stretch } from '../../match/result'
import { statesEqual } from '../../match/states'
import { amount, figureText, gainText, sentenceCase } from '../format'
import { VERDICT_SHORT } from './short-verdicts'
import { namesOf } from './names'
import { inDimension, UNKNOWN_WORDS } from './unknowns'

/** The one value that would do most to settle the verdict, in words. */

/** True where the output was given and only what its cm/s means is open. */
export function asksMeaning(inputs: MatchInputs, unknown: UnknownName): boolean {
  const { origin, condition } = inputs.cartridge.outputVolts
  return unknown === 'output' && (origin === 'printed' || origin === 'owner') && condition !== undefined
}

/** "the output in mV", "what the 5 cm/s on the leaflet means" */
function asked(inputs: MatchInputs, unknown: UnknownName): string {
  return asksMeaning(inputs, unknown) ? 'what the cm/s on the leaflet means' : UNKNOWN_WORDS[unknown].ask
}

/** "Output of the Calloway Wren" */
export function numberTitle({ unknown }: NumberToFindNext, inputs: MatchInputs): string {
  const { name } = UNKNOWN_WORDS[unknown]
  const ofCartridge: UnknownName[] = ['output', 'coilResistance', 'inductance', 'cartridgeMass', 'compliance']
  return ofCartridge.includes(unknown) ? `${name} of ${namesOf(inputs).cartridge}` : name
}

/** Where to read it, and what not to do. */
export function whereToRead({ unknown }: NumberToFindNext, inputs: MatchInputs): string {
  return asksMeaning(inputs, unknown)
    ? 'On the leaflet, beside the output: peak or RMS, sideways or one channel. Some say it in a footnote.'
    : UNKNOWN_WORDS[unknown].read
}

const ENDS: Partial<Record<UnknownName, { low: string; high: string }>> = {
  output: { low: 'far too weak', high: 'far too strong' },
  coilResistance: { low: 'loaded too lightly', high: 'loaded too heavily' },
  inductance: { low: 'too dull', high: 'too bright' },
}

/** Which way it may turn out: "it may be just right for the Merrin 5 or far too strong". */
function eitherWay(next: NumberToFindNext, inputs: MatchInputs): string {
  const { preamp } = namesOf(inputs)
  const { stretches, unknown } = next
  const fits = ({ verdict }: Stretch) => verdict !== 'does-not-suit' && verdict !== 'cannot-say'
  if (!stretches.some(fits)) return `it may suit ${preamp} or not`
  const ends = ENDS[unknown]
  const parts = [`just right for ${preamp}`]
  if (ends && !fits(stretches[0])) parts.unshift(ends.low)
  if (ends && !fits(stretches[stretches.length - 1])) parts.push(ends.high)
  return parts.length === 1 ? `it may suit ${preamp} or not` : `it may be ${parts.join(', ').replace(/, ([^,]*)$/, ' or $1')}`
}

/** The sentences under "We cannot say yet." */
export function leadToNumber({ inputs, result }: { inputs: MatchInputs; result: MatchResult }): string[] {
  const { next, tonight } = result
  const play = tonight ? ['You can still play it tonight, see Figure 1.'] : []
  if (!next) return ['Too much is not known yet, and we will not guess.', ...play]
  return [
    `Tell us ${asked(inputs, next.unknown)} and we can.`,
    `Until then ${eitherWay(next, inputs)}, and we will not guess.`,
    ...play,
  ]
}

/** Where it may be: "0.2 to 2.5 mV". */
export function numberRange(range: { unknown: UnknownName; low: number; nominal: number; high: number }): string {
  return rangeOf(range.unknown, range.low, range.high)
}

function rangeOf(unknown: UnknownName, low: number, high: number): string {
  const { dimension } = UNKNOWN_WORDS[unknown]
  const [from, to] = [inDimension(unknown, low), inDimension(unknown, high)]
  if (unknown === 'stepUpRatio') return from.toFixed(0) === to.toFixed(0) ? `1:${to.toFixed(0)}` : `1:${from.toFixed(0)} to 1:${to.toFixed(0)}`
  return figureText({ low: from, nominal: to, high: to }, dimension ?? 'decibels')
}

/** One value of the unknown: "0.35 mV". */
export function numberAt(unknown: UnknownName, si: number): string {
  const { dimension } = UNKNOWN_WORDS[unknown]
  return unknown === 'stepUpRatio' ? `1:${si.toFixed(0)}` : amount(inDimension(unknown, si), dimension ?? 'decibels')
}

/** "under 0.35 mV", "0.35 to 0.85 mV", "over 1.7 mV" */
export function stretchRange({ unknown, stretches }: NumberToFindNext, at: number): string {
  const { from, to } = stretches[at]
  if (stretches.length === 1) return rangeOf(unknown, from, to)
  if (at === 0) return `under ${numberAt(unknown, to)}`
  return at === stretches.length - 1 ? `over ${numberAt(unknown, from)}` : rangeOf(unknown, from, to)
}

const BECAUSE: Partial<Record<string, string>> = {
  'level-high': 'Too strong',
  'level-low': 'Too weak',
  'headroom-tight': 'The loudest distort',
  'headroom-loud-records': 'The loudest distort',
  'next-input-tight': 'The loudest distort',
  hiss: 'Some hiss',
  'load-near-coil': 'Load near the coil',
  'load-below-recommended': 'Load too low',
  'treble-lift': 'Too bright',
  'treble-fall': 'Too dull',
  'capacitance-high': 'Too much capacitance',
  'capacitance-low': 'Too little capacitance',
}

/** What holds in one stretch: short verdict and what to do there. */
export function stretchWords({ verdict, setting, finding }: Stretch, { preamp, present }: MatchInputs): { verdict: string; todo: string } {
  const because = finding ? BECAUSE[finding] : undefined
  const gain = setting ? gainText(setting.gainDecibels) : ''
  const stands = setting && present && statesEqual(present.left, setting.state) && statesEqual(present.right, setting.state)
  const at = !setting ? '' : preamp.controls.length === 0 ? '' : stands ? `as it is set now, ${gain}` : `gain ${gain}`
  const todo = verdict === 'does-not-suit' ? (because ?? 'Nothing fits') : [because, at].filter(Boolean).join('; ')
  return { verdict: VERDICT_SHORT[verdict], todo: sentenceCase(todo) }
}

/** Whether the number can still change the advice: for the line beside what a sheet rests on. */
export function numberMatters(next: NumberToFindNext | null, inputs: MatchInputs): string | null {
  if (!next) return null
  const what = `The number to find next is ${UNKNOWN_WORDS[next.unknown].inSentence}.`
  if (next.stretches.length > 1) return `${what} It can still change our advice.`
  return `${what} It makes the figures narrower and cannot change ${inputs.preamp.controls.length > 0 ? 'what to set' : 'the verdict'}.`
}
