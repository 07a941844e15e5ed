import 'server-only'
import { cookies } from 'next/headers'
import { decode, encode } from 'next-auth/jwt'
import { keyFor } from '@/lib/accounts/keys'
import { currentTime, type Milliseconds } from '@/lib/kernel/clock'
import { env } from './env'

/** Encrypts the cookie. Another key than any other use of the app's secret has. */
export const cookieSecret = () => keyFor('session cookie').toString('base64url')

/** Over https the cookie is sent back over https only, and says so in its name. */
export const cookiesAreSecure = () => env().publicAddress.startsWith('https://')

export const sessionCookieName = () => `${cookiesAreSecure() ? '__Secure-' : ''}setdown.session`

export const sessionCookieOptions = () => ({ httpOnly: true, sameSite: 'lax', path: '/', secure: cookiesAreSecure() }) as const

/** Makes the cookie of a session, in the form that next-auth reads and writes. It holds the session's id and nothing else. */
export function sealSession(sessionId: string, secondsLeft: number): Promise<string> {
  return encode({ token: { sessionId }, secret: cookieSecret(), maxAge: secondsLeft })
}

/** The session's id in a cookie, or nothing where it is none of ours, has run out or was tampered with. */
export async function openSealedSession(value: string): Promise<string | undefined> {
  try {
    const token = await decode({ token: value, secret: cookieSecret() })
    return typeof token?.sessionId === 'string' ? token.sessionId : undefined
  } catch {
    return undefined
  }
}

/** The session that the request at hand names. Whether it counts is the database's to say. */
export async function readSessionCookie(): Promise<string | undefined> {
  const value = (await cookies()).get(sessionCookieName())?.value
  return value ? openSealedSession(value) : undefined
}

export async function writeSessionCookie({ sessionId, expiresAt }: { sessionId: string; expiresAt: Milliseconds }) {
  const secondsLeft = Math.max(0, Math.floor((expiresAt - currentTime()) / 1000))
  const value = await sealSession(sessionId, secondsLeft)
  const jar = await cookies()
  jar.set(sessionCookieName(), value, { ...sessionCookieOptions(), maxAge: secondsLeft })
}

export async function clearSessionCookie() {
  const jar = await cookies()
  jar.set(sessionCookieName(), '', { ...sessionCookieOptions(), maxAge: 0 })
}
