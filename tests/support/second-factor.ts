import { and, eq, isNotNull, isNull } from 'drizzle-orm'
import type { Database } from '@/db/client'
import { secondFactors } from '@/db/schema/accounts'
import { generatorOf, newSecret, openSecret, sealSecret } from '@/lib/accounts/second-factor'
import { newId } from '@/lib/kernel/ids'

/** Puts a confirmed authenticator on someone's account. */
export function addSecondFactor(db: Database, personId: string, now: number) {
  const row = { id: newId('fac'), personId, sealedSecret: sealSecret(newSecret(), personId), confirmedAt: now, lastCounter: 0, createdAt: now }
  db.insert(secondFactors).values(row).run()
}

/** What someone's authenticator shows at a time; of the one that is being set up, if asked. */
export function codeOf(db: Database, personId: string, now: number, { pending = false } = {}): string {
  const state = pending ? isNull(secondFactors.confirmedAt) : isNotNull(secondFactors.confirmedAt)
  const row = db.select().from(secondFactors).where(and(eq(secondFactors.personId, personId), state)).get()
  if (!row) throw new Error('This person has no authenticator.')
  return generatorOf(openSecret(row.sealedSecret, personId)).generate({ timestamp: now })
}
