import type { Instrumentation } from 'next'

/** Unforeseen trouble while answering is logged here, once. */
export const onRequestError: Instrumentation.onRequestError = async (trouble, request, context) => {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  const { log, withoutCodes } = await import('@/lib/server/log')
  log().error(
    { err: trouble, method: request.method, path: withoutCodes(request.path), route: context.routePath },
    'A request failed.',
  )
}
