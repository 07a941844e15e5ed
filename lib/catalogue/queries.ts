import 'server-only'
import { and, eq } from 'drizzle-orm'
import { catalogueEntries } from '@/db/schema/catalogue'
import { Fault } from '../kernel/errors'
import type { Context } from '../kernel/context'
import { readEntry, type EntryOf } from './rows'
import { searchRows } from './search'
import type { CatalogueKind, InputKind, LeadUse, ListedCartridgeType, SearchedKind } from './terms'
import {
  toArmView,
  toCartridgeView,
  toInputView,
  toLeadView,
  toPreampView,
  toStepUpView,
  type ArmView,
  type CartridgeView,
  type InputView,
  type LeadView,
  type PreampView,
  type StepUpView,
} from './views'

type Reader = Pick<Context, 'db'>

export interface Search<Type extends string = string> {
  /** Words in any order; empty lists everything by name. */
  text: string
  /** Only entries of this type. */
  type?: Type
  limit: number
  /** From the answer before, for the next page. */
  cursor?: string
}

export interface Found<View> {
  entries: View[]
  next: string | null
}

/** Every preamp of the maker, in the maker's order. */
export function listPreamps({ db }: Reader): PreampView[] {
  const rows = db
    .select({ data: catalogueEntries.data })
    .from(catalogueEntries)
    .where(eq(catalogueEntries.kind, 'preamps'))
    .all()
  return rows
    .map(({ data }) => readEntry('preamps', data))
    .sort((a, b) => a.listOrder - b.listOrder)
    .map(toPreampView)
}

function getEntry<Kind extends CatalogueKind>({ db }: Reader, kind: Kind, id: string): EntryOf[Kind] {
  const row = db
    .select({ data: catalogueEntries.data })
    .from(catalogueEntries)
    .where(and(eq(catalogueEntries.id, id), eq(catalogueEntries.kind, kind)))
    .get()
  if (!row) throw new Fault('not_found', 'There is nothing by that name in the catalogue.', { detail: { kind, id } })
  return readEntry(kind, row.data)
}

/**
 * One preamp with all its boards, or with the one board asked for.
 * @throws Fault not_found when the model or the board does not exist
 */
export function getPreamp(context: Reader, modelId: string, boardId?: string): PreampView {
  const preamp = toPreampView(getEntry(context, 'preamps', modelId))
  if (boardId === undefined) return preamp
  const boards = preamp.boards.filter(({ id }) => id === boardId)
  if (boards.length === 0) throw new Fault('not_found', `The ${preamp.name} has no such board.`, { detail: { modelId, boardId } })
  return { ...preamp, boards }
}

/** @throws Fault not_found */
export function getCartridge(context: Reader, id: string): CartridgeView {
  return toCartridgeView(getEntry(context, 'cartridges', id))
}
/** @throws Fault not_found */
export function getArm(context: Reader, id: string): ArmView {
  return toArmView(getEntry(context, 'arms', id))
}
/** @throws Fault not_found */
export function getStepUp(context: Reader, id: string): StepUpView {
  return toStepUpView(getEntry(context, 'step-ups', id))
}
/** @throws Fault not_found */
export function getLead(context: Reader, id: string): LeadView {
  return toLeadView(getEntry(context, 'leads', id))
}
/** @throws Fault not_found */
export function getInput(context: Reader, id: string): InputView {
  return toInputView(getEntry(context, 'inputs', id))
}

function find<Kind extends SearchedKind, View>(
  context: Reader,
  kind: Kind,
  { type, ...search }: Search,
  toView: (entry: EntryOf[Kind]) => View,
): Found<View> {
  const types = type === undefined ? undefined : kind === 'leads' ? [type, 'either'] : [type]
  const { rows, next } = searchRows(context, kind, { ...search, types })
  return { entries: rows.map(({ data }) => toView(readEntry(kind, data))), next }
}

/** Cartridges that hold every word, best first. @throws Fault bad_input for a cursor that is not ours */
export function findCartridges(context: Reader, search: Search<ListedCartridgeType>): Found<CartridgeView> {
  return find(context, 'cartridges', search, toCartridgeView)
}
/** Arms, as `findCartridges`. */
export function findArms(context: Reader, search: Omit<Search, 'type'>): Found<ArmView> {
  return find(context, 'arms', search, toArmView)
}
/** Step-up transformers, as `findCartridges`. */
export function findStepUps(context: Reader, search: Omit<Search, 'type'>): Found<StepUpView> {
  return find(context, 'step-ups', search, toStepUpView)
}
/** Arm leads and cables; a type finds leads of that use and those of either. */
export function findLeads(context: Reader, search: Search<LeadUse>): Found<LeadView> {
  return find(context, 'leads', search, toLeadView)
}
/** Next inputs, as `findCartridges`; the type is the input's kind. */
export function findInputs(context: Reader, search: Search<InputKind>): Found<InputView> {
  return find(context, 'inputs', search, toInputView)
}
