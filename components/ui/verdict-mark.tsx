import type { VerdictKind } from '@/lib/match'

/** The five marks of a verdict, and the one of a field that has something wrong. */
export type Mark = VerdictKind | 'error'

const SQUARE = <rect className="o" x="2" y="2" width="20" height="20" />

const DRAWN: Record<Mark, React.ReactNode> = {
  suits: (
    <>
      {SQUARE}
      <rect className="f" x="6" y="6" width="12" height="12" />
    </>
  ),
  'suits-with-changes': (
    <>
      {SQUARE}
      <path className="f" d="M2 22V2L22 22z" />
    </>
  ),
  'suits-with-a-limit': (
    <>
      {SQUARE}
      <path className="o" d="M2 9H22" />
      <rect className="f" x="6" y="13" width="12" height="5.5" />
    </>
  ),
  'does-not-suit': (
    <>
      {SQUARE}
      <path className="o" d="M2 2L22 22M22 2L2 22" />
    </>
  ),
  'cannot-say': <rect className="o dash" x="2" y="2" width="20" height="20" />,
  error: (
    <path
      className="f"
      fillRule="evenodd"
      d="M12 .5L23.5 12L12 23.5L.5 12zM10.6 6h2.8v8h-2.8zM10.6 15.6h2.8v2.8h-2.8z"
    />
  ),
}

/** A mark never stands without its words, so it is hidden from those who have it read aloud. */
export function VerdictMark({ mark }: { mark: Mark }) {
  return (
    <svg className="vm" viewBox="0 0 24 24" aria-hidden="true">
      {DRAWN[mark]}
    </svg>
  )
}
