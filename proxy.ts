import { NextResponse, type NextRequest } from 'next/server'

/** Tools of development run code made from text and write style tags; the built product does neither. */
const developing = process.env.NODE_ENV === 'development'

function contentSecurityPolicy(nonce: string): string {
  const script = `'self' 'nonce-${nonce}' 'strict-dynamic'${developing ? " 'unsafe-eval'" : ''}`
  const style = developing ? "'self' 'unsafe-inline'" : `'self' 'nonce-${nonce}'`
  return [
    "default-src 'self'",
    `script-src ${script}`,
    `style-src ${style}`,
    "img-src 'self' data:",
    "font-src 'self'",
    "connect-src 'self'",
    "object-src 'none'",
    "base-uri 'none'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join('; ')
}

/**
 * Whether a page of another site sent this. Browsers say where a request comes from; what says neither is no browser, and
 * carries no cookie of ours that a stranger could ride on.
 */
function isForeign({ method, headers }: NextRequest): boolean {
  if (method === 'GET' || method === 'HEAD') return false
  const site = headers.get('sec-fetch-site')
  if (site) return site !== 'same-origin' && site !== 'none'
  const origin = headers.get('origin')
  if (origin === null) return false
  return !URL.canParse(origin) || new URL(origin).host !== (headers.get('x-forwarded-host') ?? headers.get('host'))
}

/**
 * Turns away what other sites send, and gives every page a nonce of its own. Next reads it from the request's policy and puts it on its scripts; the
 * browser holds the answer's policy against them.
 */
export function proxy(request: NextRequest) {
  if (isForeign(request)) return new NextResponse('This was sent from another site, so it is not done.\n', { status: 403 })
  // A mail's own page comes with a policy of its own, tighter than that of pages and without a nonce.
  if (/^\/workshop\/mailbox\/[^/]+\/html$/.test(request.nextUrl.pathname)) return NextResponse.next()
  const policy = contentSecurityPolicy(btoa(crypto.randomUUID()))
  const headers = new Headers(request.headers)
  headers.set('Content-Security-Policy', policy)
  const response = NextResponse.next({ request: { headers } })
  response.headers.set('Content-Security-Policy', policy)
  // The address of a sheet opens it, so it must not travel on with a link.
  const secret = /^\/(?:api\/)?sheets(?:\/|$)/.test(request.nextUrl.pathname)
  response.headers.set('Referrer-Policy', secret ? 'no-referrer' : 'same-origin')
  return response
}

export const config = { matcher: '/((?!_next/static/).*)' }
