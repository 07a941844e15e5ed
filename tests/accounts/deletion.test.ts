import { eq } from 'drizzle-orm'
import { expect, test } from 'vitest'
import { oneTimeTokens, people, sessions } from '@/db/schema/accounts'
import { sheets } from '@/db/schema/setups'
import { askForDeletion } from '@/lib/accounts/ask-for-deletion'
import { askForLink } from '@/lib/accounts/ask-for-link'
import { changeName } from '@/lib/accounts/change-name'
import { deleteDueAccounts } from '@/lib/accounts/delete-due-accounts'
import { insertPerson } from '@/lib/accounts/people'
import { getAccount } from '@/lib/accounts/queries'
import { takeBackDeletion } from '@/lib/accounts/take-back-deletion'
import { faultOf } from '../support/fault'
import { mails } from '../support/mails'
import { AT_HOME } from '../support/origins'
import { addSecondFactor } from '../support/second-factor'
import { NOW, world } from '../support/world'

const WEEK = 7 * 24 * 60 * 60_000

test('an account goes a week after its owner asked, with all that was only theirs', () => {
  const { db, at, as, person } = world()
  const ann = as('ann')
  as('bob')
  addSecondFactor(db, person('ann').id, NOW)
  askForLink(at(), { email: 'ann@brandreth.example' }, AT_HOME)
  db.insert(sheets)
    .values({ id: 'sht_a', number: 1001, code: 'k7m2w9qdh4txp3rt', name: 'Ann’s', ownerId: person('ann').id, createdAt: NOW })
    .run()

  askForDeletion(ann)
  expect(getAccount(ann).deletesAt).toBe(NOW + WEEK)
  const told = mails(db).find(({ template }) => template === 'deletion-asked')
  expect(told).toMatchObject({ to: 'ann@brandreth.example', props: { deletesAt: NOW + WEEK } })

  expect(deleteDueAccounts(at(NOW + WEEK - 1))).toBe(0)
  expect(deleteDueAccounts(at(NOW + WEEK))).toBe(1)
  expect(deleteDueAccounts(at(NOW + WEEK))).toBe(0)
  expect(db.select().from(people).all().map(({ name }) => name)).toEqual(['Bob'])
  expect(db.select().from(sessions).all().map(({ personId }) => personId)).toEqual([person('bob').id])
  expect(db.select().from(oneTimeTokens).all()).toEqual([])
  // The sheet is still there under its code, and says nothing of whose it was.
  expect(db.select().from(sheets).get()).toMatchObject({ code: 'k7m2w9qdh4txp3rt', name: null, ownerId: null })
})

test('until then the account works, and the mark can be taken back', () => {
  const { db, at, as, person } = world()
  const ann = as('ann')
  askForDeletion(ann)
  changeName(ann, { name: 'Anna' })
  takeBackDeletion({ ...ann, now: NOW + WEEK - 1 })
  expect(deleteDueAccounts(at(NOW + WEEK))).toBe(0)
  expect(db.select().from(people).where(eq(people.id, person('ann').id)).get()).toMatchObject({ name: 'Anna', deletionAskedAt: null })
})

test('asking twice does not begin the week anew', () => {
  const { db, as } = world()
  const ann = as('ann')
  askForDeletion(ann)
  askForDeletion({ ...ann, now: NOW + 1000 })
  expect(getAccount(ann).deletesAt).toBe(NOW + WEEK)
  expect(mails(db)).toHaveLength(1)
})

test('the only admin stays', async () => {
  const { db, as } = world()
  const iris = as('iris')
  expect((await faultOf(() => askForDeletion(iris))).code).toBe('conflict')
  insertPerson(db, { name: 'Gus', role: 'admin', email: 'gus@oskerby.example', passwordHash: null }, NOW)
  askForDeletion(iris)
})

test('visitors have nothing to delete', async () => {
  expect((await faultOf(() => askForDeletion(world().at()))).code).toBe('sign_in')
})
