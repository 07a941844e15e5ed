import type { Preamp } from '../match/preamp'
import type {
  ArmEntry,
  CapacitanceField,
  CartridgeEntry,
  ComplianceField,
  Figure,
  InputEntry,
  LeadEntry,
  LeafletField,
  OutputField,
  StepUpEntry,
} from './schema'
import type { BoardEntry, ControlEntry, PreampEntry } from './schema-preamp'
import type { CartridgeVariety, ListedCartridgeType } from './terms'
import { lowestLoadOhms, toPreamp } from './to-preamp'

/** What leaves the server of a catalogue entry. Every field is named here; units stand in the names. */

export interface ControlSummary {
  kind: ControlEntry['kind']
  label: string
  place: ControlEntry['place']
  /** Switches of one bank, buttons of a row, plugs or places. */
  count: number
  /** True where each channel has its own: banks and plugs. */
  eachChannel: boolean
  /** What stands on its places, plugs or buttons; empty for a bank. */
  labels: string[]
}

export interface BoardView {
  id: string
  /** Empty where only one board exists. */
  name: string
  /** Whole serial numbers, both ends included; null is open. */
  serials: { from: number | null; to: number | null }
  /** Ready to be checked, SI. */
  preamp: Preamp
}

/** A preamp as lists and the check need it. Figures of the list are those of its newest board. */
export interface PreampView {
  id: string
  maker: string
  name: string
  technology: 'transistor' | 'valve'
  /** Kinds of cartridge it has a way in for, MM first. */
  takes: ('mm' | 'mc')[]
  /** Gains from the sockets, rising. */
  gainDecibels: number[]
  controls: ControlSummary[]
  /** Load and capacitance of the first input with nothing switched; what it always is where nothing can be set. */
  baseLoadOhms: number
  basePicofarads: number
  /** The least load a cartridge can be given. */
  lowestLoadOhms: number
  boards: BoardView[]
}

function toControlSummary(control: ControlEntry): ControlSummary {
  const labels = control.kind === 'bank' ? [] : control.kind === 'buttons' ? control.buttons : control.positions
  return {
    kind: control.kind,
    label: control.label,
    place: control.place,
    count: control.kind === 'bank' ? control.switchCount : labels.length,
    eachChannel: control.kind === 'bank' || control.kind === 'plugs',
    labels: labels.map(({ label }) => label),
  }
}

function toBoardView(entry: PreampEntry, board: BoardEntry): BoardView {
  return { id: board.id, name: board.name, serials: board.serials, preamp: toPreamp(entry, board) }
}

/** @param entry its boards in order of age */
export function toPreampView(entry: PreampEntry): PreampView {
  const newest = entry.boards[entry.boards.length - 1]
  const takes = (['mm', 'mc'] as const).filter((id) => newest.paths.some((path) => path.id === id))
  return {
    id: entry.id,
    maker: entry.maker,
    name: entry.name,
    technology: entry.technology,
    takes,
    gainDecibels: newest.gains.map(({ gainDecibels }) => gainDecibels.nominal).sort((a, b) => a - b),
    controls: newest.controls.map(toControlSummary),
    baseLoadOhms: newest.paths[0].loadKilohms.nominal * 1000,
    basePicofarads: newest.paths[0].inputPicofarads.nominal,
    lowestLoadOhms: lowestLoadOhms(newest),
    boards: entry.boards.map((board) => toBoardView(entry, board)),
  }
}

/**
 * The board that a serial number belongs to; null when no board has it, or when it is not a whole number.
 * Where only one board exists every number is its own.
 */
export function boardForSerial(preamp: Pick<PreampView, 'boards'>, serial: number): BoardView | null {
  if (!Number.isInteger(serial) || serial < 0) return null
  const holds = ({ from, to }: BoardView['serials']) => (from === null || serial >= from) && (to === null || serial <= to)
  return preamp.boards.find(({ serials }) => holds(serials)) ?? null
}

interface Named {
  id: string
  maker: string
  model: string
  /** Maker and model. */
  name: string
}
const named = ({ id, maker, name: model }: { id: string; maker: string; name: string }): Named => ({
  id,
  maker,
  model,
  name: `${maker} ${model}`,
})

/** A cartridge as its leaflet prints it. A field is null where the leaflet says nothing. */
export interface CartridgeView extends Named {
  type: ListedCartridgeType
  variety: CartridgeVariety | null
  channels: 'stereo' | 'mono'
  pins: CartridgeEntry['pins']
  groove: CartridgeEntry['groove']
  source: string
  outputMillivolts: OutputField | null
  coilOhms: LeafletField | null
  impedanceOhms: LeafletField | null
  inductanceMillihenries: LeafletField | null
  loadOhms: LeafletField | null
  loadPicofarads: CapacitanceField | null
  massGrams: LeafletField | null
  complianceMicrometresPerMillinewton: ComplianceField | null
  trackingForceGrams: LeafletField | null
  stylus: string | null
  notes: string[]
}

export function toCartridgeView(entry: CartridgeEntry): CartridgeView {
  return {
    ...named(entry),
    type: entry.type,
    variety: entry.variety,
    channels: entry.channels,
    pins: entry.pins,
    groove: entry.groove,
    source: entry.source,
    outputMillivolts: entry.outputMillivolts,
    coilOhms: entry.coilOhms,
    impedanceOhms: entry.impedanceOhms,
    inductanceMillihenries: entry.inductanceMillihenries,
    loadOhms: entry.loadOhms,
    loadPicofarads: entry.loadPicofarads,
    massGrams: entry.massGrams,
    complianceMicrometresPerMillinewton: entry.complianceMicrometresPerMillinewton,
    trackingForceGrams: entry.trackingForceGrams,
    stylus: entry.stylus,
    notes: entry.notes,
  }
}

export type ArmView = Named & Pick<ArmEntry, 'effectiveMassGrams' | 'wiringPicofarads' | 'fixedLead' | 'notes'>

export function toArmView(entry: ArmEntry): ArmView {
  const { effectiveMassGrams, wiringPicofarads, fixedLead, notes } = entry
  return { ...named(entry), effectiveMassGrams, wiringPicofarads, fixedLead, notes }
}

export type StepUpView = Named & Pick<StepUpEntry, 'taps' | 'notes'>

export function toStepUpView(entry: StepUpEntry): StepUpView {
  return { ...named(entry), taps: entry.taps, notes: entry.notes }
}

export type LeadView = Named &
  Pick<LeadEntry, 'use' | 'picofaradsPerMetre' | 'notes'> & {
    /** Each length it comes in with its capacitance, null where nothing is printed. */
    lengths: { metres: number; picofarads: Figure | null }[]
  }

export function toLeadView(entry: LeadEntry): LeadView {
  const { use, picofaradsPerMetre, picofaradsWhole, lengthsMetres, notes } = entry
  const ofLength = ({ low, nominal, high, origin }: Figure, metres: number): Figure => ({
    low: low * metres,
    nominal: nominal * metres,
    high: high * metres,
    origin,
  })
  const lengths = lengthsMetres.map((metres) => ({
    metres,
    picofarads: picofaradsWhole ?? (picofaradsPerMetre && ofLength(picofaradsPerMetre, metres)),
  }))
  return { ...named(entry), use, picofaradsPerMetre, lengths, notes }
}

export type InputView = Named & Pick<InputEntry, 'kind' | 'maximumVolts' | 'inputKilohms' | 'takesBalanced' | 'notes'>

export function toInputView(entry: InputEntry): InputView {
  const { kind, maximumVolts, inputKilohms, takesBalanced, notes } = entry
  return { ...named(entry), kind, maximumVolts, inputKilohms, takesBalanced, notes }
}
