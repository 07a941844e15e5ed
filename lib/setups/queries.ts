import 'server-only'
import { eq } from 'drizzle-orm'
import { units } from '@/db/schema/shelf'
import { can, permit } from '../access/permit'
import type { Context } from '../kernel/context'
import { Fault } from '../kernel/errors'
import type { MatchInputs } from '../match/inputs'
import { ENGINE_VERSION, RULES_VERSION } from '../match/rules'
import { hashOf, readInputs } from './reckon'
import { revisionMarks, revisionOf, sheetByCode, type RevisionRow, type SheetRow } from './rows'
import type { AnswersInput } from './schema'
import { fromStored } from './stored'
import type { Changed, SheetResult, SheetView } from './views'

type Reader = Pick<Context, 'db' | 'actor'>

/**
 * A sheet at one revision, the newest unless a letter is named. Whoever holds the code may read it; the number alone
 * opens nothing.
 * @throws Fault not_found
 */
export function getSheet(context: Reader, code: string, letter?: string): SheetView {
  const sheet = permit(context.actor, 'sheet:read', sheetByCode(context.db, code))
  const row = revisionOf(context.db, sheet.id, letter)
  return {
    number: sheet.number,
    code: sheet.code,
    letter: row.letter,
    createdAt: row.createdAt,
    revisions: revisionMarks(context.db, sheet.id),
    answers: fromStored<AnswersInput>(row.answers),
    inputs: fromStored<MatchInputs>(row.inputs),
    result: fromStored<SheetResult>(row.result),
    rulesVersion: row.rulesVersion,
    engineVersion: row.engineVersion,
    changed: changedSince(context, row),
    mayChange: can(context.actor, 'sheet:change', sheet),
    keeping: sheet.ownerId === null ? 'nobody' : can(context.actor, 'sheet:place', sheet) ? 'own' : 'someone',
    unitName: can(context.actor, 'sheet:place', sheet) ? unitNameOf(context, sheet) : null,
  }
}

function unitNameOf({ db }: Reader, { unitId, modelName }: SheetRow): string | null {
  const unit = unitId === null ? undefined : db.select({ name: units.name }).from(units).where(eq(units.id, unitId)).get()
  return unit ? (unit.name ?? modelName) : null
}

function changedSince(context: Pick<Context, 'db'>, row: RevisionRow): Changed {
  const versions = { rules: row.rulesVersion !== RULES_VERSION, engine: row.engineVersion !== ENGINE_VERSION }
  try {
    const { inputs } = readInputs(context, fromStored<AnswersInput>(row.answers))
    return { ...versions, data: hashOf(inputs) !== row.dataHash, canComputeAnew: true }
  } catch (trouble) {
    // The board was renamed or taken out, or a rule for answers is stricter by now: the sheet still says what it said.
    if (trouble instanceof Fault) return { ...versions, data: true, canComputeAnew: false }
    throw trouble
  }
}
