import type { ControlState } from '../match/controls'
import type { MatchInputs } from '../match/inputs'
import type { Preamp } from '../match/preamp'
import type { Curves, Evaluation, VerdictKind } from '../match/result'
import { GROOVE_NOISE_DECIBELS } from '../match/rules'
import { describeSetting } from '../match/setting-words'
import { encodeState } from '../match/states'
import { decibels, figureText, gainText, hertzRange, roomRange, voltsText, worstThenMiddle } from '../setups/format'
import { restRows } from '../setups/sentences/rests'
import { titleRows } from '../setups/sentences/title-block'
import type { SheetView } from '../setups/views'
import { responseOn, trebleHeading, type Response } from './views-treble'

/** Two revisions side by side: what went in, how each is set, what came out. Pure. */

/** The advised setting of each, or how the unit stood when each was reckoned. */
export type Compared = 'advised' | 'stood'

export interface ComparedSide {
  number: number
  code: string
  letter: string
  createdAt: number
  letters: string[]
  verdict: VerdictKind
  preamp: Preamp
  /** Null where there is no setting to draw. */
  state: ControlState | null
}

export interface ComparedRow {
  label: string
  a: string
  b: string
  differs: boolean
}

export interface ComparisonView {
  a: ComparedSide
  b: ComparedSide
  sameSheet: boolean
  /** True where both are the same board of one model, so that their switches can be held against each other. */
  sameBoard: boolean
  shown: Compared
  /** True where how it stood is known of both. */
  stoodKnown: boolean
  inputs: ComparedRow[]
  outcome: ComparedRow[]
  treble: { a: Response; b: Response; inputs: MatchInputs; curves: Curves; heading: string } | null
  rulesDiffer: boolean
}

interface Setting {
  evaluation: Evaluation
  curves: Curves
}

function settingOf({ result: { match, tonight } }: SheetView, shown: Compared): Setting | null {
  if (shown === 'stood') {
    const curves = match.presentCurves ?? match.curves
    return match.present && curves && { evaluation: match.present, curves }
  }
  if (tonight) return tonight
  return match.chosen && match.curves && { evaluation: match.chosen, curves: match.curves }
}

const keyOf = ({ inputs: { preamp } }: SheetView, setting: Setting | null) => setting && encodeState(preamp, setting.evaluation.setting.state)

/** How it stood is what tells two revisions apart where only the switches were moved in between. */
function shownOf(a: SheetView, b: SheetView, stoodKnown: boolean): Compared {
  if (!stoodKnown) return 'advised'
  const differ = (shown: Compared) => keyOf(a, settingOf(a, shown)) !== keyOf(b, settingOf(b, shown))
  return !differ('advised') && differ('stood') ? 'stood' : 'advised'
}

/** @param asked which settings to hold against each other; where it is not said, those that differ */
export function compareRevisions(a: SheetView, b: SheetView, asked: Compared | null): ComparisonView {
  const stoodKnown = settingOf(a, 'stood') !== null && settingOf(b, 'stood') !== null
  const shown = asked === 'stood' && !stoodKnown ? 'advised' : (asked ?? shownOf(a, b, stoodKnown))
  const [first, second] = [settingOf(a, shown), settingOf(b, shown)]
  return {
    a: sideOf(a, first),
    b: sideOf(b, second),
    sameSheet: a.number === b.number,
    sameBoard: a.inputs.preamp.modelId === b.inputs.preamp.modelId && a.inputs.preamp.boardId === b.inputs.preamp.boardId,
    shown,
    stoodKnown,
    inputs: rowsOf(whatWentIn(a, first), whatWentIn(b, second)),
    outcome: rowsOf(whatCameOut(a, first), whatCameOut(b, second)),
    treble: first && second && trebleOf(first, second, b.inputs),
    rulesDiffer: a.rulesVersion !== b.rulesVersion || a.engineVersion !== b.engineVersion,
  }
}

function sideOf({ number, code, letter, createdAt, revisions, inputs, result }: SheetView, setting: Setting | null): ComparedSide {
  const letters = revisions.map((revision) => revision.letter)
  return { number, code, letter, createdAt, letters, verdict: result.match.verdict, preamp: inputs.preamp, state: setting?.evaluation.setting.state ?? null }
}

/** Labels with their values, in order. */
type Told = Map<string, string>

const NOT_SAID = 'not known'

function rowsOf(a: Told, b: Told): ComparedRow[] {
  const labels = [...new Set([...a.keys(), ...b.keys()])]
  return labels.map((label) => {
    const [first, second] = [a.get(label) ?? 'none', b.get(label) ?? 'none']
    return { label, a: first, b: second, differs: first !== second }
  })
}

function whatWentIn({ inputs }: SheetView, setting: Setting | null): Told {
  const { preamp, present, output } = inputs
  const titles = titleRows(inputs)
  const named = (label: string) => titles.find((row) => row.label === label)?.value ?? NOT_SAID
  const rests = restRows(inputs, setting?.evaluation.figures ?? null)
  const stood = !present ? NOT_SAID : [present.left, present.right].map((state) => settingInWords(preamp, state))
  return new Map([
    ['Preamp', preamp.modelName],
    ...(preamp.boardName ? [['Board', preamp.boardName] as const] : []),
    ...(preamp.controls.length > 0
      ? [['How it stood', typeof stood === 'string' ? stood : stood[0] === stood[1] ? stood[0] : `left: ${stood[0]}; right: ${stood[1]}`] as const]
      : []),
    ['Cartridge', named('Cartridge')],
    ...rests.map(({ value, used, enter }) => [value, enter ? `${used}, estimated` : used] as const),
    ['Plays into', named('Plays into')],
    ...(preamp.hasBalancedOutput ? [['Output used', output] as const] : []),
  ])
}

const settingInWords = (preamp: Preamp, state: ControlState) =>
  describeSetting(preamp, state)
    .map(({ label, value }) => `${label} ${value}`)
    .join(', ')

function whatCameOut({ rulesVersion, engineVersion }: SheetView, setting: Setting | null): Told {
  const versions = [
    ['Rules used', `version ${rulesVersion}`],
    ['Reckoned by', `version ${engineVersion}`],
  ] as const
  if (!setting) return new Map(versions)
  const { figures, setting: set } = setting.evaluation
  const { liftDecibels: lift, fallDecibels: fall, snrWeightedDecibels } = figures
  const under = snrWeightedDecibels.low - GROOVE_NOISE_DECIBELS
  return new Map([
    ['Gain', gainText(set.gainDecibels)],
    ['Load on the cartridge', figureText(figures.cartridgeLoadOhms, 'ohms')],
    ['Capacitance, all told', figureText(figures.totalFarads, 'farads')],
    ['Lift in the treble', worstThenMiddle(Math.max(0, lift.high), Math.max(0, lift.nominal))],
    ['Fall in the treble', worstThenMiddle(Math.min(0, fall.low), Math.min(0, fall.nominal))],
    ['Loud records, in the preamp', roomRange(figures.worstMarginDecibels)],
    ['Loud records, at the next input', roomRange(figures.nextMarginDecibels)],
    ['Usual output', `${voltsText(figures.outputVolts)} RMS`],
    ['Hiss', `${decibels(under)} ${under >= 0 ? 'under' : 'over'} the groove`],
    ['Arm and cartridge', hertzRange(figures.armResonanceHertz)],
    ...versions,
  ])
}

function trebleOf(first: Setting, second: Setting, inputs: MatchInputs): ComparisonView['treble'] {
  const { hertz } = second.curves.loading
  const [a, b] = [responseOn(hertz, first.curves.loading), responseOn(hertz, second.curves.loading)]
  return { a, b, inputs, curves: second.curves, heading: trebleHeading(first.evaluation.figures, second.evaluation.figures) }
}
