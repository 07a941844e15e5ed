import Link from 'next/link'
import { PressForm } from '@/components/forms/press-form'
import type { FormAction } from '@/lib/forms/terms'
import { unitNote, unitTitle } from '@/lib/shelf/format'
import type { OwnedCartridgeView, SheetHistory, UnitView } from '@/lib/shelf/views'
import { CopySheetForm } from './copy-sheet-form'
import { NameSheetForm } from './name-sheet-form'
import { PlaceSheetForm } from './place-sheet-form'
import { SheetPart } from './sheet-part'

interface Props {
  sheet: SheetHistory
  units: readonly UnitView[]
  cartridges: readonly OwnedCartridgeView[]
  actions: Record<'name' | 'place' | 'copy' | 'archive' | 'restore', FormAction>
}

/** What an owner can do with a sheet. */
export function SheetDeeds({ sheet, units, cartridges, actions }: Props) {
  const { number, name, unitId, cartridgeId, archived } = sheet
  const ofModel = units.filter(({ model }) => model.id === sheet.modelId)
  const owned = cartridges.map(({ id, name: words }) => [id, words] as const)
  return (
    <>
      <SheetPart id="name" title="Its name" words={null}>
        <NameSheetForm action={actions.name} number={number} name={name} />
      </SheetPart>
      <SheetPart
        id="place"
        title="What it is about"
        words={
          <>
            <p>With both, it stands in your table, and &ldquo;I have moved them&rdquo; sets your preamp.</p>
            <Adding sheet={sheet} hasUnit={ofModel.length > 0} />
          </>
        }
      >
        <PlaceSheetForm
          action={actions.place}
          number={number}
          unitId={unitId}
          cartridgeId={cartridgeId}
          units={ofModel.map((unit) => [unit.id, [unitTitle(unit), unitNote(unit)].filter(Boolean).join(', ')] as const)}
          cartridges={owned}
        />
      </SheetPart>
      <SheetPart id="copy" title="Another cartridge" words={<p>Preamp, arm, cable and amplifier stay as they are here. Only the cartridge is asked again.</p>}>
        <CopySheetForm action={actions.copy} number={number} cartridges={owned.filter(([id]) => id !== cartridgeId)} />
      </SheetPart>
      <SheetPart
        id="away"
        title={archived ? 'Bring it back' : 'Put it away'}
        words={<p>{archived ? 'Its code, and every link and print with it, opens it again.' : 'Its code, and every link and print with it, opens nothing until you bring it back.'}</p>}
      >
        <PressForm action={archived ? actions.restore : actions.archive} values={{ number: String(number) }} button="b">
          {archived ? 'Bring it back' : 'Put it away'}
        </PressForm>
      </SheetPart>
    </>
  )
}

/** What it is about and is not on the shelf yet can be put there from here. */
function Adding({ sheet: { code, modelId, modelName, cartridgeId, archived }, hasUnit }: { sheet: SheetHistory; hasUnit: boolean }) {
  return (
    <ul className="ways">
      {!hasUnit && (
        <li>
          <Link href={`/shelf/units/new?model=${modelId}`}>Put your {modelName} on the shelf</Link>
        </li>
      )}
      {cartridgeId === null && !archived && (
        <li>
          <Link href={`/shelf/cartridges/of-sheet?sheet=${code}`} prefetch={false}>
            Put its cartridge on the shelf
          </Link>
        </li>
      )}
    </ul>
  )
}
