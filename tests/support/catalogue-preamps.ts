import { PREAMPS } from '@/content/catalogue/preamps/all'
import { toPreamp } from '@/lib/catalogue/to-preamp'
import type { Preamp } from '@/lib/match'

/** Every board of the demo maker, ready to be checked. */
export const CATALOGUE_PREAMPS: Preamp[] = PREAMPS.flatMap((entry) => entry.boards.map((board) => toPreamp(entry, board)))

/** @throws Error when the demo has no such board */
export function cataloguePreamp(modelId: string, boardId: string): Preamp {
  const preamp = CATALOGUE_PREAMPS.find((one) => one.modelId === modelId && one.boardId === boardId)
  if (!preamp) throw new Error(`The demo has no board "${boardId}" of "${modelId}".`)
  return preamp
}
