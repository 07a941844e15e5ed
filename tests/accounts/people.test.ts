import { eq } from 'drizzle-orm'
import { describe, expect, test } from 'vitest'
import { people } from '@/db/schema/accounts'
import { acceptInvitation } from '@/lib/accounts/accept-invitation'
import { actorOfSession } from '@/lib/accounts/actor-of-session'
import { askForLink } from '@/lib/accounts/ask-for-link'
import { changeRole } from '@/lib/accounts/change-role'
import { disablePerson } from '@/lib/accounts/disable-person'
import { enablePerson } from '@/lib/accounts/enable-person'
import { endAllSessions } from '@/lib/accounts/end-all-sessions'
import { endSession } from '@/lib/accounts/end-session'
import { invitePerson } from '@/lib/accounts/invite-person'
import { insertPerson } from '@/lib/accounts/people'
import { listInvitations, listPeople, listSessions } from '@/lib/accounts/queries'
import { signInWithLink } from '@/lib/accounts/sign-in-with-link'
import { signOut } from '@/lib/accounts/sign-out'
import type { Context } from '@/lib/kernel/context'
import { faultOf } from '../support/fault'
import { mails, tokenTo } from '../support/mails'
import { AT_HOME } from '../support/origins'
import { addSecondFactor } from '../support/second-factor'
import { NOW, world } from '../support/world'

const DAVI = 'davi@oskerby.example'
const PASSWORD = 'a wren on a tarn'
const DAY = 24 * 60 * 60_000
const sessionOf = ({ actor }: Context) => (actor.kind === 'person' ? actor.sessionId : '')

describe('an invitation', () => {
  test('makes the account it names, signs in, and opens once', async () => {
    const { db, at, as } = world()
    invitePerson(as('iris'), { email: DAVI, role: 'staff' })
    expect(mails(db)[0]).toMatchObject({ template: 'invitation', to: DAVI, props: { invitedBy: 'Iris', role: 'staff' } })
    expect(listInvitations(as('iris'))).toEqual([{ email: DAVI, role: 'staff', expiresAt: NOW + 7 * DAY }])
    const token = tokenTo(db, DAVI, 'invitation')
    const { sessionId } = await acceptInvitation(at(), { token, name: 'Davi', password: PASSWORD }, AT_HOME)
    expect(actorOfSession(db, sessionId, NOW)).toMatchObject({ role: 'staff', name: 'Davi', mustSetUpSecondFactor: false })
    expect(listInvitations(as('iris'))).toEqual([])
    expect((await faultOf(() => acceptInvitation(at(), { token, name: 'Davi', password: PASSWORD }, AT_HOME))).code).toBe('conflict')
  })

  test('to an admin leads to the second factor before anything else', async () => {
    const { db, at, as } = world()
    invitePerson(as('iris'), { email: DAVI, role: 'admin' })
    const { sessionId } = await acceptInvitation(at(), { token: tokenTo(db, DAVI, 'invitation'), name: 'Davi', password: PASSWORD }, AT_HOME)
    expect(actorOfSession(db, sessionId, NOW)).toMatchObject({ role: 'admin', mustSetUpSecondFactor: true })
  })

  test('holds only while the one who sent it is an admin', async () => {
    const { db, at, as } = world()
    invitePerson(as('iris'), { email: DAVI, role: 'staff' })
    db.update(people).set({ role: 'owner' }).where(eq(people.name, 'Iris')).run()
    const accept = () => acceptInvitation(at(), { token: tokenTo(db, DAVI, 'invitation'), name: 'Davi', password: PASSWORD }, AT_HOME)
    expect((await faultOf(accept)).message).toMatch(/does not hold any more/)
  })

  test('is void once a newer one was sent, and after a week', async () => {
    const { db, at, as } = world()
    invitePerson(as('iris'), { email: DAVI, role: 'staff' })
    const older = tokenTo(db, DAVI, 'invitation')
    invitePerson(as('iris', NOW + 1), { email: DAVI, role: 'admin' })
    const accept = (token: string, now: number) => acceptInvitation(at(now), { token, name: 'Davi', password: PASSWORD }, AT_HOME)
    expect((await faultOf(() => accept(older, NOW + 2))).message).toBe('This link was used already.')
    expect((await faultOf(() => accept(tokenTo(db, DAVI, 'invitation'), NOW + 1 + 7 * DAY))).message).toBe('This link has run out.')
  })

  test('does not reach someone who has an account', async () => {
    const { db, at, as, person } = world()
    person('ann')
    expect((await faultOf(() => invitePerson(as('iris'), { email: 'Ann@brandreth.example', role: 'staff' }))).fields).toHaveProperty('email')
    invitePerson(as('iris'), { email: DAVI, role: 'staff' })
    askForLink(at(), { email: DAVI }, AT_HOME)
    signInWithLink(at(), { token: tokenTo(db, DAVI, 'link') }, AT_HOME)
    const accept = () => acceptInvitation(at(), { token: tokenTo(db, DAVI, 'invitation'), name: 'Davi', password: PASSWORD }, AT_HOME)
    expect((await faultOf(accept)).message).toMatch(/has an account already/)
  })

  test.each(['ann', 'ruth'] as const)('cannot be sent by %s', async (who) => {
    const { as } = world()
    expect((await faultOf(() => invitePerson(as(who), { email: DAVI, role: 'staff' }))).code).toBe('not_found')
  })
})

describe('closing an account', () => {
  test('ends its sessions and links at once; opening it again brings back neither', async () => {
    const { db, at, as, person } = world()
    const ann = as('ann')
    askForLink(at(), { email: 'ann@brandreth.example' }, AT_HOME)
    const token = tokenTo(db, 'ann@brandreth.example', 'link')
    disablePerson(as('iris'), { personId: person('ann').id })
    expect(actorOfSession(db, sessionOf(ann), NOW).kind).toBe('visitor')
    askForLink(at(NOW + 1), { email: 'ann@brandreth.example' }, AT_HOME)
    const later = tokenTo(db, 'ann@brandreth.example', 'link')
    expect((await faultOf(() => signInWithLink(at(NOW + 2), { token: later }, AT_HOME))).code).toBe('not_allowed')
    enablePerson(as('iris'), { personId: person('ann').id })
    expect(actorOfSession(db, sessionOf(ann), NOW).kind).toBe('visitor')
    expect((await faultOf(() => signInWithLink(at(NOW + 3), { token }, AT_HOME))).code).toBe('conflict')
  })

  test('is for admins, and not for themselves', async () => {
    const { as, person } = world()
    for (const who of ['ann', 'bob', 'ruth'] as const) {
      expect((await faultOf(() => disablePerson(as(who), { personId: person('ann').id }))).code).toBe('not_found')
    }
    expect((await faultOf(() => disablePerson(as('iris'), { personId: person('iris').id }))).code).toBe('not_allowed')
    expect((await faultOf(() => disablePerson(as('iris'), { personId: 'per_nobody' }))).code).toBe('not_found')
  })
})

describe('a change of role', () => {
  test('counts from the next sign-in, and voids what the role before allowed', async () => {
    const { db, at, as, person } = world()
    const ruth = as('ruth')
    changeRole(as('iris'), { personId: person('ruth').id, role: 'admin' })
    expect(actorOfSession(db, sessionOf(ruth), NOW).kind).toBe('visitor')
    invitePerson(as('iris'), { email: DAVI, role: 'staff' })
    const gus = insertPerson(db, { name: 'Gus', role: 'admin', email: 'gus@oskerby.example', passwordHash: null }, NOW)
    addSecondFactor(db, gus.id, NOW)
    changeRole(as(gus), { personId: person('iris').id, role: 'owner' })
    const accept = () => acceptInvitation(at(), { token: tokenTo(db, DAVI, 'invitation'), name: 'Davi', password: PASSWORD }, AT_HOME)
    expect((await faultOf(accept)).code).toBe('conflict')
  })

  test('is nobody’s own doing', async () => {
    const { as, person } = world()
    expect((await faultOf(() => changeRole(as('iris'), { personId: person('iris').id, role: 'owner' }))).code).toBe('not_allowed')
    expect((await faultOf(() => changeRole(as('ann'), { personId: person('ann').id, role: 'admin' }))).code).toBe('not_found')
  })
})

test('admins see everyone, themselves marked; nobody else sees anyone', async () => {
  const { as, person } = world()
  for (const who of ['ann', 'bob', 'ruth', 'iris'] as const) person(who)
  const { people: seen } = listPeople(as('iris'))
  expect(seen.map(({ name, role, self, hasSecondFactor }) => [name, role, self, hasSecondFactor])).toEqual([
    ['Iris', 'admin', true, true],
    ['Ruth', 'staff', false, false],
    ['Ann', 'owner', false, false],
    ['Bob', 'owner', false, false],
  ])
  expect(JSON.stringify(seen)).not.toMatch(/hash|secret/i)
  expect(listPeople(as('iris'), { text: ' BOB@' }).people.map(({ name }) => name)).toEqual(['Bob'])
  for (const who of ['ann', 'ruth'] as const) expect((await faultOf(() => listPeople(as(who)))).code).toBe('not_found')
})

describe('one’s own sessions', () => {
  test('are listed, the present one marked, and end one by one', async () => {
    const { db, as } = world()
    const [phone, here] = [as('ann'), as('ann', NOW + 1)]
    as('bob')
    expect(listSessions(here).map(({ present, device }) => [present, device])).toEqual([
      [true, 'Firefox on Linux'],
      [false, 'Firefox on Linux'],
    ])
    endSession(here, { sessionId: sessionOf(phone) })
    expect(listSessions(here)).toHaveLength(1)
    expect(actorOfSession(db, sessionOf(phone), NOW + 1).kind).toBe('visitor')
  })

  test('of someone else are not there', async () => {
    const { db, as } = world()
    const bob = as('bob')
    expect((await faultOf(() => endSession(as('ann'), { sessionId: sessionOf(bob) }))).code).toBe('not_found')
    expect(actorOfSession(db, sessionOf(bob), NOW).kind).toBe('person')
  })

  test('end all at once, here as well; those of others go on', () => {
    const { db, as } = world()
    const [phone, here, bob] = [as('ann'), as('ann'), as('bob')]
    endAllSessions(here)
    expect([phone, here, bob].map((each) => actorOfSession(db, sessionOf(each), NOW).kind)).toEqual(['visitor', 'visitor', 'person'])
  })

  test('signing out ends the present one', () => {
    const { db, at, as } = world()
    const [phone, here] = [as('ann'), as('ann')]
    signOut(here)
    signOut(at())
    expect([phone, here].map((each) => actorOfSession(db, sessionOf(each), NOW).kind)).toEqual(['person', 'visitor'])
  })
})
