import type { Control, ControlState, Exclusion, Filter, Group } from './controls'
import type { Quantity } from './quantity'

/**
 * Where a stage runs out first.
 * `output-limited`: equalisation by feedback, the output clips; the input allowed falls as the RIAA gain rises.
 * `first-stage-flat`: a flat first stage before passive equalisation; the same input at every frequency.
 * `first-stage-bass`: bass equalised in the first stage, 75 µs after it.
 */
export type OverloadTopology = 'output-limited' | 'first-stage-flat' | 'first-stage-bass'

/** A step-up transformer. Ratio is secondary over primary turns. */
export interface StepUp {
  name: string
  ratio: Quantity
  primaryOhms: Quantity
  secondaryOhms: Quantity
  primaryHenries: Quantity | null
  /** Capacitance of the lead between the transformer and the preamp, and of the winding itself. */
  secondaryFarads: Quantity
}

/** One gain of a preamp with what belongs to it. Volts RMS at the input sockets, referred to 1 kHz. */
export interface GainOption {
  id: string
  pathId: string
  gainDecibels: Quantity
  /** Input at which it distorts: at 1 kHz, or measured at several frequencies (ascending). */
  overload: { hertz: number; volts: number }[]
  voltageNoise: Quantity
  currentNoise: Quantity
}

/** One way in: an MM or an MC input with what stands across it before any switch is moved. */
export interface InputPath {
  id: 'mm' | 'mc'
  label: string
  loadOhms: Quantity
  inputFarads: Quantity
  /** A transformer inside the preamp on this input; load and capacitance then stand at its secondary. */
  stepUp: StepUp | null
}

/** A preamp as one board of one model, ready to be checked. */
export interface Preamp {
  modelId: string
  modelName: string
  boardId: string
  /** Such as "second board, from serial 19000"; empty where only one exists. */
  boardName: string
  technology: 'transistor' | 'valve'
  inputMode: 'voltage' | 'current'
  topology: OverloadTopology
  controls: Control[]
  groups: Group[]
  exclusions: Exclusion[]
  asDelivered: ControlState
  paths: InputPath[]
  gains: GainOption[]
  /** Volts RMS at the unbalanced output before it distorts, at any gain. */
  maximumOutputVolts: Quantity
  outputOhms: Quantity
  couplingFarads: Quantity | null
  /** True when a balanced output with twice the voltage exists. */
  hasBalancedOutput: boolean
  /** A filter that is always in circuit. */
  fixedFilter: Filter | null
  /** True when the 7950 µs term is built in. */
  iecBass: boolean
  /** Other models of the same maker to name when this one cannot do it. */
  offers: { stepUpInput: boolean; lowestLoadOhms: number }
}

/** What a combination of positions comes to. Ohms and farads stand at the input (or at the secondary). */
export interface Setting {
  path: InputPath
  gain: GainOption
  loadOhms: Quantity
  inputFarads: Quantity
  filter: Filter | null
}
