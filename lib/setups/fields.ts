import type { CartridgeChoice, NumberField } from './terms'
import type { Dimension, Unit } from './units'

/**
 * What each value is: its unit, where it plausibly lies, and how a slip of the pen is put into words.
 * Limits only catch slips; the usual values are those of `lib/match/typical.ts` in round numbers. Both are common
 * practice, no source, unless the engine's table names one.
 */
export interface FieldSpec {
  dimension: Dimension
  /** Unit of the figures, and the sign printed in the box. */
  unit: Unit
  /** Unit of a number written without one, where that depends on the type. */
  bare?: (type: CartridgeChoice) => Unit
  /** As a sentence begins. */
  noun: string
  /** Beyond these it is a slip, in `unit`. */
  limits: (type: CartridgeChoice) => [number, number]
  usual: (type: CartridgeChoice) => [number, number]
  /** "Most moving magnets are …" */
  most: (type: CartridgeChoice) => string
  /** After "4.5 V would be a thousand times": too much, too little. */
  slip: (type: CartridgeChoice) => [string, string]
  verb: 'would be' | 'is' | 'would press'
  opens?: 'above' | 'below'
  zero?: boolean
}

const ONE_OF: Record<CartridgeChoice, string> = {
  'moving-magnet': 'a moving magnet',
  'moving-iron': 'a moving iron',
  'moving-coil': 'a moving coil',
  other: 'a cartridge',
  unknown: 'a cartridge',
}
const MANY_OF: Record<CartridgeChoice, string> = {
  'moving-magnet': 'moving magnets',
  'moving-iron': 'moving irons',
  'moving-coil': 'moving coils',
  other: 'cartridges',
  unknown: 'cartridges',
}
export const oneOf = (type: CartridgeChoice) => ONE_OF[type]

type ByType = { magnet: [number, number]; iron?: [number, number]; coil: [number, number]; any: [number, number] }
const byType = (table: ByType) => (type: CartridgeChoice): [number, number] => {
  if (type === 'moving-magnet') return table.magnet
  if (type === 'moving-iron') return table.iron ?? table.magnet
  return type === 'moving-coil' ? table.coil : table.any
}
const always = (low: number, high: number) => (): [number, number] => [low, high]
const most = (things: string) => () => `Most ${things} are`
const mostOfType = (type: CartridgeChoice) => `Most ${MANY_OF[type]} are`
const much = (thing: string) => (): [string, string] => [`too much for ${thing}`, `too little for ${thing}`]
const muchForType = (type: CartridgeChoice): [string, string] => [
  `too much for ${ONE_OF[type]}`,
  `too little for ${ONE_OF[type]}`,
]
const isMagnet = (type: CartridgeChoice) => type === 'moving-magnet' || type === 'moving-iron'

const lead = (noun: string, things: string, thing: string): FieldSpec => ({
  dimension: 'farads',
  unit: 'pf',
  noun,
  limits: always(1, 3000),
  usual: always(50, 500),
  most: most(things),
  slip: much(thing),
  verb: 'is',
})
const input = (noun: string): FieldSpec => ({
  dimension: 'ohms',
  unit: 'kohm',
  noun,
  limits: always(0.2, 5000),
  usual: always(10, 100),
  most: most('inputs'),
  slip: much('an input'),
  verb: 'is',
})
const length = (noun: string, limit: number): FieldSpec => ({
  dimension: 'metres',
  unit: 'm',
  noun,
  limits: always(0.1, limit),
  usual: always(0.3, limit / 5),
  most: most('leads'),
  slip: () => ['too long', 'too short'],
  verb: 'is',
})
const perMetre: FieldSpec = {
  dimension: 'faradsPerMetre',
  unit: 'pf/m',
  noun: 'Capacitance of a metre',
  limits: always(15, 1200),
  usual: always(60, 150),
  most: most('leads'),
  slip: much('a metre of lead'),
  verb: 'is',
}
const winding = (noun: string, limits: [number, number], usual: [number, number]): FieldSpec => ({
  dimension: 'ohms',
  unit: 'ohm',
  noun,
  limits: always(...limits),
  usual: always(...usual),
  most: most('windings of this kind'),
  slip: much('a winding'),
  verb: 'is',
})
const weight = (noun: string, things: string, thing: string, limits: [number, number], usual: [number, number]): FieldSpec => ({
  dimension: 'grams',
  unit: 'g',
  noun,
  limits: always(...limits),
  usual: always(...usual),
  most: most(things),
  slip: () => [`too heavy for ${thing}`, `too light for ${thing}`],
  verb: 'is',
})

export const FIELDS: Record<Exclude<NumberField, 'ratio'>, FieldSpec> = {
  output: {
    dimension: 'volts',
    unit: 'mv',
    noun: 'Output',
    limits: always(0.02, 20),
    usual: byType({ magnet: [2, 8], iron: [2, 6], coil: [0.1, 2.5], any: [0.1, 8] }),
    most: mostOfType,
    slip: () => ['too strong for a cartridge', 'too weak for a cartridge'],
    verb: 'would be',
  },
  coil: {
    dimension: 'ohms',
    unit: 'ohm',
    noun: 'Coil resistance',
    limits: byType({ magnet: [30, 2500], coil: [0.5, 1000], any: [0.5, 2500] }),
    usual: byType({ magnet: [400, 1500], iron: [300, 1000], coil: [2, 200], any: [2, 1500] }),
    most: mostOfType,
    slip: muchForType,
    verb: 'is',
  },
  inductance: {
    dimension: 'henries',
    unit: 'mh',
    noun: 'Inductance',
    limits: byType({ magnet: [20, 2500], iron: [5, 1500], coil: [0.0005, 20], any: [0.0005, 2500] }),
    usual: byType({ magnet: [200, 900], iron: [30, 550], coil: [0.002, 2], any: [0.002, 900] }),
    most: mostOfType,
    slip: muchForType,
    verb: 'is',
  },
  load: {
    dimension: 'ohms',
    unit: 'ohm',
    bare: (type) => (isMagnet(type) ? 'kohm' : 'ohm'),
    noun: 'A load',
    limits: byType({ magnet: [500, 1e6], coil: [1, 1e6], any: [1, 1e6] }),
    usual: byType({ magnet: [22e3, 100e3], coil: [10, 47e3], any: [10, 100e3] }),
    most: (type) => `Most loads for ${MANY_OF[type]} are`,
    slip: muchForType,
    verb: 'is',
    opens: 'above',
  },
  capacitance: { ...lead('Capacitance', 'ranges that makers print', 'a cartridge'), usual: always(100, 500), opens: 'below' },
  mass: weight('Mass', 'cartridges', 'a cartridge', [1, 45], [4, 12]),
  compliance: {
    dimension: 'compliance',
    unit: 'cu',
    noun: 'Compliance',
    limits: always(1.5, 70),
    usual: always(5, 35),
    most: most('cartridges'),
    slip: much('a cartridge'),
    verb: 'is',
  },
  force: {
    dimension: 'force',
    unit: 'g',
    noun: 'Tracking force',
    limits: always(0.3, 10),
    usual: always(0.75, 5),
    most: most('tracking forces'),
    slip: () => ['too hard on the record', 'too lightly to stay in the groove'],
    verb: 'would press',
  },
  armMass: weight('Effective mass', 'arms', 'an arm', [1.5, 60], [5, 30]),
  armWiring: { ...lead('Arm wiring', 'arms', 'the wire in an arm'), usual: always(10, 40) },
  fixings: { ...weight('Weight of the fixings', 'sets of screws', 'screws and nuts', [0, 15], [0.5, 1.5]), zero: true },
  primaryCoil: winding('Primary winding', [0.02, 300], [0.5, 40]),
  secondaryCoil: winding('Secondary winding', [1, 20_000], [50, 3000]),
  primaryInductance: {
    dimension: 'henries',
    unit: 'h',
    noun: 'Primary inductance',
    limits: always(0.005, 200),
    usual: always(0.05, 20),
    most: most('primary inductances'),
    slip: much('a primary winding'),
    verb: 'is',
  },
  stepUpLead: lead('Capacitance', 'leads', 'a lead'),
  nextMax: {
    dimension: 'volts',
    unit: 'v',
    noun: 'The most it takes',
    limits: always(0.02, 60),
    usual: always(1, 12),
    most: most('line inputs'),
    slip: much('an input'),
    verb: 'is',
  },
  nextLoad: input('Input resistance'),
  velocityOther: {
    dimension: 'velocity',
    unit: 'cm/s',
    noun: 'Groove speed',
    limits: always(0.5, 40),
    usual: always(1, 12),
    most: most('printed speeds'),
    slip: () => ['too fast for a record', 'too slow for a record'],
    verb: 'is',
  },
  lead: lead('Capacitance', 'arm leads', 'an arm lead'),
  leadMetres: length('Length', 15),
  leadPerMetre: perMetre,
  cable: { ...lead('Capacitance', 'cables', 'a cable'), limits: always(1, 50_000), usual: always(60, 2000) },
  cableMetres: length('Length', 100),
  cablePerMetre: perMetre,
  alsoAmplifier: input('Input resistance'),
  alsoRecorder: input('Input resistance'),
  alsoSubwoofer: input('Input resistance'),
  wish: {
    dimension: 'volts',
    unit: 'mv',
    noun: 'The level you wish for',
    limits: always(20, 5000),
    usual: always(100, 2000),
    most: most('amplifiers at home in'),
    slip: () => ['too much for a line input', 'too little for a line input'],
    verb: 'is',
  },
}
