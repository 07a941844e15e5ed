import Link from 'next/link'
import { MiniPanel } from '@/components/panel/mini-panel'
import { cartridgeNote, unitNote, unitTitle } from '@/lib/shelf/format'
import type { OwnedCartridgeView, PlaceView, ShelfView, UnitView } from '@/lib/shelf/views'
import { RevisionLetters } from './revision-letters'
import { VerdictLine } from './verdict-line'

/** What goes with what: cartridges down, units across. On a phone one block a cartridge. */
export function GoesWith({ units, cartridges, places }: Pick<ShelfView, 'units' | 'cartridges' | 'places'>) {
  return (
    // More units than fit scroll inside the box; whoever has no mouse reaches it by the keyboard.
    <div className="gw-box" tabIndex={units.length > MANY_UNITS ? 0 : undefined} role="group" aria-label="What goes with what">
      <table className="gw">
        <caption className="vh">Each of your cartridges on each of your preamps</caption>
        <thead>
          <tr>
            <th scope="col">
              <span className="lab">Cartridge</span>
            </th>
            {units.map((unit) => (
              <UnitHead key={unit.id} unit={unit} />
            ))}
          </tr>
        </thead>
        <tbody>
          {cartridges.map((cartridge) => (
            <tr key={cartridge.id}>
              <th className="c" scope="row">
                <Link href={`/shelf/cartridges/${cartridge.id}`}>{cartridge.name}</Link>
                <span>{cartridgeNote(cartridge)}</span>
              </th>
              {units.map((unit) => (
                <Place
                  key={unit.id}
                  unit={unit}
                  cartridge={cartridge}
                  place={places.find(({ unitId, cartridgeId }) => unitId === unit.id && cartridgeId === cartridge.id)}
                />
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}

const MANY_UNITS = 4

function UnitHead({ unit }: { unit: UnitView }) {
  const note = unitNote(unit)
  return (
    <th className="u" scope="col">
      <Link href={`/shelf/units/${unit.id}`}>{unitTitle(unit)}</Link>
      {unit.preamp && <MiniPanel preamp={unit.preamp} />}
      {note && <span>{note}</span>}
    </th>
  )
}

function Place({ unit, cartridge, place }: { unit: UnitView; cartridge: OwnedCartridgeView; place: PlaceView | undefined }) {
  const name = <span className="m-only un-name">{unitTitle(unit)}</span>
  if (!place) {
    return (
      <td className="nil">
        {name}
        {unit.preamp && (
          <Link href={`/shelf/check?unit=${unit.id}&cartridge=${cartridge.id}`} prefetch={false}>
            Check
            <span className="vh">
              {' '}
              {cartridge.name} on {unitTitle(unit)}
            </span>
          </Link>
        )}
      </td>
    )
  }
  const { sheet, worthKnowing, older } = place
  return (
    <td>
      {name}
      <div>
        <Link href={`/sheets/${sheet.code}`}>
          <VerdictLine verdict={sheet.verdict} />
        </Link>
        <p>
          <Link href={`/shelf/sheets/${sheet.number}`}>Sheet {sheet.number}</Link> <RevisionLetters letters={sheet.letters} />
        </p>
        {worthKnowing && <p>{worthKnowing}</p>}
        {older > 0 && <p>{older === 1 ? 'one older sheet' : `${older} older sheets`}</p>}
      </div>
    </td>
  )
}
