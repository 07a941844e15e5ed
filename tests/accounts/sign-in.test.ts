import { eq } from 'drizzle-orm'
import { describe, expect, test } from 'vitest'
import type { Database } from '@/db/client'
import { people, sessions } from '@/db/schema/accounts'
import { actorOfSession } from '@/lib/accounts/actor-of-session'
import { askForLink } from '@/lib/accounts/ask-for-link'
import { changeRole } from '@/lib/accounts/change-role'
import { disablePerson } from '@/lib/accounts/disable-person'
import { hashPassword } from '@/lib/accounts/passwords'
import { getLink } from '@/lib/accounts/queries'
import { signInWithLink } from '@/lib/accounts/sign-in-with-link'
import { signInWithPassword } from '@/lib/accounts/sign-in-with-password'
import { faultOf } from '../support/fault'
import { mails, tokenTo } from '../support/mails'
import { AT_HOME, ON_PHONE } from '../support/origins'
import { twoDoors } from '../support/two-doors'
import { NOW, world } from '../support/world'

const EMAIL = 'ann@brandreth.example'
const PASSWORD = 'a wren on a tarn'
const MINUTE = 60_000
const DAY = 24 * 60 * MINUTE

async function withPassword(db: Database, personId: string, password = PASSWORD) {
  db.update(people).set({ passwordHash: await hashPassword(password) }).where(eq(people.id, personId)).run()
}

describe('with a password', () => {
  test('the right one opens a session that says where it came from', async () => {
    const { db, at, person } = world()
    await withPassword(db, person('ann').id)
    const { sessionId, codeAwaited, expiresAt } = await signInWithPassword(at(), { email: EMAIL, password: PASSWORD }, AT_HOME)
    expect(codeAwaited).toBe(false)
    expect(expiresAt).toBe(NOW + 30 * DAY)
    expect(db.select().from(sessions).get()).toMatchObject({ device: 'Firefox on Linux', origin: '203.0.113.x', way: 'password' })
    expect(actorOfSession(db, sessionId, NOW)).toMatchObject({ kind: 'person', id: person('ann').id, role: 'owner' })
  })

  test('accents typed apart or together are the same password', async () => {
    const { db, at, person } = world()
    await withPassword(db, person('ann').id, 'é marks the spot')
    await signInWithPassword(at(), { email: EMAIL, password: 'e\u0301 marks the spot' }, AT_HOME)
  })

  test('whatever is wrong, the answer is the same', async () => {
    const { db, at, person } = world()
    await withPassword(db, person('ann').id)
    person('bob') // has no password
    const answers = await Promise.all(
      [EMAIL, 'bob@brandreth.example', 'nobody@brandreth.example'].map(async (email) => {
        const { code, message, fields } = await faultOf(() => signInWithPassword(at(), { email, password: 'not the one' }, AT_HOME))
        return { code, message, fields }
      }),
    )
    expect(answers[1]).toEqual(answers[0])
    expect(answers[2]).toEqual(answers[0])
  })

  test('a closed account says so only to who knows its password', async () => {
    const { db, at, as, person } = world()
    await withPassword(db, person('ann').id)
    disablePerson(as('iris'), { personId: person('ann').id })
    expect((await faultOf(() => signInWithPassword(at(), { email: EMAIL, password: 'not the one' }, AT_HOME))).code).toBe('bad_input')
    expect((await faultOf(() => signInWithPassword(at(), { email: EMAIL, password: PASSWORD }, AT_HOME))).code).toBe('not_allowed')
  })

  test('a password changed while it was being looked at opens nothing', async () => {
    const { db, at, person } = world()
    await withPassword(db, person('ann').id)
    const other = await hashPassword('another long one')
    const signingIn = faultOf(() => signInWithPassword(at(), { email: EMAIL, password: PASSWORD }, AT_HOME))
    db.update(people).set({ passwordHash: other }).where(eq(people.id, person('ann').id)).run()
    expect((await signingIn).code).toBe('bad_input')
    expect(db.select().from(sessions).all()).toEqual([])
  })
})

describe('with a link', () => {
  test('it is sent to every address alike, opens once and lasts twenty minutes', async () => {
    const { db, at, person } = world()
    person('ann')
    askForLink(at(), { email: EMAIL }, AT_HOME)
    askForLink(at(), { email: 'new@brandreth.example' }, AT_HOME)
    expect(mails(db).map(({ template }) => template)).toEqual(['link', 'link'])
    const token = tokenTo(db, EMAIL, 'link')
    expect((await faultOf(() => signInWithLink(at(NOW + 20 * MINUTE), { token }, AT_HOME))).message).toBe('This link has run out.')
    const { sessionId } = signInWithLink(at(NOW + 19 * MINUTE), { token }, AT_HOME)
    expect(actorOfSession(db, sessionId, NOW + 19 * MINUTE)).toMatchObject({ id: person('ann').id })
    expect((await faultOf(() => signInWithLink(at(NOW + 19 * MINUTE), { token }, AT_HOME))).message).toBe('This link was used already.')
  })

  test('looking at it uses nothing up', () => {
    const { db, at, person } = world()
    person('ann')
    askForLink(at(), { email: EMAIL }, AT_HOME)
    const token = tokenTo(db, EMAIL, 'link')
    for (let k = 0; k < 3; k++) expect(getLink(at(), 'link', token)).toEqual({ state: 'open', email: EMAIL, role: null })
    expect(getLink(at(NOW + 20 * MINUTE), 'link', token).state).toBe('expired')
    expect(getLink(at(), 'reset', token).state).toBe('unknown')
    signInWithLink(at(), { token }, AT_HOME)
    expect(getLink(at(), 'link', token).state).toBe('used')
  })

  test('followed in two windows at once it opens one session', async () => {
    const { one, other } = twoDoors()
    askForLink(world(one).at(), { email: EMAIL }, AT_HOME)
    const token = tokenTo(one, EMAIL, 'link')
    const press = async (db: Database) => signInWithLink(world(db).at(), { token }, AT_HOME)
    const ends = await Promise.allSettled([press(one), press(other)])
    expect(ends.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
    expect(one.select().from(sessions).all()).toHaveLength(1)
  })

  test('the older of two links is void once the newer was followed', async () => {
    const { db, at, person } = world()
    person('ann')
    askForLink(at(), { email: EMAIL }, AT_HOME)
    const older = tokenTo(db, EMAIL, 'link')
    askForLink(at(NOW + 1), { email: EMAIL }, AT_HOME)
    signInWithLink(at(NOW + 2), { token: tokenTo(db, EMAIL, 'link') }, AT_HOME)
    expect((await faultOf(() => signInWithLink(at(NOW + 3), { token: older }, AT_HOME))).code).toBe('conflict')
  })
})

describe('a session', () => {
  test('counts until it runs out', () => {
    const { db, as } = world()
    const { actor } = as('ann')
    const id = actor.kind === 'person' ? actor.sessionId : ''
    expect(actorOfSession(db, id, NOW + DAY - 1).kind).toBe('person')
    expect(actorOfSession(db, id, NOW + DAY).kind).toBe('visitor')
    expect(actorOfSession(db, 'ses_unknown', NOW).kind).toBe('visitor')
  })

  test('ends at once when its person is disabled, and when their role changes', () => {
    for (const change of [disablePerson, changeRole]) {
      const { db, as, person } = world()
      const { actor } = as('ann')
      const id = actor.kind === 'person' ? actor.sessionId : ''
      change(as('iris'), { personId: person('ann').id, role: 'staff' })
      expect(actorOfSession(db, id, NOW)).toEqual({ kind: 'visitor' })
    }
  })

  test('of an admin without a second factor lets them do nothing but set one up', () => {
    const { db, as, person } = world()
    db.update(people).set({ role: 'admin' }).where(eq(people.id, person('ruth').id)).run()
    expect(as('ruth').actor).toMatchObject({ role: 'admin', mustSetUpSecondFactor: true })
    expect(as('iris').actor).toMatchObject({ role: 'admin', mustSetUpSecondFactor: false })
  })

  test('from a browser not seen before is told of by mail; the first, and one seen before, are not', async () => {
    const { db, at, person } = world()
    await withPassword(db, person('ann').id)
    const signIn = (now: number, origin = AT_HOME) => signInWithPassword(at(now), { email: EMAIL, password: PASSWORD }, origin)
    await signIn(NOW)
    await signIn(NOW + DAY)
    expect(mails(db)).toEqual([])
    await signIn(NOW + 2 * DAY, ON_PHONE)
    expect(mails(db)).toEqual([
      {
        template: 'new-sign-in',
        to: EMAIL,
        props: { link: 'http://localhost:3000/account', at: NOW + 2 * DAY, browser: 'Safari on iPhone', way: 'password' },
      },
    ])
    await signIn(NOW + 3 * DAY, ON_PHONE)
    expect(mails(db)).toHaveLength(1)
  })
})
