import 'server-only'
import { eq } from 'drizzle-orm'
import type { Database } from '@/db/client'
import { people } from '@/db/schema/accounts'
import type { Milliseconds } from '@/lib/kernel/clock'
import { Fault } from '@/lib/kernel/errors'
import { newId } from '@/lib/kernel/ids'
import type { Role } from './terms'

export type Person = typeof people.$inferSelect
type Reader = Pick<Database, 'select'>

/** What makes two addresses the same: case does not. The part before the @ could differ by it, and nowhere does. */
export function addressKey(email: string): string {
  return email.trim().toLowerCase()
}

export function personByAddress(db: Reader, email: string): Person | undefined {
  return db.select().from(people).where(eq(people.emailKey, addressKey(email))).get()
}

export function personById(db: Reader, id: string): Person | undefined {
  return db.select().from(people).where(eq(people.id, id)).get()
}

/** @throws Fault not_found */
export function mustBePerson(db: Reader, id: string): Person {
  const person = personById(db, id)
  if (!person) throw new Fault('not_found', 'There is no such account.')
  return person
}

interface NewPerson {
  email: string
  name: string
  role: Role
  passwordHash: string | null
  demo?: boolean
}

/** Makes an account for an address that is known to be its owner's. */
export function insertPerson(tx: Pick<Database, 'insert'>, { email, ...rest }: NewPerson, now: Milliseconds): Person {
  const address = email.trim()
  return tx
    .insert(people)
    .values({ id: newId('per'), email: address, emailKey: addressKey(address), emailConfirmedAt: now, createdAt: now, ...rest })
    .returning()
    .get()
}

/**
 * What everyone who proved who they are may be told of a closed account.
 * @throws Fault not_allowed
 */
export function mustBeOpen(person: Person) {
  if (person.disabledAt !== null) {
    throw new Fault('not_allowed', 'This account is closed. The workshop can open it again.', { detail: { personId: person.id } })
  }
}
