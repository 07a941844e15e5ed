import type { CartridgeEntry, LeafletField, PrintedVelocity } from '@/lib/catalogue/schema'

/** Short ways to write a leaflet down as it is printed, with the numbers beside the words. */

type Condition = string | null
const printedField = (printed: string, condition: Condition, ends: Pick<LeafletField, 'low' | 'nominal' | 'high'>): LeafletField => ({
  printed,
  condition,
  origin: 'printed',
  ...ends,
})

export const one = (printed: string, value: number, condition: Condition = null) =>
  printedField(printed, condition, { low: value, nominal: value, high: value })
export const between = (printed: string, low: number, high: number, condition: Condition = null) =>
  printedField(printed, condition, { low, nominal: null, high })
/** A middle with its tolerance, or a range with the value the maker prefers. */
export const around = (printed: string, low: number, nominal: number, high: number, condition: Condition = null) =>
  printedField(printed, condition, { low, nominal, high })
export const atLeast = (printed: string, low: number, condition: Condition = null) =>
  printedField(printed, condition, { low, nominal: null, high: null })
export const atMost = (printed: string, high: number, condition: Condition = null) =>
  printedField(printed, condition, { low: null, nominal: null, high })

type Kind = 'peak' | 'rms'
type Direction = 'lateral' | 'perChannel'
/** An output at a velocity; what is not said of it stays null. */
export const at = (centimetresPerSecond: number, kind: Kind | null = null, direction: Direction | null = null): PrintedVelocity => ({
  form: 'atVelocity',
  centimetresPerSecond,
  kind,
  direction,
})
export const PER_VELOCITY: PrintedVelocity = { form: 'perVelocity' }
export const NO_VELOCITY: PrintedVelocity = { form: 'none' }
export const output = (field: LeafletField, velocity: PrintedVelocity) => ({ ...field, velocity })

export const total = (field: LeafletField) => ({ ...field, means: 'total' as const })
export const preampOnly = (field: LeafletField) => ({ ...field, means: 'preamp-only' as const })
export const notSaid = (field: LeafletField) => ({ ...field, means: 'not-said' as const })

export const dynamic10Hz = (field: LeafletField) => ({ ...field, measured: 'dynamic10Hz' as const })
export const dynamic100Hz = (field: LeafletField) => ({ ...field, measured: 'dynamic100Hz' as const })
export const staticCompliance = (field: LeafletField) => ({ ...field, measured: 'static' as const })
export const conditionNotSaid = (field: LeafletField) => ({ ...field, measured: 'unknown' as const })

export const LOAD_47K = one('47 kΩ', 47_000)

type Given = Pick<CartridgeEntry, 'maker' | 'name' | 'type' | 'source'> & Partial<CartridgeEntry>

/** A leaflet: whatever is not given is not printed on it. */
export function leaflet(given: Given): CartridgeEntry {
  const id = `${given.maker} ${given.name}`.toLowerCase().replace(/[^a-z0-9]+/g, '-').replace(/^-|-$/g, '')
  return {
    id,
    variety: null,
    channels: 'stereo',
    pins: 'separate',
    groove: 'micro',
    outputMillivolts: null,
    coilOhms: null,
    impedanceOhms: null,
    inductanceMillihenries: null,
    loadOhms: null,
    loadPicofarads: null,
    massGrams: null,
    complianceMicrometresPerMillinewton: null,
    trackingForceGrams: null,
    stylus: null,
    notes: [],
    odd: {},
    ...given,
  }
}
