import { countWord, tied } from '@/lib/setups/format'
import { othersHeading, type OtherRow } from '@/lib/setups/sentences/others'
import { FigureBlock } from './figure-block'

interface Props {
  label: string
  shown: readonly OtherRow[]
  all: readonly OtherRow[]
  /** How many were reckoned, the advice included. */
  combinations: number
}

/** Other settings and why not: those worth a try first, then what stands for the rest, then every one. */
export function OthersTable({ label, shown, all, combinations }: Props) {
  const reckoned = `We reckoned all ${countWord(combinations)}.`
  const more = all.length > shown.length
  return (
    <FigureBlock label={label} heading={othersHeading(all)} paragraphs={[more ? `${reckoned} These stand for the rest.` : reckoned]} screenOnly>
      <div>
        <Rows caption="Other settings, and why not" rows={shown} />
        {more && (
          <details className="all">
            <summary>Show all</summary>
            <Rows caption="All other settings" rows={all} />
          </details>
        )}
      </div>
    </FigureBlock>
  )
}

function Rows({ caption, rows }: { caption: string; rows: readonly OtherRow[] }) {
  return (
    <table className="alt">
      <caption className="vh">{caption}</caption>
      <thead>
        <tr>
          <th scope="col">Setting</th>
          <th scope="col">Comes to</th>
          <th scope="col">Why, or why not</th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ key, setting, comesTo, why }) => (
          <tr key={key}>
            <td>{setting}</td>
            <td>{tied(comesTo)}</td>
            <td>{tied(why)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  )
}
