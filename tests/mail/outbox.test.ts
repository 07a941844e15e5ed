import { eq } from 'drizzle-orm'
import { expect, test } from 'vitest'
import { outbox } from '@/db/schema/mail'
import { Fault } from '@/lib/kernel/errors'
import { listOutbox } from '@/lib/mail/queries'
import { sendAgain, sendAllAgain } from '@/lib/mail/send-again'
import { sweepOutbox } from '@/lib/mail/sweep'
import { GIVEN_UP_STAYS_DAYS, SENT_STAYS_DAYS } from '@/lib/mail/terms'
import { post, rowOf } from '../support/post'
import { NOW, world, type World } from '../support/world'

const DAY = 24 * 60 * 60_000

const setRow = ({ db }: World, id: string, values: Partial<typeof outbox.$inferInsert>) =>
  db.update(outbox).set(values).where(eq(outbox.id, id)).run()

function codeOf(run: () => unknown): string | undefined {
  try {
    run()
  } catch (trouble) {
    if (trouble instanceof Fault) return trouble.code
    throw trouble
  }
  return undefined
}

test('the list is of one status, newest first, in pages, with how many there are of each', () => {
  const here = world()
  const ids = Array.from({ length: 120 }, (_, index) => {
    const id = post(here.db, `owner-${index}@oskerby.example`)
    setRow(here, id, { createdAt: NOW + index })
    return id
  })
  setRow(here, ids[0], { status: 'given_up', givenUpAt: NOW, lastAnswer: '550 No such mailbox' })
  const first = listOutbox(here.as('ruth'), { status: 'queued', page: 1 })
  expect(first).toMatchObject({ page: 1, pages: 3, total: 119, counts: { queued: 119, sending: 0, sent: 0, given_up: 1 } })
  expect(first.rows.map(({ id }) => id)).toEqual(ids.slice(70).toReversed())
  expect(listOutbox(here.as('ruth'), { status: 'queued', page: 3 }).rows).toHaveLength(19)
  // Pages that are not there lead to the nearest one.
  expect(listOutbox(here.as('ruth'), { status: 'queued', page: 99 }).page).toBe(3)
  expect(listOutbox(here.as('ruth'), { status: 'queued', page: Number.NaN }).page).toBe(1)
  expect(listOutbox(here.as('ruth'), { status: 'given_up', page: 1 }).rows).toMatchObject([{ at: NOW, lastAnswer: '550 No such mailbox', canSendAgain: true }])
})

test('what a list shows holds no link', () => {
  const here = world()
  post(here.db)
  expect(JSON.stringify(listOutbox(here.as('iris'), { status: 'queued', page: 1 }))).not.toContain('once-and-secret')
})

test('staff may look, admins may press, owners and visitors are not told that it is there', () => {
  const here = world()
  const mailId = post(here.db)
  const look = (context = here.at()) => codeOf(() => listOutbox(context, { status: 'queued', page: 1 }))
  const press = (context = here.at()) => codeOf(() => sendAgain(context, { mailId }))
  expect([look(), look(here.as('ann')), look(here.as('ruth')), look(here.as('iris'))]).toEqual(['sign_in', 'not_found', undefined, undefined])
  expect([press(), press(here.as('ann')), press(here.as('ruth')), press(here.as('iris'))]).toEqual(['sign_in', 'not_found', 'not_allowed', undefined])
  expect(codeOf(() => sendAllAgain(here.as('ruth'), { status: 'queued' }))).toBe('not_allowed')
})

test('a given up mail starts anew, under the name it had', () => {
  const here = world()
  const id = post(here.db)
  setRow(here, id, { status: 'given_up', attempts: 25, givenUpAt: NOW - DAY, lastAnswer: '550 No such mailbox' })
  const before = rowOf(here.db, id)
  sendAgain(here.as('iris'), { mailId: id })
  expect(rowOf(here.db, id)).toEqual({ ...before, status: 'queued', attempts: 0, nextTryAt: NOW, givenUpAt: null })
})

test('a waiting mail is due at once', () => {
  const here = world()
  const id = post(here.db)
  setRow(here, id, { attempts: 8, nextTryAt: NOW + DAY })
  sendAgain(here.as('iris'), { mailId: id })
  expect(rowOf(here.db, id)).toMatchObject({ status: 'queued', nextTryAt: NOW })
})

test.each([
  ['was sent', { status: 'sent', sentAt: NOW }],
  ['is on its way', { status: 'sending', claim: 'abc', claimedUntil: NOW + 1000 }],
  ['has run out', { status: 'given_up', goodUntil: NOW - 1 }],
] as const)('a mail that %s is not sent again', (_what, values) => {
  const here = world()
  const id = post(here.db)
  setRow(here, id, values)
  const before = rowOf(here.db, id)
  expect(codeOf(() => sendAgain(here.as('iris'), { mailId: id }))).toBe('conflict')
  expect(rowOf(here.db, id)).toEqual(before)
})

test('all at once means all that still say something', () => {
  const here = world()
  const [good, out, sent] = [post(here.db), post(here.db), post(here.db)]
  setRow(here, good, { status: 'given_up', givenUpAt: NOW })
  setRow(here, out, { status: 'given_up', givenUpAt: NOW, goodUntil: NOW - 1 })
  setRow(here, sent, { status: 'sent' })
  expect(sendAllAgain(here.as('iris'), { status: 'given_up' })).toBe(1)
  expect([good, out, sent].map((id) => rowOf(here.db, id).status)).toEqual(['queued', 'given_up', 'sent'])
})

test('what is long done is forgotten, what waits is not', () => {
  const here = world()
  const ids = ['sent', 'given_up', 'queued', 'sending'] as const
  const rows = ids.map((status) => {
    const id = post(here.db)
    setRow(here, id, { status })
    return id
  })
  const left = () => here.db.select({ status: outbox.status }).from(outbox).all().map(({ status }) => status)
  sweepOutbox(here.at(NOW + SENT_STAYS_DAYS * DAY))
  expect(left()).toHaveLength(rows.length)
  sweepOutbox(here.at(NOW + SENT_STAYS_DAYS * DAY + 1))
  expect(left().toSorted()).toEqual(['given_up', 'queued', 'sending'])
  sweepOutbox(here.at(NOW + GIVEN_UP_STAYS_DAYS * DAY + 1))
  expect(left().toSorted()).toEqual(['queued', 'sending'])
})
