import Link from 'next/link'

/** A shelf with nothing on it yet: what it is for, and the ways to begin. */
export function EmptyShelf() {
  return (
    <section className="two emp" aria-labelledby="begin">
      <h2 id="begin">Nothing here yet</h2>
      <div>
        <p>Put your preamp and your cartridges here once, and every check begins with them filled in. What goes with what then stands in one table.</p>
        <p className="row">
          <Link className="b pri" href="/shelf/units/new">
            Add a preamp
          </Link>
          <Link className="b" href="/shelf/cartridges/new">
            Add a cartridge
          </Link>
          <Link className="b" href="/shelf/sheets/add">
            Add a sheet by its code
          </Link>
        </p>
      </div>
    </section>
  )
}
