import 'server-only'
import { eq } from 'drizzle-orm'
import { DEMO_AMPLIFIER, DEMO_CARTRIDGES, DEMO_SHEETS, DEMO_UNITS, type DemoCartridge, type DemoSheet } from '@/content/shelf/demo'
import { meta } from '@/db/schema/meta'
import type { SignedIn } from '@/lib/access/actor'
import { DEMO_PEOPLE } from '@/lib/accounts/demo'
import { personByAddress, type Person } from '@/lib/accounts/people'
import { getCartridge } from '@/lib/catalogue/queries'
import type { Context } from '@/lib/kernel/context'
import { addRevision } from '@/lib/setups/add-revision'
import { saveSheet } from '@/lib/setups/save-sheet'
import { answersFromCartridge } from '@/lib/setups/schema-picked'
import type { AnswersInput } from '@/lib/setups/schema'
import { addCartridge } from './add-cartridge'
import { addUnit } from './add-unit'
import { nameSheet } from './name-sheet'
import { answersOfCartridge, answersOfUnit } from './offers'
import { getOwnedCartridge, getUnit } from './queries'
import { AddCartridgeInput, AddUnitInput } from './schema'
import { setPositions } from './set-positions'
import { takeUpPositions } from './take-up-positions'

const DAY = 24 * 60 * 60_000
const MARK = 'demo shelf'

/**
 * Fills the shelf of the demo's owner, once: what was changed or put away there since stays so. Needs the demo's
 * catalogue and people; without them it does nothing.
 * @returns whether it was filled just now
 */
export function loadDemoShelf({ db, now }: Pick<Context, 'db' | 'now'>): boolean {
  const [{ email }] = DEMO_PEOPLE.filter(({ role }) => role === 'owner')
  const owner = personByAddress(db, email)
  if (!owner?.demo) return false
  return db.transaction(
    (tx) => {
      if (tx.select().from(meta).where(eq(meta.key, MARK)).get()?.value === owner.id) return false
      fill(asOwner({ db, now }, owner))
      tx.insert(meta).values({ key: MARK, value: owner.id, updatedAt: now }).onConflictDoUpdate({ target: meta.key, set: { value: owner.id, updatedAt: now } }).run()
      return true
    },
    { behavior: 'immediate' },
  )
}

type At = (daysAgo: number) => Context

/** The demo's owner at any day before today. */
function asOwner({ db, now }: Pick<Context, 'db' | 'now'>, { id, role, name }: Person): At {
  const actor: SignedIn = { kind: 'person', id, role, name, sessionId: 'demo', disabled: false, mustSetUpSecondFactor: false }
  return (daysAgo) => ({ db, actor, now: now - daysAgo * DAY })
}

/** Things came one a day, so that they stand in this order. */
const LONG_AGO = 300

function fill(at: At) {
  const units = mapValues(DEMO_UNITS, ({ stood, ...unit }, index) => {
    const context = at(LONG_AGO - index)
    const { id } = addUnit(context, AddUnitInput.parse(unit))
    setPositions(context, { unitId: id, known: 'yes', left: stood, right: stood })
    return id
  })
  const cartridges = mapValues(DEMO_CARTRIDGES, (cartridge, index) => {
    const context = at(LONG_AGO - index)
    return addCartridge(context, AddCartridgeInput.parse(toForm(context, cartridge))).id
  })
  for (const sheet of DEMO_SHEETS) makeSheet(at, sheet, { unitId: units[sheet.unit], cartridgeId: cartridges[sheet.cartridge] })
}

function toForm(context: Context, { catalogueId, answers, hours, notes }: DemoCartridge) {
  return { ...(catalogueId ? answersFromCartridge(getCartridge(context, catalogueId)) : answers), hours, notes }
}

function makeSheet(at: At, { daysAgo, answers, name, later = [], moved }: DemoSheet, place: { unitId: string; cartridgeId: string }) {
  const context = at(daysAgo)
  const { unit: _unit, own: _own, ...filled }: AnswersInput = {
    ...answersOfCartridge(getOwnedCartridge(context, place.cartridgeId)),
    ...answersOfUnit(getUnit(context, place.unitId)),
    ...DEMO_AMPLIFIER,
    ...answers,
  }
  const { code, number } = saveSheet(context, { answers: filled, place })
  if (name) nameSheet(context, { number, name })
  later.forEach((found, index) => addRevision(at(daysAgo - 1 - index), code, (before) => ({ ...before, ...found })))
  if (moved) takeUpPositions(at(daysAgo - 1 - later.length), { code })
}

function mapValues<Key extends string, From, To>(record: Record<Key, From>, make: (from: From, index: number) => To): Record<Key, To> {
  return Object.fromEntries(Object.entries<From>(record).map(([key, value], index) => [key, make(value, index)])) as Record<Key, To>
}
