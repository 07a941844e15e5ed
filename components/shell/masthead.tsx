import Link from 'next/link'
import { LogRule } from './log-rule'
import { MainNav } from './main-nav'

export function Masthead() {
  return (
    <>
      <header className="mast">
        <div className="w">
          <Link className="brand" href="/">
            Oskerby
          </Link>
          <MainNav />
        </div>
      </header>
      <LogRule />
    </>
  )
}
