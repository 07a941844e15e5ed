import type { Metadata } from 'next'
import Link from 'next/link'
import { PressForm } from '@/components/forms/press-form'
import { ChangeUnitForm } from '@/components/shelf/change-unit-form'
import { UnitPositions } from '@/components/shelf/unit-positions'
import { ownContext } from '@/lib/server/enter'
import { orNotFound } from '@/lib/server/or-not-found'
import { sentenceCase } from '@/lib/setups/format'
import { unitNote, unitTitle } from '@/lib/shelf/format'
import { getUnit } from '@/lib/shelf/queries'
import { archiveUnitAction, changeUnitAction, restoreUnitAction, setPositionsAction, undoPositionsAction } from '../actions'

export const metadata: Metadata = { title: 'Your preamp' }

export default async function UnitPage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params
  const context = await ownContext(`/shelf/units/${encodeURIComponent(id)}`)
  const { preamp, ...unit } = await orNotFound(() => getUnit(context, id))
  return (
    <main id="main" className="w pg shelf">
      <p className="crumb">
        <Link href="/shelf">My sheets</Link> / {unit.archived ? 'Put away' : 'Your preamp'}
      </p>
      <h1>{unitTitle(unit)}</h1>
      <p className="lead">{sentenceCase([unitNote(unit), unit.board?.name].filter(Boolean).join(', '))}</p>
      {preamp && preamp.controls.length > 0 && <UnitPositions unit={unit} preamp={preamp} now={context.now} setPositions={setPositionsAction} undo={undoPositionsAction} />}
      <section className="two part" aria-labelledby="about">
        <h2 id="about">About it</h2>
        <ChangeUnitForm action={changeUnitAction} unit={unit} />
      </section>
      <section className="two part" aria-labelledby="away">
        <h2 id="away">{unit.archived ? 'Bring it back' : 'Put it away'}</h2>
        <div>
          <p>{unit.archived ? 'It stands on your shelf again, with its sheets.' : 'Sold, or no longer in use? Its sheets stay. You can bring it back.'}</p>
          <PressForm action={unit.archived ? restoreUnitAction : archiveUnitAction} values={{ unitId: id }} button="b">
            {unit.archived ? 'Bring it back' : 'Put it away'}
          </PressForm>
        </div>
      </section>
    </main>
  )
}
