import 'server-only'
import { asc, eq } from 'drizzle-orm'
import type { Database } from '@/db/client'
import { revisions, sheets } from '@/db/schema/setups'
import type { Person } from '@/lib/accounts/people'
import type { MatchInputs } from '@/lib/match/inputs'
import type { AnswersInput } from '@/lib/setups/schema'
import { fromStored } from '@/lib/setups/stored'
import type { SheetResult } from '@/lib/setups/views'

const time = (milliseconds: number | null) => (milliseconds === null ? null : new Date(milliseconds).toISOString())

export interface HeldRevision {
  letter: string
  createdAt: number
  rulesVersion: number
  engineVersion: string
  answers: AnswersInput
  inputs: MatchInputs
  result: SheetResult
}

export interface HeldSheet {
  id: string
  number: number
  code: string
  name: string | null
  unitId: string | null
  cartridgeId: string | null
  createdAt: number
  archivedAt: number | null
}

/** Every sheet of someone's, without its revisions, in order of number. */
export function sheetsHeld(db: Database, person: Person): HeldSheet[] {
  const { id, number, code, name, unitId, cartridgeId, createdAt, archivedAt } = sheets
  return db.select({ id, number, code, name, unitId, cartridgeId, createdAt, archivedAt }).from(sheets).where(eq(sheets.ownerId, person.id)).orderBy(asc(number)).all()
}

/** All revisions of a sheet, the first one first. They are large, so one sheet's are read at a time. */
export function revisionsHeld(db: Database, sheetId: string): HeldRevision[] {
  const rows = db.select().from(revisions).where(eq(revisions.sheetId, sheetId)).orderBy(asc(revisions.letter)).all()
  return rows.map(({ letter, createdAt, rulesVersion, engineVersion, answers, inputs, result }) => ({
    letter,
    createdAt,
    rulesVersion,
    engineVersion,
    answers: fromStored<AnswersInput>(answers),
    inputs: fromStored<MatchInputs>(inputs),
    result: fromStored<SheetResult>(result),
  }))
}

/** JSON knows no infinity: where a limit is open it reads null. */
export function sheetJson({ id: _id, createdAt, archivedAt, ...sheet }: HeldSheet, held: readonly HeldRevision[]) {
  return {
    ...sheet,
    createdAt: time(createdAt),
    putAwayAt: time(archivedAt),
    revisions: held.map((revision) => ({ ...revision, createdAt: time(revision.createdAt) })),
  }
}
