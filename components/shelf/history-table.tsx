import Link from 'next/link'
import { dayText } from '@/lib/setups/format'
import { comparePath } from '@/lib/shelf/format'
import type { SheetHistory } from '@/lib/shelf/views'
import { VerdictLine } from './verdict-line'

/** Every state of a sheet, the newest first. */
export function HistoryTable({ sheet: { code, archived, revisions } }: { sheet: SheetHistory }) {
  return (
    <table className="shl hst">
      <caption className="vh">Revisions of this sheet</caption>
      <thead>
        <tr>
          <th scope="col">Revision</th>
          <th scope="col">Made</th>
          <th scope="col">Verdict</th>
          <th scope="col">Worth knowing</th>
          <th scope="col">
            <span className="vh">Look at it</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {revisions.map(({ letter, createdAt, verdict, worthKnowing }, index) => {
          const before = revisions[index + 1]
          return (
            <tr key={letter}>
              <th scope="row">
                <span className="rv">
                  <b className={index === 0 ? 'on' : undefined}>{letter}</b>
                </span>
                {index === 0 && <span className="sub">in use</span>}
              </th>
              <td>{dayText(createdAt)}</td>
              <td>
                <VerdictLine verdict={verdict} />
              </td>
              <td>{worthKnowing}</td>
              <td>
                {!archived && (
                  <>
                    <Link href={`/sheets/${code}?revision=${letter}`}>Open {letter}</Link>
                    {before && (
                      <>
                        <br />
                        <Link href={comparePath({ code, letter: before.letter }, { code, letter })}>
                          {before.letter} beside {letter}
                        </Link>
                      </>
                    )}
                  </>
                )}
              </td>
            </tr>
          )
        })}
      </tbody>
    </table>
  )
}
