import 'server-only'
import { createHmac, hkdfSync } from 'node:crypto'
import { env } from '@/lib/server/env'

type Use = 'second factor' | 'recovery code' | 'attempts' | 'session cookie' | 'demo'

const KEY_BYTES = 32

/** A key for one use, made from the app's secret. RFC 5869. Another secret makes another key, and what the old one sealed stays shut. */
export function keyFor(use: Use): Buffer {
  return Buffer.from(hkdfSync('sha256', env().appSecret, '', `accounts: ${use}`, KEY_BYTES))
}

/** A short text that only this installation can make from another. RFC 2104. */
export function keyedHash(use: Use, text: string): string {
  return createHmac('sha256', keyFor(use)).update(text).digest('hex')
}
