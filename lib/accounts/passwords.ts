import 'server-only'
import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { hash, verify } from '@node-rs/argon2'
import { fold } from '@/lib/kernel/text'
import { Fault } from '@/lib/kernel/errors'
import { PASSWORD_LENGTH } from './terms'

// argon2id, 19 MiB, two passes, one lane: the first of the equal choices in OWASP's Password Storage Cheat Sheet. The
// algorithm is the package's default; its name is a const enum, which cannot be imported.
const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 }

const COMMON_FILE = 'content/accounts/common-passwords.txt'
let common: Set<string> | undefined

function isCommon(password: string): boolean {
  common ??= new Set(readFileSync(join(process.cwd(), COMMON_FILE), 'utf8').split('\n').filter(Boolean).map(plainForm))
  return common.has(plainForm(password))
}

const LOOKALIKES: Record<string, string> = { '@': 'a', '4': 'a', '3': 'e', '1': 'i', '!': 'i', '0': 'o', '$': 's', '5': 's', '7': 't' }

/** Without capitals, accents and spaces, and every figure or sign as the letter it looks like: "P@ssw0rd" is "password". */
export function plainForm(password: string): string {
  return fold(password)
    .replace(/\s/g, '')
    .replace(/[@4310!$57]/g, (sign) => LOOKALIKES[sign])
}

/**
 * Judges a new password: long enough, none of the common ones, not one's own name or address. Nothing else is asked of it.
 * @throws Fault bad_input with a sentence for the field `password`
 */
export function judgePassword(password: string, { email, name }: { email: string; name: string }) {
  const plain = plainForm(password)
  const [mailbox, domain] = plainForm(email).split('@')
  const own = [plainForm(email), plainForm(name), mailbox, domain, mailbox + mailbox]
  if ([...password].length < PASSWORD_LENGTH.min) refuse(`Use at least ${PASSWORD_LENGTH.min} characters. Four words that do not belong together are easy to keep in mind.`)
  if ([...password].length > PASSWORD_LENGTH.max) refuse(`Use no more than ${PASSWORD_LENGTH.max} characters.`)
  if (own.includes(plain)) refuse('That is your own name or address. Choose something that nobody can look up.')
  if (isCommon(password)) refuse('Many people use this one, so it is tried first. Four words that do not belong together would do.')
}

function refuse(sentence: string): never {
  throw new Fault('bad_input', sentence, { fields: { password: sentence } })
}

/** Slow on purpose: done before a transaction, never in one. */
export function hashPassword(password: string): Promise<string> {
  return hash(password.normalize('NFC'), COST)
}

/** Hash of a password that nobody has, made once with the same cost. */
let nobodys: Promise<string> | undefined

/** Whether this is the password. Takes as long where there is no account or no password. */
export async function passwordIs(known: string | null | undefined, password: string): Promise<boolean> {
  nobodys ??= hashPassword('the password of nobody at all')
  const spare = await nobodys
  const right = await verify(known ?? spare, password.normalize('NFC'))
  return right && typeof known === 'string'
}
