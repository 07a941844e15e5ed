import Link from 'next/link'
import { PressForm } from '@/components/forms/press-form'
import type { FormAction } from '@/lib/forms/terms'
import { unitNote, unitTitle } from '@/lib/shelf/format'
import type { OwnedCartridgeView, UnitView } from '@/lib/shelf/views'

interface Props {
  units: readonly UnitView[]
  cartridges: readonly OwnedCartridgeView[]
  restoreUnit: FormAction
  restoreCartridge: FormAction
}

/** What was put away: folded, each with the way back. */
export function PutAway({ units, cartridges, restoreUnit, restoreCartridge }: Props) {
  if (units.length + cartridges.length === 0) return null
  return (
    <details className="away">
      <summary>Put away: {units.length + cartridges.length}</summary>
      <ul>
        {units.map((unit) => (
          <li key={unit.id}>
            <Link href={`/shelf/units/${unit.id}`}>{unitTitle(unit)}</Link> {unitNote(unit)}
            <PressForm action={restoreUnit} values={{ unitId: unit.id }} label={`Bring back ${unitTitle(unit)}`}>
              Bring back
            </PressForm>
          </li>
        ))}
        {cartridges.map(({ id, name }) => (
          <li key={id}>
            <Link href={`/shelf/cartridges/${id}`}>{name}</Link>
            <PressForm action={restoreCartridge} values={{ cartridgeId: id }} label={`Bring back ${name}`}>
              Bring back
            </PressForm>
          </li>
        ))}
      </ul>
    </details>
  )
}
