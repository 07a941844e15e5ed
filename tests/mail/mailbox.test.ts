import { simpleParser } from 'mailparser'
import { afterEach, expect, test, vi } from 'vitest'
import { mailboxMessages } from '@/db/schema/mail'
import { Fault } from '@/lib/kernel/errors'
import { deliverDue } from '@/lib/mail/worker'
import { getMailboxHtml, getMailboxMessage, listMailbox } from '@/lib/mail/mailbox-queries'
import { mailboxTransport } from '@/lib/mail/mailbox-transport'
import * as settings from '@/lib/server/env'
import { post, rowOf, testDelivery } from '../support/post'
import { NOW, world, type World } from '../support/world'

afterEach(() => void vi.restoreAllMocks())

/** Delivers what is queued into the local mailbox. */
async function keep({ db }: World) {
  const { delivery } = testDelivery(db, { host: 'unused', port: 1, security: 'none', credentials: null })
  await deliverDue({ ...delivery, transport: mailboxTransport(db, () => NOW) })
}

function codeOf(run: () => unknown): string | undefined {
  try {
    run()
  } catch (trouble) {
    if (trouble instanceof Fault) return trouble.code
    throw trouble
  }
  return undefined
}

test('a mail is kept whole, and its link can be read', async () => {
  const here = world()
  const id = post(here.db, 'ann@oskerby.example')
  await keep(here)
  expect(rowOf(here.db, id)).toMatchObject({ status: 'sent', lastAnswer: 'Kept in the local mailbox.', props: '{}' })

  const { rows } = listMailbox(here.as('iris'), { to: null, page: 1 })
  expect(rows).toMatchObject([{ recipient: 'ann@oskerby.example', subject: 'Your link to sign in', receivedAt: NOW }])
  const message = getMailboxMessage(here.as('iris'), rows[0].id)
  expect(message.plain).toContain('http://localhost:3000/sign-in/link?token=once-and-secret')
  expect(getMailboxHtml(here.as('iris'), rows[0].id)).toContain('href="http://localhost:3000/sign-in/link?token=once-and-secret"')
  // The raw form is a message that mail programs read.
  expect(await simpleParser(message.raw)).toMatchObject({ subject: 'Your link to sign in', messageId: `<${id}@localhost>` })
})

test('a mail that comes twice is kept once', async () => {
  const here = world()
  const transport = mailboxTransport(here.db, () => NOW)
  const mail = {
    messageId: 'out_1@localhost',
    from: { name: 'Workshop', address: 'workshop@oskerby.example' },
    to: 'ann@oskerby.example',
    subject: 'Once',
    html: '<p>Once</p>',
    plain: 'Once',
    date: NOW,
  }
  await transport.deliver(mail)
  await transport.deliver(mail)
  expect(here.db.select().from(mailboxMessages).all()).toHaveLength(1)
})

test('the list goes in pages and narrows to one recipient', async () => {
  const here = world()
  for (let count = 0; count < 60; count += 1) post(here.db, `owner-${count % 3}@oskerby.example`)
  await keep(here)
  const iris = here.as('iris')
  expect(listMailbox(iris, { to: null, page: 2 })).toMatchObject({ page: 2, pages: 2, total: 60 })
  expect(listMailbox(iris, { to: 'owner-1@oskerby.example', page: 1 })).toMatchObject({ pages: 1, total: 20 })
  expect(listMailbox(iris, { to: 'nobody@oskerby.example', page: 1 })).toMatchObject({ rows: [], total: 0 })
})

test('admins alone may read it, and only where no mail server is set', async () => {
  const here = world()
  post(here.db)
  await keep(here)
  const [{ id }] = listMailbox(here.as('iris'), { to: null, page: 1 }).rows
  const readings = [
    (context = here.at()) => codeOf(() => listMailbox(context, { to: null, page: 1 })),
    (context = here.at()) => codeOf(() => getMailboxMessage(context, id)),
    (context = here.at()) => codeOf(() => getMailboxHtml(context, id)),
  ]
  for (const read of readings) {
    expect([read(), read(here.as('ann')), read(here.as('ruth')), read(here.as('iris'))]).toEqual(['sign_in', 'not_found', 'not_found', undefined])
  }
  const { mail, ...env } = settings.env()
  const smtp = { host: 'mail.example.org', port: 587, security: 'starttls', credentials: null } as const
  vi.spyOn(settings, 'env').mockReturnValue({ ...env, mail: { ...mail, smtp } })
  for (const read of readings) expect(read(here.as('iris'))).toBe('not_found')
})
