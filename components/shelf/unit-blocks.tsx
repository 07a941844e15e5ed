import Link from 'next/link'
import { PressForm } from '@/components/forms/press-form'
import type { FormAction } from '@/lib/forms/terms'
import { standingNote, unitTitle } from '@/lib/shelf/format'
import type { UnitView } from '@/lib/shelf/views'
import { UnitStanding } from './unit-standing'

/** Every unit as it is set now. */
export function UnitBlocks({ units, now, undo }: { units: readonly UnitView[]; now: number; undo: FormAction }) {
  return (
    <div className="un">
      {units.map((unit) => (
        <section key={unit.id} aria-label={unitTitle(unit)}>
          <h3>
            {unitTitle(unit)} {unit.standing && <span>{standingNote(unit.standing, now)}</span>}
          </h3>
          <UnitStanding {...unit} />
          {unit.preamp && unit.preamp.controls.length > 0 && (
            <div className="acts">
              <Link href={`/shelf/units/${unit.id}#stands`}>
                {unit.standing ? 'Say how it stands now' : 'Say how it stands'}
                <span className="vh">, {unitTitle(unit)}</span>
              </Link>
              <UndoStep unit={unit} undo={undo} />
            </div>
          )}
        </section>
      ))}
    </div>
  )
}

/** Takes the last word on how a unit stands back. */
export function UndoStep({ unit: { id, lastStep, ...unit }, undo, from = 'shelf' }: { unit: Pick<UnitView, 'id' | 'lastStep' | 'name' | 'model'>; undo: FormAction; from?: 'shelf' | 'unit' }) {
  if (!lastStep) return null
  return (
    <PressForm action={undo} values={{ unitId: id, positionsId: lastStep.id, from }} className="inline" button="lnk" label={`Undo, ${unitTitle(unit)}`}>
      Undo
    </PressForm>
  )
}
