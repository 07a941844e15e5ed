import { eq } from 'drizzle-orm'
import { expect, test } from 'vitest'
import { people } from '@/db/schema/accounts'
import { askForLink } from '@/lib/accounts/ask-for-link'
import { askToChangeAddress } from '@/lib/accounts/ask-to-change-address'
import { confirmAddressChange } from '@/lib/accounts/confirm-address-change'
import { signInWithLink } from '@/lib/accounts/sign-in-with-link'
import { faultOf } from '../support/fault'
import { mails, tokenTo } from '../support/mails'
import { AT_HOME } from '../support/origins'
import { twoDoors } from '../support/two-doors'
import { NOW, world, type World } from '../support/world'

const OLD = 'ann@brandreth.example'
const NEW = 'Ann@Mill.example'

const emailOf = ({ db, person }: World) => db.select().from(people).where(eq(people.id, person('ann').id)).get()?.email
const say = ({ db, at }: World, end: 'old' | 'new', now = NOW) =>
  confirmAddressChange(at(now), { end, token: tokenTo(db, end === 'old' ? OLD : NEW, 'change-address') }, AT_HOME)

test.each([
  ['old', 'new'],
  ['new', 'old'],
] as const)('first the %s end, then the %s one: only then is it changed, and both hear of it', (first, second) => {
  const here = world()
  askToChangeAddress(here.as('ann'), { email: NEW }, AT_HOME)
  expect(mails(here.db).map(({ to }) => to).sort()).toEqual([NEW, OLD])
  expect(say(here, first)).toEqual({ done: false, newAddress: NEW })
  expect(emailOf(here)).toBe(OLD)
  expect(say(here, second, NOW + 1)).toEqual({ done: true, newAddress: NEW })
  expect(emailOf(here)).toBe(NEW)
  const told = mails(here.db).filter(({ template }) => template === 'address-changed')
  expect(told.map(({ to }) => to).sort()).toEqual([NEW, OLD])
})

test('links of one end are no good at the other, and none is good twice', async () => {
  const here = world()
  askToChangeAddress(here.as('ann'), { email: NEW }, AT_HOME)
  const atOld = tokenTo(here.db, OLD, 'change-address')
  expect((await faultOf(() => confirmAddressChange(here.at(), { end: 'new', token: atOld }, AT_HOME))).code).toBe('not_found')
  say(here, 'old')
  expect((await faultOf(() => say(here, 'old'))).code).toBe('conflict')
  expect(emailOf(here)).toBe(OLD)
})

test('asking for an address that has an account says nothing of it, and it is not taken over', async () => {
  const here = world()
  here.person('bob')
  askToChangeAddress(here.as('ann'), { email: 'bob@brandreth.example' }, AT_HOME)
  const confirm = (end: 'old' | 'new', to: string) =>
    confirmAddressChange(here.at(), { end, token: tokenTo(here.db, to, 'change-address') }, AT_HOME)
  confirm('old', OLD)
  expect((await faultOf(() => confirm('new', 'bob@brandreth.example'))).code).toBe('conflict')
  expect(emailOf(here)).toBe(OLD)
})

test('a link that lies in the old mailbox does not open the account after the change', async () => {
  const here = world()
  askForLink(here.at(), { email: OLD }, AT_HOME)
  askToChangeAddress(here.as('ann'), { email: NEW }, AT_HOME)
  say(here, 'old')
  say(here, 'new')
  expect((await faultOf(() => signInWithLink(here.at(), { token: tokenTo(here.db, OLD, 'link') }, AT_HOME))).code).toBe('conflict')
})

test('another change that was begun before is void', async () => {
  const here = world()
  askToChangeAddress(here.as('ann'), { email: 'first@mill.example' }, AT_HOME)
  const firstNew = tokenTo(here.db, 'first@mill.example', 'change-address')
  confirmAddressChange(here.at(), { end: 'old', token: tokenTo(here.db, OLD, 'change-address') }, AT_HOME)
  askToChangeAddress(here.as('ann', NOW + 1), { email: NEW }, AT_HOME)
  say(here, 'old', NOW + 2)
  say(here, 'new', NOW + 2)
  expect((await faultOf(() => confirmAddressChange(here.at(NOW + 3), { end: 'new', token: firstNew }, AT_HOME))).code).toBe('conflict')
  expect(emailOf(here)).toBe(NEW)
})

test('one’s own address is no new one', async () => {
  const here = world()
  expect((await faultOf(() => askToChangeAddress(here.as('ann'), { email: 'ANN@brandreth.example' }, AT_HOME))).fields).toHaveProperty('email')
  expect((await faultOf(() => askToChangeAddress(here.at(), { email: NEW }, AT_HOME))).code).toBe('sign_in')
})

test('both ends pressed at once change it once', async () => {
  const { one, other } = twoDoors()
  const [here, there] = [world(one), world(other)]
  askToChangeAddress(here.as('ann'), { email: NEW }, AT_HOME)
  const press = async (place: World, end: 'old' | 'new') => say(place, end)
  const ends = await Promise.all([press(here, 'old'), press(there, 'new')])
  expect(ends.filter(({ done }) => done)).toHaveLength(1)
  expect(emailOf(here)).toBe(NEW)
})
