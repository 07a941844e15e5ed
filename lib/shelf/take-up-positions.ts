import 'server-only'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { markMoved } from '@/lib/setups/mark-moved'
import { addStep, unitById } from './rows'

/**
 * The owner has moved what the newest revision of a sheet asked for. The next revision starts from there, and the unit
 * that the sheet is about stands so from now on, which can be undone. Either both are written or neither.
 * @throws Fault as `markMoved`
 */
export function takeUpPositions(context: Context, { code }: { code: string }): { code: string; letter: string } {
  const { actor, now } = context
  return markMoved(context, { code }, (tx, { sheet, letter, boardId, left, right }) => {
    if (sheet.unitId === null) return
    const unit = permit(actor, 'unit:change', unitById(tx, sheet.unitId))
    addStep(tx, unit, { boardId, left, right, source: 'moved', sheetId: sheet.id, letter }, now)
  })
}
