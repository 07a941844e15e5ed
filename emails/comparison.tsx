import { Column, Row } from '@react-email/components'
import type { CSSProperties } from 'react'
import { LIGHT } from './inks'
import { row, text } from './styles'

export interface Comparison {
  /** What is compared, what it is now, what it would be: "Sheet 4471", "Now, A", "With B". */
  head: [string, string, string]
  rows: [name: string, now: string, then: string][]
}

const CELL: CSSProperties = { padding: '8px 8px 8px 0', borderBottom: `1px solid ${LIGHT.hair}` }
const HEAD: CSSProperties = { ...text(14, 20, LIGHT.ink2), padding: '0 8px 6px 0', borderBottom: `1px solid ${LIGHT.ink}` }

/** Before and after, side by side: a table of data, in plain text too. */
export function BeforeAndAfter({ head, rows }: Comparison) {
  return (
    <Row>
      <Column className="pad" style={row(16)}>
        <table data-text-format="dataTable" width="100%" cellPadding={0} cellSpacing={0}>
          <thead>
            <tr>
              {head.map((words) => (
                <th key={words} scope="col" align="left" className="ink2 edge" style={HEAD}>
                  {words}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {rows.map(([name, now, then]) => (
              <tr key={name}>
                <th scope="row" align="left" className="ink hair" style={{ ...text(15, 20), ...CELL }}>
                  {name}
                </th>
                <td className="ink2 hair" style={{ ...text(15, 20, LIGHT.ink2), ...CELL }}>
                  {now}
                </td>
                <td className="ink hair" style={{ ...text(15, 20), fontWeight: 700, ...CELL }}>
                  {then}
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </Column>
    </Row>
  )
}
