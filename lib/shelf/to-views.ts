import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { choiceOf } from '@/lib/setups/answers'
import type { SheetRow } from '@/lib/setups/rows'
import type { AnswersInput } from '@/lib/setups/schema'
import { fromStored } from '@/lib/setups/stored'
import type { CartridgeRow, PositionsRow, UnitRow } from './rows'
import { SERIAL_ENDING_LENGTH } from './terms'
import { standsOn } from './unit-answers'
import { boardIn, modelInCatalogue } from './unit-board'
import type { OwnedCartridgeView, SheetMark, StandingView, UnitView } from './views'

/** @param step the last word on how it stands, with the number of the sheet that asked for it */
export function toUnitView(context: Pick<Context, 'db'>, row: UnitRow, step: (PositionsRow & { sheetNumber: number | null }) | undefined): UnitView {
  const model = modelInCatalogue(context, row)
  const board = model && boardIn(model, row)
  const named = board && row.boardId !== null ? { id: board.id, name: board.name } : null
  const stands = standsOn(board, step)
  const sheet = step?.sheetNumber && step.letter ? { number: step.sheetNumber, letter: step.letter } : null
  const standing: StandingView | null = stands && step ? { ...stands, since: step.createdAt, source: step.source, sheet } : null
  return {
    id: row.id,
    name: row.name,
    model: { id: row.modelId, name: model?.name ?? row.modelId },
    board: named,
    boards: model ? model.boards.map(({ id, name }) => ({ id, name })) : [],
    preamp: board?.preamp ?? null,
    serialEnding: row.serial && row.serial.slice(-SERIAL_ENDING_LENGTH),
    boughtOn: row.boughtOn,
    boughtFrom: row.boughtFrom,
    secondHand: row.secondHand === null ? 'not-said' : row.secondHand ? 'yes' : 'no',
    standing,
    lastStep: step ? { id: step.id, since: step.createdAt, source: step.source } : null,
    archived: row.archivedAt !== null,
  }
}

export function toOwnedCartridgeView({ id, name, catalogueId, answers: stored, stylusHours, notes, archivedAt }: CartridgeRow): OwnedCartridgeView {
  const answers = fromStored<AnswersInput>(stored)
  return { id, name, type: choiceOf(answers), fromCatalogue: catalogueId !== null, stylusHours, notes, answers, archived: archivedAt !== null }
}

export function toSheetMark({ number, code, name, letter, verdict, modelName, cartridgeName, changedAt, archivedAt }: SheetRow): SheetMark {
  return { number, code, name, letters: lettersTo(letter), verdict, modelName, cartridgeName, changedAt, archived: archivedAt !== null }
}

/** Letters are given one after another, so the newest says them all. */
function lettersTo(newest: string): string[] {
  const [from, to] = ['A'.charCodeAt(0), newest.charCodeAt(0)]
  return Array.from({ length: to - from + 1 }, (_, index) => String.fromCharCode(from + index))
}
