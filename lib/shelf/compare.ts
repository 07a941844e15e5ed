import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { getSheet } from '@/lib/setups/queries'
import type { SheetView } from '@/lib/setups/views'
import { mustHaveShelf } from './owner'
import { compareRevisions, type Compared, type ComparisonView } from './views-compare'

type Reader = Pick<Context, 'db' | 'actor'>

/** "k7m2-w9qd-h4tx-p3rt.B": a code and a letter; the newest where no letter is named. */
function named(context: Reader, text: string): SheetView {
  const [, code, letter] = /^(.*?)(?:\.([A-Za-z]))?$/.exec(text.trim()) ?? []
  if (!code) throw new Fault('not_found', 'There is no sheet under this code.')
  return getSheet(context, code, letter?.toUpperCase())
}

/**
 * Two revisions held against each other, of one sheet or of two. Each is named by its sheet's code, so whoever holds
 * both codes may compare.
 * @throws Fault sign_in; not_found, the same for a code that is none and a letter that the sheet does not have
 */
export function getComparison(context: Reader, { a, b, shown }: { a: string; b: string; shown: Compared | null }): ComparisonView {
  mustHaveShelf(context.actor, 'shelf:read')
  return compareRevisions(named(context, a), named(context, b), shown)
}
