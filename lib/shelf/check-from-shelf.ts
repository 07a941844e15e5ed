import 'server-only'
import { and, desc, eq, isNull } from 'drizzle-orm'
import { revisions, sheets } from '@/db/schema/setups'
import { visibleTo } from '@/lib/access/visible-to'
import type { Context } from '@/lib/kernel/context'
import { toQuery, type AnswersInput } from '@/lib/setups/schema'
import { fromStored } from '@/lib/setups/stored'
import { STEP_PATHS } from '@/lib/setups/views-steps'
import { answersOfCartridge, answersOfUnit } from './offers'
import { getOwnedCartridge, getUnit } from './queries'
import { withCartridge } from './views-answers'

/**
 * Where a check of one's own cartridge on one's own unit begins: at the arm, with both filled in. Arm, cable and what it
 * plays into are as on the unit's newest sheet, where it has one; they are seen before anything is made of them.
 * @throws Fault not_found for what is not one's own
 */
export function checkFromShelf(context: Pick<Context, 'db' | 'actor'>, { unitId, cartridgeId }: { unitId: string; cartridgeId: string }): { path: string } {
  const unit = getUnit(context, unitId)
  const cartridge = getOwnedCartridge(context, cartridgeId)
  const before = newestAnswers(context, unitId) ?? {}
  const answers = withCartridge({ ...before, ...answersOfUnit(unit) }, answersOfCartridge(cartridge))
  return { path: `${STEP_PATHS.arm}?${toQuery(answers)}` }
}

function newestAnswers({ db, actor }: Pick<Context, 'db' | 'actor'>, unitId: string): AnswersInput | null {
  const row = db
    .select({ answers: revisions.answers })
    .from(sheets)
    .innerJoin(revisions, and(eq(revisions.sheetId, sheets.id), eq(revisions.letter, sheets.letter)))
    .where(and(visibleTo(actor, sheets.ownerId), eq(sheets.unitId, unitId), isNull(sheets.archivedAt)))
    .orderBy(desc(sheets.changedAt), desc(sheets.number))
    .limit(1)
    .get()
  return row ? fromStored<AnswersInput>(row.answers) : null
}
