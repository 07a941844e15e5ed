import { Readable } from 'node:stream'
import { everythingHeld } from '@/lib/download/archive'
import { ARCHIVE_NAME, DOWNLOAD_LIMIT } from '@/lib/download/terms'
import { Fault } from '@/lib/kernel/errors'
import { answerFault } from '@/lib/server/answer-fault'
import { env } from '@/lib/server/env'
import { countRequest } from '@/lib/server/rate-limit'
import { requestContext } from '@/lib/server/request-context'

export const dynamic = 'force-dynamic'

/** Everything that we hold about whoever is signed in, as one archive. */
export async function GET() {
  try {
    const context = await requestContext()
    if (context.actor.kind === 'visitor') throw new Fault('sign_in', 'Sign in first.')
    // Counted by person: it is about nobody else, wherever they ask from.
    await countRequest(context.db, DOWNLOAD_LIMIT, { address: context.actor.id, secret: env().appSecret })
    const body = Readable.toWeb(everythingHeld(context)) as ReadableStream<Uint8Array>
    return new Response(body, {
      headers: {
        'Content-Type': 'application/zip',
        'Content-Disposition': `attachment; filename="${ARCHIVE_NAME}"`,
        'Cache-Control': 'no-store',
        'X-Content-Type-Options': 'nosniff',
      },
    })
  } catch (trouble) {
    if (trouble instanceof Fault) return answerFault(trouble)
    throw trouble
  }
}
