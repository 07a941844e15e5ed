import { Fault } from '@/lib/kernel/errors'
import { requestContext } from '@/lib/server/request-context'
import { getSheet } from '@/lib/setups/queries'
import { toQuery } from '@/lib/setups/schema'
import { cartridgeAnswersOf } from '@/lib/shelf/views-answers'

export const dynamic = 'force-dynamic'

/** A page on this site, by its path: behind a proxy the server does not know its own name. */
const seeOther = (path: string) => new Response(null, { status: 303, headers: { Location: path, 'Cache-Control': 'no-store' } })

/** Takes the cartridge of a sheet into the form that puts one on the shelf. */
export async function GET(request: Request) {
  try {
    const { code, answers } = getSheet(await requestContext(), new URL(request.url).searchParams.get('sheet') ?? '')
    return seeOther(`/shelf/cartridges/new?${toQuery(cartridgeAnswersOf(answers))}&fromSheet=${code}`)
  } catch (trouble) {
    if (trouble instanceof Fault) return seeOther('/shelf')
    throw trouble
  }
}
