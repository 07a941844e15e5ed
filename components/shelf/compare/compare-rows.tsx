import { countWord, sentenceCase, tied } from '@/lib/setups/format'
import type { ComparedRow } from '@/lib/shelf/views-compare'

interface Props {
  heading: string
  rows: readonly ComparedRow[]
  labels: { a: string; b: string }
  /** Rows that are equal stand folded into one line. */
  folded?: boolean
}

/** Rows held against each other: bold and with a bar where they differ, grey where they are equal. */
export function CompareRows({ heading, rows, labels, folded = false }: Props) {
  const equal = rows.filter(({ differs }) => !differs)
  const shown = folded ? rows.filter(({ differs }) => differs) : rows
  return (
    <section className="cmp-s">
      <h2>{heading}</h2>
      {shown.length > 0 && <Rows caption={heading} rows={shown} labels={labels} />}
      {folded && equal.length > 0 && (
        <details className="same">
          <summary>
            {sentenceCase(countWord(equal.length))} {shown.length > 0 ? 'other ' : ''}
            {equal.length === 1 ? 'value is' : 'values are'} the same. <span>Show</span>
          </summary>
          <Rows caption={`${heading}, the same in both`} rows={equal} labels={labels} />
        </details>
      )}
    </section>
  )
}

function Rows({ caption, rows, labels }: { caption: string; rows: readonly ComparedRow[]; labels: { a: string; b: string } }) {
  return (
    <table className="cmpt">
      <caption className="vh">{caption}</caption>
      <colgroup>
        <col className="c0" />
        <col />
        <col />
      </colgroup>
      <thead className="vh">
        <tr>
          <th scope="col">Value</th>
          <th scope="col">{labels.a}</th>
          <th scope="col">{labels.b}</th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ label, a, b, differs }) => (
          <tr key={label} className={differs ? 'ch' : undefined}>
            <th scope="row">{label}</th>
            <td>{tied(a)}</td>
            <td>
              {differs && <span className="vh">differs: </span>}
              {tied(b)}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  )
}
