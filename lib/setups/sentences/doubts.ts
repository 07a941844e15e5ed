import type { MatchInputs, UnknownName } from '../../match/inputs'
import type { Doubt, Evaluation, MatchResult } from '../../match/result'
import { GROOVE_NOISE_DECIBELS } from '../../match/rules'
import { countWord, decibels, hertzRange, sentenceCase, voltsText } from '../format'
import { namesOf } from './names'
import { loadWords } from './others'
import { numberRange } from './number-to-find'
import { UNKNOWN_WORDS } from './unknowns'

/** What can be said while the verdict is open, and what each unknown decides. */

export interface Held {
  what: string
  holds: string
}

/** What is fine over everything that is not known, at this setting. */
export function whatHolds({ figures, findings, setting }: Evaluation, inputs: MatchInputs): Held[] {
  const open = (codes: RegExp) => findings.some(({ code }) => codes.test(code))
  const { next, cartridge } = namesOf(inputs)
  const held: (Held | false)[] = [
    !open(/^(treble|capacitance|load-above)/) && {
      what: 'Treble',
      holds: `Flat within ${decibels(Math.max(figures.liftDecibels.high, -figures.fallDecibels.low, 0.1))} to 15 kHz`,
    },
    figures.snrWeightedDecibels.low >= GROOVE_NOISE_DECIBELS && {
      what: 'Hiss',
      holds: `At least ${decibels(figures.snrWeightedDecibels.low - GROOVE_NOISE_DECIBELS)} under the noise of the groove`,
    },
    !open(/^load-(below|near)/) && { what: 'Load', holds: `${loadWords(setting, inputs)} is right for ${cartridge}` },
    !open(/^headroom/) && { what: 'Room in the preamp', holds: `At least ${decibels(figures.worstMarginDecibels.low)} on loud records` },
    !open(/^next-input/) && { what: `Room at ${next}`, holds: `At least ${decibels(figures.nextMarginDecibels.low)} on loud records` },
    !open(/^level/) && { what: 'Level', holds: `${voltsText(figures.outputVolts)} RMS at usual music level` },
    !open(/^arm/) && { what: 'Arm', holds: `Arm and cartridge resonate at ${hertzRange(figures.armResonanceHertz)}, a good place` },
  ]
  return held.filter((row) => row !== false)
}

export function holdsHeading(held: readonly Held[]): string {
  return `${sentenceCase(countWord(held.length))} ${held.length === 1 ? 'thing holds' : 'things hold'}, whatever it is`
}

const DECIDES: Partial<Record<UnknownName, string>> = {
  output: 'the gain',
  coilResistance: 'the load',
  inductance: 'the treble',
  armWiring: 'the treble',
  lead: 'the treble',
  stepUpRatio: 'level and load',
  stepUpPrimary: 'level and hiss',
  stepUpSecondary: 'level and hiss',
  stepUpCapacitance: 'the treble',
  stepUpInductance: 'the bass',
  nextMaximum: 'room at the next input',
  nextResistance: 'level and bass',
  cable: 'the very top',
  armMass: 'the arm',
  cartridgeMass: 'the arm',
  fixings: 'the arm',
  compliance: 'the arm',
}

/** What an unknown decides that changes nothing said on the sheet. */
export const NOTHING = 'nothing here'

/** Below this share an unknown changes nothing that is said. */
const NOTHING_SHARE = 0.02

export interface DoubtRow {
  unknown: UnknownName
  name: string
  reckonedWith: string
  decides: string
  share: number
}

/** Every unknown that an owner could find out, what it was taken to be and what hangs on it. */
export function doubtRows({ doubts, next }: MatchResult, inputs: MatchInputs): DoubtRow[] {
  const findable = doubts.filter(({ unknown }) => inputs.stepUp !== null || !unknown.startsWith('stepUp'))
  const turns = next !== null && next.stretches.length > 1
  return findable.map((doubt) => ({
    unknown: doubt.unknown,
    name: UNKNOWN_WORDS[doubt.unknown].name,
    reckonedWith: `${numberRange(doubt)}${originTail(doubt)}`,
    decides: decides(doubt, turns && next.unknown === doubt.unknown),
    share: doubt.share,
  }))
}

function decides({ unknown, share }: Doubt, settles: boolean): string {
  if (share < NOTHING_SHARE && !settles) return NOTHING
  const what = DECIDES[unknown] ?? 'the figures'
  return settles ? `the verdict, and ${what}` : what
}

function originTail({ origin }: Doubt): string {
  if (origin === 'typical') return ', which is usual'
  return origin === 'unknown' ? ', whatever the type' : ''
}

export function doubtsHeading(rows: readonly DoubtRow[]): string {
  const deciding = rows.filter(({ share }) => share >= 0.2).length
  if (deciding === 0) return 'None of them decides alone'
  return `${sentenceCase(countWord(deciding))} of them ${deciding === 1 ? 'decides' : 'decide'}`
}
