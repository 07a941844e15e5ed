import { eq } from 'drizzle-orm'
import { Secret, TOTP } from 'otpauth'
import { describe, expect, test } from 'vitest'
import type { Database } from '@/db/client'
import { people, secondFactors, sessions } from '@/db/schema/accounts'
import { actorOfSession } from '@/lib/accounts/actor-of-session'
import { beginSecondFactor } from '@/lib/accounts/begin-second-factor'
import { changeRole } from '@/lib/accounts/change-role'
import { checkSecondFactor } from '@/lib/accounts/check-second-factor'
import { confirmSecondFactor } from '@/lib/accounts/confirm-second-factor'
import { hashPassword } from '@/lib/accounts/passwords'
import { getAccount, getPendingSecondFactor } from '@/lib/accounts/queries'
import { removeSecondFactor } from '@/lib/accounts/remove-second-factor'
import { generatorOf, openSecret, sealSecret } from '@/lib/accounts/second-factor'
import { signInWithRecoveryCode } from '@/lib/accounts/sign-in-with-recovery-code'
import { signInWithPassword } from '@/lib/accounts/sign-in-with-password'
import type { Context } from '@/lib/kernel/context'
import { faultOf } from '../support/fault'
import { AT_HOME } from '../support/origins'
import { codeOf } from '../support/second-factor'
import { twoDoors } from '../support/two-doors'
import { NOW, world, type World } from '../support/world'

const PASSWORD = 'a wren on a tarn'
const HALF_MINUTE = 30_000
const MINUTE = 60_000

/** Sets up an authenticator for Ruth and gives back her recovery codes and the context she did it in. */
function withFactor({ db, as, person }: World, now = NOW) {
  const here = as('ruth', now)
  beginSecondFactor(here, {})
  const { recoveryCodes } = confirmSecondFactor(here, { code: codeOf(db, person('ruth').id, now, { pending: true }) })
  return { here, recoveryCodes }
}

/** A sign-in of Ruth's that still owes its code. */
async function waitingSignIn({ db, at, person }: World, now = NOW + 2 * MINUTE): Promise<Context> {
  db.update(people).set({ passwordHash: await hashPassword(PASSWORD) }).where(eq(people.id, person('ruth').id)).run()
  const { sessionId, codeAwaited } = await signInWithPassword(at(now), { email: 'ruth@brandreth.example', password: PASSWORD }, AT_HOME)
  expect(codeAwaited).toBe(true)
  return { db, actor: actorOfSession(db, sessionId, now), now }
}
const counts = (db: Database, { actor }: Context, now: number) =>
  actorOfSession(db, (actor.kind === 'visitor' ? actor.awaitsCode?.sessionId : actor.sessionId) ?? '', now).kind === 'person'

// RFC 6238, appendix B, SHA-1, its last six of eight figures.
test.each([
  [59, '287082'],
  [1111111109, '081804'],
  [1111111111, '050471'],
  [1234567890, '005924'],
  [2000000000, '279037'],
])('codes are those of the standard: at %i s %s', (seconds, code) => {
  expect(generatorOf(Buffer.from('12345678901234567890')).generate({ timestamp: seconds * 1000 })).toBe(code)
})

test('what the square code holds makes the same codes in an app', () => {
  const here = world()
  const ruth = here.as('ruth')
  beginSecondFactor(ruth, {})
  const shown = getPendingSecondFactor(ruth)
  expect(shown?.address).toMatch(/^otpauth:\/\/totp\/Oskerby:ruth%40brandreth\.example\?/)
  const app = new TOTP({ secret: Secret.fromBase32(shown?.secret ?? '') })
  expect(app.generate({ timestamp: NOW })).toBe(codeOf(here.db, here.person('ruth').id, NOW, { pending: true }))
})

test('a secret is kept sealed, for one person, with a key from the app’s secret', () => {
  const secret = Buffer.from('12345678901234567890')
  const sealed = sealSecret(secret, 'per_a')
  expect(sealed.includes(secret)).toBe(false)
  expect(openSecret(sealed, 'per_a')).toEqual(secret)
  expect(() => openSecret(sealed, 'per_b')).toThrow()
  expect(() => openSecret(Buffer.concat([sealed.subarray(0, -1), Buffer.from([sealed.at(-1)! ^ 1])]), 'per_a')).toThrow()
})

describe('setting one up', () => {
  test('counts from its first right code, and shows ten recovery codes once', async () => {
    const here = world()
    const ruth = here.as('ruth')
    beginSecondFactor(ruth, {})
    expect(getAccount(ruth).secondFactor).toBeNull()
    expect((await faultOf(() => confirmSecondFactor(ruth, { code: '000000' }))).fields).toHaveProperty('code')
    const { recoveryCodes } = confirmSecondFactor(ruth, { code: codeOf(here.db, here.person('ruth').id, NOW, { pending: true }) })
    expect(new Set(recoveryCodes).size).toBe(10)
    expect(recoveryCodes.every((each) => /^[2-9b-z]{5}-[2-9b-z]{5}$/.test(each))).toBe(true)
    expect(getAccount(ruth).secondFactor).toEqual({ since: NOW, codesLeft: 10 })
    expect(getPendingSecondFactor(ruth)).toBeNull()
    expect(JSON.stringify(here.db.$client.prepare('select * from recovery_codes').all())).not.toContain(recoveryCodes[0].slice(0, 5))
  })

  test('ends the sessions that began without it, and not the one it was done in', () => {
    const here = world()
    const elsewhere = here.as('ruth')
    const { here: done } = withFactor(here)
    expect(counts(here.db, elsewhere, NOW)).toBe(false)
    expect(counts(here.db, done, NOW)).toBe(true)
  })

  test('makes a full admin of one who had none', () => {
    const here = world()
    changeRole(here.as('iris'), { personId: here.person('ruth').id, role: 'admin' })
    expect(here.as('ruth').actor).toMatchObject({ mustSetUpSecondFactor: true })
    withFactor(here)
    expect(here.as('ruth').actor).toMatchObject({ mustSetUpSecondFactor: false })
  })

  test('is not for owners, nor for visitors', async () => {
    const here = world()
    expect((await faultOf(() => beginSecondFactor(here.as('ann'), {}))).code).toBe('not_allowed')
    expect((await faultOf(() => beginSecondFactor(here.at(), {}))).code).toBe('sign_in')
  })

  test('another one takes a code of the present one, which counts until then', async () => {
    const here = world()
    const { here: ruth, recoveryCodes } = withFactor(here)
    const id = here.person('ruth').id
    const later = { ...ruth, now: NOW + 2 * MINUTE }
    for (const code of [undefined, '', '000000', 'bcdfg-hjkmn']) expect((await faultOf(() => beginSecondFactor(later, { code }))).fields).toHaveProperty('code')
    beginSecondFactor(later, { code: codeOf(here.db, id, later.now) })
    expect(here.db.select().from(secondFactors).all()).toHaveLength(2)
    confirmSecondFactor(later, { code: codeOf(here.db, id, later.now, { pending: true }) })
    expect(here.db.select().from(secondFactors).all()).toHaveLength(1)
    // The phone is gone: a recovery code does as well. Those of before went with the authenticator they belonged to.
    expect((await faultOf(() => beginSecondFactor(later, { code: recoveryCodes[0] }))).code).toBe('bad_input')
  })

  test('a recovery code begins another one too', () => {
    const here = world()
    const { here: ruth, recoveryCodes } = withFactor(here)
    beginSecondFactor(ruth, { code: recoveryCodes[4] })
    expect(getPendingSecondFactor(ruth)).not.toBeNull()
    expect(getAccount(ruth).secondFactor?.codesLeft).toBe(9)
  })
})

describe('signing in with one', () => {
  test('counts for nothing before the code, and for everything after', async () => {
    const here = world()
    withFactor(here)
    const waiting = await waitingSignIn(here)
    expect(waiting.actor).toMatchObject({ kind: 'visitor', awaitsCode: { personId: here.person('ruth').id } })
    expect((await faultOf(() => checkSecondFactor(waiting, { code: '000000' }))).fields).toHaveProperty('code')
    checkSecondFactor(waiting, { code: codeOf(here.db, here.person('ruth').id, waiting.now) })
    expect(counts(here.db, waiting, waiting.now)).toBe(true)
  })

  test.each([
    [-1, true],
    [0, true],
    [1, true],
    [-2, false],
    [2, false],
  ])('a code %i half minutes off: %s', async (steps, taken) => {
    const here = world()
    withFactor(here, NOW - 10 * MINUTE)
    const waiting = await waitingSignIn(here, NOW)
    const code = codeOf(here.db, here.person('ruth').id, NOW + steps * HALF_MINUTE)
    if (taken) checkSecondFactor(waiting, { code })
    else expect((await faultOf(() => checkSecondFactor(waiting, { code }))).code).toBe('bad_input')
  })

  test('a code is taken once, and none from before it', async () => {
    const here = world()
    withFactor(here)
    const first = await waitingSignIn(here)
    const id = here.person('ruth').id
    const [earlier, code] = [codeOf(here.db, id, first.now - HALF_MINUTE), codeOf(here.db, id, first.now)]
    checkSecondFactor(first, { code })
    const second = await waitingSignIn(here)
    for (const used of [code, earlier]) expect((await faultOf(() => checkSecondFactor(second, { code: used }))).code).toBe('bad_input')
  })

  test('one code pressed in two windows at once lets one in', async () => {
    const { one, other } = twoDoors()
    const [here, there] = [world(one), world(other)]
    withFactor(here)
    const [first, second] = [await waitingSignIn(here), await waitingSignIn(here)]
    const code = codeOf(one, here.person('ruth').id, first.now)
    const press = async (context: Context) => checkSecondFactor(context, { code })
    const ends = await Promise.allSettled([press(first), press({ ...second, db: there.db })])
    expect(ends.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
  })

  test('the code has to come within ten minutes', async () => {
    const here = world()
    withFactor(here)
    const waiting = await waitingSignIn(here)
    const late = waiting.now + 10 * MINUTE
    const id = waiting.actor.kind === 'visitor' ? waiting.actor.awaitsCode?.sessionId : ''
    expect(actorOfSession(here.db, id ?? '', late)).toEqual({ kind: 'visitor' })
    const fault = await faultOf(() => checkSecondFactor({ ...here.at(late) }, { code: codeOf(here.db, here.person('ruth').id, late) }))
    expect(fault.code).toBe('sign_in')
  })

  test('cannot be tried through: after eight codes there is a wait, with a right one as well', async () => {
    const here = world()
    withFactor(here)
    const waiting = await waitingSignIn(here)
    for (let k = 0; k < 8; k++) await faultOf(() => checkSecondFactor(waiting, { code: '000000' }))
    const code = codeOf(here.db, here.person('ruth').id, waiting.now)
    expect((await faultOf(() => checkSecondFactor(waiting, { code }))).code).toBe('too_many')
  })

  test('a recovery code does it once, however it is typed', async () => {
    const here = world()
    const { recoveryCodes } = withFactor(here)
    const first = await waitingSignIn(here)
    signInWithRecoveryCode(first, { code: ` ${recoveryCodes[2].toUpperCase().replace('-', ' ')} ` })
    expect(counts(here.db, first, first.now)).toBe(true)
    const second = await waitingSignIn(here)
    expect((await faultOf(() => signInWithRecoveryCode(second, { code: recoveryCodes[2] }))).code).toBe('bad_input')
  })

  test('a closed account is not opened by a code', async () => {
    const here = world()
    withFactor(here)
    const waiting = await waitingSignIn(here)
    here.db.update(people).set({ disabledAt: NOW }).where(eq(people.id, here.person('ruth').id)).run()
    const code = codeOf(here.db, here.person('ruth').id, waiting.now)
    expect((await faultOf(() => checkSecondFactor(waiting, { code }))).code).toBe('not_allowed')
    expect(here.db.select().from(sessions).where(eq(sessions.completedAt, waiting.now)).all()).toEqual([])
  })
})

describe('taking it off', () => {
  test('takes a code, and leaves nothing of it', () => {
    const here = world()
    const { here: ruth, recoveryCodes } = withFactor(here)
    removeSecondFactor(ruth, { code: recoveryCodes[0] })
    expect(getAccount(ruth).secondFactor).toBeNull()
    expect(here.db.$client.prepare('select count(*) as n from recovery_codes').get()).toEqual({ n: 0 })
  })

  test('is not for admins', async () => {
    const here = world()
    const iris = here.as('iris')
    const code = codeOf(here.db, here.person('iris').id, NOW)
    expect((await faultOf(() => removeSecondFactor(iris, { code }))).code).toBe('not_allowed')
  })
})
