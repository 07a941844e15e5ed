import { expect, test } from 'vitest'
import { sheets } from '@/db/schema/setups'
import { DEMO_PEOPLE } from '@/lib/accounts/demo'
import { insertPerson, personByAddress } from '@/lib/accounts/people'
import { VERDICTS } from '@/lib/match/result'
import { archiveUnit } from '@/lib/shelf/archive-unit'
import { loadDemoShelf } from '@/lib/shelf/load-demo'
import { getShelf } from '@/lib/shelf/queries'
import { shelfWorlds, type ShelfWorld } from '../support/shelf'
import { NOW } from '../support/world'

const here = shelfWorlds()

/** The demo's owner as the accounts' loader makes them, without the wait for a password. */
function demoOwner({ db, as }: ShelfWorld) {
  const [{ email, name, role }] = DEMO_PEOPLE
  const person = personByAddress(db, email) ?? insertPerson(db, { email, name, role, passwordHash: null, demo: true }, NOW)
  return as(person)
}

test('fills the owner’s shelf with all verdicts, once', { timeout: 60_000 }, () => {
  const world = here()
  const owner = demoOwner(world)
  expect(loadDemoShelf(world.at())).toBe(true)
  const { units, cartridges, places } = getShelf(owner)
  expect([units.length, cartridges.length, places.length]).toEqual([2, 4, 6])
  // An empty place is a check still to make.
  expect(places.length).toBeLessThan(units.length * cartridges.length)
  expect([...new Set(places.map(({ sheet }) => sheet.verdict))].sort()).toEqual([...VERDICTS].sort())
  expect(places.some(({ sheet }) => sheet.letters.length > 2)).toBe(true)
  expect(units.map(({ standing }) => standing?.source)).toEqual(['moved', 'told'])
  expect(units.map(({ serialEnding }) => serialEnding)).toEqual(['418', '077'])

  archiveUnit(owner, { unitId: units[0].id })
  expect(loadDemoShelf(world.at())).toBe(false)
  expect(getShelf(owner).units).toHaveLength(1)
  expect(world.db.select().from(sheets).all()).toHaveLength(6)
})

test('without the demo’s owner, or where someone really has that address, it does nothing', () => {
  const world = here()
  expect(loadDemoShelf(world.at())).toBe(false)
  const [{ email, name, role }] = DEMO_PEOPLE
  insertPerson(world.db, { email, name, role, passwordHash: null }, NOW)
  expect(loadDemoShelf(world.at())).toBe(false)
  expect(world.db.select().from(sheets).all()).toEqual([])
})
