import { describe, expect, test } from 'vitest'
import { attempts } from '@/db/schema/accounts'
import { askForLink } from '@/lib/accounts/ask-for-link'
import { askForReset } from '@/lib/accounts/ask-for-reset'
import { countAttempt, LIMITS } from '@/lib/accounts/attempts'
import { join } from '@/lib/accounts/join'
import { hashPassword } from '@/lib/accounts/passwords'
import { insertPerson } from '@/lib/accounts/people'
import { signInWithPassword } from '@/lib/accounts/sign-in-with-password'
import { sweepAccounts } from '@/lib/accounts/sweep'
import { faultOf } from '../support/fault'
import { AT_HOME, ON_PHONE } from '../support/origins'
import { twoDoors } from '../support/two-doors'
import { NOW, world } from '../support/world'

const EMAIL = 'ann@brandreth.example'
const PASSWORD = 'a wren on a tarn'
const MINUTE = 60_000
const LIMIT = LIMITS.mailToAddress

test('a limit lets so many through, then says when to come again', async () => {
  const { db } = world()
  for (let k = 0; k < LIMIT.most; k++) countAttempt(db, LIMIT, 'someone', NOW + k)
  const fault = await faultOf(() => countAttempt(db, LIMIT, 'someone', NOW + 5 * MINUTE))
  expect(fault).toMatchObject({ code: 'too_many', retryAfterSeconds: 600, message: 'That was tried too often. Wait 10 minutes, then try again.' })
  countAttempt(db, LIMIT, 'someone else', NOW + 5 * MINUTE)
  countAttempt(db, LIMIT, 'someone', NOW + 15 * MINUTE)
})

test('a restart forgets nothing', async () => {
  const { one, reopen } = twoDoors()
  for (let k = 0; k < LIMIT.most; k++) countAttempt(one, LIMIT, 'someone', NOW)
  const again = reopen()
  expect((await faultOf(() => countAttempt(again, LIMIT, 'someone', NOW + 1))).code).toBe('too_many')
})

test('two doors count together', async () => {
  const { one, other } = twoDoors()
  for (let k = 0; k < LIMIT.most; k++) countAttempt(k % 2 ? one : other, LIMIT, 'someone', NOW)
  expect((await faultOf(() => countAttempt(other, LIMIT, 'someone', NOW))).code).toBe('too_many')
})

test('what is kept names nobody, and is swept out when it has run out', () => {
  const { db, at } = world()
  askForLink(at(), { email: EMAIL }, AT_HOME)
  const kept = JSON.stringify(db.select().from(attempts).all())
  expect(kept).not.toMatch(/ann|brandreth|203\.0\.113/)
  sweepAccounts(at(NOW + 61 * MINUTE))
  expect(db.select().from(attempts).all()).toEqual([])
})

describe('passwords', () => {
  test('of one account can be tried ten times from wherever, then wait; a right one before that starts anew', async () => {
    const { db, at } = world()
    insertPerson(db, { name: 'Ann', role: 'owner', email: EMAIL, passwordHash: await hashPassword(PASSWORD) }, NOW)
    const attempt = (password: string, origin = AT_HOME) => signInWithPassword(at(), { email: EMAIL, password }, origin)
    for (let k = 0; k < 9; k++) await faultOf(() => attempt('not it', k % 2 ? AT_HOME : ON_PHONE))
    await attempt(PASSWORD)
    for (let k = 0; k < 10; k++) expect((await faultOf(() => attempt('not it'))).code).toBe('bad_input')
    expect((await faultOf(() => attempt(PASSWORD, ON_PHONE))).code).toBe('too_many')
  })

  test('from one place can be tried fifty times over all accounts', async () => {
    const { db, at } = world()
    for (let k = 0; k < LIMITS.passwordFromOrigin.most; k++) countAttempt(db, LIMITS.passwordFromOrigin, AT_HOME.address, NOW)
    const attempt = (origin = AT_HOME) => signInWithPassword(at(), { email: EMAIL, password: PASSWORD }, origin)
    expect((await faultOf(() => attempt())).code).toBe('too_many')
    expect((await faultOf(() => attempt(ON_PHONE))).code).toBe('bad_input')
  })
})

test('one mailbox gets five mails in a quarter of an hour, whatever they are asked for, account or not', async () => {
  for (const known of [true, false]) {
    const { at, person } = world()
    if (known) person('ann')
    askForLink(at(), { email: EMAIL }, AT_HOME)
    askForReset(at(), { email: EMAIL }, AT_HOME)
    await join(at(), { name: 'Ann', email: EMAIL, password: PASSWORD }, AT_HOME)
    askForLink(at(), { email: EMAIL }, ON_PHONE)
    askForReset(at(), { email: EMAIL }, ON_PHONE)
    expect((await faultOf(() => askForLink(at(), { email: EMAIL.toUpperCase() }, AT_HOME))).code).toBe('too_many')
    expect((await faultOf(() => join(at(), { name: 'Ann', email: EMAIL, password: PASSWORD }, AT_HOME))).code).toBe('too_many')
  }
})
