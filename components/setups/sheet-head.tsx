import type { ReactNode } from 'react'
import { sheetRow, titleRows } from '@/lib/setups/sentences/title-block'
import { troubleSentence } from '@/lib/setups/sentences/troubles'
import { verdictLead, verdictTitle } from '@/lib/setups/sentences/verdict'
import type { SheetView } from '@/lib/setups/views'
import { FieldError } from './field-error'
import { RevisionNotes } from './revision-notes'
import type { SheetParts } from './sheet-parts'
import { TitleBar, TitleBlock } from './title-block'
import { VerdictHead } from './verdict-head'

interface Props extends SheetParts {
  /** Under the verdict, beside the title block. */
  children?: ReactNode
}

/** Verdict and title block, with the revisions above them where there are several. */
export function SheetHead({ sheet, paths, address, returned, children }: Props) {
  const { inputs, result } = sheet
  const facts = { inputs, result: result.match, alternatives: result.alternatives }
  const trouble = returned && troubleSentence(returned.trouble)
  const rows = [...titleRows(inputs), sheetRow(sheet)]
  return (
    <>
      <RevisionNotes {...sheet} model={inputs.preamp.modelName} />
      {trouble && <FieldError>{trouble}</FieldError>}
      <section className="ver2">
        <div>
          <VerdictHead verdict={result.match.verdict} title={verdictTitle(facts)} lead={verdictLead(facts)} short={asksForMoves(sheet)} />
          {children}
        </div>
        <TitleBlock rows={rows} changePath={paths.change} address={address} sharesFirst={!asksForMoves(sheet)} />
      </section>
      <TitleBar rows={rows} />
    </>
  )
}

function asksForMoves({ result: { match } }: SheetView): boolean {
  return match.gate === null && match.verdict !== 'does-not-suit' && match.verdict !== 'cannot-say' && match.moves?.length !== 0
}
