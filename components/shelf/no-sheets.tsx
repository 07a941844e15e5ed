import Link from 'next/link'
import type { SheetsPage } from '@/lib/shelf/views'

/** What stands in place of an empty list, and the way on. */
export function NoSheets({ q, show }: Pick<SheetsPage, 'q' | 'show'>) {
  if (q) {
    return (
      <p>
        No sheet of yours matches &ldquo;{q}&rdquo;. Try a shorter word, or <Link href="/shelf/sheets">show all of them</Link>.
      </p>
    )
  }
  if (show === 'put-away') return <p>You have put no sheet away.</p>
  return (
    <p>
      You have no sheets yet. <Link href="/check">Check a cartridge</Link>, or <Link href="/shelf/sheets/add">add a sheet by its code</Link>.
    </p>
  )
}
