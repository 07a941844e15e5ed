/** Units as people write them, and how figures are written back. Texts are lower case with μ for micro. */

const PER_FOOT = 1 / 0.3048

const UNITS = {
  volts: { v: 1, volt: 1, volts: 1, mv: 1e-3, μv: 1e-6, uv: 1e-6 },
  ohms: { ohm: 1, r: 1, o: 1, k: 1e3, kohm: 1e3, kr: 1e3, m: 1e6, mohm: 1e6, megohm: 1e6 },
  henries: { h: 1, mh: 1e-3, μh: 1e-6, uh: 1e-6 },
  farads: { pf: 1e-12, p: 1e-12, uuf: 1e-12, μμf: 1e-12, nf: 1e-9, n: 1e-9, μf: 1e-6, uf: 1e-6 },
  grams: { g: 1, gr: 1, gram: 1, grams: 1, kg: 1e3, mg: 1e-3 },
  /** Newtons; a gram-force is 9.80665 mN. */
  force: { g: 9.80665e-3, gr: 9.80665e-3, gf: 9.80665e-3, p: 9.80665e-3, pond: 9.80665e-3, gram: 9.80665e-3, grams: 9.80665e-3, mn: 1e-3, cn: 1e-2 },
  /** Micrometres per millinewton. */
  compliance: { cu: 1, 'μm/mn': 1, 'um/mn': 1, 'mm/n': 1 },
  metres: { m: 1, metre: 1, metres: 1, meter: 1, meters: 1, cm: 1e-2, mm: 1e-3, ft: 0.3048, feet: 0.3048 },
  faradsPerMetre: { 'pf/m': 1e-12, pf: 1e-12, 'pf/metre': 1e-12, 'pf/meter': 1e-12, 'pf/ft': 1e-12 * PER_FOOT, 'pf/foot': 1e-12 * PER_FOOT },
  /** Metres a second. */
  velocity: { 'cm/s': 1e-2, 'cm/sec': 1e-2, 'mm/s': 1e-3, 'm/s': 1 },
  decibels: { db: 1 },
} as const satisfies Record<string, Record<string, number>>

export type Dimension = keyof typeof UNITS
export type Unit = string

/** Size of a unit in the dimension's base. @returns null for a unit that this dimension does not have */
export function factorOf(dimension: Dimension, unit: Unit): number | null {
  const units: Record<string, number> = UNITS[dimension]
  return Object.hasOwn(units, unit) ? units[unit] : null
}

/** Steps of each written unit, smallest first: from that many base units on, this unit is used. */
const WRITTEN: Record<Dimension, [from: number, unit: string, size: number][]> = {
  volts: [
    [0, 'µV', 1e-6],
    [0.1e-3, 'mV', 1e-3],
    [1, 'V', 1],
  ],
  ohms: [
    [0, 'Ω', 1],
    [1e3, 'kΩ', 1e3],
    [1e6, 'MΩ', 1e6],
  ],
  henries: [
    [0, 'µH', 1e-6],
    [1e-3, 'mH', 1e-3],
    [1, 'H', 1],
  ],
  farads: [
    [0, 'pF', 1e-12],
    [1e-8, 'nF', 1e-9],
  ],
  grams: [[0, 'g', 1]],
  force: [[0, 'g', 9.80665e-3]],
  compliance: [[0, 'µm/mN', 1]],
  metres: [[0, 'm', 1]],
  faradsPerMetre: [[0, 'pF/m', 1e-12]],
  velocity: [[0, 'cm/s', 1e-2]],
  decibels: [[0, 'dB', 1]],
}

/** The sign of a unit of that size, where one is in use. */
export function unitSign(size: number, dimension: Dimension): string | null {
  if (dimension === 'force' && size === 1e-3) return 'mN'
  return WRITTEN[dimension].find(([, , s]) => Math.abs(s / size - 1) < 1e-9)?.[1] ?? null
}

function writtenUnit(base: number, dimension: Dimension): { unit: string; size: number } {
  const [, unit, size] = [...WRITTEN[dimension]].reverse().find(([from]) => base * (1 + 1e-9) >= from) ?? WRITTEN[dimension][0]
  return { unit, size }
}

/** At most three figures, four where a thousand is reached, no trailing zeros. */
export function shortNumber(value: number): string {
  return String(Number(value.toPrecision(Math.abs(value) >= 1000 ? 4 : 3)))
}

/** A figure with the unit that a person would choose. `base` in volts, ohms, henries, farads, grams, newtons… */
export function written(base: number, dimension: Dimension): string {
  const { unit, size } = writtenUnit(base, dimension)
  return `${shortNumber(base / size)} ${unit}`
}

/** "400 to 550 mH", "0.9 to 1.2 H", "100 Ω or more", "up to 500 pF", or one value. */
export function writtenRange(low: number, high: number, dimension: Dimension): string {
  if (high === Infinity) return `${written(low, dimension)} or more`
  if (low === 0) return `up to ${written(high, dimension)}`
  const { unit, size } = writtenUnit(high, dimension)
  const [a, b] = [shortNumber(low / size), shortNumber(high / size)]
  if (a === b) return written(high, dimension)
  const own = writtenUnit(low, dimension)
  return own.unit === unit || low / size >= 0.5 ? `${a} to ${b} ${unit}` : `${written(low, dimension)} to ${b} ${unit}`
}
