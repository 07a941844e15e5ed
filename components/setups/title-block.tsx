import { tied } from '@/lib/setups/format'
import type { TitleRow } from '@/lib/setups/sentences/title-block'
import { PrintButton, ShareButton } from './sheet-buttons'
import Link from 'next/link'

interface Props {
  rows: readonly TitleRow[]
  /** Where its answers can be changed. */
  changePath: string
  address: string
  /** True where the page asks for nothing, so that Share is what one does next. */
  sharesFirst: boolean
}

/** What the sheet is about, with what can be done with it. */
export function TitleBlock({ rows, changePath, address, sharesFirst }: Props) {
  return (
    <div className="tbc">
      {rows.map(({ label, value, note }) => (
        <div key={label}>
          <span className="lab">{label}</span>
          <span className="dat">{tied(value)}</span>
          {note && <span className="sub">{tied(note)}</span>}
        </div>
      ))}
      <div className="ac2 no-p">
        <ShareButton address={address} primary={sharesFirst} />
        <PrintButton />
        <Link className="b wide" href={changePath}>
          Change an answer
        </Link>
      </div>
    </div>
  )
}

/** The same as a bar of cells, for paper. */
export function TitleBar({ rows }: { rows: readonly TitleRow[] }) {
  return (
    <div className="tbw p-only">
      <div className="tb five">
        {rows.map(({ label, value, note }) => (
          <div key={label}>
            <span className="lab">{label}</span>
            <span className="dat">{tied(value)}</span>
            {note && <span className="sub">{tied(note)}</span>}
          </div>
        ))}
      </div>
    </div>
  )
}
