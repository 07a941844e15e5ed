import 'server-only'
import { hkdfSync } from 'node:crypto'
import { keyFor } from './keys'
import type { Role } from './terms'

/** The demo's invented people. */
export const DEMO_PEOPLE = [
  { email: 'owner@oskerby.example', name: 'Hettie Brandreth', role: 'owner' },
  { email: 'second-owner@oskerby.example', name: 'Olan Petrie', role: 'owner' },
  { email: 'staff@oskerby.example', name: 'Ruth Calder', role: 'staff' },
  { email: 'admin@oskerby.example', name: 'Davi Moss', role: 'admin' },
] as const satisfies readonly { email: string; name: string; role: Role }[]

const LETTERS = '23456789bcdfghjkmnpqrstvwxyz'
const PASSWORD_GROUPS = 4
const GROUP_LENGTH = 4
const SECRET_BYTES = 20

const bytesFor = (what: string, count: number) => Buffer.from(hkdfSync('sha256', keyFor('demo'), '', what, count))

/**
 * A demo person's password: the same at every start of this installation, another at every other one, so that whoever
 * reads the source cannot sign in.
 */
export function demoPassword(email: string): string {
  const letters = [...bytesFor(`password of ${email}`, PASSWORD_GROUPS * GROUP_LENGTH)].map((byte) => LETTERS[byte % LETTERS.length])
  return Array.from({ length: PASSWORD_GROUPS }, (_, k) => letters.slice(k * GROUP_LENGTH, (k + 1) * GROUP_LENGTH).join('')).join('-')
}

/** The secret in a demo person's authenticator, made in the same way. */
export function demoSecret(email: string): Buffer {
  return bytesFor(`authenticator of ${email}`, SECRET_BYTES)
}
