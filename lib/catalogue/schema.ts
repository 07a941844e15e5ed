import { z } from 'zod'
import { ORIGINS } from '../match/quantity'
import {
  CAPACITANCE_MEANINGS,
  CARTRIDGE_VARIETIES,
  COMPLIANCE_CONDITIONS,
  GROOVES,
  INPUT_KINDS,
  LEAD_USES,
  LISTED_CARTRIDGE_TYPES,
  PIN_ARRANGEMENTS,
  VELOCITY_DIRECTIONS,
  VELOCITY_KINDS,
} from './terms'

/** The same schemas read the shipped content, the database and every later edit. Units stand in the names. */

export const EntryId = z.string().regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, 'An id is small letters, digits and single hyphens.')
export const Words = z.string().trim().min(1, 'Say something here.').max(200)
const amount = z.number('Give a number.').nonnegative('This cannot be below zero.')

/** True when the numbers given do not fall. Nulls are skipped. */
const rising = (numbers: (number | null | undefined)[]) => {
  const known = numbers.filter((number) => typeof number === 'number')
  return known.every((number, i) => i === 0 || known[i - 1] <= number)
}

/** A value with its tolerance and where it came from, in the unit that the key names. */
export const Figure = z
  .strictObject({
    low: amount,
    nominal: amount,
    high: amount,
    origin: z.enum(ORIGINS),
    /** The maker's own text where it says more than the number. */
    printed: Words.optional(),
  })
  .refine(({ low, nominal, high }) => rising([low, nominal, high]), 'Lowest, middle and highest must not fall.')
export type Figure = z.infer<typeof Figure>

/** A figure that is above zero at every end: no ratio, gain or limit is nothing. */
export const PositiveFigure = Figure.refine(({ low }) => low > 0, 'This is always above zero.')

const leafletShape = {
  /** Word for word, unit included. */
  printed: Words,
  /** What the leaflet says beside it: frequency, velocity, temperature. */
  condition: Words.nullable(),
  origin: z.enum(ORIGINS),
  /** Null is an open end: "100 Ω or more" has no highest. */
  low: amount.nullable(),
  /** The middle, where the leaflet names one. */
  nominal: amount.nullable(),
  high: amount.nullable(),
}
const hasEnds = (field: { low: number | null; high: number | null }) => field.low !== null || field.high !== null
const inOrder = (field: { low: number | null; nominal: number | null; high: number | null }) =>
  rising([field.low, field.nominal, field.high])
const NEEDS_END = 'Give the lower end, the upper end, or both.'
const MUST_RISE = 'The second value is lower than the first.'

/** One line of a leaflet, as printed and as numbers. */
export const LeafletField = z.strictObject(leafletShape).refine(hasEnds, NEEDS_END).refine(inOrder, MUST_RISE)
export type LeafletField = z.infer<typeof LeafletField>

/** What the leaflet says of the velocity behind its output. Null where it leaves a word out. */
export const PrintedVelocity = z.discriminatedUnion('form', [
  z.strictObject({
    form: z.literal('atVelocity'),
    centimetresPerSecond: z.number().positive(),
    kind: z.enum(VELOCITY_KINDS).nullable(),
    direction: z.enum(VELOCITY_DIRECTIONS).nullable(),
  }),
  z.strictObject({ form: z.literal('perVelocity') }),
  z.strictObject({ form: z.literal('none') }),
])
export type PrintedVelocity = z.infer<typeof PrintedVelocity>

export const OutputField = z
  .strictObject({ ...leafletShape, velocity: PrintedVelocity })
  .refine(hasEnds, NEEDS_END)
  .refine(inOrder, MUST_RISE)
export type OutputField = z.infer<typeof OutputField>
export const CapacitanceField = z
  .strictObject({ ...leafletShape, means: z.enum(CAPACITANCE_MEANINGS) })
  .refine(hasEnds, NEEDS_END)
  .refine(inOrder, MUST_RISE)
export type CapacitanceField = z.infer<typeof CapacitanceField>
export const ComplianceField = z
  .strictObject({ ...leafletShape, measured: z.enum(COMPLIANCE_CONDITIONS) })
  .refine(hasEnds, NEEDS_END)
  .refine(inOrder, MUST_RISE)
export type ComplianceField = z.infer<typeof ComplianceField>

/** Leaflet lines that are held against what is usual for the type. */
export const HELD_FIELDS = ['outputMillivolts', 'coilOhms', 'inductanceMillihenries', 'loadOhms', 'loadPicofarads'] as const

export const CartridgeEntry = z.strictObject({
  id: EntryId,
  maker: Words,
  name: Words,
  type: z.enum(LISTED_CARTRIDGE_TYPES),
  variety: z.enum(CARTRIDGE_VARIETIES).nullable(),
  channels: z.enum(['stereo', 'mono']),
  pins: z.enum(PIN_ARRANGEMENTS),
  groove: z.enum(GROOVES),
  /** What the figures were taken from, such as "Leaflet, 2014". */
  source: Words,
  outputMillivolts: OutputField.nullable(),
  coilOhms: LeafletField.nullable(),
  /** Impedance at a frequency. For magnets and irons it is not the coil's resistance and must not stand in for it. */
  impedanceOhms: LeafletField.nullable(),
  inductanceMillihenries: LeafletField.nullable(),
  loadOhms: LeafletField.nullable(),
  loadPicofarads: CapacitanceField.nullable(),
  massGrams: LeafletField.nullable(),
  complianceMicrometresPerMillinewton: ComplianceField.nullable(),
  trackingForceGrams: LeafletField.nullable(),
  stylus: Words.nullable(),
  /** Sentences the leaflet adds that a check cannot compute with. */
  notes: z.array(Words),
  /** Why a figure lies outside what is usual for the type, by its field. */
  odd: z.partialRecord(z.enum(HELD_FIELDS), Words),
})
export type CartridgeEntry = z.infer<typeof CartridgeEntry>

export const ArmEntry = z.strictObject({
  id: EntryId,
  maker: Words,
  name: Words,
  effectiveMassGrams: PositiveFigure.nullable(),
  /** Wire inside the arm, up to its socket. */
  wiringPicofarads: Figure.nullable(),
  /** A lead that cannot be taken off; null where the owner chooses one. */
  fixedLead: z.strictObject({ lengthMetres: z.number().positive(), picofarads: Figure.nullable() }).nullable(),
  notes: z.array(Words),
})
export type ArmEntry = z.infer<typeof ArmEntry>

/** One way to wire a transformer. Ratio is secondary over primary turns. */
export const StepUpTap = z.strictObject({
  id: EntryId,
  /** What stands on its switch or socket. */
  label: Words,
  ratio: PositiveFigure,
  primaryOhms: Figure.nullable(),
  secondaryOhms: Figure.nullable(),
  primaryHenries: PositiveFigure.nullable(),
  secondaryPicofarads: Figure.nullable(),
})
export type StepUpTap = z.infer<typeof StepUpTap>

export const StepUpEntry = z
  .strictObject({ id: EntryId, maker: Words, name: Words, taps: z.array(StepUpTap).min(1), notes: z.array(Words) })
  .refine(({ taps }) => new Set(taps.map((tap) => tap.id)).size === taps.length, {
    path: ['taps'],
    message: 'Two taps have the same id.',
  })
export type StepUpEntry = z.infer<typeof StepUpEntry>

export const LeadEntry = z
  .strictObject({
    id: EntryId,
    maker: Words,
    name: Words,
    use: z.enum(LEAD_USES),
    picofaradsPerMetre: PositiveFigure.nullable(),
    /** Capacitance of a whole lead of the one length, where the maker gives that instead. */
    picofaradsWhole: PositiveFigure.nullable(),
    lengthsMetres: z.array(z.number().positive()).min(1),
    notes: z.array(Words),
  })
  .refine((lead) => lead.picofaradsPerMetre === null || lead.picofaradsWhole === null, {
    path: ['picofaradsWhole'],
    message: 'Give the capacitance per metre or of the whole lead, not both.',
  })
  .refine((lead) => lead.picofaradsWhole === null || lead.lengthsMetres.length === 1, {
    path: ['lengthsMetres'],
    message: 'A capacitance of the whole lead belongs to one length.',
  })
export type LeadEntry = z.infer<typeof LeadEntry>

export const InputEntry = z.strictObject({
  id: EntryId,
  maker: Words,
  name: Words,
  kind: z.enum(INPUT_KINDS),
  /** Volts RMS at which it distorts. */
  maximumVolts: PositiveFigure.nullable(),
  inputKilohms: PositiveFigure.nullable(),
  takesBalanced: z.boolean(),
  notes: z.array(Words),
})
export type InputEntry = z.infer<typeof InputEntry>
