'use client'

interface Props {
  /** Next's number for the error, the same as in the log. */
  digest?: string
  tryAgain: () => void
}

/** Unforeseen trouble: it is ours, nothing was asked of the owner wrongly. */
export function TroublePage({ digest, tryAgain }: Props) {
  return (
    <main id="main" className="w lost">
      <h1>This page broke, and the fault is ours</h1>
      <p className="lead">
        Nothing you did caused it, and what was saved is still there. Load the page again. If it breaks again, go back
        one step and take another way.
      </p>
      <div className="row">
        <button type="button" className="b pri" onClick={tryAgain}>
          Load again
        </button>
        {/* Asks for a whole new page: what broke may be in the one at hand. */}
        <form action="/">
          <button type="submit" className="b">
            Go to the front page
          </button>
        </form>
      </div>
      {digest && <p className="note">Noted in our log under {digest}.</p>}
    </main>
  )
}
