import type { Instrumentation } from 'next'

/** Runs once when the server starts, before the first request. */
export async function register() {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  const { startBackground } = await import('@/lib/server/background')
  startBackground()
}

/** Unforeseen trouble while answering is logged here, once. */
export const onRequestError: Instrumentation.onRequestError = async (trouble, request, context) => {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  const { log, withoutCodes } = await import('@/lib/server/log')
  log().error(
    { err: trouble, method: request.method, path: withoutCodes(request.path), route: context.routePath },
    'A request failed.',
  )
}
