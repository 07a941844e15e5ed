import { VerdictMark } from '../ui/verdict-mark'
import type { VerdictKind } from '@/lib/match/result'
import { tied } from '@/lib/setups/format'

interface Props {
  verdict: VerdictKind
  title: string
  lead: readonly string[]
  /** On a phone the first sentence is enough, so that the moves come soon. */
  short: boolean
}

/** In one breath whether it suits, and what to do. */
export function VerdictHead({ verdict, title, lead, short }: Props) {
  return (
    <>
      <h1>
        <VerdictMark mark={verdict} />
        {tied(title)}
      </h1>
      {lead.length > 0 && <p className={short ? 'lead d-only' : 'lead'}>{tied(lead.join(' '))}</p>}
      {lead.length > 0 && short && <p className="lead m-only">{tied(lead[0])}</p>}
    </>
  )
}
