import { requestContext } from '@/lib/server/request-context'
import { answersFrom, toQuery } from '@/lib/setups/schema'
import { STEP_PATHS } from '@/lib/setups/views-steps'
import { sentWith, wayOn } from '../go-on'

export const dynamic = 'force-dynamic'

/** A page on this site, by its path: behind a proxy the server does not know its own name. */
const seeOther = (path: string) => new Response(null, { status: 303, headers: { Location: path } })

/** Where the steps go without script. Sent as a form, so that a serial number never stands in an address. */
export async function POST(request: Request) {
  const data = await request.formData()
  const answers = answersFrom(Object.fromEntries(data))
  const path = wayOn(await requestContext(), sentWith(data, answers))
  return seeOther(path ?? `${STEP_PATHS['plays-into']}?${toQuery(answers)}`)
}

/** Someone came here by hand. */
export function GET(request: Request) {
  return seeOther(`${STEP_PATHS.preamp}${new URL(request.url).search}`)
}
