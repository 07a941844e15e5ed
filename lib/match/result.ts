import type { ControlState, Filter } from './controls'
import type { UnknownName } from './inputs'
import type { Origin, Range } from './quantity'

export const WEIGHTS = ['fine', 'worth-knowing', 'limit', 'rules-it-out'] as const
export type Weight = (typeof WEIGHTS)[number]

export const VERDICTS = ['suits', 'suits-with-changes', 'suits-with-a-limit', 'does-not-suit', 'cannot-say'] as const
export type VerdictKind = (typeof VERDICTS)[number]

export const RECORD_LEVELS = ['ordinary', 'loud', 'extreme'] as const
export type RecordLevel = (typeof RECORD_LEVELS)[number]

/**
 * Every figure of one setting, SI and decibels, each over the whole doubt. Null where it has no meaning
 * (no peak; no capacitance range for a moving coil; resistance unknown).
 * Room and margin are the same number: positive is under the limit.
 */
export interface Figures {
  /** At the preamp's input sockets at 1 kHz, after the coil's loss into the load, nominal level. */
  inputVolts: Range
  /** At the output sockets into the next input, 1 kHz, nominal level; balanced doubling included. */
  outputVolts: Range
  outputDecibelVolts: Range
  /** Against a digital source's 2 V at full scale (common practice). Loud peaks over it. */
  outputReDigitalDecibels: Range
  levelLossDecibels: Range
  /** Overload margin at 1 kHz, re nominal level. */
  overloadMarginDecibels: Range
  /** Worst margin of the preamp from 20 Hz to 20 kHz on the loud and the extreme envelope. */
  worstMarginDecibels: Range
  worstMarginHertz: Range
  extremeMarginDecibels: Range
  /** Worst margin at the next input on the loud envelope. */
  nextMarginDecibels: Range
  nextMarginHertz: Range
  /** What the cartridge sees at 1 kHz as a resistance, over the coil resistance. */
  cartridgeLoadOhms: Range
  loadRatio: Range
  /** All capacitance across the coil: wiring, lead, preamp. At the secondary with a transformer. */
  totalFarads: Range
  /** Response re 1 kHz: largest lift and deepest fall from 1 kHz to 15 kHz (fall is negative or zero). */
  liftDecibels: Range
  fallDecibels: Range
  at10kHzDecibels: Range
  at15kHzDecibels: Range
  at20kHzDecibels: Range
  resonanceHertz: Range | null
  peakHertz: Range | null
  peakDecibels: Range | null
  minus3dBHertz: Range | null
  /** S/N re nominal level after the load, 20 Hz to 20 kHz, RIAA. */
  snrFlatDecibels: Range
  snrWeightedDecibels: Range
  /** The coil's own limit, A-weighted. */
  coilSnrWeightedDecibels: Range
  armResonanceHertz: Range
  /** Attenuation of the filter in circuit (0 when none), at the arm's resonance, 4 Hz and 20 Hz. */
  filterAtResonanceDecibels: Range
  filterAt4HertzDecibels: Range
  filterAt20HertzDecibels: Range
  riaaAtResonanceDecibels: Range
  /** Output: loss by resistance and cable at 20 kHz re 1 kHz, corner in the bass, loss by the divider. */
  cableLossAt20kHzDecibels: Range
  bassCornerHertz: Range | null
  dividerLossDecibels: Range
  /** With a transformer: its own corner in the bass, when its inductance is known. */
  stepUpBassCornerHertz: Range | null
}
export type FigureName = keyof Figures

export const FINDING_CODES = [
  'headroom-tight',
  'headroom-loud-records',
  'level-low',
  'level-high',
  'next-input-tight',
  'load-below-recommended',
  'load-above-recommended',
  'load-near-coil',
  'capacitance-low',
  'capacitance-high',
  'treble-lift',
  'treble-fall',
  'hiss',
  'arm-resonance-low',
  'arm-resonance-high',
  'cable-loss',
  'bass-loss',
  'double-step-up',
  'step-up-into-mc',
  'two-phono-stages',
  'magnet-into-mc',
  'current-input',
  'not-magnetic',
  'strapped-mono',
] as const
export type FindingCode = (typeof FINDING_CODES)[number]

/** A sentence's worth of judgement: what, how heavy at worst, in the middle and at best, resting on which figure. */
export interface Finding {
  code: FindingCode
  /** Heaviest weight anywhere in the doubt, in the middle, and lightest. */
  worst: Weight
  middle: Weight
  best: Weight
  figure: FigureName | null
  range: Range | null
  /** The threshold that the worst end was held against, in the figure's own unit. */
  limit: number | null
  /** Which unknown the doubt comes from most; null when there is none. */
  doubt: UnknownName | null
}

/** What a setting is, in the words of its groups. */
export interface SettingSummary {
  state: ControlState
  gainDecibels: number
  pathId: 'mm' | 'mc'
  /** Resistance across the input as set, nominal. */
  loadOhms: number
  /** Base and switched capacitance of the preamp, nominal. */
  inputFarads: number
  filter: Filter | null
}

export interface Evaluation {
  setting: SettingSummary
  figures: Figures
  findings: Finding[]
  worst: Weight
  middle: Weight
  /** Share of the doubt, 0 to 1, in which something rules it out. */
  shareRuledOut: number
}

/** One thing to do with a hand. */
export interface Move {
  control: string
  /** 1-based member of a bank or button row; null for slides, plugs. */
  member: number | null
  side: 'both' | 'left' | 'right'
  from: string
  to: string
  /** The group it changes, and that group's value before and after in display words ("42 dB", "36 dB"). */
  group: string
  before: string
  after: string
}

/**
 * Another combination, and what speaks for or against it. Neighbours (distance 1) carry their ranges; of the rest
 * only the middle is given, as a range of one point.
 */
export interface OtherSetting {
  setting: SettingSummary
  outputVolts: Range
  roomDecibels: Range
  /** Worth a try, or not, and the finding that decides. */
  worthATry: 'if-dull' | 'if-bright' | 'if-rumble' | 'if-quiet' | 'if-loud' | 'if-load' | null
  against: Finding | null
  /** Number of groups in which it differs from the advice. */
  distance: number
}

export type Remedy =
  | { kind: 'attenuator'; decibels: number }
  | { kind: 'more-gain'; decibels: number }
  | { kind: 'other-input'; pathId: 'mm' | 'mc' }
  | { kind: 'step-up'; ratioLow: number; ratioHigh: number }
  | { kind: 'without-step-up' }
  | { kind: 'line-input' }
  | { kind: 'load-plug'; ohms: number }
  | { kind: 'lead'; farads: number }
  | { kind: 'other-model'; needs: 'gain' | 'load' | 'magnet-input' | 'voltage-input' | 'room' }

/** Along the one unknown: from here to there, this advice. SI of that unknown. */
export interface Stretch {
  from: number
  to: number
  verdict: VerdictKind
  /** The setting advised there; null when nothing fits. */
  setting: SettingSummary | null
  finding: FindingCode | null
}

export interface NumberToFindNext {
  unknown: UnknownName
  low: number
  nominal: number
  high: number
  /** Drop of the doubt about the verdict if it were known, 0 to 1. */
  share: number
  stretches: Stretch[]
}

export interface Doubt {
  unknown: UnknownName
  low: number
  nominal: number
  high: number
  origin: Origin
  share: number
}

/** Arrays for the plots, all of one length within a plot. */
export interface Curves {
  loading: { hertz: number[]; low: number[]; nominal: number[]; high: number[] }
  room: { hertz: number[]; low: number[]; nominal: number[]; high: number[]; extremeLow: number[] }
  arm: { hertz: number[]; low: number[]; nominal: number[]; high: number[]; filtered: number[] | null }
}

/** One column of the level diagram. Decibels re nominal level; limit and floor on that same footing. */
export interface LevelStage {
  key: 'record' | 'into-preamp' | 'out-of-preamp' | 'into-next'
  usualVolts: Range | null
  peakVolts: Range | null
  limitDecibels: Range | null
  floorDecibels: Range
  roomDecibels: Range | null
  limitHertz: number | null
}

export type Gate =
  | { reason: 'not-magnetic'; type: 'ceramic' | 'strain-gauge' | 'optical' }
  | { reason: 'current-input'; coilOhms: Range }

export interface MatchResult {
  rulesVersion: number
  engineVersion: string
  gate: Gate | null
  verdict: VerdictKind
  /** Share of the doubt in which the verdict holds, 0 to 1. */
  verdictShare: number
  /** The setting advised; null when the gate closed. When nothing fits, the least bad one. */
  chosen: Evaluation | null
  /** As the unit stands now (left side), when known and different or equal alike. */
  present: Evaluation | null
  /** From the present positions; null when these are not known. Empty when nothing is to be moved. */
  moves: Move[] | null
  presentSidesDiffer: boolean
  /** How many real combinations were evaluated. */
  combinations: number
  others: OtherSetting[]
  remedies: Remedy[]
  next: NumberToFindNext | null
  doubts: Doubt[]
  /** A careful setting to play with tonight while the verdict is open. */
  tonight: SettingSummary | null
  curves: Curves | null
  presentCurves: Curves | null
  stages: LevelStage[]
}
