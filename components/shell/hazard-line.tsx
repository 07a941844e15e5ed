import Link from 'next/link'

/** The way to the stop cards, in one line: at the top of home and wherever something may be wrong. */
export function HazardLine() {
  return (
    <Link className="hz ln" href="/stop">
      <i aria-hidden="true" />
      <span>
        Smoke, smell, tingle, very hot? <b>Stop here</b>
      </span>
    </Link>
  )
}

/** The same as a row of its own, first among what one may hear. */
export function HazardRow() {
  return (
    <Link className="hz" href="/stop">
      <i aria-hidden="true" />
      <span>
        <b>Smoke, a burning smell, a tingle, very hot, liquid inside</b>
        <span>Do not test anything. Start here</span>
      </span>
    </Link>
  )
}
