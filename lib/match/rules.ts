import type { Weight } from './result'

/**
 * The thresholds of every judgement, in one place, with their reasons. Changing one here raises `RULES_VERSION`,
 * so that an older sheet can be shown as it was and computed anew. Unless a line names a source, the value is
 * common practice, no source.
 */
export const RULES_VERSION = 1
export const ENGINE_VERSION = '1.0.0'

/** Worst case first: the value at which each weight begins. The figure is better the higher it is. */
interface AtLeast {
  fine: number
  worthKnowing: number
  limit: number
  reason: string
}

/** The figure is better inside; each weight has its own inner band. */
interface Inside {
  fine: [number, number]
  worthKnowing: [number, number]
  limit: [number, number]
  reason: string
}

export const AT_LEAST = {
  overloadMarginDecibels: {
    fine: 26,
    worthKnowing: 20,
    limit: 14,
    reason: 'Records peak up to 20 dB over 5 cm/s; below 14 dB ordinary loud passages distort.',
  },
  worstMarginDecibels: {
    fine: 3,
    worthKnowing: 0,
    limit: -3,
    reason: 'Room above the loud envelope at the frequency where it is tightest.',
  },
  nextMarginDecibels: {
    fine: 6,
    worthKnowing: 0,
    limit: -6,
    reason: 'Peaks of loud records against the next input; clicks go higher still.',
  },
  loadRatio: {
    fine: 8,
    worthKnowing: 4,
    limit: 2,
    reason: 'A load of 10, 5, 2 times the coil costs 0.8, 1.6, 3.5 dB of level.',
  },
  snrWeightedDecibels: {
    fine: 70,
    worthKnowing: 64,
    limit: 58,
    reason: 'The groove itself lies some 58 dB under 5 cm/s.',
  },
  cableLossAt20kHzDecibels: {
    fine: -0.5,
    worthKnowing: -1.5,
    limit: -3,
    reason: 'Loss of treble in the cable after a high output resistance.',
  },
} as const satisfies Record<string, AtLeast>

export const INSIDE = {
  outputVolts: {
    fine: [0.3, 1],
    worthKnowing: [0.15, 1.5],
    limit: [0.08, 2],
    reason: 'Amplifiers reach full power from 100 to 500 mV; above 2 V most line inputs run out on peaks.',
  },
  treble: {
    fine: [-1.5, 1.5],
    worthKnowing: [-3, 3],
    limit: [-5, 5],
    reason: 'Tilt of the electrical response between 1 and 15 kHz, where no capacitance range is printed.',
  },
  armResonanceHertz: {
    fine: [8, 12],
    worthKnowing: [7, 14],
    limit: [5.5, 17],
    reason: 'Above warps, below music. Sources say 8 to 10, 8 to 12, 7 to 12.',
  },
} as const satisfies Record<string, Inside>

/** Total capacitance against the printed range: how far outside each weight begins, farads. */
export const CAPACITANCE_OUTSIDE_FARADS = { worthKnowing: 50e-12, limit: 150e-12 }

/**
 * Load against the maker's range, as a ratio to its nearer end. A load somewhat off costs level or damping;
 * one far below it takes level and treble from a magnet coil.
 */
export const LOAD_OUTSIDE_RATIO = { inside: 1.12, worthKnowing: 1.6, limit: 3 }

/** A bass corner below this is not heard; above it costs bass. Hertz. */
export const BASS_CORNER_HERTZ = { fine: 8, worthKnowing: 16, limit: 30 }

/** Inputs whose whole load is assumed where a magnet's leaflet prints none: the standard 47 kΩ. */
export const STANDARD_MAGNET_LOAD_OHMS = { low: 44_000, high: 50_000 }

/**
 * Share of the doubt that may go against a statement before the statement falls. One in ten: the draws crowd at
 * the ends of each range, so this is the outermost few per cent of a single unknown.
 */
export const SHARE_THAT_COUNTS = 0.1

/** Least S/N the groove itself gives, re 5 cm/s peak, A-weighted. Practical value, memory. */
export const GROOVE_NOISE_DECIBELS = 58

export const WEIGHT_ORDER: Record<Weight, number> = { fine: 0, 'worth-knowing': 1, limit: 2, 'rules-it-out': 3 }
const BY_ORDER: Weight[] = ['fine', 'worth-knowing', 'limit', 'rules-it-out']
export const weightOf = (order: number): Weight => BY_ORDER[order]

/** 0 fine to 3 rules it out, for a figure that is better the higher it is. */
export function orderAtLeast(value: number, rule: Omit<AtLeast, 'reason'>): number {
  if (value >= rule.fine) return 0
  if (value >= rule.worthKnowing) return 1
  return value >= rule.limit ? 2 : 3
}

/** 0 fine to 3 rules it out, for a figure that belongs inside a band. */
export function orderInside(value: number, rule: { [K in 'fine' | 'worthKnowing' | 'limit']: readonly [number, number] }): number {
  if (value >= rule.fine[0] && value <= rule.fine[1]) return 0
  if (value >= rule.worthKnowing[0] && value <= rule.worthKnowing[1]) return 1
  return value >= rule.limit[0] && value <= rule.limit[1] ? 2 : 3
}
