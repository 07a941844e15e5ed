'use server'

import type { FormState } from '@/lib/forms/terms'
import { Fault } from '@/lib/kernel/errors'
import { readPositionFields } from '@/lib/match/state-fields'
import { action } from '@/lib/server/action'
import { requestContext } from '@/lib/server/request-context'
import { writePositions } from '@/lib/setups/positions'
import { addUnit } from '@/lib/shelf/add-unit'
import { archiveUnit } from '@/lib/shelf/archive-unit'
import { changeUnit } from '@/lib/shelf/change-unit'
import { getUnit } from '@/lib/shelf/queries'
import { restoreUnit } from '@/lib/shelf/restore-unit'
import { AddUnitInput, ChangeUnitInput, SetPositionsInput, UndoPositionsInput, UnitInput } from '@/lib/shelf/schema'
import { setPositions } from '@/lib/shelf/set-positions'
import { undoPositions } from '@/lib/shelf/undo-positions'

const toUnit = ({ id }: { id: string }) => ({ go: `/shelf/units/${id}` })
const toShelf = () => ({ go: '/shelf' })

export const addUnitAction = action(AddUnitInput, addUnit, toUnit)
export const changeUnitAction = action(ChangeUnitInput, changeUnit, toUnit)
export const archiveUnitAction = action(UnitInput, archiveUnit, toShelf)
export const restoreUnitAction = action(UnitInput, restoreUnit, toShelf)
export const undoPositionsAction = action(UndoPositionsInput, undoPositions, ({ id }, { from }) => ({ go: from === 'unit' ? `/shelf/units/${id}` : '/shelf' }))

const setTexts = action(SetPositionsInput, setPositions, toUnit)

/** Without script the drawn switches are checkboxes, and what they say counts instead of the two short texts. */
export async function setPositionsAction(before: FormState, form: FormData): Promise<FormState> {
  return setTexts(before, await withDrawn(form))
}

async function withDrawn(form: FormData): Promise<FormData> {
  const unitId = form.get('unitId')
  if (typeof unitId !== 'string') return form
  try {
    const { preamp } = getUnit(await requestContext(), unitId)
    const ticked = preamp && readPositionFields(preamp, (name) => form.getAll(name).filter((value) => typeof value === 'string'))
    if (!preamp || !ticked) return form
    const texts = writePositions(ticked, preamp)
    form.set('left', texts.left)
    form.set('right', texts.right)
  } catch (trouble) {
    // Whose it is, the verb says.
    if (!(trouble instanceof Fault)) throw trouble
  }
  return form
}
