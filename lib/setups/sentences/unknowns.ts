import type { UnknownName } from '../../match/inputs'
import type { NumberField, Step } from '../terms'
import type { Dimension } from '../units'

/** What an owner could find out: what it is called, where it stands, what not to do to get it. */
export interface UnknownWords {
  /** "Output", as a sentence begins. */
  name: string
  /** "the output", in the middle of a sentence. */
  inSentence: string
  /** "the output in mV", to be told. */
  ask: string
  /** Where to read it, and what not to do. */
  read: string
  dimension: Dimension | null
  /** The question that asks for it in a check; null for what only the maker knows. */
  field: NumberField | null
  step: Step | null
  /** Unit beside the box. */
  unit: string
  /** SI size of that unit. */
  size: number
}

const COIL_WARNING = 'Do not measure the coil: a meter can wreck it.'
const WINDING_WARNING = 'Do not measure a winding: a meter can magnetise its core.'

const own = (name: string, dimension: Dimension | null, unit = ''): UnknownWords => ({
  name,
  inSentence: `the ${name.charAt(0).toLowerCase()}${name.slice(1)}`,
  ask: `the ${name.charAt(0).toLowerCase()}${name.slice(1)}`,
  read: 'Only its maker can say.',
  dimension,
  field: null,
  step: null,
  unit,
  size: 1,
})

export const UNKNOWN_WORDS: Record<UnknownName, UnknownWords> = {
  output: {
    name: 'Output',
    inSentence: 'the output',
    ask: 'the output in mV',
    read: `On the leaflet or the box, as "output", in mV at so many cm/s. ${COIL_WARNING}`,
    dimension: 'volts',
    field: 'output',
    step: 'cartridge',
    unit: 'mV',
    size: 1e-3,
  },
  coilResistance: {
    name: 'Coil resistance',
    inSentence: 'the coil resistance',
    ask: 'the coil resistance in Ω',
    read: `On the leaflet, as "DC resistance" or "internal resistance". ${COIL_WARNING}`,
    dimension: 'ohms',
    field: 'coil',
    step: 'cartridge',
    unit: 'Ω',
    size: 1,
  },
  inductance: {
    name: 'Inductance',
    inSentence: 'the inductance',
    ask: 'the inductance in mH',
    read: `On the leaflet, as "inductance" or "coil inductance", in mH. ${COIL_WARNING}`,
    dimension: 'henries',
    field: 'inductance',
    step: 'cartridge',
    unit: 'mH',
    size: 1e-3,
  },
  armWiring: {
    name: 'Arm wiring',
    inSentence: 'the arm wiring',
    ask: 'the capacitance of the arm wiring in pF',
    read: 'In the manual of the arm, as capacitance of the wiring, in pF.',
    dimension: 'farads',
    field: 'armWiring',
    step: 'arm',
    unit: 'pF',
    size: 1e-12,
  },
  lead: {
    name: 'Arm lead',
    inSentence: 'the arm lead',
    ask: 'the capacitance of the arm lead in pF',
    read: "On the lead's packing or its maker's page, in pF, or in pF a metre times its length.",
    dimension: 'farads',
    field: 'lead',
    step: 'arm',
    unit: 'pF',
    size: 1e-12,
  },
  stepUpRatio: {
    name: 'Ratio of the step-up',
    inSentence: 'the ratio of the step-up',
    ask: 'the ratio of the step-up',
    read: `On the transformer, as 1:10 or as gain in dB. ${WINDING_WARNING}`,
    dimension: null,
    field: 'ratio',
    step: 'arm',
    unit: '',
    size: 1,
  },
  stepUpPrimary: {
    name: 'Primary winding',
    inSentence: 'the primary winding',
    ask: 'the resistance of the primary winding in Ω',
    read: `On the transformer's leaflet, as DC resistance. ${WINDING_WARNING}`,
    dimension: 'ohms',
    field: 'primaryCoil',
    step: 'arm',
    unit: 'Ω',
    size: 1,
  },
  stepUpSecondary: {
    name: 'Secondary winding',
    inSentence: 'the secondary winding',
    ask: 'the resistance of the secondary winding in Ω',
    read: `On the transformer's leaflet, as DC resistance. ${WINDING_WARNING}`,
    dimension: 'ohms',
    field: 'secondaryCoil',
    step: 'arm',
    unit: 'Ω',
    size: 1,
  },
  stepUpCapacitance: {
    name: 'Lead after the step-up',
    inSentence: 'the lead after the step-up',
    ask: 'the capacitance of the lead after the step-up in pF',
    read: "On the lead's packing, in pF, or in pF a metre times its length.",
    dimension: 'farads',
    field: 'stepUpLead',
    step: 'arm',
    unit: 'pF',
    size: 1e-12,
  },
  stepUpInductance: {
    name: 'Primary inductance',
    inSentence: 'the primary inductance',
    ask: 'the primary inductance in H',
    read: `On the transformer's leaflet, in H. ${WINDING_WARNING}`,
    dimension: 'henries',
    field: 'primaryInductance',
    step: 'arm',
    unit: 'H',
    size: 1,
  },
  nextMaximum: {
    name: 'What the next input takes',
    inSentence: 'what the next input takes',
    ask: 'how many volts the next input takes',
    read: 'In its manual, as "maximum input" or "input overload", in V RMS.',
    dimension: 'volts',
    field: 'nextMax',
    step: 'plays-into',
    unit: 'V',
    size: 1,
  },
  nextResistance: {
    name: 'Next input, resistance',
    inSentence: 'the resistance of the next input',
    ask: 'the resistance of the next input in kΩ',
    read: 'In its manual, as "input impedance", in kΩ.',
    dimension: 'ohms',
    field: 'nextLoad',
    step: 'plays-into',
    unit: 'kΩ',
    size: 1e3,
  },
  cable: {
    name: 'Cable after the preamp',
    inSentence: 'the cable after the preamp',
    ask: 'the capacitance of the cable after the preamp in pF',
    read: "On the cable's packing or its maker's page, in pF, or in pF a metre times its length.",
    dimension: 'farads',
    field: 'cable',
    step: 'plays-into',
    unit: 'pF',
    size: 1e-12,
  },
  armMass: {
    name: 'Effective mass of the arm',
    inSentence: 'the effective mass of the arm',
    ask: 'the effective mass of the arm in g',
    read: 'In the manual of the arm, as "effective mass", in g. A kitchen scale cannot tell it.',
    dimension: 'grams',
    field: 'armMass',
    step: 'arm',
    unit: 'g',
    size: 1e-3,
  },
  cartridgeMass: {
    name: 'Weight of the cartridge',
    inSentence: 'the weight of the cartridge',
    ask: 'the weight of the cartridge in g',
    read: 'On the leaflet, as "weight" or "mass", in g.',
    dimension: 'grams',
    field: 'mass',
    step: 'cartridge',
    unit: 'g',
    size: 1e-3,
  },
  fixings: {
    name: 'Screws and nuts',
    inSentence: 'the weight of the screws and nuts',
    ask: 'the weight of the screws and nuts in g',
    read: 'Weigh them before they go in; together they are about a gram.',
    dimension: 'grams',
    field: 'fixings',
    step: 'arm',
    unit: 'g',
    size: 1e-3,
  },
  compliance: {
    name: 'Compliance',
    inSentence: 'the compliance',
    ask: 'the compliance in µm/mN',
    read: 'On the leaflet, as "compliance", in µm/mN or cu, at 10 Hz, at 100 Hz or static.',
    dimension: 'compliance',
    field: 'compliance',
    step: 'cartridge',
    unit: 'µm/mN',
    size: 1e-3,
  },
  inputLoad: own('Load inside the preamp', 'ohms', 'Ω'),
  inputCapacitance: own('Capacitance inside the preamp', 'farads', 'pF'),
  gain: own('Gain', 'decibels', 'dB'),
  voltageNoise: own('Voltage noise', null),
  currentNoise: own('Current noise', null),
  maximumOutput: own('Most that comes out', 'volts', 'V'),
  outputResistance: own('Output resistance', 'ohms', 'Ω'),
  couplingCapacitor: own('Coupling capacitor', 'farads', 'µF'),
}

/** A value of the unknown in the base unit of its dimension: grams and µm/mN stand in the thousandth of SI. */
export function inDimension(unknown: UnknownName, si: number): number {
  const { dimension } = UNKNOWN_WORDS[unknown]
  return dimension === 'grams' || dimension === 'compliance' ? si * 1e3 : si
}

/** A value of the unknown in the unit beside its box. */
export function inDisplayUnit(unknown: UnknownName, si: number): number {
  return si / UNKNOWN_WORDS[unknown].size
}
