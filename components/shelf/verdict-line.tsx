import { VerdictMark } from '@/components/ui/verdict-mark'
import type { VerdictKind } from '@/lib/match/result'
import { VERDICT_SHORT } from '@/lib/setups/sentences/short-verdicts'

/** A verdict in a row: its mark and its short form, never one without the other. */
export function VerdictLine({ verdict }: { verdict: VerdictKind }) {
  return (
    <span className="vl">
      <VerdictMark mark={verdict} />
      {VERDICT_SHORT[verdict]}
    </span>
  )
}
