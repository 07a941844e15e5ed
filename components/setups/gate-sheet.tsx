import { gateRemedies } from '@/lib/setups/sentences/gate'
import { RemediesList } from './remedies-list'
import { SheetHead } from './sheet-head'
import type { SheetParts } from './sheet-parts'

/** For what no figure would be true of: a plain answer, and what would do. */
export function GateSheet(parts: SheetParts) {
  const { gate } = parts.sheet.result.match
  return (
    <>
      <SheetHead {...parts} />
      {gate && <RemediesList heading="Something else" sentences={gateRemedies(gate)} plugs first />}
    </>
  )
}
