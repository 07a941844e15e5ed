import 'server-only'
import { and, count, eq, isNull } from 'drizzle-orm'
import type { Database } from '@/db/client'
import { recoveryCodes } from '@/db/schema/accounts'
import type { Milliseconds } from '@/lib/kernel/clock'
import { randomLetters } from '@/lib/kernel/ids'
import { keyedHash } from './keys'
import { RECOVERY_CODE_COUNT } from './terms'

/** Ten letters of 28: 48 bits, which nobody tries through at a few tries in a quarter of an hour. */
const LETTERS = 10

/** However it was typed: capitals, spaces and hyphens make no difference. */
const hashOf = (personId: string, code: string) => keyedHash('recovery code', `${personId}:${code.toLowerCase().replace(/[^a-z0-9]/g, '')}`)

/** Makes new recovery codes in place of the old ones. They are shown this once: only hashes are kept. */
export function renewRecoveryCodes(tx: Pick<Database, 'delete' | 'insert'>, personId: string, now: Milliseconds): string[] {
  dropRecoveryCodes(tx, personId)
  return Array.from({ length: RECOVERY_CODE_COUNT }, () => {
    const letters = randomLetters(LETTERS)
    tx.insert(recoveryCodes).values({ hash: hashOf(personId, letters), personId, createdAt: now }).run()
    return `${letters.slice(0, LETTERS / 2)}-${letters.slice(LETTERS / 2)}`
  })
}

/** Takes a recovery code, once. @returns whether it was one of theirs and unused */
export function takeRecoveryCode(tx: Pick<Database, 'update'>, personId: string, code: string, now: Milliseconds): boolean {
  const { changes } = tx
    .update(recoveryCodes)
    .set({ usedAt: now })
    .where(and(eq(recoveryCodes.hash, hashOf(personId, code)), eq(recoveryCodes.personId, personId), isNull(recoveryCodes.usedAt)))
    .run()
  return changes === 1
}

export function recoveryCodesLeft(db: Pick<Database, 'select'>, personId: string): number {
  const row = db
    .select({ left: count() })
    .from(recoveryCodes)
    .where(and(eq(recoveryCodes.personId, personId), isNull(recoveryCodes.usedAt)))
    .get()
  return row?.left ?? 0
}

export function dropRecoveryCodes(tx: Pick<Database, 'delete'>, personId: string) {
  tx.delete(recoveryCodes).where(eq(recoveryCodes.personId, personId)).run()
}
