import { describe, expect, test } from 'vitest'
import { waitAfter } from '@/lib/mail/back-off'
import { deliverDue } from '@/lib/mail/worker'
import type { SmtpSettings } from '@/lib/server/env-mail'
import { post, rowOf, testDelivery } from '../support/post'
import { CERTIFICATE, droppingLine, reply, smtpServer, type Behaviour } from '../support/smtp'
import { NOW, world } from '../support/world'

// The server is a real one, on the loopback address. Reply codes: RFC 5321, 4.2.

test('what a server takes is sent, whole, and its link is forgotten here', async () => {
  const { db } = world()
  const server = await smtpServer()
  const { delivery } = testDelivery(db, server.settings())
  const id = post(db)
  await deliverDue(delivery)

  const [mail, ...others] = server.received
  expect(others).toEqual([])
  expect(mail.recipients).toEqual(['ann@oskerby.example'])
  expect(mail.parsed).toMatchObject({ subject: 'Your link to sign in', messageId: `<${id}@localhost>`, date: new Date(NOW) })
  expect(mail.parsed.from?.value).toEqual([{ name: 'Oskerby workshop', address: 'workshop@oskerby.example' }])
  expect(mail.parsed.headers.get('auto-submitted')).toBe('auto-generated')
  expect(mail.parsed.text).toContain('http://localhost:3000/sign-in/link?token=once-and-secret')
  expect(mail.parsed.html).toContain('href="http://localhost:3000/sign-in/link?token=once-and-secret"')

  const row = rowOf(db, id)
  expect(row).toMatchObject({ status: 'sent', attempts: 1, sentAt: NOW, claim: null, subject: 'Your link to sign in' })
  expect(row.lastAnswer).toMatch(/^250 /)
  expect(JSON.stringify(row)).not.toContain('once-and-secret')
})

test.each([
  ['the recipient', { onRecipient: () => reply(550, 'No such mailbox here') }],
  ['the mail', { onWhole: () => reply(554, 'Not wanted: http://localhost:3000/sign-in/link?token=once-and-secret') }],
])('a server that refuses %s for good is asked once, and its answer is kept without links', async (_what, behaviour) => {
  const { db } = world()
  const server = await smtpServer(behaviour)
  const { delivery, time } = testDelivery(db, server.settings())
  const id = post(db)
  await deliverDue(delivery)
  time.now += 90 * 24 * 60 * 60_000
  expect(await deliverDue(delivery)).toBe(0)

  const row = rowOf(db, id)
  expect(row).toMatchObject({ status: 'given_up', attempts: 1, givenUpAt: NOW, claim: null })
  expect(row.lastAnswer).toMatch(/^55[04] /)
  expect(row.lastAnswer).not.toContain('once-and-secret')
})

test('a greylisting server is asked again, later, with the same mail', async () => {
  const { db } = world()
  let asked = 0
  const server = await smtpServer({
    onRecipient: () => {
      asked += 1
      return asked <= 2 ? reply(451, 'Come back later') : undefined
    },
  })
  const { delivery, time } = testDelivery(db, server.settings())
  const id = post(db)
  await deliverDue(delivery)
  expect(rowOf(db, id)).toMatchObject({ status: 'queued', attempts: 1, nextTryAt: NOW + waitAfter(1, 0.5), lastAnswer: expect.stringMatching(/^451 /) })

  expect(await deliverDue(delivery)).toBe(0)
  time.now += waitAfter(1, 0.5)
  await deliverDue(delivery)
  time.now += waitAfter(2, 0.5)
  await deliverDue(delivery)
  expect(rowOf(db, id)).toMatchObject({ status: 'sent', attempts: 3 })
  expect(server.received).toHaveLength(1)
})

test('a server that says nothing is left, and asked again', async () => {
  const { db } = world()
  let slow = true
  const server = await smtpServer({ onWhole: () => (slow ? new Promise(() => undefined) : undefined) })
  const id = post(db)
  await deliverDue(testDelivery(db, server.settings(), { impatient: true }).delivery)
  expect(rowOf(db, id)).toMatchObject({ status: 'queued', attempts: 1, lastAnswer: 'The server did not answer in time. (ETIMEDOUT)' })

  slow = false
  const { delivery, time } = testDelivery(db, server.settings())
  time.now += waitAfter(1, 0.5)
  await deliverDue(delivery)
  expect(rowOf(db, id)).toMatchObject({ status: 'sent', attempts: 2 })
})

test('a connection that drops in the middle of a mail loses nothing', async () => {
  const { db } = world()
  const server = await smtpServer()
  const line = await droppingLine(server.port, 2000)
  const { delivery, time } = testDelivery(db, server.settings({ port: line.port }))
  const id = post(db)
  await deliverDue(delivery)
  expect(rowOf(db, id)).toMatchObject({ status: 'queued', attempts: 1, lastAnswer: expect.stringMatching(/closed the connection in the middle/) })
  expect(server.received).toEqual([])

  line.mend()
  time.now += waitAfter(1, 0.5)
  await deliverDue(delivery)
  expect(rowOf(db, id)).toMatchObject({ status: 'sent', attempts: 2 })
  expect(server.received).toHaveLength(1)
})

test('nobody listening is no reason to give up', async () => {
  const { db } = world()
  const server = await smtpServer()
  await new Promise<void>((resolve) => void server.stop(resolve))
  const { delivery } = testDelivery(db, server.settings())
  const id = post(db)
  await deliverDue(delivery)
  expect(rowOf(db, id)).toMatchObject({ status: 'queued', lastAnswer: 'Nothing listens at the mail server’s port. (ECONNREFUSED)' })
})

test('an address that is not plain Latin arrives as it is', async () => {
  const { db } = world()
  const server = await smtpServer()
  const { delivery } = testDelivery(db, server.settings())
  const odd = ["o'neil+phono@oskerby.example", 'müller@oskerby.example', 'a!#$%&*/=?^_`{|}~-z@oskerby.example', 'ann@bücher.example']
  for (const address of odd) post(db, address)
  await deliverDue(delivery)
  expect(server.received.flatMap(({ recipients }) => recipients).toSorted()).toEqual(odd.toSorted())
  expect(server.received.map(({ parsed }) => [parsed.to].flat()[0]?.value[0].address).toSorted()).toEqual(odd.toSorted())
})

describe('encryption', () => {
  const encrypted = (settings: { security: 'starttls' | 'tls' }, options: { secure?: boolean; disabledCommands?: string[] } = {}) =>
    async function run(trusted?: string) {
      const { db } = world()
      const server = await smtpServer(options)
      const { delivery } = testDelivery(db, server.settings(settings), { trusted })
      const id = post(db)
      await deliverDue(delivery)
      return { row: rowOf(db, id), received: server.received }
    }

  test.each([
    ['asked for on the way', encrypted({ security: 'starttls' })],
    ['from the start', encrypted({ security: 'tls' }, { secure: true })],
  ])('%s, with a certificate that is trusted', async (_how, run) => {
    const { row, received } = await run(CERTIFICATE)
    expect(row).toMatchObject({ status: 'sent' })
    expect(received.map((mail) => mail.encrypted)).toEqual([true])
  })

  test.each([
    ['a certificate that nobody vouches for', encrypted({ security: 'starttls' })],
    ['a certificate that nobody vouches for, from the start', encrypted({ security: 'tls' }, { secure: true })],
    ['a server that cannot encrypt', encrypted({ security: 'starttls' }, { disabledCommands: ['STARTTLS'] })],
    ['a server that speaks plainly where encryption is due from the start', encrypted({ security: 'tls' })],
  ])('nothing is said to %s', async (_what, run) => {
    const { row, received } = await run()
    expect(row).toMatchObject({ status: 'queued', attempts: 1 })
    expect(row.lastAnswer).toMatch(/encrypted/)
    expect(received).toEqual([])
  })
})

describe('signing in to the mail server', () => {
  const credentials = { user: 'workshop', password: 'right' }
  const withPassword: Behaviour = {
    authOptional: false,
    onAuth({ username, password }, _session, callback) {
      if (username === credentials.user && password === credentials.password) callback(null, { user: username })
      else callback(reply(535, 'No'))
    },
  }

  async function send(behaviour: Behaviour, changes: Partial<SmtpSettings>) {
    const { db } = world()
    const server = await smtpServer(behaviour)
    const { delivery } = testDelivery(db, server.settings({ security: 'starttls', ...changes }), { trusted: CERTIFICATE })
    const id = post(db)
    await deliverDue(delivery)
    return { row: rowOf(db, id), received: server.received }
  }

  test('with the right password', async () => {
    const { row, received } = await send(withPassword, { credentials })
    expect(row.status).toBe('sent')
    expect(received.map(({ user }) => user)).toEqual(['workshop'])
  })

  test.each([
    ['a wrong password', withPassword, { credentials: { ...credentials, password: 'wrong' } }],
    ['a password that is missing', withPassword, {}],
    ['a server that offers no sign-in', { disabledCommands: ['AUTH'] }, { credentials }],
  ])('%s can be mended, so the mail waits', async (_what, behaviour, changes) => {
    const { row, received } = await send(behaviour, changes)
    expect(row).toMatchObject({ status: 'queued', attempts: 1 })
    expect(row.lastAnswer).not.toContain('wrong')
    expect(received).toEqual([])
  })
})
