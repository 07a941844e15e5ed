import { z } from 'zod'
import { EntryId, Figure, PositiveFigure, Words } from './schema'
import { findBoardProblems, findSerialProblems } from './preamp-rules'

/** A preamp as the maker describes it: one or more boards, each complete. Units stand in the names. */

const place = z.enum(['back', 'front', 'underside'])
const position = z.strictObject({ id: EntryId, label: Words })
const controlShape = { id: EntryId, label: Words, place }

export const ControlEntry = z.discriminatedUnion('kind', [
  z.strictObject({ ...controlShape, kind: z.literal('bank'), switchCount: z.int().min(1).max(12) }),
  z.strictObject({ ...controlShape, kind: z.literal('slide'), positions: z.array(position).min(2) }),
  z.strictObject({ ...controlShape, kind: z.literal('plugs'), positions: z.array(position).min(1) }),
  z.strictObject({
    ...controlShape,
    kind: z.literal('buttons'),
    latch: z.enum(['one-in', 'each']),
    buttons: z.array(position).min(1),
  }),
])
export type ControlEntry = z.infer<typeof ControlEntry>

const groupShape = {
  id: EntryId,
  label: Words,
  control: EntryId,
  /** 1-based members of a bank or button row; null is the whole control. */
  members: z.array(z.int().min(1)).min(1).nullable(),
  onlyWhen: z.strictObject({ group: EntryId, options: z.array(z.string().min(1)).min(1) }).optional(),
}
const choice = { ...groupShape, how: z.literal('choice') }
const onOff = { ...groupShape, how: z.literal('on-off') }
const filter = z.strictObject({
  cornerHertz: z.number().positive(),
  order: z.union([z.literal(1), z.literal(2), z.literal(3), z.literal(4)]),
})

export const GroupEntry = z.union([
  z.strictObject({ ...choice, sets: z.literal('gain'), options: z.record(z.string(), z.strictObject({ gainId: EntryId })) }),
  z.strictObject({ ...choice, sets: z.literal('input'), options: z.record(z.string(), z.strictObject({ pathId: EntryId })) }),
  z.strictObject({
    ...choice,
    sets: z.literal('load'),
    options: z.record(z.string(), z.strictObject({ loadOhms: PositiveFigure })),
  }),
  z.strictObject({
    ...groupShape,
    sets: z.literal('load'),
    how: z.literal('parallel'),
    resistorsOhms: z.array(PositiveFigure).min(1),
  }),
  z.strictObject({
    ...groupShape,
    sets: z.literal('capacitance'),
    how: z.literal('sum'),
    capacitorsPicofarads: z.array(PositiveFigure).min(1),
  }),
  z.strictObject({ ...onOff, sets: z.literal('filter'), filter }),
  z.strictObject({ ...onOff, sets: z.literal('other') }),
])
export type GroupEntry = z.infer<typeof GroupEntry>

const BuiltInStepUp = z.strictObject({
  name: Words,
  ratio: PositiveFigure,
  primaryOhms: Figure,
  secondaryOhms: Figure,
  primaryHenries: PositiveFigure.nullable(),
  secondaryPicofarads: Figure,
})

export const PathEntry = z.strictObject({
  id: z.enum(['mm', 'mc']),
  label: Words,
  /** Behind a built-in transformer both stand at its secondary. */
  loadKilohms: PositiveFigure,
  inputPicofarads: Figure,
  stepUp: BuiltInStepUp.nullable(),
})
export type PathEntry = z.infer<typeof PathEntry>

/** Gain, limit and noise from the input sockets, as a manual prints them, a built-in transformer included. */
export const GainEntry = z.strictObject({
  id: EntryId,
  pathId: z.enum(['mm', 'mc']),
  gainDecibels: PositiveFigure,
  /** Input RMS at which it distorts, at rising frequencies. */
  overload: z.array(z.strictObject({ hertz: z.number().positive(), millivolts: PositiveFigure })).min(1),
  /** The amplifier's own, behind any transformer. */
  voltageNoiseNanovoltsPerRootHertz: PositiveFigure,
  currentNoisePicoamperesPerRootHertz: PositiveFigure,
})
export type GainEntry = z.infer<typeof GainEntry>

export const BoardEntry = z
  .strictObject({
    id: EntryId,
    /** Such as "second board, from serial 19000"; empty where only one exists. */
    name: z.string().trim().max(100),
    /** Whole serial numbers, both ends included; null is open. */
    serials: z.strictObject({ from: z.int().min(0).nullable(), to: z.int().min(0).nullable() }),
    topology: z.enum(['output-limited', 'first-stage-flat', 'first-stage-bass']),
    controls: z.array(ControlEntry),
    groups: z.array(GroupEntry),
    /** Members of one control that must not be ON together. */
    exclusions: z.array(z.strictObject({ control: EntryId, members: z.tuple([z.int().min(1), z.int().min(1)]) })),
    asDelivered: z.record(z.string(), z.string()),
    paths: z.array(PathEntry).min(1),
    gains: z.array(GainEntry).min(1),
    maximumOutputVolts: PositiveFigure,
    outputOhms: PositiveFigure,
    couplingMicrofarads: PositiveFigure.nullable(),
    hasBalancedOutput: z.boolean(),
    fixedFilter: filter.nullable(),
    iecBass: z.boolean(),
  })
  .superRefine((board, context) => {
    for (const { path, message } of findBoardProblems(board)) context.addIssue({ code: 'custom', path, message })
  })
export type BoardEntry = z.infer<typeof BoardEntry>

export const PreampEntry = z
  .strictObject({
    id: EntryId,
    maker: Words,
    name: Words,
    /** Place in the maker's list, smallest first. */
    listOrder: z.int().min(0),
    technology: z.enum(['transistor', 'valve']),
    inputMode: z.enum(['voltage', 'current']),
    /** What the figures were taken from. */
    source: Words,
    boards: z.array(BoardEntry).min(1),
  })
  .superRefine((preamp, context) => {
    for (const { path, message } of findSerialProblems(preamp.boards)) context.addIssue({ code: 'custom', path, message })
  })
export type PreampEntry = z.infer<typeof PreampEntry>
