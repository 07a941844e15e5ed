import type { FormAction } from '@/lib/forms/terms'
import type { Preamp } from '@/lib/match'
import { sentenceCase } from '@/lib/setups/format'
import { standingNote } from '@/lib/shelf/format'
import type { UnitView } from '@/lib/shelf/views'
import { PositionsForm } from './positions-form'
import { UndoStep } from './unit-blocks'
import { UnitStanding } from './unit-standing'

interface Props {
  unit: Omit<UnitView, 'preamp'>
  preamp: Preamp
  now: number
  setPositions: FormAction
  undo: FormAction
}

/** How a unit stands: drawn, and as a form to say otherwise. */
export function UnitPositions({ unit, preamp, now, setPositions, undo }: Props) {
  const { standing, board, boards, lastStep } = unit
  return (
    <section className="two part" id="stands" aria-labelledby="stands-h">
      <div>
        <h2 id="stands-h">How it is set now</h2>
        {standing && <p>{sentenceCase(standingNote(standing, now))}.</p>}
        {!board && boards.length > 1 && <p>Until you say which board it has, we take the {boards[boards.length - 1].name}.</p>}
        {lastStep && (
          <>
            <UndoStep unit={unit} undo={undo} from="unit" />
            <p className="note">Undo changes what we keep. Your switches stay where they are.</p>
          </>
        )}
      </div>
      <div>
        <UnitStanding preamp={preamp} standing={standing} />
        <details className="say-so" open={standing === null}>
          <summary>Say how it stands now</summary>
          <p className="note">Look, and leave them as they are.</p>
          <PositionsForm key={standing?.since ?? 0} action={setPositions} unitId={unit.id} preamp={preamp} standing={standing} />
        </details>
      </div>
    </section>
  )
}
