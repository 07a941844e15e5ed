import Link from 'next/link'
import { dayInYear } from '@/lib/shelf/format'
import type { SheetMark } from '@/lib/shelf/views'
import { RevisionLetters } from './revision-letters'
import { VerdictLine } from './verdict-line'

/** Sheets as rows, each leading to its revisions. */
export function SheetsTable({ sheets, now }: { sheets: readonly SheetMark[]; now: number }) {
  return (
    <table className="shl">
      <caption className="vh">Your sheets</caption>
      <thead>
        <tr>
          <th scope="col">Sheet</th>
          <th scope="col">Cartridge</th>
          <th scope="col">Preamp</th>
          <th scope="col">Verdict</th>
          <th scope="col">Revisions</th>
          <th scope="col">Changed</th>
        </tr>
      </thead>
      <tbody>
        {sheets.map(({ number, name, cartridgeName, modelName, verdict, letters, changedAt }) => (
          <tr key={number}>
            <th scope="row">
              <Link href={`/shelf/sheets/${number}`}>Sheet {number}</Link>
              {name && <span className="sub">{name}</span>}
            </th>
            <td>{cartridgeName || 'no name on it'}</td>
            <td>{modelName}</td>
            <td>
              <VerdictLine verdict={verdict} />
            </td>
            <td>
              <RevisionLetters letters={letters} />
            </td>
            <td>{dayInYear(changedAt, now)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  )
}
