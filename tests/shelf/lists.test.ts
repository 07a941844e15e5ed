import { describe, expect, test } from 'vitest'
import { revisions, sheets } from '@/db/schema/setups'
import { ownedCartridges, units } from '@/db/schema/shelf'
import { VISITOR, type Actor } from '@/lib/access/actor'
import { can } from '@/lib/access/permit'
import { visibleTo } from '@/lib/access/visible-to'
import { VERDICTS } from '@/lib/match/result'
import { archiveSheet } from '@/lib/shelf/archive-sheet'
import { findSheets } from '@/lib/shelf/find-sheets'
import { nameSheet } from '@/lib/shelf/name-sheet'
import { getShelf } from '@/lib/shelf/queries'
import { SheetSearch } from '@/lib/shelf/schema'
import { SHEETS_A_PAGE } from '@/lib/shelf/terms'
import { COIL, FINCH, shelfWorlds, type ShelfWorld } from '../support/shelf'
import { NOW } from '../support/world'

const here = shelfWorlds()
const find = (world: ShelfWorld, given: object = {}) => findSheets(world.as('ann'), SheetSearch.parse(given))
const numbers = (page: { sheets: { number: number }[] }) => page.sheets.map(({ number }) => number)

describe('a list holds what the rules let its reader read', () => {
  test('units, cartridges and sheets, for everyone', () => {
    const world = here()
    for (const who of ['ann', 'bob', 'ruth', 'iris'] as const) {
      world.unitOf(who)
      world.cartridgeOf(who)
      world.sheetOf(who)
    }
    world.sheetOf(null)
    const { actor: ann } = world.as('ann')
    const everyone: Actor[] = [VISITOR, ...(['ann', 'bob', 'ruth', 'iris'] as const).map((who) => world.as(who).actor), { ...ann, disabled: true } as Actor]
    for (const actor of everyone) {
      const { db } = world
      const byRule = <Row extends { ownerId: string | null }>(rows: Row[], permission: 'unit:read' | 'cartridge:read' | 'sheet:name') =>
        rows.filter((row) => can(actor, permission, row))
      expect(db.select().from(units).where(visibleTo(actor, units.ownerId)).all()).toEqual(byRule(db.select().from(units).all(), 'unit:read'))
      expect(db.select().from(ownedCartridges).where(visibleTo(actor, ownedCartridges.ownerId)).all()).toEqual(byRule(db.select().from(ownedCartridges).all(), 'cartridge:read'))
      // A sheet is read by its code; on a list it stands for whoever it belongs to.
      expect(db.select().from(sheets).where(visibleTo(actor, sheets.ownerId)).all()).toEqual(byRule(db.select().from(sheets).all(), 'sheet:name'))
    }
  })

  test('someone else’s sheet of the same pair is in no place of the table', () => {
    const world = here()
    const place = { unitId: world.unitOf('ann', { model: 'sedge-1', serial: '' }), cartridgeId: world.cartridgeOf('ann') }
    world.sheetOf('bob', FINCH, place)
    expect(getShelf(world.as('ann')).places).toEqual([])
  })
})

describe('finding sheets', () => {
  test('by words of the preamp, the board and the cartridge, by the name and by the number', () => {
    const world = here()
    const finch = world.sheetOf('ann').number
    const coil = world.sheetOf('ann', { ...COIL, name: 'Brightwater Émile' }).number
    const tarn = world.sheetOf('ann', { ...FINCH, preamp: 'tarn-2', board: 'second' }).number
    nameSheet(world.as('ann'), { number: finch, name: '100 % Sunday' })
    expect(numbers(find(world, { q: 'emile' }))).toEqual([coil])
    expect(numbers(find(world, { q: 'FINCH tarn' }))).toEqual([tarn])
    expect(numbers(find(world, { q: 'second board' }))).toEqual([tarn])
    expect(numbers(find(world, { q: 'sunday' }))).toEqual([finch])
    expect(numbers(find(world, { q: String(coil) }))).toEqual([coil])
    // Signs of patterns are no patterns, and the beginning of a number is none.
    expect(numbers(find(world, { q: '100 %' }))).toEqual([finch])
    expect(find(world, { q: '_ % \\' }).total).toBe(3)
    expect(find(world, { q: 'wobble' })).toMatchObject({ sheets: [], total: 0, page: 1, pages: 1 })
  })

  test('kept and put away apart; nobody else’s', () => {
    const world = here()
    const [first, second] = [world.sheetOf('ann').number, world.sheetOf('ann').number]
    world.sheetOf('bob')
    world.sheetOf(null)
    archiveSheet(world.as('ann'), { number: first })
    expect(numbers(find(world))).toEqual([second])
    expect(numbers(find(world, { show: 'put-away' }))).toEqual([first])
  })

  test('what an address cannot ask for counts as not asked', () => {
    expect(SheetSearch.parse({ q: 'x'.repeat(500), show: 'all', order: 'random', page: '-3' })).toEqual({ q: '', show: 'kept', order: 'newest', page: 1 })
  })
})

/** So many sheets of Ann's. Were a list to open a revision, what stands in them would stop it. */
function manySheets({ db, sheetOf, person }: ShelfWorld, count: number) {
  sheetOf('ann')
  const row = db.select().from(sheets).get()
  const revision = db.select().from(revisions).get()
  if (!row || !revision) throw new Error('There is no sheet to copy.')
  db.transaction((tx) => {
    for (let index = 0; index < count; index++) {
      const about = { cartridgeName: `Cartridge ${index % 7}`, modelName: `Model ${index % 3}`, words: `model ${index % 3} cartridge ${index % 7}` }
      const own = { id: `sht_${index}`, number: 5000 + index, code: `code-${index}`, requestKey: null, verdict: VERDICTS[index % 5], changedAt: NOW + index }
      tx.insert(sheets).values({ ...row, ...about, ...own, ownerId: person('ann').id }).run()
      tx.insert(revisions).values({ ...revision, id: `rev_${index}`, sheetId: own.id, answers: '!', inputs: '!', result: '!' }).run()
    }
  })
}

describe('thousands of sheets', () => {
  const COUNT = 3000

  test('come page by page, each once, in every order, and no list opens a revision', { timeout: 60_000 }, () => {
    const world = here()
    manySheets(world, COUNT)
    const first = find(world)
    expect(first).toMatchObject({ total: COUNT + 1, page: 1, pages: Math.ceil((COUNT + 1) / SHEETS_A_PAGE) })
    expect(numbers(first).slice(0, 2)).toEqual([5000 + COUNT - 1, 5000 + COUNT - 2])
    for (const order of ['newest', 'number', 'cartridge', 'preamp', 'verdict']) {
      const seen = new Set<number>()
      for (let page = 1; page <= first.pages; page++) for (const number of numbers(find(world, { order, page }))) seen.add(number)
      expect(seen.size, order).toBe(COUNT + 1)
    }
    expect(find(world, { order: 'verdict' }).sheets[0].verdict).toBe('cannot-say')
    expect(find(world, { order: 'verdict', page: first.pages }).sheets.at(-1)?.verdict).toBe('suits')
  })

  test('a page past the end is the last one; a search narrows all of them', { timeout: 60_000 }, () => {
    const world = here()
    manySheets(world, COUNT)
    const last = find(world, { page: 9999 })
    expect([last.page, last.sheets.length]).toEqual([last.pages, (COUNT + 1) % SHEETS_A_PAGE || SHEETS_A_PAGE])
    expect(find(world, { q: 'cartridge 3 model 1' }).total).toBe(Array.from({ length: COUNT }, (_, index) => index).filter((index) => index % 7 === 3 && index % 3 === 1).length)
  })
})
