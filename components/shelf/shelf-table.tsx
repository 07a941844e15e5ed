import Link from 'next/link'
import { counted, sentenceCase } from '@/lib/setups/format'
import { shelfHeading } from '@/lib/shelf/format'
import type { ShelfView } from '@/lib/shelf/views'
import { GoesWith } from './goes-with'

/** The table with its words, and where what is not in it can be found. */
export function ShelfTable({ shelf }: { shelf: ShelfView }) {
  const { units, cartridges, sheetCount, elsewhere } = shelf
  const drawn = units.length > 0 && cartridges.length > 0
  return (
    <section className="fig top">
      <div className="say">
        <span className="fn">What goes with what</span>
        <h2>{shelfHeading(units.length, cartridges.length)}</h2>
        {drawn && <p>Down a column: what suits that preamp. An empty place is a check you have not made.</p>}
        {elsewhere > 0 && <p>{sentenceCase(counted(elsewhere, 'sheet stands', 'sheets stand'))} in no place of it, being about something that is not here.</p>}
        <ul className="ways">
          <li>
            <Link href="/shelf/sheets">All sheets, {sheetCount}</Link>
          </li>
          {sheetCount > 0 && (
            <li>
              <Link href="/shelf/compare">Compare two revisions</Link>
            </li>
          )}
        </ul>
      </div>
      <div>
        {drawn ? <GoesWith {...shelf} /> : <Missing {...shelf} />}
        <p className="note adds">
          <Link href="/shelf/units/new">Add a preamp</Link> or <Link href="/shelf/cartridges/new">a cartridge</Link>.{' '}
          <Link href="/shelf/sheets/add">Add a sheet by its code</Link>
        </p>
      </div>
    </section>
  )
}

/** With one half of it there is no table yet. */
function Missing({ units, cartridges }: ShelfView) {
  return (
    <div className="gw-none">
      {units.length > 0 && <p>{units.length === 1 ? 'Your preamp is here.' : 'Your preamps are here.'} Add a cartridge, and what goes with what stands in this place.</p>}
      {cartridges.length > 0 && (
        <>
          <p>Add a preamp, and what goes with what stands in this place. Until then, your cartridges:</p>
          <ul>
            {cartridges.map(({ id, name }) => (
              <li key={id}>
                <Link href={`/shelf/cartridges/${id}`}>{name}</Link>
              </li>
            ))}
          </ul>
        </>
      )}
      {units.length + cartridges.length === 0 && <p>Add your preamp and your cartridges, and what goes with what stands in this place.</p>}
    </div>
  )
}
