import type { FormAction } from '@/lib/forms/terms'
import type { UnitView } from '@/lib/shelf/views'
import { UnitBlocks } from './unit-blocks'

/** Units as they are set now, with what keeps that true. */
export function ShelfUnits({ units, now, undo }: { units: readonly UnitView[]; now: number; undo: FormAction }) {
  return (
    <section className="fig">
      <div className="say">
        <span className="fn">As they are set now</span>
        <h2>{units.length === 1 ? 'Your unit' : 'Your units'}</h2>
        <p>They follow when you press &ldquo;I have moved them&rdquo; on a sheet. If you moved a switch yourself, say so beside it.</p>
        <p>Undo changes what we keep. Your switches stay where they are.</p>
      </div>
      <UnitBlocks units={units} now={now} undo={undo} />
    </section>
  )
}
