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
 * Gives every page a nonce of its own. Next reads it from the request's policy and puts it on its scripts; the
 * browser holds the answer's policy against them.
 */
export function proxy(request: NextRequest) {
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
