import type { MatchInputs } from '../../match/inputs'
import type { Evaluation, LevelStage, MatchResult, OtherSetting } from '../../match/result'
import { GROOVE_NOISE_DECIBELS } from '../../match/rules'
import { added, decibels, figureText, hertz, hertzRange, roomText, sentenceCase, valueText, worstThenMiddle } from '../format'
import { namesOf } from './names'

/** A figure's heading states what was found; the sentences under it say how much. */
export interface Headed {
  heading: string
  /** One paragraph each. */
  paragraphs: string[]
}

/** From this much room on nothing needs to be said about it, dB. */
const ROOMY_DECIBELS = 12
const JUST_DECIBELS = 6

export interface ShownSetting {
  evaluation: Evaluation
  stages: LevelStage[]
}

const inParagraph = (...sentences: string[]) => sentences.filter(Boolean).join(' ')

/** The stage with least room at worst; null where no limit is known. */
export function tightestStage(stages: readonly LevelStage[]): LevelStage | null {
  const limited = stages.filter(({ roomDecibels }) => roomDecibels !== null)
  if (limited.length === 0) return null
  return limited.reduce((least, stage) => ((stage.roomDecibels?.low ?? Infinity) < (least.roomDecibels?.low ?? Infinity) ? stage : least))
}

/** What passes between distortion and noise. `others` tells what one gain step up would do. */
export function levelFinding({ evaluation, stages }: ShownSetting, inputs: MatchInputs, others: readonly OtherSetting[] = []): Headed {
  const names = namesOf(inputs)
  const tight = tightestStage(stages)
  const room = tight?.roomDecibels
  if (!tight || !room) return { heading: 'What comes out, stage by stage', paragraphs: [] }
  const inPreamp = tight.key !== 'into-next'
  const place = inPreamp ? `${names.preamp} itself` : names.nextInput
  const heading =
    room.low < 0
      ? `The tight place is ${inPreamp ? 'the preamp itself' : names.next}`
      : `Loud records have ${room.low >= ROOMY_DECIBELS ? 'plenty of room' : room.low >= JUST_DECIBELS ? 'room' : 'room, just'}`
  const tightest = inParagraph(`The tightest place is ${place}.`, roomSentence(room), oneStepUp(evaluation, others))
  return { heading, paragraphs: [tightest, noiseUnderGroove(evaluation)] }
}

function roomSentence(room: { low: number; nominal: number }): string {
  if (Math.round(room.low * 10) < 0) {
    const middle = room.nominal >= 0 ? `, in the middle there is ${roomText(room.nominal)}` : ''
    return `A loud record goes over its limit by ${decibels(room.low)} at worst${middle}.`
  }
  const enough = room.low >= 3 ? ', and that is enough' : ''
  return `A loud record stays ${decibels(room.low)} under its limit${enough}.`
}

/** What the next gain up would do, where it would go over. */
function oneStepUp({ setting }: Evaluation, others: readonly OtherSetting[]): string {
  const above = others
    .filter((other) => other.distance === 1 && other.setting.gainDecibels > setting.gainDecibels && other.setting.pathId === setting.pathId)
    .sort((a, b) => a.setting.gainDecibels - b.setting.gainDecibels)[0]
  return above && above.roomDecibels.low < 0 ? `One gain step up it would go over by ${decibels(above.roomDecibels.low)}.` : ''
}

function noiseUnderGroove({ figures }: Evaluation): string {
  const under = figures.snrWeightedDecibels.low - GROOVE_NOISE_DECIBELS
  return under >= 0
    ? `Hiss from preamp and cartridge sits ${decibels(under)} under the noise of the groove.`
    : `Hiss from preamp and cartridge lies ${decibels(under)} over the noise of the groove.`
}

/** Loud records lie this far over ordinary ones, dB: 38 over 25 cm/s. */
const ORDINARY_UNDER_LOUD = 20 * Math.log10(38 / 25)

/** Room at each pitch, in the preamp alone. */
export function roomFinding({ figures, setting }: Evaluation, inputs: MatchInputs): Headed {
  const { worstMarginDecibels: room, worstMarginHertz, overloadMarginDecibels: atOneKilohertz, inputVolts } = figures
  if (room.low < 0) {
    const ordinary = room.low + ORDINARY_UNDER_LOUD
    return {
      heading: `It runs out around ${hertz(worstMarginHertz.nominal)}`,
      paragraphs: [
        inParagraph(
          `Loud records go over by ${decibels(room.low)} at worst.`,
          ordinary >= 0 ? 'Ordinary records, 25 cm/s, stay clear of it.' : 'Ordinary records, 25 cm/s, reach it as well.',
        ),
      ],
    }
  }
  const path = inputs.preamp.paths.find(({ id }) => id === setting.pathId)
  const behindTransformer = path?.stepUp || inputs.stepUp
  const takes = inputVolts.nominal * 10 ** (atOneKilohertz.nominal / 20)
  const over = `${decibels(atOneKilohertz.low)} above your usual level`
  return {
    heading: room.low >= JUST_DECIBELS ? 'The preamp itself has plenty' : 'The preamp itself has room, just',
    paragraphs: [
      inParagraph(
        `At least ${decibels(room.low)} on loud records.`,
        behindTransformer
          ? `At 1 kHz its limit lies ${over}.`
          : `At 1 kHz it takes ${figureText({ low: takes, nominal: takes, high: takes }, 'volts')} RMS, ${over}.`,
      ),
    ],
  }
}

/** Treble below this moves nobody, dB. */
const SLIGHT = 1.5
const CLEAR = 3
const STRONG = 5

const inTenths = (value: number) => Math.round(value * 10) / 10

/** What load and capacitance do to the treble, and what they do as the unit stands now. */
export function trebleFinding(evaluation: Evaluation, present: Evaluation | null = null): Headed {
  const { liftDecibels: lift, fallDecibels: fall, peakHertz, minus3dBHertz } = evaluation.figures
  const up = inTenths(Math.max(0, lift.high))
  const down = inTenths(Math.max(0, -fall.low))
  const where = hertz(Math.min(peakHertz?.nominal ?? 15_000, 15_000))
  const then = minus3dBHertz && minus3dBHertz.nominal < 40_000 ? ', then it falls' : ''
  const sentences: string[] = []
  let heading: string
  if (up <= SLIGHT && down <= SLIGHT) {
    heading = 'Flat as far as it counts'
    sentences.push(`Within ${decibels(Math.max(up, down, 0.1))} up to 15 kHz. Nobody hears that.`)
  } else if (up >= down) {
    heading = up <= CLEAR ? `A slight lift${then}` : up <= STRONG ? `It lifts the treble${then}` : `It lifts the treble a lot${then}`
    sentences.push(sentenceCase(`${worstUp(lift.high, lift.nominal, where)}.`))
    sentences.push(up <= CLEAR ? 'Few people hear that.' : 'Voices turn sharp.')
  } else {
    heading = down <= CLEAR ? 'The treble falls a little' : down <= STRONG ? 'The treble falls' : 'The treble falls a lot'
    sentences.push(`Down by ${worstThenMiddle(fall.low, fall.nominal)} at 15 kHz.`)
    sentences.push(down <= CLEAR ? 'Few people hear that.' : 'It sounds dull.')
  }
  const now = present ? nowTreble(present, up, down) : ''
  return { heading, paragraphs: [sentences.join(' '), now].filter(Boolean) }
}

function worstUp(worst: number, middle: number, where: string): string {
  const [a, b] = [decibels(worst), decibels(Math.max(0, middle))]
  return a === b ? `${a} up at ${where}` : `at worst ${a} up at ${where}, in the middle ${b}`
}

function nowTreble({ figures }: Evaluation, up: number, down: number): string {
  const nowUp = Math.max(0, figures.liftDecibels.high)
  const nowDown = Math.max(0, -figures.fallDecibels.low)
  if (nowUp > up + 0.5 && nowUp > SLIGHT) return `As you have it now it is up by ${decibels(nowUp)} at worst.${nowUp > CLEAR ? ' Voices turn sharp.' : ''}`
  if (nowDown > down + 0.5 && nowDown > SLIGHT) return `As you have it now it is down by ${decibels(nowDown)} at worst.${nowDown > CLEAR ? ' It sounds dull.' : ''}`
  return ''
}

const GOOD = { low: 8, high: 12 }

/** Where arm and cartridge resonate, and what the rumble filter has to do with it. */
export function armFinding({ figures, setting }: Evaluation, inputs: MatchInputs): Headed {
  const at = figures.armResonanceHertz
  const names = namesOf(inputs)
  const heading =
    at.nominal < GOOD.low
      ? 'A heavy arm for it'
      : at.nominal > GOOD.high
        ? 'A light arm for it'
        : at.low < GOOD.low && at.high > GOOD.high
          ? 'Good, most likely'
          : at.low < GOOD.low
            ? 'Good, or just under it'
            : at.high > GOOD.high
              ? 'Good, or just over it'
              : 'A good arm for it'
  const { arm, cartridge } = inputs
  const mass = added([arm.effectiveMassKilograms, arm.fixingsKilograms, cartridge.massKilograms])
  const grams = valueText({ ...mass, low: mass.low * 1e3, nominal: mass.nominal * 1e3, high: mass.high * 1e3 }, 'grams')
  const compliance = figureText(inMicrometres(cartridge.complianceMetresPerNewton), 'compliance')
  const filter = filterSentence(at.low, setting.filter !== null, inputs, names.preamp)
  return { heading, paragraphs: [inParagraph(`${grams} all told, ${compliance} at 10 Hz: ${hertzRange(at)}.`, filter)] }
}

const inMicrometres = ({ low, nominal, high }: { low: number; nominal: number; high: number }) => ({ low: low * 1e3, nominal: nominal * 1e3, high: high * 1e3 })

function filterSentence(lowestHertz: number, on: boolean, { preamp }: MatchInputs, name: string): string {
  const switched = preamp.groups.some(({ sets }) => sets === 'filter')
  if (on) return switched ? 'The rumble filter is on.' : `${sentenceCase(name)} has a rumble filter that is always on.`
  if (switched) return lowestHertz >= GOOD.low ? 'The rumble filter can stay off.' : 'The rumble filter is off here.'
  return lowestHertz < GOOD.low ? `${sentenceCase(name)} has no rumble filter, so a warp shows on your woofers.` : ''
}

/** How quiet it is, against the groove. */
export function noiseFinding({ figures }: Evaluation): Headed {
  const under = figures.snrWeightedDecibels.low - GROOVE_NOISE_DECIBELS
  const heading =
    under >= 10 ? 'Quieter than any record' : under >= 3 ? 'Quieter than most records' : under >= 0 ? 'About as quiet as the groove' : 'You hear some hiss'
  return { heading, paragraphs: [] }
}

/** The figures of a sheet that have a heading, with the room at each pitch for one line on paper. */
export function paperLine(evaluation: Evaluation): { room: string; arm: string; noise: string } {
  const { worstMarginDecibels, overloadMarginDecibels, armResonanceHertz, snrWeightedDecibels } = evaluation.figures
  const room = worstMarginDecibels.low >= 0 ? `at least ${decibels(worstMarginDecibels.low)} in the preamp on loud records` : `loud records go over by ${decibels(worstMarginDecibels.low)} in the preamp`
  const margin = overloadMarginDecibels.low >= 0 ? `; ${decibels(overloadMarginDecibels.low)} at 1 kHz` : ''
  const good = armResonanceHertz.low >= GOOD.low && armResonanceHertz.high <= GOOD.high ? ', good' : ''
  return { room: `${room}${margin}`, arm: `${hertzRange(armResonanceHertz)}${good}`, noise: `${decibels(snrWeightedDecibels.low)} under 5 cm/s, A` }
}

/** True where the unit stands elsewhere than advised and both sides alike, so that now can be compared. */
export function presentToCompare({ present, moves }: MatchResult): Evaluation | null {
  return present && moves && moves.length > 0 ? present : null
}
