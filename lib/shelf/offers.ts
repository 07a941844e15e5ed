import 'server-only'
import { can } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { unitNote, unitTitle } from './format'
import { listCartridges, listUnits } from './queries'
import type { CartridgeOffer, OwnedCartridgeView, UnitOffer, UnitView } from './views'
import type { AnswersInput } from '@/lib/setups/schema'

type Reader = Pick<Context, 'db' | 'actor'>

/** A unit as answers of a check: its model, its board, how it stands. */
export function answersOfUnit({ id, model, board, standing }: UnitView): AnswersInput {
  const present = standing ? { present: 'known', left: standing.left, right: standing.right } : { present: 'unknown', left: '', right: '' }
  return { preamp: model.id, board: board?.id ?? '', ...present, unit: id }
}

/** A cartridge as answers of a check. */
export function answersOfCartridge({ id, answers }: OwnedCartridgeView): AnswersInput {
  return { ...answers, own: id }
}

/** What a check is offered from the shelf of whoever asks; nothing for those who have none. */
export function unitOffers(context: Reader): UnitOffer[] {
  if (!can(context.actor, 'shelf:read')) return []
  return listUnits(context, { archived: false })
    .filter(({ preamp }) => preamp !== null)
    .map((unit) => ({ id: unit.id, name: unitTitle(unit), note: unitNote(unit), answers: answersOfUnit(unit) }))
}

/** @see unitOffers */
export function cartridgeOffers(context: Reader): CartridgeOffer[] {
  if (!can(context.actor, 'shelf:read')) return []
  return listCartridges(context, { archived: false }).map((cartridge) => ({ id: cartridge.id, name: cartridge.name, answers: answersOfCartridge(cartridge) }))
}
