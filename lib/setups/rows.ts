import 'server-only'
import { and, asc, desc, eq, isNull } from 'drizzle-orm'
import type { Database, Transaction } from '@/db/client'
import { revisions, sheets } from '@/db/schema/setups'
import type { Milliseconds } from '../kernel/clock'
import { Fault } from '../kernel/errors'
import { newId } from '../kernel/ids'
import { fold, foldedWords } from '../kernel/text'
import { ENGINE_VERSION, RULES_VERSION } from '../match/rules'
import { readSheetCode } from './codes'
import type { Reckoned } from './reckon'
import { toQuery, type AnswersInput } from './schema'
import { fromStored, toStored } from './stored'

export type SheetRow = typeof sheets.$inferSelect
export type RevisionRow = typeof revisions.$inferSelect

type Rows = Database | Transaction

/** Figures are kept to so many digits: more than any of them means, and a third of the room. */
const STORED_FIGURES = 7

/**
 * The sheet behind a code.
 * @throws Fault not_found, the same for a code that is none, one that was replaced and one that never was
 */
export function sheetByCode(db: Rows, text: string): SheetRow {
  const code = readSheetCode(text)
  const row = code && db.select().from(sheets).where(and(eq(sheets.code, code), isNull(sheets.archivedAt))).get()
  if (!row) throw new Fault('not_found', 'There is no sheet under this code.')
  return row
}

/** Its revisions without their contents, oldest first. */
export function revisionMarks(db: Rows, sheetId: string) {
  return db
    .select({ letter: revisions.letter, createdAt: revisions.createdAt })
    .from(revisions)
    .where(eq(revisions.sheetId, sheetId))
    .orderBy(asc(revisions.letter))
    .all()
}

/** @throws Fault not_found when the sheet has no such letter */
export function revisionOf(db: Rows, sheetId: string, letter?: string): RevisionRow {
  const wanted = letter === undefined ? eq(revisions.sheetId, sheetId) : and(eq(revisions.sheetId, sheetId), eq(revisions.letter, letter))
  const row = db.select().from(revisions).where(wanted).orderBy(desc(revisions.letter)).limit(1).get()
  if (!row) throw new Fault('not_found', 'This sheet has no such revision.')
  return row
}

/** What a sheet's own row says of its newest revision. */
export function headOf({ inputs, result }: Reckoned, letter: string, now: Milliseconds) {
  const { modelId, modelName, boardName } = inputs.preamp
  const cartridgeName = inputs.cartridge.name.trim()
  const words = foldedWords(`${modelName} ${boardName} ${cartridgeName}`).join(' ')
  return { letter, verdict: result.match.verdict, modelId, modelName, cartridgeName, words, changedAt: now }
}

/**
 * Adds a revision and takes its head over to the sheet. Where it is about another model or another cartridge than the
 * one before, the sheet is no longer about that unit or cartridge of its owner's.
 */
export function insertRevision(db: Rows, sheet: SheetRow, letter: string, reckoned: Reckoned, now: Milliseconds) {
  const { answers, inputs, result, dataHash } = reckoned
  const head = headOf(reckoned, letter, now)
  const unitId = head.modelId === sheet.modelId ? sheet.unitId : null
  const cartridgeId = fold(head.cartridgeName) === fold(sheet.cartridgeName) ? sheet.cartridgeId : null
  db.update(sheets).set({ ...head, unitId, cartridgeId }).where(eq(sheets.id, sheet.id)).run()
  const row = {
    id: newId('rev'),
    sheetId: sheet.id,
    letter,
    answers: JSON.stringify(answers),
    inputs: toStored(inputs),
    result: toStored(result, STORED_FIGURES),
    engineVersion: ENGINE_VERSION,
    rulesVersion: RULES_VERSION,
    dataHash,
    createdAt: now,
  }
  db.insert(revisions).values(row).run()
}

/** True when this revision already says what a new one would. */
export function saysTheSame(row: RevisionRow, { answers, dataHash }: Reckoned): boolean {
  return (
    row.rulesVersion === RULES_VERSION &&
    row.engineVersion === ENGINE_VERSION &&
    row.dataHash === dataHash &&
    toQuery(fromStored<AnswersInput>(row.answers)) === toQuery(answers)
  )
}
