import type { MatchInputs } from '../../match/inputs'
import type { Range } from '../../match/quantity'
import type { Finding, FindingCode, Weight } from '../../match/result'
import { decibels, figureText, hertz, hertzRange, roomText, sentenceCase, voltsText, worstThenMiddle } from '../format'
import { namesOf, possessive, type Names } from './names'

/** A finding with what its sentence may need. */
interface Told {
  finding: Finding
  /** The heaviest weight anywhere in the doubt. */
  worst: Weight
  range: Range
  limit: number
  names: Names
  inputs: MatchInputs
}

const heavy = (weight: Weight) => weight === 'limit' || weight === 'rules-it-out'

/** From here on a loud record has all the room it needs, whatever the rule asks, dB. */
const ENOUGH_DECIBELS = 3

/** Room of a loud record under a limit, or what it goes over by. */
function loudRecord(limitOf: string, { range }: Told): string {
  const [low, middle] = [Math.round(range.low * 10), Math.round(range.nominal * 10)]
  if (low < 0 && middle < 0) return `a loud record goes over ${limitOf} by ${worstThenMiddle(range.low, range.nominal)}`
  if (low < 0) return `the very loudest records go over ${limitOf}, by ${decibels(range.low)} at worst; in the middle there is ${roomText(range.nominal)}`
  if (low === 0) return `a loud record just reaches ${limitOf}`
  if (range.low >= ENOUGH_DECIBELS) return `a loud record stays ${decibels(range.low)} under ${limitOf}, and that is enough`
  return `a loud record stays under ${limitOf} by ${worstThenMiddle(range.low, range.nominal)}`
}

/** "at worst " where only the far end of the doubt is so. */
const onlyAtWorst = ({ worst, finding }: Told) => (heavy(worst) && !heavy(finding.middle) ? 'at worst ' : '')

function headroom(told: Told): string {
  const { range, worst, names } = told
  if (range.low < 0) return `${names.preamp} distorts at usual music level already: ${roomText(range.low)} at worst`
  const over = `at 1 kHz the limit of ${names.preamp} lies over usual music level by ${worstThenMiddle(range.low, range.nominal)}`
  const then: Record<Weight, string> = {
    fine: 'which is plenty',
    'worth-knowing': 'which does for all but the hottest pressings',
    limit: `and ${onlyAtWorst(told)}loud passages can reach it`,
    'rules-it-out': `and ${onlyAtWorst(told)}ordinary loud passages distort`,
  }
  return `${over}, ${then[worst]}`
}

function level(side: 'low' | 'high', told: Told): string {
  const { range, limit, names, worst } = told
  const volts = `${voltsText(range)} at usual music level`
  if (worst === 'fine') return `${volts} comes out, which is what ${names.next} likes`
  const wanted = voltsText({ low: limit, nominal: limit, high: limit })
  const is = onlyAtWorst(told) ? 'it may be' : 'it is'
  if (side === 'low') {
    return heavy(worst) ? `${is} too quiet, with ${volts} where ${wanted} is wanted` : `it plays quietly, with ${volts} where ${wanted} is comfortable`
  }
  return heavy(worst) ? `${is} too loud, with ${volts} where ${wanted} is plenty` : `it plays loudly, with ${volts} where ${wanted} is plenty`
}

function load(side: 'below' | 'above', { range, limit, names, worst, inputs }: Told): string {
  const is = `the load is ${figureText(range, 'ohms')}`
  const printed = inputs.cartridge.recommendedLoadOhms !== null
  const asked = printed ? figureText({ low: limit, nominal: limit, high: limit }, 'ohms') : '47 kΩ'
  const asks = printed ? `${names.cartridge} asks for` : 'a magnet wants'
  if (worst === 'fine') return `${is}, ${printed ? `as ${names.cartridge} asks` : 'as a magnet wants'}`
  if (side === 'above') return `${is}, and ${asks} ${asked}${printed ? ' at most' : ''}`
  const costs = heavy(worst) ? ', which costs level and treble' : ''
  return `${is}, and ${asks} ${printed ? 'at least ' : ''}${asked}${costs}`
}

function loadNearCoil({ range, worst }: Told): string {
  const [least, most] = [figureTimes(range.low), figureTimes(range.high)]
  if (worst === 'fine') return `the load is at least ${least} times the coil, which is comfortable`
  const times = least === most ? least : `${least} to ${most}`
  if (!heavy(worst)) return `the load is ${times} times the coil, which costs a little level`
  return range.high / range.low > 1.5 ? `at worst the load is only ${least} times the coil, which costs level` : `the load is only ${times} times the coil, which costs level`
}

const figureTimes = (value: number) => (value < 9.95 ? value.toFixed(1) : value.toFixed(0))

function capacitance(side: 'low' | 'high', { range, limit, names, worst }: Told): string {
  const total = `the capacitance comes to ${figureText(range, 'farads')}`
  const [least, most] = side === 'high' ? [range.low - limit, range.high - limit] : [limit - range.high, limit - range.low]
  if (worst === 'fine' || most <= 0) return `${total}, inside what ${names.cartridge} asks`
  const off = { low: Math.max(0, least), nominal: most, high: most }
  return `${total}, ${figureText(off, 'farads')} ${side === 'high' ? 'above' : 'below'} what ${names.cartridge} asks`
}

const lift = ({ range }: Told) => `the treble lifts by ${worstThenMiddle(range.high, range.nominal)}`
const fall = ({ range }: Told) => `the treble falls by ${worstThenMiddle(range.low, range.nominal)}`

function hiss(told: Told): string {
  const { range, worst } = told
  const lies = `hiss lies under usual music level by ${worstThenMiddle(range.low, range.nominal)}`
  const then: Record<Weight, string> = {
    fine: 'under the noise of any groove',
    'worth-knowing': 'about as quiet as a very good pressing',
    limit: `and ${onlyAtWorst(told)}you hear it between pieces`,
    'rules-it-out': `and ${onlyAtWorst(told)}you hear it all the time`,
  }
  return `${lies}, ${then[worst]}`
}

function armResonance(side: 'low' | 'high', { range, worst }: Told): string {
  const at = `arm and cartridge resonate at ${hertzRange(range)}`
  if (worst === 'fine') return `${at}, a good place`
  return side === 'low' ? `${at}, down where warps are; 8 to 12 Hz is the good place` : `${at}, up towards the music; 8 to 12 Hz is the good place`
}

function cableLoss({ range, names }: Told): string {
  return `the cable to ${names.next} takes ${worstThenMiddle(range.low, range.nominal)} at 20 kHz`
}

function bassLoss({ range, names }: Told): string {
  return `bass falls away below ${hertz(range.high)} on the way to ${names.next}`
}

const SENTENCES: Record<FindingCode, (told: Told) => string> = {
  'headroom-tight': headroom,
  'headroom-loud-records': (told) => loudRecord(`the limit of ${told.names.preamp}`, told),
  'next-input-tight': (told) => loudRecord(`${possessive(told.names.next)} limit`, told),
  'level-low': (told) => level('low', told),
  'level-high': (told) => level('high', told),
  'load-below-recommended': (told) => load('below', told),
  'load-above-recommended': (told) => load('above', told),
  'load-near-coil': loadNearCoil,
  'capacitance-low': (told) => capacitance('low', told),
  'capacitance-high': (told) => capacitance('high', told),
  'treble-lift': lift,
  'treble-fall': fall,
  hiss,
  'arm-resonance-low': (told) => armResonance('low', told),
  'arm-resonance-high': (told) => armResonance('high', told),
  'cable-loss': cableLoss,
  'bass-loss': bassLoss,
  'double-step-up': () => 'two transformers in a row give far too much',
  'step-up-into-mc': () => 'a step-up transformer goes into an MM input, not into MC',
  'two-phono-stages': () => 'a phono input equalises the record a second time: bass booms and treble is gone',
  'magnet-into-mc': ({ names }) => `${names.cartridge} is far too strong for a moving coil input`,
  'current-input': ({ names }) => `${names.preamp} takes current, not voltage, so there is no load to set`,
  'not-magnetic': ({ names }) => `${names.cartridge} is not a magnetic cartridge, and ${names.preamp} is made for those`,
  'strapped-mono': ({ names }) =>
    `${names.cartridge} is mono: where its pins are joined, both inputs load the one coil, and it sees half the load`,
}

const NOTHING: Range = { low: 0, nominal: 0, high: 0 }

/** A finding without its capital and its full stop, to stand after "Not this:". */
export function findingClause(finding: Finding, inputs: MatchInputs): string {
  const { code, worst, range, limit } = finding
  return SENTENCES[code]({ finding, worst, range: range ?? NOTHING, limit: limit ?? 0, names: namesOf(inputs), inputs })
}

/** A finding as its owner reads it: room, never a negative number. */
export function findingSentence(finding: Finding, inputs: MatchInputs): string {
  return `${sentenceCase(findingClause(finding, inputs))}.`
}

const SOUNDS: Partial<Record<FindingCode, string>> = {
  'headroom-tight': 'You hear it as an edge on loud voices and brass.',
  'headroom-loud-records': 'You hear it as an edge on loud voices and brass.',
  'next-input-tight': 'You hear it as an edge on loud voices and brass.',
  'level-low': 'The volume knob sits high, and hiss comes up with it.',
  'level-high': 'The volume knob does all its work at the bottom.',
  'load-below-recommended': 'It sounds quieter and duller than it is.',
  'load-above-recommended': 'It may sound brighter than its maker meant.',
  'load-near-coil': 'It plays quieter, and the bass can turn soft.',
  'capacitance-low': 'The top end may lift a little late, or not at all.',
  'capacitance-high': 'Voices turn sharp, then the very top is missing.',
  'treble-lift': 'Voices turn sharp.',
  'treble-fall': 'It sounds dull.',
  hiss: 'You hear it as a soft rush between pieces.',
  'arm-resonance-low': 'A warp shows on your woofers, and the stylus can lose the groove on it.',
  'arm-resonance-high': 'Deep bass comes out heavier than it is.',
  'cable-loss': 'Cymbals lose some of their shine.',
  'bass-loss': 'The deepest notes come out thin.',
}

/** How a finding sounds; empty where there is nothing to hear. */
export function soundOf(code: FindingCode): string {
  return SOUNDS[code] ?? ''
}
