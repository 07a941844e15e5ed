import 'server-only'
import type { NextAuthOptions } from 'next-auth'
import CredentialsProvider from 'next-auth/providers/credentials'
import type { z } from 'zod'
import { actorOfSession } from '@/lib/accounts/actor-of-session'
import type { Origin } from '@/lib/accounts/origin'
import { LinkInput, SignInInput } from '@/lib/accounts/schema'
import { endSessionRow, type OpenedSession } from '@/lib/accounts/sessions'
import { signInWithLink } from '@/lib/accounts/sign-in-with-link'
import { signInWithPassword } from '@/lib/accounts/sign-in-with-password'
import { SESSION_LASTS_MS } from '@/lib/accounts/terms'
import { currentTime } from '@/lib/kernel/clock'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { log } from './log'
import { nobodysContext } from './nobodys-context'
import { requestOrigin } from './origin'
import { cookieSecret, cookiesAreSecure, sessionCookieName, sessionCookieOptions } from './session-cookie'

type SignIn<Input> = (context: Context, input: Input, origin: Origin) => OpenedSession | Promise<OpenedSession>

/** Runs a verb for next-auth. Null is its word for "no"; a reason would end up in the address bar, so it gets none. */
async function authorize<Schema extends z.ZodType>(schema: Schema, signIn: SignIn<z.output<Schema>>, sent: unknown) {
  const input = schema.safeParse(sent)
  if (!input.success) return null
  try {
    const { sessionId } = await signIn(nobodysContext(), input.data, await requestOrigin())
    return { id: sessionId }
  } catch (trouble) {
    if (!(trouble instanceof Fault)) log().error({ err: trouble }, 'A sign-in failed.')
    return null
  }
}

/**
 * How next-auth signs people in: by the same two verbs as the pages. Its token carries the id of our session and nothing
 * else; who that is, and whether it still counts, is asked of the database with every request.
 */
export function authOptions(): NextAuthOptions {
  return {
    secret: cookieSecret(),
    useSecureCookies: cookiesAreSecure(),
    session: { strategy: 'jwt', maxAge: SESSION_LASTS_MS.owner / 1000 },
    cookies: { sessionToken: { name: sessionCookieName(), options: sessionCookieOptions() } },
    pages: { signIn: '/sign-in', signOut: '/account', error: '/sign-in' },
    providers: [
      CredentialsProvider({
        id: 'password',
        name: 'Password',
        credentials: { email: { label: 'Mail address' }, password: { label: 'Password', type: 'password' } },
        authorize: (sent) => authorize(SignInInput, signInWithPassword, sent),
      }),
      CredentialsProvider({
        id: 'link',
        name: 'Link by mail',
        credentials: { token: { label: 'Link' } },
        authorize: (sent) => authorize(LinkInput, signInWithLink, sent),
      }),
    ],
    callbacks: {
      jwt: ({ token, user }) => ({ sessionId: user ? user.id : token.sessionId }),
      session({ session: { expires }, token }) {
        const { db } = nobodysContext()
        const actor = typeof token.sessionId === 'string' ? actorOfSession(db, token.sessionId, currentTime()) : undefined
        return actor?.kind === 'person' ? { expires, user: { name: actor.name } } : { expires }
      },
    },
    events: {
      signOut({ token }) {
        if (typeof token?.sessionId === 'string') endSessionRow(nobodysContext().db, token.sessionId, currentTime())
      },
    },
    logger: {
      error: (code, details) => log().error({ code, details }, 'next-auth failed.'),
      warn: (code) => log().warn({ code }, 'next-auth warns.'),
      debug: () => undefined,
    },
  }
}
