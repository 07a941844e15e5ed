import { readFileSync } from 'node:fs'
import { eq } from 'drizzle-orm'
import { describe, expect, test } from 'vitest'
import type { Database } from '@/db/client'
import { people, sessions } from '@/db/schema/accounts'
import { actorOfSession } from '@/lib/accounts/actor-of-session'
import { askForReset } from '@/lib/accounts/ask-for-reset'
import { changePassword } from '@/lib/accounts/change-password'
import { disablePerson } from '@/lib/accounts/disable-person'
import { hashPassword, judgePassword, passwordIs, plainForm } from '@/lib/accounts/passwords'
import { resetPassword } from '@/lib/accounts/reset-password'
import { PASSWORD_LENGTH } from '@/lib/accounts/terms'
import type { Context } from '@/lib/kernel/context'
import { faultOf } from '../support/fault'
import { mails, tokenTo } from '../support/mails'
import { AT_HOME } from '../support/origins'
import { twoDoors } from '../support/two-doors'
import { NOW, world } from '../support/world'

const EMAIL = 'ann@brandreth.example'
const OLD = 'a wren on a tarn'
const NEW = 'three larks in a mill'
const MINUTE = 60_000
const ANN = { email: EMAIL, name: 'Ann' }

const hashIn = (db: Database) => db.select().from(people).where(eq(people.emailKey, EMAIL)).get()?.passwordHash
const setPassword = async (db: Database, password = OLD) =>
  db.update(people).set({ passwordHash: await hashPassword(password) }).where(eq(people.emailKey, EMAIL)).run()

describe('judging a new password', () => {
  const refusal = async (password: string) => (await faultOf(() => judgePassword(password, ANN))).fields.password

  test.each(['a wren on a tarn', 'Kiesel-Moos-Docht', 'ααααβββγγγδδδ', '🎻🎷🎺🪕🎸🥁🎹🪗📯🪘', 'x'.repeat(199) + 'y', 'only small letters here'])(
    'takes "%s"',
    (password) => expect(() => judgePassword(password, ANN)).not.toThrow(),
  )

  test.each(['short', 'ninechars', '🎻🎷🎺🪕🎸🥁🎹🪗📯'])('finds "%s" too short', async (password) => expect(await refusal(password)).toMatch(/^Use at least 10/))

  test('finds more than 200 characters too long', async () => expect(await refusal('ab'.repeat(101))).toMatch(/no more than 200/))

  test.each(['password123', 'PASSWORD1234', 'P@ssw0rd123', 'pass word 123', 'qwertyuiop', '1234567890', 'aaaaaaaaaaaa', 'Welcome2026', '1qaz2wsx3edc'])(
    'knows that many use "%s"',
    async (password) => expect(await refusal(password)).toMatch(/^Many people use this one/),
  )

  test('refuses one’s own address and name', async () => {
    expect(await refusal('Ann@Brandreth.example')).toMatch(/your own/)
    await expect(faultOf(() => judgePassword('Hettie Brandreth', { email: EMAIL, name: 'Hettie Brandreth' }))).resolves.toMatchObject({ code: 'bad_input' })
  })

  test('rests on a list of more than a thousand, each long enough to be chosen, none twice', () => {
    const list = readFileSync('content/accounts/common-passwords.txt', 'utf8').trim().split('\n')
    expect(list.length).toBeGreaterThan(1000)
    expect(new Set(list).size).toBe(list.length)
    expect(list.filter((each) => each.length < PASSWORD_LENGTH.min)).toEqual([])
    expect(list.every((each) => plainForm(each).length > 0)).toBe(true)
  })
})

test('passwords are kept as argon2id with the cost that OWASP names', async () => {
  // OWASP Password Storage Cheat Sheet: argon2id, m=19456 (19 MiB), t=2, p=1.
  expect(await hashPassword(OLD)).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/)
  expect(await hashPassword(OLD)).not.toBe(await hashPassword(OLD))
  expect(await passwordIs(null, OLD)).toBe(false)
})

describe('a forgotten password', () => {
  test('is replaced by link, everyone who was in is out, and the old one opens nothing', async () => {
    const { db, at, as, person } = world()
    person('ann')
    await setPassword(db)
    const { actor } = as('ann')
    askForReset(at(), { email: EMAIL }, AT_HOME)
    await resetPassword(at(NOW + 1), { token: tokenTo(db, EMAIL, 'reset'), password: NEW }, AT_HOME)
    expect(await passwordIs(hashIn(db), NEW)).toBe(true)
    expect(actorOfSession(db, actor.kind === 'person' ? actor.sessionId : '', NOW + 1).kind).toBe('visitor')
  })

  test('takes no common one, and the link is not used up by trying', async () => {
    const { db, at, person } = world()
    person('ann')
    askForReset(at(), { email: EMAIL }, AT_HOME)
    const token = tokenTo(db, EMAIL, 'reset')
    expect((await faultOf(() => resetPassword(at(), { token, password: 'password123' }, AT_HOME))).fields).toHaveProperty('password')
    await resetPassword(at(), { token, password: NEW }, AT_HOME)
    expect((await faultOf(() => resetPassword(at(), { token, password: NEW }, AT_HOME))).message).toBe('This link was used already.')
  })

  test('runs out after an hour', async () => {
    const { db, at, person } = world()
    person('ann')
    askForReset(at(), { email: EMAIL }, AT_HOME)
    const token = tokenTo(db, EMAIL, 'reset')
    expect((await faultOf(() => resetPassword(at(NOW + 60 * MINUTE), { token, password: NEW }, AT_HOME))).message).toBe('This link has run out.')
  })

  test('sends nothing to an address without an account, nor to a closed one', () => {
    const { db, at, as, person } = world()
    disablePerson(as('iris'), { personId: person('ann').id })
    askForReset(at(), { email: EMAIL }, AT_HOME)
    askForReset(at(), { email: 'nobody@brandreth.example' }, AT_HOME)
    expect(mails(db)).toEqual([])
  })

  test('set in two windows at once is the one or the other', async () => {
    const { one, other } = twoDoors()
    world(one).person('ann')
    askForReset(world(one).at(), { email: EMAIL }, AT_HOME)
    const token = tokenTo(one, EMAIL, 'reset')
    const set = (db: Database, password: string) => resetPassword(world(db).at(), { token, password }, AT_HOME)
    const ends = await Promise.allSettled([set(one, NEW), set(other, 'four mills in a lark')])
    expect(ends.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
    const won = ends[0].status === 'fulfilled' ? NEW : 'four mills in a lark'
    expect(await passwordIs(hashIn(one), won)).toBe(true)
  })
})

describe('changing a password', () => {
  const others = (context: Context) => context.db.select().from(sessions).all().filter(({ endedAt }) => endedAt === null).length

  test('takes the present one, and ends every other session', async () => {
    const { db, as, person } = world()
    person('ann')
    await setPassword(db)
    as('ann')
    const here = as('ann')
    await changePassword(here, { present: OLD, password: NEW })
    expect(await passwordIs(hashIn(db), NEW)).toBe(true)
    expect(others(here)).toBe(1)
  })

  test('is refused with another present one', async () => {
    const { db, as, person } = world()
    person('ann')
    await setPassword(db)
    expect((await faultOf(() => changePassword(as('ann'), { present: 'not it', password: NEW }))).fields).toHaveProperty('present')
  })

  test('gives a first one to someone who signs in by link', async () => {
    const { db, as } = world()
    await changePassword(as('ann'), { present: '', password: NEW })
    expect(await passwordIs(hashIn(db), NEW)).toBe(true)
  })

  test('in two windows at once: one wins, the other hears of it', async () => {
    const { db, as, person } = world()
    person('ann')
    await setPassword(db)
    const ends = await Promise.allSettled([
      changePassword(as('ann'), { present: OLD, password: NEW }),
      changePassword(as('ann'), { present: OLD, password: 'four mills in a lark' }),
    ])
    expect(ends.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
  })

  test('is not for visitors', async () => {
    expect((await faultOf(() => changePassword(world().at(), { present: '', password: NEW }))).code).toBe('sign_in')
  })
})
