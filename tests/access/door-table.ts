import { oneTimeTokens } from '@/db/schema/accounts'
import { mailboxMessages } from '@/db/schema/mail'
import { askForDeletion } from '@/lib/accounts/ask-for-deletion'
import { beginSecondFactor } from '@/lib/accounts/begin-second-factor'
import { hashPassword } from '@/lib/accounts/passwords'
import { issueLink } from '@/lib/accounts/tokens'
import type { TokenPurpose } from '@/lib/accounts/terms'
import { enqueue } from '@/lib/mail/enqueue'
import { archiveCartridge } from '@/lib/shelf/archive-cartridge'
import { archiveSheet } from '@/lib/shelf/archive-sheet'
import { archiveUnit } from '@/lib/shelf/archive-unit'
import { getUnit } from '@/lib/shelf/queries'
import { setPositions } from '@/lib/shelf/set-positions'
import { addSecondFactor, codeOf } from '../support/second-factor'
import { COIL, FINCH, type ShelfWorld } from '../support/shelf'
import { NOW } from '../support/world'

const PASSWORD = 'a wren on a tarn'

/** Everyone who may knock. What the table's rows are about belongs to Ann. */
export const WHO = ['visitor', 'Ann', 'another owner', 'staff', 'admin', 'Ann, closed'] as const
export type Who = (typeof WHO)[number]
export const CAST = { Ann: 'ann', 'another owner': 'bob', staff: 'ruth', admin: 'iris', 'Ann, closed': 'ann' } as const

/** What comes of it for each; whoever is not named gets `others`. */
type Outcomes = Partial<Record<Who, string>> & { others: string }
export interface Row {
  /** What is sent: the fields of a form, or of an address. */
  send: (world: ShelfWorld) => Fields | Promise<Fields>
  outcomes: Outcomes
  params?: Record<string, string>
}
export type Fields = Record<string, string>

const everyone = (outcome: string): Outcomes => ({ others: outcome })
/** Doors of someone's own account: whoever is signed in acts on themselves. */
const ownAccount = (outcome: string): Outcomes => ({ others: outcome, visitor: 'sign_in', 'Ann, closed': 'sign_in' })
const shelfOf = ownAccount
/** Doors to a thing of Ann's: for others it is not there. */
const annsThing = (outcome: string): Outcomes => ({ others: 'not_found', Ann: outcome })
const admins = (outcome: string): Outcomes => ({ others: 'not_found', visitor: 'sign_in', 'Ann, closed': 'sign_in', admin: outcome })

const linkTo = (purpose: TokenPurpose, email: string, more: Partial<typeof oneTimeTokens.$inferInsert> = {}) =>
  async ({ db }: ShelfWorld): Promise<Fields> => {
    const { link } = issueLink(db, { purpose, email, ...more }, NOW)
    return { token: new URL(link).searchParams.get('token') ?? '', password: PASSWORD, name: 'Davi' }
  }
const NEW = 'davi@brandreth.example'
const E = 'app/(entry)'
const ACCOUNT = 'app/(owner)/account/actions.ts'
const SECOND = 'app/(owner)/account/second-factor/actions.ts'
const SHELF = 'app/(owner)/shelf'
const SHEET = 'app/(site)/sheets/[code]/[act]/route.ts POST'
const PEOPLE = 'app/(workshop)/workshop/people/actions.ts'
const OUTBOX = 'app/(workshop)/workshop/outbox/actions.ts'
const CHECK: Fields = { ...(FINCH as Fields) }

const keptSheet: Outcomes = { others: 'refused: refused', Ann: 'to /sheets/…' }
/** Ann's sheet, on her shelf. Its number names it there, its code opens it anywhere. */
const annsSheet = (world: ShelfWorld) => world.sheetOf('ann')
const annsCode = (world: ShelfWorld): Fields => ({ code: annsSheet(world).code })
const annsNumber = (world: ShelfWorld): Fields => ({ number: String(annsSheet(world).number) })
const queued = ({ db }: ShelfWorld): Fields => {
  const props = { link: 'http://localhost:3000/link?token=t', minutes: 20 }
  return { mailId: enqueue(db, { template: 'link', to: NEW, now: NOW, props }), status: 'queued' }
}

/** Every door, what is sent through it, and what comes of it for each. */
export const TABLE: Record<string, Row> = {
  // The ways in are open to all; what they are about stands in the address or the link, not in who asks.
  [`${E}/join/actions.ts joinAction`]: { send: () => ({ name: 'Davi', email: NEW, password: PASSWORD }), outcomes: everyone('done') },
  [`${E}/sign-in/actions.ts signInAction`]: { send: () => ({ how: 'link', email: NEW }), outcomes: everyone('done') },
  [`${E}/reset-password/actions.ts askForResetAction`]: { send: () => ({ email: NEW }), outcomes: everyone('done') },
  [`${E}/link/actions.ts signInWithLinkAction`]: { send: linkTo('link', NEW), outcomes: everyone('to /account') },
  [`${E}/confirm-email/actions.ts confirmAddressAction`]: {
    send: async (world) => linkTo('confirm', NEW, { name: 'Davi', passwordHash: await hashPassword(PASSWORD) })(world),
    outcomes: everyone('to /account'),
  },
  [`${E}/invitation/actions.ts acceptInvitationAction`]: {
    send: (world) => linkTo('invite', NEW, { role: 'staff', personId: world.person('iris').id })(world),
    outcomes: everyone('to /account'),
  },
  [`${E}/reset-password/new/actions.ts resetPasswordAction`]: {
    send: (world) => linkTo('reset', 'bob@brandreth.example', { personId: world.person('bob').id })(world),
    outcomes: everyone('to /sign-in'),
  },
  [`${E}/change-address/[end]/actions.ts confirmFromOldAction`]: {
    send: (world) => linkTo('change-address-old', NEW, { personId: world.person('bob').id })(world),
    outcomes: everyone('done'),
  },
  [`${E}/change-address/[end]/actions.ts confirmFromNewAction`]: {
    send: (world) => linkTo('change-address-new', NEW, { personId: world.person('bob').id })(world),
    outcomes: everyone('done'),
  },
  // A code belongs to a sign-in that waits for one, and nobody here has such a one.
  [`${E}/second-factor/actions.ts checkSecondFactorAction`]: {
    send: () => ({ code: '123456' }),
    outcomes: everyone('refused: Sign in again first: the code has to come within ten minutes.'),
  },
  [`${E}/second-factor/actions.ts recoveryCodeAction`]: {
    send: () => ({ code: 'k7m2w-9qdh4' }),
    outcomes: everyone('refused: Sign in again first: the code has to come within ten minutes.'),
  },

  [`${ACCOUNT} changeNameAction`]: { send: () => ({ name: 'Davi' }), outcomes: ownAccount('done') },
  [`${ACCOUNT} changeAddressAction`]: { send: () => ({ email: NEW }), outcomes: ownAccount('done') },
  [`${ACCOUNT} changePasswordAction`]: { send: () => ({ password: PASSWORD }), outcomes: ownAccount('done') },
  [`${ACCOUNT} endSessionAction`]: {
    send: (world) => ({ sessionId: sessionIdOf(world) }),
    outcomes: {
      others: 'refused: There is no such session.',
      Ann: 'to /account',
      visitor: 'sign_in',
      'Ann, closed': 'sign_in',
    },
  },
  [`${ACCOUNT} endAllSessionsAction`]: { send: () => ({}), outcomes: ownAccount('to /') },
  [`${ACCOUNT} signOutAction`]: { send: () => ({}), outcomes: everyone('to /') },
  [`${ACCOUNT} askForDeletionAction`]: {
    send: () => ({ understood: 'yes' }),
    outcomes: { ...ownAccount('to /account'), admin: 'refused: You are the only admin. Make someone else admin first.' },
  },
  [`${ACCOUNT} takeBackDeletionAction`]: {
    send: (world) => {
      askForDeletion(world.as('ann'))
      return {}
    },
    outcomes: ownAccount('to /account'),
  },
  [`${SECOND} beginSecondFactorAction`]: {
    send: ({ db, person }) => ({ code: codeOf(db, person('iris').id, NOW) }),
    outcomes: {
      others: 'not_allowed',
      staff: 'to /account/second-factor',
      admin: 'to /account/second-factor',
      visitor: 'sign_in',
      'Ann, closed': 'sign_in',
    },
  },
  [`${SECOND} confirmSecondFactorAction`]: {
    send: (world) => {
      beginSecondFactor(world.as('ruth'), {})
      return { code: codeOf(world.db, world.person('ruth').id, NOW, { pending: true }) }
    },
    outcomes: {
      others: 'not_allowed',
      staff: 'done',
      admin: 'refused: Begin again: no authenticator is being set up in this account.',
      visitor: 'sign_in',
      'Ann, closed': 'sign_in',
    },
  },
  [`${SECOND} removeSecondFactorAction`]: {
    send: ({ db, person }) => {
      addSecondFactor(db, person('ruth').id, NOW)
      return { code: codeOf(db, person('ruth').id, NOW) }
    },
    outcomes: {
      others: 'refused: There is no authenticator on this account.',
      staff: 'to /account',
      admin: 'not_allowed',
      visitor: 'sign_in',
      'Ann, closed': 'sign_in',
    },
  },
  'app/api/account/export/route.ts GET': { send: () => ({}), outcomes: ownAccount('done') },

  [`${PEOPLE} inviteAction`]: { send: () => ({ email: NEW, role: 'staff' }), outcomes: admins('done') },
  [`${PEOPLE} changeRoleAction`]: {
    send: ({ person }) => ({ personId: person('ann').id, role: 'staff' }),
    outcomes: admins('to /workshop/people'),
  },
  [`${PEOPLE} disableAction`]: { send: ({ person }) => ({ personId: person('ann').id }), outcomes: admins('to /workshop/people') },
  [`${PEOPLE} enableAction`]: { send: ({ person }) => ({ personId: person('ann').id }), outcomes: admins('to /workshop/people') },

  [`${OUTBOX} sendAgainAction`]: { send: queued, outcomes: { ...admins('done'), staff: 'not_allowed' } },
  [`${OUTBOX} sendAllAgainAction`]: { send: queued, outcomes: { ...admins('done'), staff: 'not_allowed' } },
  'app/(workshop)/workshop/mailbox/[id]/html/route.ts GET': {
    send: ({ db }) => {
      const message = { id: 'msg_one', messageId: 'one@localhost', recipient: NEW, subject: 'One', html: '<p>One</p>', plain: 'One', raw: 'One' }
      db.insert(mailboxMessages).values({ ...message, receivedAt: NOW }).run()
      return {}
    },
    params: { id: 'msg_one' },
    outcomes: admins('done'),
  },

  // The shelf: everyone has their own, and nobody sees another's.
  [`${SHELF}/units/actions.ts addUnitAction`]: { send: () => ({ model: 'tarn-2' }), outcomes: shelfOf('to /shelf/units/…') },
  [`${SHELF}/units/actions.ts changeUnitAction`]: { send: (world) => ({ unitId: world.unitOf('ann') }), outcomes: annsThing('to /shelf/units/…') },
  [`${SHELF}/units/actions.ts archiveUnitAction`]: { send: (world) => ({ unitId: world.unitOf('ann') }), outcomes: annsThing('to /shelf') },
  [`${SHELF}/units/actions.ts restoreUnitAction`]: {
    send: (world) => {
      const unitId = world.unitOf('ann')
      archiveUnit(world.as('ann'), { unitId })
      return { unitId }
    },
    outcomes: annsThing('to /shelf'),
  },
  [`${SHELF}/units/actions.ts setPositionsAction`]: {
    send: (world) => ({ unitId: world.unitOf('ann'), known: 'no' }),
    outcomes: annsThing('to /shelf/units/…'),
  },
  [`${SHELF}/units/actions.ts undoPositionsAction`]: {
    send: (world) => {
      const unitId = world.unitOf('ann')
      setPositions(world.as('ann'), { unitId, known: 'no', left: '', right: '' })
      return { unitId, positionsId: positionsIdOf(world, unitId) }
    },
    outcomes: annsThing('to /shelf'),
  },
  [`${SHELF}/cartridges/actions.ts addCartridgeAction`]: { send: () => ({ name: 'The old one' }), outcomes: shelfOf('to /shelf') },
  [`${SHELF}/cartridges/actions.ts changeCartridgeAction`]: {
    send: (world) => ({ cartridgeId: world.cartridgeOf('ann'), name: 'The old one' }),
    outcomes: annsThing('to /shelf'),
  },
  [`${SHELF}/cartridges/actions.ts addHoursAction`]: {
    send: (world) => ({ cartridgeId: world.cartridgeOf('ann'), hours: '5', counted: '' }),
    outcomes: annsThing('to /shelf/cartridges/…'),
  },
  [`${SHELF}/cartridges/actions.ts archiveCartridgeAction`]: {
    send: (world) => ({ cartridgeId: world.cartridgeOf('ann') }),
    outcomes: annsThing('to /shelf'),
  },
  [`${SHELF}/cartridges/actions.ts restoreCartridgeAction`]: {
    send: (world) => {
      const cartridgeId = world.cartridgeOf('ann')
      archiveCartridge(world.as('ann'), { cartridgeId })
      return { cartridgeId }
    },
    outcomes: annsThing('to /shelf'),
  },
  [`${SHELF}/sheets/actions.ts claimSheetAction`]: {
    send: (world) => ({ sheet: world.sheetOf(null).code }),
    outcomes: shelfOf('to /shelf/sheets/…'),
  },
  [`${SHELF}/sheets/actions.ts nameSheetAction`]: { send: (world) => ({ ...annsNumber(world), name: 'Best' }), outcomes: annsThing('to /shelf/sheets/…') },
  [`${SHELF}/sheets/actions.ts placeSheetAction`]: { send: annsNumber, outcomes: annsThing('to /shelf/sheets/…') },
  [`${SHELF}/sheets/actions.ts archiveSheetAction`]: { send: annsNumber, outcomes: annsThing('to /shelf/sheets/…') },
  [`${SHELF}/sheets/actions.ts restoreSheetAction`]: {
    send: (world) => {
      const { number } = annsSheet(world)
      archiveSheet(world.as('ann'), { number })
      return { number: String(number) }
    },
    outcomes: annsThing('to /shelf/sheets/…'),
  },
  [`${SHELF}/sheets/actions.ts copySheetAction`]: { send: annsNumber, outcomes: annsThing('to /check/cartridge') },
  [`${SHELF}/check/route.ts GET`]: {
    send: (world) => ({ unit: world.unitOf('ann'), cartridge: world.cartridgeOf('ann') }),
    outcomes: { others: 'to /shelf', Ann: 'to /check/arm' },
  },
  [`${SHELF}/cartridges/of-sheet/route.ts GET`]: {
    send: (world) => ({ sheet: annsSheet(world).code }),
    outcomes: everyone('to /shelf/cartridges/new'),
  },

  // A sheet is read by its code, by whoever holds it. One that Ann keeps is hers to change.
  'app/api/sheets/[code]/route.ts GET': { send: annsCode, outcomes: everyone('done') },
  [`${SHEET}, anew`]: { send: annsCode, params: { act: 'anew' }, outcomes: keptSheet },
  [`${SHEET}, new-code`]: { send: annsCode, params: { act: 'new-code' }, outcomes: keptSheet },
  [`${SHEET}, moved`]: { send: (world) => ({ code: world.sheetOf('ann', COIL).code }), params: { act: 'moved' }, outcomes: keptSheet },
  [`${SHEET}, number`]: {
    send: (world) => ({ ...annsCode(world), unknown: 'output', value: '4 mV' }),
    params: { act: 'number' },
    outcomes: keptSheet,
  },

  // Open to all, signed in or not.
  'app/(site)/check/actions.ts makeSheet': { send: () => CHECK, outcomes: everyone('to /sheets/…') },
  'app/(site)/check/next/route.ts GET': { send: () => CHECK, outcomes: everyone('to /check') },
  'app/(site)/check/next/route.ts POST': { send: () => ({ ...CHECK, step: 'preamp' }), outcomes: everyone('to /check/cartridge') },
  'app/api/check/route.ts GET': { send: () => ({}), outcomes: everyone('done') },
  'app/api/check/route.ts POST': { send: () => ({ json: JSON.stringify({ answers: CHECK }) }), outcomes: everyone('done') },
  'app/api/catalogue/[kind]/route.ts GET': { send: () => ({ q: 'wren' }), params: { kind: 'cartridges' }, outcomes: everyone('done') },
  'app/api/health/route.ts GET': { send: () => ({}), outcomes: everyone('done') },
  'app/theme/route.ts POST': { send: () => ({ theme: 'dark', back: '/stop' }), outcomes: everyone('to /stop') },
}

/** next-auth reads the request from Next itself, which is not here; a browser goes through it in tests/pages/accounts.spec.ts. */
export const ELSEWHERE = ['app/api/auth/[...nextauth]/route.ts GET', 'app/api/auth/[...nextauth]/route.ts POST']

function sessionIdOf(world: ShelfWorld): string {
  const { actor } = world.as('ann')
  return actor.kind === 'person' ? actor.sessionId : ''
}

function positionsIdOf(world: ShelfWorld, unitId: string): string {
  return getUnit(world.as('ann'), unitId).lastStep?.id ?? ''
}
