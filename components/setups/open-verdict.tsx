'use client'

import { DoubtBar } from '../plots/doubt-bar'
import { tied } from '@/lib/setups/format'
import { doubtsHeading, holdsHeading, NOTHING, whatHolds, type DoubtRow } from '@/lib/setups/sentences/doubts'
import { FigureBlock } from './figure-block'
import { useWhatIf } from './what-if'

/** What holds over everything not known, with the switches as drawn. */
export function HoldsTable({ label }: { label: string }) {
  const { inputs, shown } = useWhatIf()
  const held = whatHolds(shown.evaluation, inputs)
  if (held.length === 0) return null
  return (
    <FigureBlock label={label} heading={holdsHeading(held)}>
      <table className="ord">
        <caption className="vh">What can be said</caption>
        <tbody>
          {held.map(({ what, holds }) => (
            <tr key={what}>
              <th scope="row">{what}</th>
              <td>{tied(holds)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </FigureBlock>
  )
}

/** Everything that is not known, what we reckon with, what hangs on it and how much. */
export function DoubtsTable({ label, rows }: { label: string; rows: readonly DoubtRow[] }) {
  return (
    <FigureBlock label={label} heading={doubtsHeading(rows)}>
      <table className="ord">
        <caption className="vh">What we do not know</caption>
        <thead>
          <tr>
            <th scope="col">Not known</th>
            <th scope="col">We reckon with</th>
            <th scope="col">Decides</th>
            <th scope="col">Share of the doubt</th>
          </tr>
        </thead>
        <tbody>
          {rows.map(({ unknown, name, reckonedWith, decides, share }) => (
            // What decides nothing needs no paper.
            <tr key={unknown} className={decides === NOTHING ? 'no-p' : undefined}>
              <th scope="row">{name}</th>
              <td>{tied(reckonedWith)}</td>
              <td>{decides}</td>
              <td className="b1">
                <DoubtBar share={share} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </FigureBlock>
  )
}
