import { describe, expect, test } from 'vitest'
import { VISITOR, type Actor, type SignedIn } from '@/lib/access/actor'
import { can, permit } from '@/lib/access/permit'
import { RULES, type Permission } from '@/lib/access/rules'
import { Fault } from '@/lib/kernel/errors'

const person = (id: string, role: SignedIn['role'], more: Partial<SignedIn> = {}): SignedIn => ({
  kind: 'person',
  id,
  role,
  name: id,
  sessionId: `ses_${id}`,
  disabled: false,
  mustSetUpSecondFactor: false,
  ...more,
})

/** Everyone the table speaks of. Rows below belong to Ann, or are Ann. */
const WHO = {
  visitor: VISITOR,
  'the owner': person('ann', 'owner'),
  'another owner': person('bob', 'owner'),
  staff: person('ruth', 'staff'),
  admin: person('iris', 'admin'),
  'an admin without a second factor': person('gus', 'admin', { mustSetUpSecondFactor: true }),
  'a disabled owner': person('ann', 'owner', { disabled: true }),
  'a disabled admin': person('iris', 'admin', { disabled: true }),
} satisfies Record<string, Actor>
type Who = keyof typeof WHO

const ANN = { id: 'ann' }
const ANNS = { ownerId: 'ann' }
const NOBODYS = { ownerId: null }
const SELF = 'self'

const EVERYONE = Object.keys(WHO) as Who[]
const SIGNED_IN: Who[] = ['the owner', 'another owner', 'staff', 'admin']
const WORKSHOP: Who[] = ['staff', 'admin']

/** What each permission is asked about, and who has it. `SELF` asks everyone about their own account. */
const TABLE: { [P in Permission]: [about: object | typeof SELF | undefined, allowed: Who[]][] } = {
  'account:read': [[ANN, ['the owner']], [SELF, [...SIGNED_IN, 'an admin without a second factor']]],
  'account:change': [[ANN, ['the owner']], [SELF, SIGNED_IN]],
  'account:end-sessions': [[ANN, ['the owner']], [SELF, [...SIGNED_IN, 'an admin without a second factor']]],
  'account:set-up-second-factor': [[ANN, []], [SELF, [...WORKSHOP, 'an admin without a second factor']]],
  'account:remove-second-factor': [[ANN, ['the owner']], [SELF, ['the owner', 'another owner', 'staff']]],
  'account:download': [[ANN, ['the owner']], [SELF, SIGNED_IN]],
  'account:delete': [[ANN, ['the owner']], [SELF, SIGNED_IN]],
  'workshop:enter': [[undefined, WORKSHOP]],
  'people:read': [[undefined, ['admin']]],
  'people:invite': [[undefined, ['admin']]],
  'person:read': [[ANN, ['admin']], [SELF, ['admin']]],
  'person:change-role': [[ANN, ['admin']], [SELF, []]],
  'person:disable': [[ANN, ['admin']], [SELF, []]],
  'person:enable': [[ANN, ['admin']], [SELF, []]],
  'shelf:read': [[undefined, SIGNED_IN]],
  'unit:add': [[undefined, SIGNED_IN]],
  'unit:read': [[ANNS, ['the owner']]],
  'unit:change': [[ANNS, ['the owner']]],
  'unit:remove': [[ANNS, ['the owner']]],
  'cartridge:add': [[undefined, SIGNED_IN]],
  'cartridge:read': [[ANNS, ['the owner']]],
  'cartridge:change': [[ANNS, ['the owner']]],
  'cartridge:remove': [[ANNS, ['the owner']]],
  'sheet:read': [[ANNS, EVERYONE], [NOBODYS, EVERYONE]],
  'sheet:change': [[ANNS, ['the owner']], [NOBODYS, EVERYONE]],
  'sheet:keep': [[ANNS, []], [NOBODYS, SIGNED_IN]],
  'sheet:name': [[ANNS, ['the owner']], [NOBODYS, []]],
  'sheet:place': [[ANNS, ['the owner']], [NOBODYS, []]],
  'sheet:archive': [[ANNS, ['the owner']], [NOBODYS, []]],
  'outbox:read': [[undefined, WORKSHOP]],
  'outbox:send-again': [[undefined, ['admin']]],
  'mailbox:read': [[undefined, ['admin']]],
}

const cases = Object.entries(TABLE).flatMap(([permission, rows]) =>
  rows.flatMap(([about, allowed]) =>
    EVERYONE.map((who) => {
      const row = about === SELF ? { id: (WHO[who] as Partial<SignedIn>).id ?? 'nobody' } : about
      const words = about === SELF ? 'themselves' : about === undefined ? '' : JSON.stringify(about)
      return { permission: permission as Permission, who, row, words, allowed: allowed.includes(who) }
    }),
  ),
)

/** The table's cells come by name, so each is asked without the types that bind a row to its permission. */
const asked = can as (actor: Actor, permission: Permission, row?: object) => boolean
const held = permit as (actor: Actor, permission: Permission, row?: object) => unknown

test('the table speaks of every permission', () => {
  expect(Object.keys(TABLE).sort()).toEqual(Object.keys(RULES).sort())
})

test.each(cases)('$permission $words: $who, $allowed', ({ permission, who, row, allowed }) => {
  expect(asked(WHO[who], permission, row)).toBe(allowed)
  if (allowed) expect(held(WHO[who], permission, row)).toBe(row)
  else expect(() => held(WHO[who], permission, row)).toThrow(Fault)
})

describe('what someone is told who may not', () => {
  const codeOf = (run: () => unknown) => {
    try {
      run()
    } catch (trouble) {
      if (trouble instanceof Fault) return trouble.code
    }
    return 'nothing'
  }

  test('a stranger hears that there is nothing, and so does a visitor', () => {
    expect(codeOf(() => permit(WHO['another owner'], 'unit:change', ANNS))).toBe('not_found')
    expect(codeOf(() => permit(VISITOR, 'unit:read', ANNS))).toBe('not_found')
    expect(codeOf(() => permit(WHO.staff, 'people:invite'))).toBe('not_found')
  })

  test('a visitor is asked to sign in where that gives nothing away', () => {
    expect(codeOf(() => permit(VISITOR, 'shelf:read'))).toBe('sign_in')
    expect(codeOf(() => permit(VISITOR, 'people:invite'))).toBe('sign_in')
    expect(codeOf(() => permit(VISITOR, 'sheet:change', ANNS))).toBe('sign_in')
  })

  test('someone who may read it hears that their account may not do this', () => {
    expect(codeOf(() => permit(WHO['another owner'], 'sheet:change', ANNS))).toBe('not_allowed')
    expect(codeOf(() => permit(WHO.admin, 'account:remove-second-factor', { id: 'iris' }))).toBe('not_allowed')
    expect(codeOf(() => permit(WHO.admin, 'person:disable', { id: 'iris' }))).toBe('not_allowed')
    expect(codeOf(() => permit(WHO.staff, 'outbox:send-again'))).toBe('not_allowed')
  })
})
