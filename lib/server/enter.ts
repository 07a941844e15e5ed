import 'server-only'
import { redirect } from 'next/navigation'
import type { OpenedSession } from '@/lib/accounts/sessions'
import type { Context } from '@/lib/kernel/context'
import { pathWithin } from '@/lib/kernel/path-within'
import type { Outcome } from './action'
import { requestContext } from './request-context'
import { writeSessionCookie } from './session-cookie'

/** Where people land who came to sign in and nothing else. */
export const FIRST_PAGE = '/account'
export const SET_UP_PAGE = '/account/second-factor'

const withNext = (path: string, next: string) => (next === FIRST_PAGE ? path : `${path}?next=${encodeURIComponent(next)}`)

/** After a sign-in: hands over the cookie, and leads to the code where one is awaited, or to where they wanted to go. */
export async function enter(opened: OpenedSession, { next }: { next?: string }): Promise<Outcome> {
  await writeSessionCookie(opened)
  const target = pathWithin(next, FIRST_PAGE)
  return { go: opened.codeAwaited ? withNext('/second-factor', target) : target }
}

/**
 * The context of a page that is someone's own. Sends everyone else where they have to go first: visitors to sign in, who
 * owes a code to the code, an admin without a second factor to setting it up. What they may do is for the verbs to say.
 */
export async function ownContext(path: string): Promise<Context> {
  const context = await requestContext()
  if (context.actor.kind === 'visitor') redirect(withNext(context.actor.awaitsCode ? '/second-factor' : '/sign-in', path))
  if (context.actor.mustSetUpSecondFactor && path !== SET_UP_PAGE) redirect(SET_UP_PAGE)
  return context
}
