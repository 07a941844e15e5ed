import { VerdictMark } from '../ui/verdict-mark'
import type { VerdictKind } from '@/lib/match/result'
import { tied } from '@/lib/setups/format'

interface Props {
  verdict: VerdictKind
  title: string
  /** The first is all that a phone shows, so that the moves come soon. */
  lead: readonly string[]
}

/** In one breath whether it suits, and what to do. */
export function VerdictHead({ verdict, title, lead }: Props) {
  return (
    <>
      <h1>
        <VerdictMark mark={verdict} />
        {tied(title)}
      </h1>
      {lead.length > 0 && (
        <>
          <p className="lead d-only">{tied(lead.join(' '))}</p>
          <p className="lead m-only">{tied(lead[0])}</p>
        </>
      )}
    </>
  )
}
