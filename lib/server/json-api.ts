import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { answerFault } from './answer-fault'
import { env } from './env'
import { addressOf, countRequest, type Limit } from './rate-limit'
import { requestContext } from './request-context'

/** A check takes some milliseconds of the processor; a person makes a few a minute, a script may make more. */
export const API_LIMIT: Limit = { name: 'api', perAddress: 60, together: 1200, seconds: 60 }

/**
 * Answers a request of the JSON API: counts it, runs it, and puts a fault into the same form everywhere. Nothing is
 * kept by a cache.
 */
export async function answerJson(request: Request, run: (context: Context) => object | Promise<object>): Promise<Response> {
  try {
    const context = await requestContext()
    await countRequest(context.db, API_LIMIT, { address: addressOf(request.headers), secret: env().appSecret })
    return Response.json(await run(context), { headers: { 'Cache-Control': 'no-store' } })
  } catch (trouble) {
    if (trouble instanceof Fault) return answerFault(trouble)
    throw trouble
  }
}
