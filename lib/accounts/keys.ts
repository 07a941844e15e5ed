import 'server-only'
import { createHmac } from 'node:crypto'
import { deriveKey, type KeyUse } from '@/lib/kernel/derive-key'
import { env } from '@/lib/server/env'

/** This installation's key for one use. */
export function keyFor(use: KeyUse): Buffer {
  return deriveKey(env().appSecret, use)
}

/** A short text that only this installation can make from another. RFC 2104. */
export function keyedHash(use: KeyUse, text: string): string {
  return createHmac('sha256', keyFor(use)).update(text).digest('hex')
}
