import { Fault } from '@/lib/kernel/errors'
import { requestContext } from '@/lib/server/request-context'
import { checkFromShelf } from '@/lib/shelf/check-from-shelf'

export const dynamic = 'force-dynamic'

/** A page on this site, by its path: behind a proxy the server does not know its own name. */
const seeOther = (path: string) => new Response(null, { status: 303, headers: { Location: path, 'Cache-Control': 'no-store' } })

/** Begins a check of one's own cartridge on one's own unit; back to the shelf where it is not there any more. */
export async function GET(request: Request) {
  const { searchParams } = new URL(request.url)
  try {
    const place = { unitId: searchParams.get('unit') ?? '', cartridgeId: searchParams.get('cartridge') ?? '' }
    return seeOther(checkFromShelf(await requestContext(), place).path)
  } catch (trouble) {
    if (trouble instanceof Fault) return seeOther('/shelf')
    throw trouble
  }
}
