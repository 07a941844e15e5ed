import type { Metadata } from 'next'
import Link from 'next/link'

export const metadata: Metadata = { title: 'Nothing at this address' }

export default function NotFoundPage() {
  return (
    <main id="main" className="w lost">
      <h1>There is nothing at this address</h1>
      <p className="lead">
        Look for a letter too many or too few. A link to a sheet holds a code, and the code has to be whole.
      </p>
      <div className="row">
        <Link className="b pri" href="/check">
          Check a cartridge
        </Link>
        <Link className="b" href="/">
          Go to the front page
        </Link>
      </div>
    </main>
  )
}
