import 'server-only'
import { getPreamp } from '@/lib/catalogue/queries'
import type { BoardView, PreampView } from '@/lib/catalogue/views'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import type { UnitRow } from './rows'

/** The model of a unit; null where it is no longer in the catalogue. */
export function modelInCatalogue(context: Pick<Context, 'db'>, { modelId }: Pick<UnitRow, 'modelId'>): PreampView | null {
  try {
    return getPreamp(context, modelId)
  } catch (trouble) {
    if (trouble instanceof Fault && trouble.code === 'not_found') return null
    throw trouble
  }
}

/** The board of a unit, or the newest where nobody knows which; null where the catalogue has it no longer. */
export function boardOfUnit(context: Pick<Context, 'db'>, unit: Pick<UnitRow, 'modelId' | 'boardId'>): BoardView | null {
  const model = modelInCatalogue(context, unit)
  return model && boardIn(model, unit)
}

export function boardIn({ boards }: PreampView, { boardId }: Pick<UnitRow, 'boardId'>): BoardView | null {
  return boardId === null ? boards[boards.length - 1] : (boards.find(({ id }) => id === boardId) ?? null)
}
