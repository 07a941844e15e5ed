import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { eq } from 'drizzle-orm'
import { expect, onTestFinished, test, vi } from 'vitest'
import { openDatabase, type Database } from '@/db/client'
import { migrateDatabase } from '@/db/migrate'
import { outbox } from '@/db/schema/mail'
import { MOST_ATTEMPTS } from '@/lib/mail/back-off'
import { CLAIM_LASTS_MS, claimNext } from '@/lib/mail/claim'
import type { Delivery } from '@/lib/mail/deliver'
import { DeliveryFailure, type OutgoingMail } from '@/lib/mail/transport'
import { deliverDue, startWorker } from '@/lib/mail/worker'
import { post, rowOf } from '../support/post'
import { NOW, world } from '../support/world'

/** Delivering by a function of the test, at a time that the test sets. */
function byHand(db: Database, take: (mail: OutgoingMail) => Promise<string>) {
  const time = { now: NOW }
  const delivery: Delivery = {
    db,
    transport: { deliver: take },
    from: { name: 'Oskerby workshop', address: 'workshop@oskerby.example' },
    site: 'http://localhost:3000',
    clock: () => time.now,
    random: () => 0.5,
  }
  return { delivery, time }
}

const statuses = (db: Database) => db.select({ status: outbox.status }).from(outbox).all().map(({ status }) => status)

test('a mail that is never taken is given up after the last attempt, and not before four days', async () => {
  const { db } = world()
  const { delivery, time } = byHand(db, () => Promise.reject(new DeliveryFailure('451 Not now', false)))
  const id = post(db)
  for (let attempt = 1; attempt <= MOST_ATTEMPTS; attempt += 1) {
    expect(rowOf(db, id)).toMatchObject({ status: 'queued', attempts: attempt - 1 })
    time.now = rowOf(db, id).nextTryAt
    await deliverDue(delivery)
  }
  expect(rowOf(db, id)).toMatchObject({ status: 'given_up', attempts: MOST_ATTEMPTS, lastAnswer: '451 Not now' })
  // RFC 5321, 4.5.4.1.
  expect(time.now - NOW).toBeGreaterThanOrEqual(4 * 24 * 60 * 60_000)
  // It can be sent again: its words are still there.
  expect(rowOf(db, id).props).toContain('once-and-secret')
})

test('a mail whose link ran out is given up untried, and its words go', async () => {
  const { db } = world()
  const taken: string[] = []
  const { delivery, time } = byHand(db, async ({ to }) => String(taken.push(to)))
  const id = post(db, 'ann@oskerby.example', { goodUntil: NOW + 1000 })
  time.now = NOW + 1000
  await deliverDue(delivery)
  expect(taken).toEqual([])
  expect(rowOf(db, id)).toMatchObject({ status: 'given_up', attempts: 0, props: '{}' })
})

test('every attempt sends the same words under the same Message-ID', async () => {
  const { db } = world()
  const tried: OutgoingMail[] = []
  const { delivery, time } = byHand(db, async (mail) => {
    tried.push(mail)
    if (tried.length < 3) throw new DeliveryFailure('451 Not now', false)
    return '250 Taken'
  })
  const id = post(db)
  for (let attempt = 0; attempt < 3; attempt += 1) {
    time.now = rowOf(db, id).nextTryAt
    await deliverDue(delivery)
  }
  expect(tried).toHaveLength(3)
  expect(tried[1]).toEqual(tried[0])
  expect(tried[2]).toEqual(tried[0])
})

test('a mail that cannot be written waits like any other, and stops nothing else', async () => {
  const { db } = world()
  const taken: string[] = []
  const { delivery } = byHand(db, async ({ to }) => String(taken.push(to)))
  const broken = post(db, 'bob@oskerby.example')
  db.update(outbox).set({ props: '{"link":1}' }).where(eq(outbox.id, broken)).run()
  post(db, 'ann@oskerby.example')
  await deliverDue(delivery)
  expect(taken).toEqual(['ann@oskerby.example'])
  expect(rowOf(db, broken)).toMatchObject({ status: 'queued', attempts: 1, lastAnswer: 'The mail could not be written. The log says why.' })
})

test('a row belongs to one attempt until its claim runs out', () => {
  const { db } = world()
  const id = post(db)
  const first = claimNext(db, NOW)
  expect(first).toMatchObject({ id, attempts: 1 })
  expect(claimNext(db, NOW + CLAIM_LASTS_MS - 1)).toBeUndefined()
  expect(claimNext(db, NOW + CLAIM_LASTS_MS)).toMatchObject({ id, attempts: 2 })
})

test('an attempt that comes back after another took over changes nothing', async () => {
  const { db } = world()
  const id = post(db)
  let answer = (_words: string) => {}
  const { delivery, time } = byHand(db, () => new Promise((resolve) => (answer = resolve)))
  const late = deliverDue(delivery)
  await vi.waitFor(() => expect(rowOf(db, id).subject).not.toBeNull())
  time.now += CLAIM_LASTS_MS
  claimNext(db, time.now)
  const held = rowOf(db, id)
  answer('250 Taken')
  await late
  expect(rowOf(db, id)).toEqual(held)
})

test('a mail that ends the process each time is given up in the end', () => {
  const { db } = world()
  const id = post(db)
  let now = NOW
  for (let attempt = 1; attempt <= MOST_ATTEMPTS; attempt += 1) {
    expect(claimNext(db, now)).toMatchObject({ id, attempts: attempt })
    now += CLAIM_LASTS_MS
  }
  expect(claimNext(db, now)).toBeUndefined()
  expect(rowOf(db, id)).toMatchObject({ status: 'given_up', lastAnswer: 'The last attempt never ended.' })
})

test('two workers on one file send each mail once', async () => {
  const folder = mkdtempSync(join(tmpdir(), 'setdown-mail-'))
  onTestFinished(() => rmSync(folder, { recursive: true, force: true }))
  const file = join(folder, 'setdown.db')
  const [one, two] = [openDatabase(file), openDatabase(file)]
  migrateDatabase(one)
  const recipients = Array.from({ length: 40 }, (_, index) => `owner-${index}@oskerby.example`)
  for (const to of recipients) post(one, to)

  const taken: string[] = []
  const slowly = async ({ to }: OutgoingMail) => {
    await new Promise((resolve) => setImmediate(resolve))
    taken.push(to)
    return '250 Taken'
  }
  const workers = [one, two].map((db) => startWorker(byHand(db, slowly).delivery, { lookEveryMs: 5 }))
  await vi.waitFor(() => expect(statuses(one).every((status) => status === 'sent')).toBe(true), { timeout: 20_000 })
  await Promise.all(workers.map((worker) => worker.stop()))
  expect(taken.toSorted()).toEqual(recipients.toSorted())
})

test('stopping waits for what is under way and takes no more', async () => {
  const { db } = world()
  const answers: (() => void)[] = []
  const { delivery } = byHand(db, () => new Promise((resolve) => void answers.push(() => resolve('250 Taken'))))
  for (let count = 0; count < 5; count += 1) post(db)
  const worker = startWorker(delivery, { lookEveryMs: 5 })
  await vi.waitFor(() => expect(answers).toHaveLength(2))
  const stopped = worker.stop()
  for (const answer of answers) answer()
  await stopped
  expect(statuses(db).toSorted()).toEqual(['queued', 'queued', 'queued', 'sent', 'sent'])
})

test('a process that ends puts back what it holds', async () => {
  const { db } = world()
  let begun = 0
  const { delivery } = byHand(db, () => {
    begun += 1
    return new Promise(() => undefined)
  })
  const id = post(db)
  const worker = startWorker(delivery, { lookEveryMs: 5 })
  await vi.waitFor(() => expect(begun).toBe(1))
  worker.abandon()
  expect(rowOf(db, id)).toMatchObject({ status: 'queued', nextTryAt: NOW, claim: null, claimedUntil: null })
})

test('a database that cannot be reached is not the end of the worker', async () => {
  const { db } = world()
  const { delivery } = byHand(db, async () => '250 Taken')
  post(db)
  vi.useFakeTimers({ toFake: ['setTimeout', 'clearTimeout'] })
  onTestFinished(() => void vi.useRealTimers())
  db.$client.pragma('query_only = ON')
  const worker = startWorker(delivery)
  await vi.advanceTimersByTimeAsync(0)
  expect(statuses(db)).toEqual(['queued'])
  db.$client.pragma('query_only = OFF')
  await vi.advanceTimersByTimeAsync(30_000)
  vi.useRealTimers()
  await vi.waitFor(() => expect(statuses(db)).toEqual(['sent']))
  await worker.stop()
})
