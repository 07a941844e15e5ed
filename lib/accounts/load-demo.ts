import 'server-only'
import { eq } from 'drizzle-orm'
import { people, secondFactors } from '@/db/schema/accounts'
import type { Context } from '@/lib/kernel/context'
import { newId } from '@/lib/kernel/ids'
import { DEMO_PEOPLE, demoPassword, demoSecret } from './demo'
import { hashPassword, passwordIs } from './passwords'
import { insertPerson, personByAddress, type Person } from './people'
import { confirmedFactor, openSecret, sealSecret } from './second-factor'

/**
 * Makes the demo's people where they are missing, and gives those that are there the password and the authenticator that
 * the start prints, whatever a visitor of the demo changed. Someone who really has one of these addresses is left alone.
 */
export async function loadDemoPeople({ db, now }: Pick<Context, 'db' | 'now'>) {
  for (const { email, name, role } of DEMO_PEOPLE) {
    const password = demoPassword(email)
    const known = personByAddress(db, email)
    if (known && !known.demo) continue
    const right = known !== undefined && (await passwordIs(known.passwordHash, password))
    const passwordHash = right ? known.passwordHash : await hashPassword(password)
    const person = known ?? insertPerson(db, { email, name, role, passwordHash, demo: true }, now)
    if (!right) db.update(people).set({ passwordHash }).where(eq(people.id, person.id)).run()
    if (role === 'admin') setAuthenticator(db, person, now)
  }
}

function setAuthenticator(db: Context['db'], { id, email }: Person, now: number) {
  const secret = demoSecret(email)
  const known = confirmedFactor(db, id)
  if (known && opensTo(known.sealedSecret, id, secret)) return
  db.transaction((tx) => {
    tx.delete(secondFactors).where(eq(secondFactors.personId, id)).run()
    const row = { id: newId('fac'), personId: id, sealedSecret: sealSecret(secret, id), confirmedAt: now, lastCounter: 0, createdAt: now }
    tx.insert(secondFactors).values(row).run()
  })
}

/** False as well where it was sealed under another secret of the app. */
function opensTo(sealed: Buffer, personId: string, secret: Buffer): boolean {
  try {
    return openSecret(sealed, personId).equals(secret)
  } catch {
    return false
  }
}
