import type { SheetsPage } from '@/lib/shelf/views'
import { MAX_SHEET_SEARCH_LENGTH, type SheetOrder, type SheetsShown } from '@/lib/shelf/terms'

const ORDER_WORDS: Record<SheetOrder, string> = {
  newest: 'Changed last first',
  number: 'By number',
  cartridge: 'By cartridge',
  preamp: 'By preamp',
  verdict: 'By verdict, open ones first',
}
const SHOWN_WORDS: Record<SheetsShown, string> = { kept: 'Kept', 'put-away': 'Put away' }

/** What of all sheets is shown, and in which order. A plain form: it needs no script. */
export function SheetsFilter({ q, show, order }: Pick<SheetsPage, 'q' | 'show' | 'order'>) {
  return (
    <form action="/shelf/sheets" method="get" role="search" className="filt">
      <div>
        <label className="lab" htmlFor="sheets-q">
          Cartridge, preamp, name or number
        </label>
        <span className="in">
          <input id="sheets-q" name="q" type="search" defaultValue={q} maxLength={MAX_SHEET_SEARCH_LENGTH} autoComplete="off" />
        </span>
      </div>
      <div>
        <label className="lab" htmlFor="sheets-show">
          Which
        </label>
        <select id="sheets-show" name="show" defaultValue={show}>
          {Object.entries(SHOWN_WORDS).map(([value, words]) => (
            <option key={value} value={value}>
              {words}
            </option>
          ))}
        </select>
      </div>
      <div>
        <label className="lab" htmlFor="sheets-order">
          Order
        </label>
        <select id="sheets-order" name="order" defaultValue={order}>
          {Object.entries(ORDER_WORDS).map(([value, words]) => (
            <option key={value} value={value}>
              {words}
            </option>
          ))}
        </select>
      </div>
      <button type="submit" className="b">
        Show
      </button>
    </form>
  )
}
