import 'server-only'
import { createCipheriv, createDecipheriv, randomBytes } from 'node:crypto'
import { and, eq, isNotNull, isNull } from 'drizzle-orm'
import { Secret, TOTP } from 'otpauth'
import type { Database } from '@/db/client'
import { secondFactors } from '@/db/schema/accounts'
import type { Milliseconds } from '@/lib/kernel/clock'
import { keyFor } from './keys'

export type SecondFactorRow = typeof secondFactors.$inferSelect
type Reader = Pick<Database, 'select'>

// RFC 6238 with what every authenticator app takes: SHA-1, six figures, half a minute.
const SETTINGS = { algorithm: 'SHA1', digits: 6, period: 30 }
/** RFC 4226, section 4: 160 bits are recommended. */
const SECRET_BYTES = 20
/** One step early or late: clocks differ, and typing takes time. RFC 6238, section 5.2. */
const STEPS_OFF = 1
const NONCE_BYTES = 12
const TAG_BYTES = 16

/** Encrypts a secret: AES-256-GCM, the person's id bound in so that a row cannot be moved to someone else. */
export function sealSecret(secret: Uint8Array, personId: string): Buffer {
  const nonce = randomBytes(NONCE_BYTES)
  const cipher = createCipheriv('aes-256-gcm', keyFor('second factor'), nonce).setAAD(Buffer.from(personId))
  const sealed = Buffer.concat([cipher.update(secret), cipher.final()])
  return Buffer.concat([nonce, cipher.getAuthTag(), sealed])
}

/** @throws Error when the app's secret is another one than it was, or the row was tampered with */
export function openSecret(sealed: Buffer, personId: string): Buffer {
  const decipher = createDecipheriv('aes-256-gcm', keyFor('second factor'), sealed.subarray(0, NONCE_BYTES))
    .setAAD(Buffer.from(personId))
    .setAuthTag(sealed.subarray(NONCE_BYTES, NONCE_BYTES + TAG_BYTES))
  return Buffer.concat([decipher.update(sealed.subarray(NONCE_BYTES + TAG_BYTES)), decipher.final()])
}

export function newSecret(): Buffer {
  return randomBytes(SECRET_BYTES)
}

/** A generator of codes from the bytes of a secret. */
export function generatorOf(secret: Uint8Array, label = ''): TOTP {
  return new TOTP({ ...SETTINGS, issuer: 'Oskerby', label, secret: new Secret({ buffer: new Uint8Array(secret).buffer }) })
}

export function hasSecondFactor(db: Reader, personId: string): boolean {
  return confirmedFactor(db, personId) !== undefined
}

export function confirmedFactor(db: Reader, personId: string): SecondFactorRow | undefined {
  return db
    .select()
    .from(secondFactors)
    .where(and(eq(secondFactors.personId, personId), isNotNull(secondFactors.confirmedAt)))
    .get()
}

/** One that is being set up. */
export function pendingFactor(db: Reader, personId: string): SecondFactorRow | undefined {
  return db
    .select()
    .from(secondFactors)
    .where(and(eq(secondFactors.personId, personId), isNull(secondFactors.confirmedAt)))
    .get()
}

/**
 * Takes a code from the authenticator, once: its step and all before it are used up.
 * @returns whether it was right and new
 */
export function takeCode(tx: Pick<Database, 'update'>, factor: SecondFactorRow, code: string, now: Milliseconds): boolean {
  const totp = generatorOf(openSecret(factor.sealedSecret, factor.personId))
  const off = totp.validate({ token: code.replace(/\s/g, ''), timestamp: now, window: STEPS_OFF })
  if (off === null) return false
  const counter = totp.counter({ timestamp: now }) + off
  if (counter <= factor.lastCounter) return false
  tx.update(secondFactors).set({ lastCounter: counter }).where(eq(secondFactors.id, factor.id)).run()
  return true
}
