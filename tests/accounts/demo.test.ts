import { eq } from 'drizzle-orm'
import { expect, test } from 'vitest'
import { people, secondFactors } from '@/db/schema/accounts'
import { actorOfSession } from '@/lib/accounts/actor-of-session'
import { checkSecondFactor } from '@/lib/accounts/check-second-factor'
import { DEMO_PEOPLE, demoPassword, demoSecret } from '@/lib/accounts/demo'
import { loadDemoPeople } from '@/lib/accounts/load-demo'
import { insertPerson } from '@/lib/accounts/people'
import { generatorOf } from '@/lib/accounts/second-factor'
import { signInWithPassword } from '@/lib/accounts/sign-in-with-password'
import { AT_HOME } from '../support/origins'
import { NOW, world } from '../support/world'

const ADMIN = 'admin@oskerby.example'

test('what the start prints signs in as each, the admin with a code', async () => {
  const { db, at } = world()
  await loadDemoPeople(at())
  for (const { email, role } of DEMO_PEOPLE) {
    const { sessionId, codeAwaited } = await signInWithPassword(at(), { email, password: demoPassword(email) }, AT_HOME)
    const actor = actorOfSession(db, sessionId, NOW)
    expect(codeAwaited).toBe(role === 'admin')
    if (!codeAwaited) expect(actor).toMatchObject({ kind: 'person', role })
    else {
      checkSecondFactor({ db, actor, now: NOW }, { code: generatorOf(demoSecret(email)).generate({ timestamp: NOW }) })
      expect(actorOfSession(db, sessionId, NOW)).toMatchObject({ role, mustSetUpSecondFactor: false })
    }
  }
})

test('loading it again makes nobody twice, and puts back what a visitor changed', async () => {
  const { db, at } = world()
  await loadDemoPeople(at())
  const before = db.select().from(people).all()
  await loadDemoPeople(at(NOW + 1))
  expect(db.select().from(people).all()).toEqual(before)
  db.update(people).set({ passwordHash: null }).where(eq(people.email, ADMIN)).run()
  db.delete(secondFactors).run()
  await loadDemoPeople(at(NOW + 2))
  expect((await signInWithPassword(at(), { email: ADMIN, password: demoPassword(ADMIN) }, AT_HOME)).codeAwaited).toBe(true)
})

test('someone who really has such an address is left alone', async () => {
  const { db, at } = world()
  insertPerson(db, { email: ADMIN, name: 'Someone', role: 'owner', passwordHash: null }, NOW)
  await loadDemoPeople(at())
  expect(db.select().from(people).where(eq(people.email, ADMIN)).get()).toMatchObject({ name: 'Someone', role: 'owner', passwordHash: null, demo: false })
})

test('passwords are this installation’s own, and none is another’s', () => {
  const all = DEMO_PEOPLE.map(({ email }) => demoPassword(email))
  expect(new Set(all).size).toBe(DEMO_PEOPLE.length)
  expect(all.every((each) => /^[2-9b-z]{4}(-[2-9b-z]{4}){3}$/.test(each))).toBe(true)
})
