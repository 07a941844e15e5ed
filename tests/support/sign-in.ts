import { randomUUID } from 'node:crypto'
import type { BrowserContext } from '@playwright/test'
import { encode } from 'next-auth/jwt'
import { people, secondFactors, sessions } from '@/db/schema/accounts'
import type { Role } from '@/lib/accounts/terms'
import { deriveKey } from '@/lib/kernel/derive-key'
import { newId } from '@/lib/kernel/ids'
import { pagesDatabase, pagesSecret } from './pages'

const DAY = 24 * 60 * 60_000

export interface SignedInPerson {
  id: string
  email: string
  name: string
}

/** A new account of a browser test's own, so that tests do not get in each other's way. */
export function newAccount({ role = 'owner', name = 'Hettie' }: { role?: Role; name?: string } = {}): SignedInPerson {
  const db = pagesDatabase()
  const now = Date.now()
  const person = { id: newId('per'), name, email: `${name.toLowerCase()}-${randomUUID().slice(0, 8)}@brandreth.example` }
  db.insert(people).values({ ...person, emailKey: person.email, role, emailConfirmedAt: now, createdAt: now }).run()
  if (role === 'admin') {
    // Never asked for, since the session below is complete; without one an admin is led to setting one up.
    const sealedSecret = Buffer.alloc(48)
    db.insert(secondFactors).values({ id: newId('fac'), personId: person.id, sealedSecret, confirmedAt: now, lastCounter: 0, createdAt: now }).run()
  }
  return person
}

/** Signs a browser in as someone, by a row in the database and the cookie that names it: fast, and without the page. */
export async function signIn(context: BrowserContext, person: SignedInPerson = newAccount()): Promise<SignedInPerson> {
  const now = Date.now()
  const session = { id: newId('ses'), personId: person.id, completedAt: now, lastSeenAt: now, expiresAt: now + DAY, createdAt: now }
  pagesDatabase().insert(sessions).values({ ...session, device: 'Firefox on Linux', origin: '203.0.113.x' }).run()
  const secret = deriveKey(pagesSecret(), 'session cookie').toString('base64url')
  const value = await encode({ token: { sessionId: session.id }, secret, maxAge: DAY / 1000 })
  await context.addCookies([{ name: 'setdown.session', value, domain: '127.0.0.1', path: '/', httpOnly: true, sameSite: 'Lax' }])
  return person
}
