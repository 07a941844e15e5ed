import { match } from '../match'
import type { MatchInputs } from '../match/inputs'
import type { Preamp } from '../match/preamp'
import type { Quantity } from '../match/quantity'
import type { Evaluation, Finding, MatchResult } from '../match/result'
import { INSIDE } from '../match/rules'
import { choiceOf, readAnswers, type Answers } from './answers'
import type { RawAnswers } from './trouble'
import { footingOf } from './footing'
import { figureText, gainText, tied, valueText, voltsText } from './format'
import { toMatchInputs } from './inputs'
import { findingSentence } from './sentences/findings'
import { gateLead, gateTitle } from './sentences/gate'
import { namesOf } from './sentences/names'
import { TYPE_WORDS } from './sentences/title-block'

/** What can be said after the answers so far. Plain data: made on the server, then anew in the browser. */
export interface SoFarView {
  heading: string
  sentences: string[]
  /** Heading of the strip on a phone. */
  short: string
  treble: { hertz: number[]; low: number[]; high: number[] } | null
  /** Total capacitance across the coil, picofarads; null where it decides nothing. */
  capacitance: { low: number; high: number; note: string } | null
  settled: string[]
  open: string[]
}

const NOTHING: SoFarView = {
  heading: 'Nothing yet',
  sentences: ['Choose your preamp, then tell us what you know of the cartridge. It narrows with each answer.'],
  short: 'Nothing yet',
  treble: null,
  capacitance: null,
  settled: [],
  open: [],
}

export function soFar(raw: RawAnswers, preamp: Preamp | null): SoFarView {
  const { answers } = readAnswers(raw)
  const lists = { settled: settledOf(answers), open: openOf(answers) }
  if (!preamp) return { ...NOTHING, ...lists }
  const inputs = toMatchInputs(answers, preamp)
  const result = match(inputs)
  if (result.gate) {
    const heading = gateTitle(result.gate)
    return { ...NOTHING, heading, short: heading, sentences: gateLead(result.gate, inputs).slice(0, 1), settled: lists.settled }
  }
  const told = levelSoFar(answers, inputs, result)
  return {
    ...told,
    short: shortOf(told.heading, result, inputs),
    treble: trebleOf(result),
    capacitance: capacitanceOf(answers, result),
    ...lists,
  }
}

/**
 * Whether what the groove speed means is not said, and saying it could turn the advice: tried at both ends of what it
 * may mean. Apart from `soFar`, since it takes two more checks and is seldom asked.
 */
export function meaningMatters(raw: RawAnswers, preamp: Preamp | null): boolean {
  const { answers } = readAnswers(raw)
  const { outputMillivolts, velocity, meaning } = answers.cartridge
  if (!preamp || !outputMillivolts || velocity === 'none' || meaning !== 'not-said') return false
  const inputs = toMatchInputs(answers, preamp)
  const ends = [footingOf({ ...answers.cartridge, meaning: 'peak-lateral' }), footingOf({ ...answers.cartridge, meaning: 'rms-channel' })]
  const [most, least] = ends.map(({ nominal }) => {
    const volts = outputMillivolts.nominal * 1e-3 * nominal
    const outputVolts: Quantity = { low: volts, nominal: volts, high: volts, origin: 'owner' }
    return match({ ...inputs, cartridge: { ...inputs.cartridge, outputVolts } })
  })
  const advice = ({ verdict, chosen }: MatchResult) => JSON.stringify([verdict, chosen?.setting.state, chosen?.worst])
  return advice(most) !== advice(least)
}

const isKnown = ({ origin }: Quantity) => origin !== 'typical' && origin !== 'unknown'

const CARTRIDGE_OPEN = 'Now the cartridge'
const OUTPUT_OPEN = 'Its output decides the most'
const SHORT: Record<string, string> = {
  [CARTRIDGE_OPEN]: 'the cartridge is still open',
  [OUTPUT_OPEN]: 'its output is still open',
}

type Told = Pick<SoFarView, 'heading' | 'sentences'>

function levelSoFar(answers: Answers, inputs: MatchInputs, { chosen }: MatchResult): Told {
  const { model, cartridge } = namesOf(inputs)
  if (!chosen || !isKnown(inputs.cartridge.outputVolts)) {
    const about = choiceOf(answers.given) === 'unknown' && !answers.cartridge.name ? 'the cartridge' : cartridge
    const begun = answers.cartridge.name !== '' || choiceOf(answers.given) !== 'unknown'
    return {
      heading: begun ? OUTPUT_OPEN : CARTRIDGE_OPEN,
      sentences: [`The ${model} is ready. What the leaflet says of ${about} narrows this down; its output in mV does most.`],
    }
  }
  const { figures, setting } = chosen
  const output = valueText(inputs.cartridge.outputVolts, 'volts')
  const volts = `${output} gives ${voltsText(figures.outputVolts)} RMS`
  const gives =
    inputs.preamp.gains.length > 1
      ? `${volts} with the ${model} at ${gainText(setting.gainDecibels)}, which suits best so far.`
      : `${volts} out of the ${model}.`
  const heading = inputs.next.kind === 'phono' ? 'Two phono stages in a row' : loudness(figures.outputVolts)
  return { heading, sentences: [gives, against(chosen, inputs)].filter(Boolean).map(tied) }
}

function loudness({ low, high }: { low: number; high: number }): string {
  const [least, most] = INSIDE.outputVolts.worthKnowing
  if (high < least) return 'It will be too quiet'
  if (low > most) return 'It will be too loud'
  if (low < least) return 'It may be too quiet'
  return high > most ? 'It may be too loud' : 'It will be loud enough'
}

/** What the heading says already, and what an answer that is still to come may well change. */
function isSaidOrOpen({ code }: Finding, { arm, next }: MatchInputs): boolean {
  if (code === 'level-low' || code === 'level-high') return true
  if (code === 'next-input-tight') return next.kind === 'unknown'
  return (code === 'arm-resonance-low' || code === 'arm-resonance-high') && !isKnown(arm.effectiveMassKilograms)
}

/** The heaviest thing that stands against it by now; empty while there is none. */
function against({ findings }: Evaluation, inputs: MatchInputs): string {
  const heavy = findings.find((finding) => {
    const counts = finding.middle === 'limit' || finding.middle === 'rules-it-out'
    return counts && !isSaidOrOpen(finding, inputs)
  })
  return heavy ? findingSentence(heavy, inputs) : ''
}

/** A doubt of the treble beyond this is still open, dB at 15 kHz. */
const TREBLE_OPEN_DECIBELS = 2

function shortOf(heading: string, { chosen }: MatchResult, { cartridge }: MatchInputs): string {
  if (SHORT[heading]) return `So far: ${SHORT[heading]}`
  const start = `So far: ${heading.replace('It will be ', '').replace('It may be ', 'perhaps ').replace(/^T/, 't')}`
  if (!chosen || cartridge.type === 'moving-coil') return start
  const { low, high } = chosen.figures.at15kHzDecibels
  return `${start}. Treble ${high - low > TREBLE_OPEN_DECIBELS ? 'still open' : 'settled'}`
}

/** Two decimals are plenty on a screen and keep the page short; a rounded nothing has no sign. */
const short = (values: number[]) => values.map((value) => Number(value.toFixed(2)) || 0)

function trebleOf({ curves }: MatchResult): SoFarView['treble'] {
  if (!curves) return null
  const { hertz, low, high } = curves.loading
  return { hertz: hertz.map((value) => Number(value.toPrecision(5))), low: short(low), high: short(high) }
}

function capacitanceOf({ cartridge }: Answers, { chosen }: MatchResult): SoFarView['capacitance'] {
  if (!chosen || cartridge.type === 'moving-coil') return null
  const { low, high } = chosen.figures.totalFarads
  const asked = cartridge.capacitancePicofarads
  const asks = asked ? ` ${cartridge.name || 'The cartridge'} asks for ${figureText({ low: asked.low * 1e-12, nominal: asked.nominal * 1e-12, high: asked.high * 1e-12 }, 'farads')}.` : ''
  const tens = (farads: number) => Math.round(farads * 1e11) * 10
  return {
    low: tens(low),
    high: tens(high),
    note: tied(`Capacitance so far, ${figureText(chosen.figures.totalFarads, 'farads')}: arm, lead and preamp together.${asks}`),
  }
}

function settledOf({ cartridge, arm, next }: Answers): string[] {
  const type = cartridge.type === 'unknown' ? [] : [TYPE_WORDS[cartridge.type]]
  const texts = [cartridge.outputMillivolts, cartridge.coilOhms, cartridge.inductanceMillihenries, arm.effectiveMassGrams].flatMap((value) => value?.text ?? [])
  const lead = 'metres' in arm.lead ? [`${arm.lead.metres.text} of lead`] : arm.lead.picofarads ? [`lead ${arm.lead.picofarads.text}`] : []
  return [...type, ...texts, ...lead, ...(next.kind === 'unknown' ? [] : [NEXT_WORDS[next.kind]])]
}

const NEXT_WORDS = {
  line: 'amplifier',
  digital: 'digital input',
  recorder: 'recorder',
  headphones: 'headphone stage',
  phono: 'phono input',
}

function openOf({ cartridge, arm, next }: Answers): string[] {
  const coil = cartridge.type === 'moving-coil'
  const electrical = cartridge.type === 'ceramic' || cartridge.type === 'strain-gauge' || cartridge.type === 'optical'
  if (electrical) return []
  return [
    cartridge.type === 'unknown' && 'type',
    !cartridge.outputMillivolts && 'output',
    !cartridge.coilOhms && 'coil resistance',
    !coil && !cartridge.inductanceMillihenries && 'inductance',
    !('metres' in arm.lead) && !arm.lead.picofarads && !coil && 'arm lead',
    !arm.effectiveMassGrams && 'arm',
    next.kind === 'unknown' && 'amplifier',
  ].filter((word) => word !== false)
}
