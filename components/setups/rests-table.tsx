import Link from 'next/link'
import { RangeBar } from '../plots/range-bar'
import { tied } from '@/lib/setups/format'
import { restsHeading, type RestRow } from '@/lib/setups/sentences/rests'
import { FigureBlock } from './figure-block'

interface Props {
  label: string
  rows: readonly RestRow[]
  /** What the number to find next would do. */
  next: string | null
  /** Where a value can be entered. */
  enterPath: (row: NonNullable<RestRow['enter']>) => string
}

/** Every value that went in: used here, where it sits, where it came from. */
export function RestsTable({ label, rows, next, enterPath }: Props) {
  return (
    <FigureBlock label={label} heading={restsHeading(rows)} aside={next && <p className="no-p">{next}</p>}>
      <table className="as">
        <caption className="vh">What this rests on</caption>
        <thead>
          <tr>
            <th scope="col">Value</th>
            <th scope="col">Used here</th>
            <th scope="col" className="bar">
              Where it sits
            </th>
            <th scope="col">Where it came from</th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.key} className={row.screenOnly ? 'no-p' : undefined}>
              <th scope="row">{row.value}</th>
              <td className="v">{tied(row.used)}</td>
              <td className="bar">{row.bar && <RangeBar {...row.bar} />}</td>
              <td className="src">
                {tied(row.from)}
                {row.enter && (
                  <span className="no-p">
                    . <Link href={enterPath(row.enter)} aria-label={`Enter it: ${row.value}`}>Enter it</Link>
                  </span>
                )}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </FigureBlock>
  )
}
