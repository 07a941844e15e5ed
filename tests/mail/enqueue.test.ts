import { expect, test } from 'vitest'
import { outbox } from '@/db/schema/mail'
import { enqueue } from '@/lib/mail/enqueue'
import { NOW, world } from '../support/world'

const props = { link: 'http://localhost:3000/confirm-address?token=abc', minutes: 60 }

test('a mail exists when the change does', () => {
  const { db } = world()
  db.transaction((tx) => enqueue(tx, { template: 'confirm', to: 'ann@oskerby.example', props, now: NOW, goodUntil: NOW + 1 }))
  const [row, ...others] = db.select().from(outbox).all()
  expect(others).toEqual([])
  expect(row).toMatchObject({
    template: 'confirm',
    recipient: 'ann@oskerby.example',
    status: 'queued',
    attempts: 0,
    nextTryAt: NOW,
    goodUntil: NOW + 1,
    createdAt: NOW,
    messageId: `${row.id}@localhost`,
  })
  expect(JSON.parse(row.props)).toEqual(props)
})

test('a change that fails takes its mail with it', () => {
  const { db } = world()
  const change = () =>
    db.transaction((tx) => {
      enqueue(tx, { template: 'confirm', to: 'ann@oskerby.example', props, now: NOW })
      throw new Error('The change failed.')
    })
  expect(change).toThrow('The change failed.')
  expect(db.select().from(outbox).all()).toEqual([])
})

test.each([
  'ann@oskerby.example\r\nBcc: bob@oskerby.example',
  'ann@oskerby.example\nbob@oskerby.example',
  'ann@oskerby.example, bob@oskerby.example',
  'Ann <ann@oskerby.example>',
  'ann@oskerby.example>',
  'ann',
  'ann@',
  '@oskerby.example',
  'an n@oskerby.example',
  `${'a'.repeat(254)}@oskerby.example`,
])('no mail goes to %j', (to) => {
  const { db } = world()
  expect(() => enqueue(db, { template: 'confirm', to, props, now: NOW })).toThrow('no address')
  expect(db.select().from(outbox).all()).toEqual([])
})

test.each(["o'neil+phono@oskerby.example", 'müller@oskerby.example', 'ann@bücher.example', 'a.b-c_d!#$%&*/=?^`{|}~@oskerby.example'])(
  'odd but good: %s',
  (to) => {
    const { db } = world()
    enqueue(db, { template: 'confirm', to, props, now: NOW })
    expect(db.select({ recipient: outbox.recipient }).from(outbox).all()).toEqual([{ recipient: to }])
  },
)

test.each([
  { ...props, link: 'javascript:alert(1)' },
  { ...props, link: '/confirm-address?token=abc' },
  { ...props, minutes: 0 },
])('wrong props are refused where the mail is asked for: %j', (wrong) => {
  const { db } = world()
  expect(() => enqueue(db, { template: 'confirm', to: 'ann@oskerby.example', props: wrong, now: NOW })).toThrow()
})

test('a name cannot break out of its line', () => {
  const { db } = world()
  const invite = (invitedBy: string) =>
    enqueue(db, {
      template: 'invitation',
      to: 'ruth@oskerby.example',
      props: { link: props.link, minutes: 60, invitedBy, role: 'staff' },
      now: NOW,
    })
  expect(() => invite('Davi\r\nBcc: bob@oskerby.example')).toThrow()
  invite('Davi')
})
