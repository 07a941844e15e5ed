import type { Positions } from './controls'
import type { Preamp, StepUp } from './preamp'
import type { Quantity } from './quantity'

export const CARTRIDGE_TYPES = [
  'moving-magnet',
  'moving-iron',
  'moving-coil',
  'ceramic',
  'strain-gauge',
  'optical',
  'unknown',
] as const
export type CartridgeType = (typeof CARTRIDGE_TYPES)[number]

/** The cartridge. `outputVolts` is already at the reference level (5 cm/s peak lateral, 1 kHz, RMS, one channel). */
export interface Cartridge {
  name: string
  type: CartridgeType
  outputVolts: Quantity
  coilOhms: Quantity
  coilHenries: Quantity
  /** The maker's recommended load, null where none is printed; high is null for "100 Ω or more". */
  recommendedLoadOhms: { low: number; high: number | null } | null
  /** The maker's recommended total capacitance, null where none is printed. */
  recommendedFarads: { low: number; high: number } | null
  massKilograms: Quantity
  /** Dynamic compliance at 10 Hz, metres per newton (1 µm/mN is 1e-3 m/N). */
  complianceMetresPerNewton: Quantity
  trackingForceNewtons: Quantity | null
  channels: 'stereo' | 'mono'
}

/** The arm, its wire and the lead to the preamp. `farads` is arm wiring and lead together. */
export interface ArmAndLead {
  effectiveMassKilograms: Quantity
  fixingsKilograms: Quantity
  wiringFarads: Quantity
  leadFarads: Quantity
}

/** What the preamp plays into. Parallel loads (a second amplifier, a recorder) are already combined in `inputOhms`. */
export interface NextInput {
  kind: 'line' | 'digital' | 'recorder' | 'headphones' | 'phono' | 'unknown'
  name: string
  /** Volts RMS at which it distorts. */
  maximumVolts: Quantity
  inputOhms: Quantity
  cableFarads: Quantity
}

/** Everything that one check rests on. Pure data: it is stored with each sheet. */
export interface MatchInputs {
  preamp: Preamp
  /** How the unit stands now; null when not known. */
  present: Positions | null
  cartridge: Cartridge
  arm: ArmAndLead
  /** The owner's own transformer between arm and preamp. */
  stepUp: StepUp | null
  output: 'unbalanced' | 'balanced'
  next: NextInput
  /** Wished nominal output, volts RMS; null is the usual 300 to 1000 mV. */
  wishedVolts: { low: number; high: number } | null
  temperatureKelvin: number
}

/** The parts of the inputs that carry doubt, by name. Order is the order of the signal. */
export const UNKNOWNS = [
  'output',
  'coilResistance',
  'inductance',
  'armWiring',
  'lead',
  'stepUpRatio',
  'stepUpPrimary',
  'stepUpSecondary',
  'stepUpCapacitance',
  'stepUpInductance',
  'inputLoad',
  'inputCapacitance',
  'gain',
  'voltageNoise',
  'currentNoise',
  'maximumOutput',
  'outputResistance',
  'couplingCapacitor',
  'nextMaximum',
  'nextResistance',
  'cable',
  'armMass',
  'cartridgeMass',
  'fixings',
  'compliance',
] as const
export type UnknownName = (typeof UNKNOWNS)[number]
