import 'server-only'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { revisionOf } from '@/lib/setups/rows'
import { toQuery, type AnswersInput } from '@/lib/setups/schema'
import { fromStored } from '@/lib/setups/stored'
import { STEP_PATHS } from '@/lib/setups/views-steps'
import { cartridgeById, lastStep, ownSheet, unitById } from './rows'
import type { CopySheetInput } from './schema'
import { boardOfUnit } from './unit-board'
import { presentAnswers } from './unit-answers'
import { withCartridge } from './views-answers'

/**
 * Where a new check begins with everything as on the sheet's newest revision but the cartridge: at the cartridge where
 * none is chosen, at the last step where one is. The unit's switches are as they stand now.
 * @throws Fault not_found for a sheet or a cartridge that is not one's own
 */
export function copySheetWithCartridge(context: Context, { number, cartridgeId }: CopySheetInput): { path: string } {
  const { db, actor } = context
  const sheet = permit(actor, 'sheet:place', ownSheet(db, actor, number))
  const cartridge = cartridgeId === '' ? null : permit(actor, 'cartridge:read', cartridgeById(db, cartridgeId))
  const unit = sheet.unitId === null ? null : permit(actor, 'unit:read', unitById(db, sheet.unitId))
  const before = fromStored<AnswersInput>(revisionOf(db, sheet.id).answers)
  const present = unit ? { unit: unit.id, ...presentAnswers(boardOfUnit(context, unit), lastStep(db, unit.id)) } : {}
  const answers = {
    ...withCartridge({ ...before, ...present }, cartridge && fromStored<AnswersInput>(cartridge.answers)),
    ...(cartridge ? { own: cartridge.id } : {}),
  }
  return { path: `${STEP_PATHS[cartridge ? 'plays-into' : 'cartridge']}?${toQuery(answers)}` }
}
