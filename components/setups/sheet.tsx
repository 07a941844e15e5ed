import type { SheetView } from '@/lib/setups/views'
import { FullSheet } from './full-sheet'
import { GateSheet } from './gate-sheet'
import { KeepIt } from './keep-it'
import { OpenSheet } from './open-sheet'
import { PaperFoot, PROMISE } from './paper'
import { adviceOf, pathsOf } from './sheet-facts'
import type { ReturnedForm } from './sheet-parts'
import { WhatIfSheet } from './what-if'
import { WhatNext } from './what-next'

interface Props {
  sheet: SheetView
  /** Scheme and host of this service. */
  origin: string
  returned: ReturnedForm | null
}

/** A set-up sheet, in the order in which an owner needs it. */
export function Sheet({ sheet, origin, returned }: Props) {
  const { inputs, number, code, rulesVersion } = sheet
  const address = `${origin}/sheets/${code}`
  const paths = pathsOf(sheet)
  const advice = adviceOf(sheet)
  const parts = { sheet, paths, address, returned }
  return (
    <main id="main" className="w sheet" tabIndex={-1}>
      {!advice ? (
        <GateSheet {...parts} />
      ) : (
        <WhatIfSheet key={`${code} ${sheet.letter}`} inputs={inputs} advice={advice}>
          {sheet.result.match.verdict === 'cannot-say' ? <OpenSheet {...parts} advice={advice} /> : <FullSheet {...parts} advice={advice} />}
        </WhatIfSheet>
      )}
      <KeepIt number={number} code={code} address={address} mayChange={sheet.mayChange} keeping={sheet.keeping} />
      <WhatNext changePath={paths.change} anotherCartridgePath={paths.anotherCartridge} />
      <p className="prm no-p">
        {PROMISE} Rules, version {rulesVersion}.
      </p>
      <PaperFoot {...sheet} address={address} />
    </main>
  )
}

