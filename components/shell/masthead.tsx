import Link from 'next/link'
import { LogRule } from './log-rule'
import { MainNav } from './main-nav'

/** Whoever is signed in, as the masthead shows them. */
export interface Present {
  name: string
  /** May enter the workshop. */
  workshop: boolean
}

export function Masthead({ present }: { present: Present | null }) {
  return (
    <>
      <header className="mast">
        <div className="w">
          <Link className="brand" href="/">
            Oskerby
          </Link>
          <MainNav shelf={present !== null} workshop={present?.workshop ?? false} />
          <Link className="acc" href={present ? '/account' : '/sign-in'}>
            {present ? present.name : 'Sign in'}
          </Link>
        </div>
      </header>
      <LogRule />
    </>
  )
}
