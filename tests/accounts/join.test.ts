import { expect, test } from 'vitest'
import { oneTimeTokens, people } from '@/db/schema/accounts'
import { actorOfSession } from '@/lib/accounts/actor-of-session'
import { confirmAddress } from '@/lib/accounts/confirm-address'
import { join } from '@/lib/accounts/join'
import { passwordIs } from '@/lib/accounts/passwords'
import { askForLink } from '@/lib/accounts/ask-for-link'
import { signInWithLink } from '@/lib/accounts/sign-in-with-link'
import { signInWithPassword } from '@/lib/accounts/sign-in-with-password'
import { faultOf } from '../support/fault'
import { mails, tokenTo } from '../support/mails'
import { AT_HOME } from '../support/origins'
import { twoDoors } from '../support/two-doors'
import { NOW, world } from '../support/world'

const EMAIL = 'Hettie@Brandreth.example'
const PASSWORD = 'a wren on a tarn'
const asked = { name: 'Hettie', email: EMAIL, password: PASSWORD }
const MINUTE = 60_000

test('joining sends a mail and makes no account', async () => {
  const { db, at } = world()
  await join(at(), asked, AT_HOME)
  expect(mails(db)).toEqual([{ template: 'confirm', to: EMAIL, props: { link: expect.stringContaining('/confirm-email?token='), minutes: 2880 } }])
  expect(db.select().from(people).all()).toEqual([])
})

test('what is kept of the link opens nothing', async () => {
  const { db, at } = world()
  await join(at(), asked, AT_HOME)
  const token = tokenTo(db, EMAIL, 'confirm')
  const row = db.select().from(oneTimeTokens).get()
  expect(JSON.stringify(row)).not.toContain(token)
  expect(JSON.stringify(row)).not.toContain(PASSWORD)
  expect((await faultOf(() => confirmAddress(at(), { token: row?.hash ?? '', password: PASSWORD }, AT_HOME))).code).toBe('not_found')
})

test('following the link with the password makes the account and signs in', async () => {
  const { db, at } = world()
  await join(at(), asked, AT_HOME)
  const opened = await confirmAddress(at(NOW + MINUTE), { token: tokenTo(db, EMAIL, 'confirm'), password: PASSWORD }, AT_HOME)
  expect(opened.codeAwaited).toBe(false)
  expect(actorOfSession(db, opened.sessionId, NOW + MINUTE)).toMatchObject({ kind: 'person', role: 'owner', name: 'Hettie' })
  expect(db.select().from(people).get()).toMatchObject({ email: EMAIL, emailKey: 'hettie@brandreth.example', emailConfirmedAt: NOW + MINUTE, demo: false })
  await signInWithPassword(at(NOW + MINUTE), { email: 'HETTIE@brandreth.EXAMPLE', password: PASSWORD }, AT_HOME)
})

test('someone who got the mail without having joined cannot confirm a stranger’s password', async () => {
  const { db, at } = world()
  await join(at(), asked, AT_HOME)
  const token = tokenTo(db, EMAIL, 'confirm')
  const fault = await faultOf(() => confirmAddress(at(), { token, password: 'something of my own' }, AT_HOME))
  expect(fault.fields).toHaveProperty('password')
  // The link is not used up by that.
  await confirmAddress(at(), { token, password: PASSWORD }, AT_HOME)
})

test('a link by mail makes the account, and voids the password that a stranger had put there', async () => {
  const { db, at } = world()
  await join(at(), { ...asked, password: 'chosen by a stranger' }, AT_HOME)
  askForLink(at(NOW + 1), { email: EMAIL }, AT_HOME)
  const { sessionId } = signInWithLink(at(NOW + 2), { token: tokenTo(db, EMAIL, 'link') }, AT_HOME)
  expect(actorOfSession(db, sessionId, NOW + 2)).toMatchObject({ name: 'Hettie', role: 'owner' })
  const fault = await faultOf(() => confirmAddress(at(NOW + 3), { token: tokenTo(db, EMAIL, 'confirm'), password: 'chosen by a stranger' }, AT_HOME))
  expect(fault.code).toBe('conflict')
  expect(db.select().from(people).get()?.passwordHash).toBeNull()
})

test('the link is used once, runs out after two days, and opens nothing else', async () => {
  const { db, at } = world()
  await join(at(), asked, AT_HOME)
  const token = tokenTo(db, EMAIL, 'confirm')
  expect((await faultOf(() => signInWithLink(at(), { token }, AT_HOME))).code).toBe('not_found')
  const late = at(NOW + 2 * 24 * 60 * MINUTE)
  expect((await faultOf(() => confirmAddress(late, { token, password: PASSWORD }, AT_HOME))).message).toBe('This link has run out.')
  await confirmAddress(at(), { token, password: PASSWORD }, AT_HOME)
  expect((await faultOf(() => confirmAddress(at(), { token, password: PASSWORD }, AT_HOME))).message).toBe('This link was used already.')
})

test('the link followed in two windows at once makes one account', async () => {
  const { one, other } = twoDoors()
  await join(world(one).at(), asked, AT_HOME)
  const token = tokenTo(one, EMAIL, 'confirm')
  const press = (db: typeof one) => confirmAddress(world(db).at(), { token, password: PASSWORD }, AT_HOME)
  const ends = await Promise.allSettled([press(one), press(other)])
  expect(ends.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
  expect(one.select().from(people).all()).toHaveLength(1)
})

test('two who joined with one address: the second to confirm hears that it has an account', async () => {
  const { db, at } = world()
  await join(at(), asked, AT_HOME)
  const first = tokenTo(db, EMAIL, 'confirm')
  await join(at(NOW + 1), { ...asked, password: 'another long one' }, AT_HOME)
  await confirmAddress(at(NOW + 2), { token: tokenTo(db, EMAIL, 'confirm'), password: 'another long one' }, AT_HOME)
  expect((await faultOf(() => confirmAddress(at(NOW + 3), { token: first, password: PASSWORD }, AT_HOME))).code).toBe('conflict')
  expect(await passwordIs(db.select().from(people).get()?.passwordHash, 'another long one')).toBe(true)
})
