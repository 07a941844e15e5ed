import type { Metadata } from 'next'
import { EmptyShelf } from '@/components/shelf/empty-shelf'
import { PutAway } from '@/components/shelf/put-away'
import { ShelfTable } from '@/components/shelf/shelf-table'
import { ShelfUnits } from '@/components/shelf/shelf-units'
import { ownContext } from '@/lib/server/enter'
import { getShelf, listCartridges, listUnits } from '@/lib/shelf/queries'
import { restoreCartridgeAction } from './cartridges/actions'
import { restoreUnitAction, undoPositionsAction } from './units/actions'

export const metadata: Metadata = { title: 'My sheets' }

export default async function ShelfPage() {
  const context = await ownContext('/shelf')
  const shelf = getShelf(context)
  const { units, cartridges, sheetCount } = shelf
  return (
    <main id="main" className="w pg goes">
      <h1>My sheets</h1>
      {units.length + cartridges.length + sheetCount === 0 ? <EmptyShelf /> : <ShelfTable shelf={shelf} />}
      {units.length > 0 && <ShelfUnits units={units} now={context.now} undo={undoPositionsAction} />}
      <PutAway
        units={listUnits(context, { archived: true })}
        cartridges={listCartridges(context, { archived: true })}
        restoreUnit={restoreUnitAction}
        restoreCartridge={restoreCartridgeAction}
      />
    </main>
  )
}
