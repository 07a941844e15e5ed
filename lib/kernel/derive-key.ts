import { hkdfSync } from 'node:crypto'

/** What keys are made for. Each use has a key of its own, so that none gives another away. */
export type KeyUse = 'second factor' | 'recovery code' | 'attempts' | 'session cookie' | 'demo'

const KEY_BYTES = 32

/** A key for one use, made from a secret. RFC 5869. Another secret makes another key, and what the old one sealed stays shut. */
export function deriveKey(secret: string, use: KeyUse): Buffer {
  return Buffer.from(hkdfSync('sha256', secret, '', `accounts: ${use}`, KEY_BYTES))
}
