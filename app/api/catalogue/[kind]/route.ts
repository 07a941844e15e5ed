import { findEntries } from '@/lib/catalogue/find-entries'
import { CatalogueSearch } from '@/lib/catalogue/schema-search'
import { SEARCHED_KINDS } from '@/lib/catalogue/terms'
import { Fault } from '@/lib/kernel/errors'
import { answerFault, faultOfIssues } from '@/lib/server/answer-fault'
import { requestContext } from '@/lib/server/request-context'

export const dynamic = 'force-dynamic'

/** Long enough to type a name and go back over it, short enough that an edit shows the same minute. */
const CACHE = 'private, max-age=30'

const isSearched = (kind: string) => SEARCHED_KINDS.some((known) => known === kind)

/**
 * Type-ahead over the catalogue: `q` words, `type`, `limit` up to 20, `cursor` from the answer before.
 * Answers `{ entries, next }`; 422 with sentences by field, 404 for a list that does not exist.
 */
export async function GET(request: Request, { params }: { params: Promise<{ kind: string }> }) {
  const { kind } = await params
  if (!isSearched(kind)) return answerFault(new Fault('not_found', 'There is no such list in the catalogue.'))
  const asked = Object.fromEntries(new URL(request.url).searchParams)
  const search = CatalogueSearch.safeParse({ ...asked, kind })
  if (!search.success) return answerFault(faultOfIssues(search.error))
  try {
    return Response.json(findEntries(await requestContext(), search.data), { headers: { 'Cache-Control': CACHE } })
  } catch (trouble) {
    if (trouble instanceof Fault) return answerFault(trouble)
    throw trouble
  }
}
