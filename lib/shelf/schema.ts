import { z } from 'zod'
import { answersFrom } from '../setups/schema'
import { MAX_ANSWER_LENGTH } from '../setups/terms'
import {
  MAX_NOTES_LENGTH,
  MAX_SERIAL_LENGTH,
  MAX_SHEET_SEARCH_LENGTH,
  MAX_SHELF_NAME_LENGTH,
  MAX_SHOP_LENGTH,
  MAX_STYLUS_HOURS,
  SECOND_HANDS,
  SHEETS_SHOWN,
  SHEET_ORDERS,
} from './terms'

const id = z.string().min(1).max(60)
const oneLine = (most: number) =>
  z
    .string()
    .trim()
    .max(most, `Use no more than ${most} characters.`)
    .regex(/^\P{Cc}*$/u, 'Write it on one line.')
    .default('')
const notes = z.string().trim().max(MAX_NOTES_LENGTH, `Use no more than ${MAX_NOTES_LENGTH} characters.`).default('')
const ticked = z.literal('yes').optional()
const number = z.coerce.number().int().positive()

const HOURS = 'Write the hours as a number, such as 380 or 12.5.'
/** "380", "12,5"; empty is not known. */
const hours = z
  .string()
  .trim()
  .default('')
  .transform((text) => (text === '' ? null : Number(text.replace(/\s*h$/i, '').replace(',', '.'))))
  .pipe(
    z
      .number(HOURS)
      .min(0, HOURS)
      .max(MAX_STYLUS_HOURS, `More than ${MAX_STYLUS_HOURS} hours is more than any stylus lasts.`)
      .transform((value) => Math.round(value * 10) / 10)
      .nullable(),
  )

const unitFields = {
  serial: oneLine(MAX_SERIAL_LENGTH),
  /** A board's id; empty where nobody knows. */
  board: z.string().max(60).default(''),
  name: oneLine(MAX_SHELF_NAME_LENGTH),
  boughtOn: oneLine(MAX_SHELF_NAME_LENGTH),
  boughtFrom: oneLine(MAX_SHOP_LENGTH),
  secondHand: z.enum(SECOND_HANDS, 'Choose one of the three.').default('not-said'),
}

export const AddUnitInput = z.object({ model: z.string('Choose the model.').min(1, 'Choose the model.').max(60), ...unitFields })
export type AddUnitInput = z.infer<typeof AddUnitInput>

/** An empty serial number leaves the one that is kept as it is; `forgetSerial` takes it out. */
export const ChangeUnitInput = z.object({ unitId: id, ...unitFields, forgetSerial: ticked })
export type ChangeUnitInput = z.infer<typeof ChangeUnitInput>

export const UnitInput = z.object({ unitId: id })
export type UnitInput = z.infer<typeof UnitInput>

/** How both sides stand, in short texts; `known` is "no" where its owner cannot say any more. */
export const SetPositionsInput = z.object({
  unitId: id,
  known: z.enum(['yes', 'no']).default('yes'),
  left: z.string().max(400).default(''),
  right: z.string().max(400).default(''),
})
export type SetPositionsInput = z.infer<typeof SetPositionsInput>

/** Names the step that is undone, so that pressing twice undoes one. */
export const UndoPositionsInput = z.object({ unitId: id, positionsId: id })
export type UndoPositionsInput = z.infer<typeof UndoPositionsInput>

const NAMELESS = 'Give it a name, if only "the old one".'
const cartridgeFields = { hours, notes }

/** The fields of the shelf, and beside them the answers of a check that are about the cartridge. */
const withAnswers = <Shape extends z.ZodRawShape>(shape: Shape) =>
  z
    .looseObject({ ...shape, name: oneLine(MAX_ANSWER_LENGTH).pipe(z.string().min(1, NAMELESS)) })
    .transform((given) => ({ ...given, answers: answersFrom(given) }))

export const AddCartridgeInput = withAnswers({ ...cartridgeFields, fromSheet: z.string().max(40).optional() })
export type AddCartridgeInput = z.infer<typeof AddCartridgeInput>

export const ChangeCartridgeInput = withAnswers({ ...cartridgeFields, cartridgeId: id })
export type ChangeCartridgeInput = z.infer<typeof ChangeCartridgeInput>

export const CartridgeInput = z.object({ cartridgeId: id })
export type CartridgeInput = z.infer<typeof CartridgeInput>

/** `counted` is what stood there when the form was filled in, so that pressing twice adds once. */
export const AddHoursInput = z.object({
  cartridgeId: id,
  hours: hours.pipe(z.number(HOURS)),
  counted: hours,
})
export type AddHoursInput = z.infer<typeof AddHoursInput>

const CODE = 'Type the code that stands at the foot of the sheet, in four groups of four.'
export const ClaimSheetInput = z.object({ sheet: z.string(CODE).trim().min(1, CODE).max(60, CODE) })
export type ClaimSheetInput = z.infer<typeof ClaimSheetInput>

export const SheetInput = z.object({ number })
export type SheetInput = z.infer<typeof SheetInput>

export const NameSheetInput = z.object({ number, name: oneLine(MAX_SHELF_NAME_LENGTH) })
export type NameSheetInput = z.infer<typeof NameSheetInput>

/** Empty is none of them. */
export const PlaceSheetInput = z.object({ number, unitId: id.or(z.literal('')).default(''), cartridgeId: id.or(z.literal('')).default('') })
export type PlaceSheetInput = z.infer<typeof PlaceSheetInput>

/** Another cartridge of the shelf; without one, the check asks for it. */
export const CopySheetInput = z.object({ number, cartridgeId: id.or(z.literal('')).default('') })
export type CopySheetInput = z.infer<typeof CopySheetInput>

/** What the list of all sheets is asked for. Whatever it cannot be counts as not said. */
export const SheetSearch = z.object({
  q: z.string().trim().max(MAX_SHEET_SEARCH_LENGTH).catch('').default(''),
  show: z.enum(SHEETS_SHOWN).catch('kept').default('kept'),
  order: z.enum(SHEET_ORDERS).catch('newest').default('newest'),
  page: z.coerce.number().int().min(1).max(100_000).catch(1).default(1),
})
export type SheetSearch = z.infer<typeof SheetSearch>
