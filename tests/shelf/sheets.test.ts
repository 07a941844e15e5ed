import { eq } from 'drizzle-orm'
import { describe, expect, test } from 'vitest'
import { openDatabase } from '@/db/client'
import { sheets } from '@/db/schema/setups'
import { people } from '@/db/schema/accounts'
import { deleteDueAccounts } from '@/lib/accounts/delete-due-accounts'
import { DELETION_WAITS_MS } from '@/lib/accounts/terms'
import { addRevision } from '@/lib/setups/add-revision'
import { computeAnew } from '@/lib/setups/compute-anew'
import { getSheet } from '@/lib/setups/queries'
import { fromQuery } from '@/lib/setups/schema'
import { archiveSheet } from '@/lib/shelf/archive-sheet'
import { archiveUnit } from '@/lib/shelf/archive-unit'
import { checkFromShelf } from '@/lib/shelf/check-from-shelf'
import { claimSheet } from '@/lib/shelf/claim-sheet'
import { copySheetWithCartridge } from '@/lib/shelf/copy-sheet-with-cartridge'
import { keepCheck } from '@/lib/shelf/keep-check'
import { nameSheet } from '@/lib/shelf/name-sheet'
import { cartridgeOffers, unitOffers } from '@/lib/shelf/offers'
import { placeSheet } from '@/lib/shelf/place-sheet'
import { getSheetHistory, getShelf, getUnit } from '@/lib/shelf/queries'
import { restoreSheet } from '@/lib/shelf/restore-sheet'
import { setPositions } from '@/lib/shelf/set-positions'
import { takeUpPositions } from '@/lib/shelf/take-up-positions'
import { undoPositions } from '@/lib/shelf/undo-positions'
import { faultOf } from '../support/fault'
import { COIL, FINCH, shelfWorlds } from '../support/shelf'
import { NOW } from '../support/world'

const here = shelfWorlds()
const ownerOf = (world: ReturnType<typeof here>, number: number) => world.db.select().from(sheets).where(eq(sheets.number, number)).get()?.ownerId

describe('whose a sheet is', () => {
  test('made while signed in it is theirs; made by a visitor nobody’s', () => {
    const world = here()
    expect(ownerOf(world, world.sheetOf('ann').number)).toBe(world.person('ann').id)
    expect(ownerOf(world, world.sheetOf(null).number)).toBeNull()
  })

  test('someone else holds the code and may read, not change', async () => {
    const { sheetOf, as, at } = here()
    const { code } = sheetOf('ann')
    expect(getSheet(as('bob'), code).mayChange).toBe(false)
    expect(getSheet(at(), code).mayChange).toBe(false)
    expect((await faultOf(() => computeAnew(as('bob'), { code }))).code).toBe('not_allowed')
    expect(getSheet(as('ann'), code).mayChange).toBe(true)
  })
})

describe('putting one made before on the shelf', () => {
  test('by its code, however typed, and once', () => {
    const world = here()
    const { code, number } = world.sheetOf(null)
    expect(claimSheet(world.as('ann'), { sheet: code.toUpperCase().replaceAll('-', ' ') })).toEqual({ number })
    expect(claimSheet(world.as('ann'), { sheet: code })).toEqual({ number })
    expect(ownerOf(world, number)).toBe(world.person('ann').id)
  })

  test('one that someone keeps cannot be taken', async () => {
    const world = here()
    const { code, number } = world.sheetOf(null)
    claimSheet(world.as('ann'), { sheet: code })
    expect((await faultOf(() => claimSheet(world.as('bob'), { sheet: code }))).code).toBe('conflict')
    expect(ownerOf(world, number)).toBe(world.person('ann').id)
  })

  test('through another door to the file, whoever comes second is refused', async () => {
    const world = here()
    const { code, number } = world.sheetOf(null)
    const other = openDatabase(world.db.$client.name)
    claimSheet({ ...world.as('bob'), db: other }, { sheet: code })
    other.$client.close()
    expect((await faultOf(() => claimSheet(world.as('ann'), { sheet: code }))).code).toBe('conflict')
    expect(ownerOf(world, number)).toBe(world.person('bob').id)
  })

  test('while one claims, the other cannot even read it as nobody’s', async () => {
    const world = here()
    const { code, number } = world.sheetOf(null)
    const [ann, bob] = [world.as('ann'), world.as('bob')]
    const other = openDatabase(world.db.$client.name)
    other.$client.pragma('busy_timeout = 0')
    const inside = await new Promise<string>((resolve) => {
      world.db.transaction(
        () => {
          claimSheet(bob, { sheet: code })
          try {
            claimSheet({ ...ann, db: other }, { sheet: code })
            resolve('both')
          } catch (trouble) {
            resolve(trouble instanceof Error && 'code' in trouble ? String(trouble.code) : 'refused')
          }
        },
        { behavior: 'immediate' },
      )
    })
    other.$client.close()
    expect(inside).toBe('SQLITE_BUSY')
    expect(ownerOf(world, number)).toBe(world.person('bob').id)
  })

  test('it stands beside the one unit and the one cartridge that it can be about', () => {
    const { as, sheetOf, unitOf, cartridgeOf } = here()
    const unitId = unitOf('ann', { model: 'sedge-1', serial: '' })
    const cartridgeId = cartridgeOf('ann')
    unitOf('ann')
    const { number } = claimSheet(as('ann'), { sheet: sheetOf(null).code })
    expect(getSheetHistory(as('ann'), number)).toMatchObject({ unitId, cartridgeId })
  })

  test('where two could be meant, none is', () => {
    const { as, sheetOf, unitOf, cartridgeOf } = here()
    unitOf('ann', { model: 'sedge-1', serial: '' })
    unitOf('ann', { model: 'sedge-1', serial: '' })
    cartridgeOf('ann', 'calloway-wren')
    const { number } = claimSheet(as('ann'), { sheet: sheetOf(null).code })
    expect(getSheetHistory(as('ann'), number)).toMatchObject({ unitId: null, cartridgeId: null })
  })

  test.each(['', '1001', 'aaaa-aaaa-aaaa-aaaa'])('"%s" is no sheet', async (sheet) => {
    const { as } = here()
    expect((await faultOf(() => claimSheet(as('ann'), { sheet }))).code).toBe('not_found')
  })
})

describe('a check kept from the shelf', () => {
  test('the unit and cartridge chosen place the sheet, and are no part of what it says', () => {
    const { as, at, unitOf, cartridgeOf } = here()
    const unitId = unitOf('ann', { model: 'sedge-1', serial: '' })
    const cartridgeId = cartridgeOf('ann')
    const { code } = keepCheck(as('ann'), { answers: { ...FINCH, unit: unitId, own: cartridgeId } })
    const sheet = getSheet(at(), code)
    expect(JSON.stringify(sheet)).not.toContain(unitId)
    expect(JSON.stringify(sheet)).not.toContain(cartridgeId)
    expect(getSheetHistory(as('ann'), sheet.number)).toMatchObject({ unitId, cartridgeId })
    expect(getShelf(as('ann')).places).toMatchObject([{ unitId, cartridgeId, older: 0, sheet: { number: sheet.number, letters: ['A'], verdict: 'suits' } }])
  })

  test('what is someone else’s, put away or of another model places nothing', () => {
    const { as, at, unitOf } = here()
    const [bobs, away, tarn] = [unitOf('bob', { model: 'sedge-1', serial: '' }), unitOf('ann', { model: 'sedge-1', serial: '' }), unitOf('ann')]
    archiveUnit(as('ann'), { unitId: away })
    for (const unit of [bobs, away, tarn, 'unt_nothing']) {
      const { code } = keepCheck(as('ann'), { answers: { ...FINCH, unit } })
      expect(getSheetHistory(as('ann'), getSheet(at(), code).number).unitId).toBeNull()
    }
    const { code } = keepCheck(at(), { answers: { ...FINCH, unit: bobs } })
    expect(getSheet(at(), code).mayChange).toBe(true)
  })

  test('a cartridge is known by its entry in the catalogue or its name, where only one of theirs is that', () => {
    const { as, at, cartridgeOf } = here()
    const cartridgeId = cartridgeOf('ann')
    const history = (code: string) => getSheetHistory(as('ann'), getSheet(at(), code).number)
    expect(history(keepCheck(as('ann'), { answers: { ...FINCH, name: 'calloway FINCH' } }).code).cartridgeId).toBe(cartridgeId)
    cartridgeOf('ann')
    expect(history(keepCheck(as('ann'), { answers: FINCH }).code).cartridgeId).toBeNull()
  })

  test('changed answers are the next revision of one’s own sheet, and a new sheet of someone else’s', () => {
    const { as, sheetOf } = here()
    const { code } = sheetOf('ann')
    const changed = { ...FINCH, output: '5', sheet: code }
    expect(keepCheck(as('ann'), { answers: changed }).code).toBe(code)
    expect(getSheet(as('ann'), code).letter).toBe('B')
    expect(keepCheck(as('bob'), { answers: changed }).code).not.toBe(code)
  })

  test('a revision about another cartridge or another model is no longer about those on the shelf', () => {
    const { as, unitOf, cartridgeOf, sheetOf } = here()
    const place = { unitId: unitOf('ann', { model: 'sedge-1', serial: '' }), cartridgeId: cartridgeOf('ann') }
    const { code, number } = sheetOf('ann', FINCH, place)
    addRevision(as('ann'), code, (answers) => ({ ...answers, output: '5' }))
    expect(getSheetHistory(as('ann'), number)).toMatchObject(place)
    addRevision(as('ann'), code, (answers) => ({ ...answers, name: 'Another' }))
    expect(getSheetHistory(as('ann'), number)).toMatchObject({ unitId: place.unitId, cartridgeId: null, letters: ['A', 'B', 'C'] })
    addRevision(as('ann'), code, (answers) => ({ ...answers, preamp: 'tarn-2' }))
    expect(getSheetHistory(as('ann'), number)).toMatchObject({ unitId: null, modelId: 'tarn-2' })
  })
})

describe('I have moved them', () => {
  function withMoves(world: ReturnType<typeof here>) {
    const unitId = world.unitOf('ann', { model: 'merrin-5', serial: '' })
    const stood = 'plugs.100_slide.64'
    setPositions(world.as('ann'), { unitId, known: 'yes', left: stood, right: stood })
    const sheet = world.sheetOf('ann', COIL, { unitId, cartridgeId: null })
    return { unitId, stood, ...sheet }
  }

  test('sets the unit as the sheet asked, says which sheet, and can be undone while the revision stays', () => {
    const world = here()
    const { unitId, stood, code, number } = withMoves(world)
    const asked = getSheet(world.as('ann'), code).result.match.chosen?.setting.state
    expect(takeUpPositions(world.as('ann', NOW + 5), { code })).toEqual({ code, letter: 'B' })
    const unit = getUnit(world.as('ann'), unitId)
    expect(unit.standing).toMatchObject({ since: NOW + 5, source: 'moved', sheet: { number, letter: 'B' } })
    expect(unit.standing?.left).toBe(`plugs.${asked?.plugs}_slide.${asked?.slide}`)
    undoPositions(world.as('ann'), { unitId, positionsId: unit.lastStep?.id ?? '' })
    expect(getUnit(world.as('ann'), unitId).standing?.left).toBe(stood)
    expect(getSheet(world.as('ann'), code).letter).toBe('B')
  })

  test('of a sheet that is about no unit it changes no unit', () => {
    const world = here()
    const { unitId, stood } = withMoves(world)
    takeUpPositions(world.as('ann'), { code: world.sheetOf('ann', COIL).code })
    takeUpPositions(world.at(), { code: world.sheetOf(null, COIL).code })
    expect(getUnit(world.as('ann'), unitId).standing?.left).toBe(stood)
  })

  test('nothing of it is kept when one part cannot be', () => {
    const world = here()
    const { unitId, stood, code } = withMoves(world)
    world.db.$client.exec("create trigger refuse before insert on unit_positions begin select raise(abort, 'no room'); end")
    expect(() => takeUpPositions(world.as('ann'), { code })).toThrow('no room')
    expect(getSheet(world.as('ann'), code).letter).toBe('A')
    expect(getUnit(world.as('ann'), unitId).standing?.left).toBe(stood)
  })
})

describe('the name, the place and the end of one', () => {
  test('a name is its owner’s and stands nowhere else', () => {
    const { as, at, sheetOf } = here()
    const { number, code } = sheetOf('ann')
    nameSheet(as('ann'), { number, name: 'Sunday records' })
    expect(getSheetHistory(as('ann'), number).name).toBe('Sunday records')
    expect(JSON.stringify(getSheet(at(), code))).not.toContain('Sunday')
    nameSheet(as('ann'), { number, name: '' })
    expect(getSheetHistory(as('ann'), number).name).toBeNull()
  })

  test('it is placed among one’s own things of its model', async () => {
    const { as, sheetOf, unitOf, cartridgeOf } = here()
    const { number } = sheetOf('ann')
    const [sedge, tarn, bobs, cartridgeId] = [unitOf('ann', { model: 'sedge-1', serial: '' }), unitOf('ann'), unitOf('bob', { model: 'sedge-1', serial: '' }), cartridgeOf('ann')]
    placeSheet(as('ann'), { number, unitId: sedge, cartridgeId })
    expect(getSheetHistory(as('ann'), number)).toMatchObject({ unitId: sedge, cartridgeId })
    expect((await faultOf(() => placeSheet(as('ann'), { number, unitId: tarn, cartridgeId }))).fields).toHaveProperty('unitId')
    expect((await faultOf(() => placeSheet(as('ann'), { number, unitId: bobs, cartridgeId }))).code).toBe('not_found')
    placeSheet(as('ann'), { number, unitId: '', cartridgeId: '' })
    expect(getSheetHistory(as('ann'), number)).toMatchObject({ unitId: null, cartridgeId: null })
  })

  test('put away, its code opens nothing, until it is brought back', async () => {
    const { as, at, sheetOf } = here()
    const { number, code } = sheetOf('ann')
    archiveSheet(as('ann'), { number })
    expect((await faultOf(() => getSheet(at(), code))).code).toBe('not_found')
    expect((await faultOf(() => claimSheet(as('bob'), { sheet: code }))).code).toBe('not_found')
    expect(getSheetHistory(as('ann'), number).archived).toBe(true)
    restoreSheet(as('ann'), { number })
    expect(getSheet(at(), code).number).toBe(number)
  })

  test('of the same two, the newest stands in the place and says how many are older', () => {
    const { as, sheetOf, unitOf, cartridgeOf } = here()
    const place = { unitId: unitOf('ann', { model: 'sedge-1', serial: '' }), cartridgeId: cartridgeOf('ann') }
    const first = sheetOf('ann', FINCH, place)
    const second = sheetOf('ann', { ...FINCH, output: '5' }, place)
    sheetOf('ann')
    expect(getShelf(as('ann'))).toMatchObject({ places: [{ older: 1, sheet: { number: second.number } }], sheetCount: 3, elsewhere: 1 })
    archiveSheet(as('ann'), { number: second.number })
    expect(getShelf(as('ann'))).toMatchObject({ places: [{ older: 0, sheet: { number: first.number } }], sheetCount: 2, elsewhere: 1 })
  })
})

describe('another check from here', () => {
  const answersOf = (path: string) => fromQuery(path.split('?')[1])

  test('a copy has everything but the cartridge, and the unit as it stands now', () => {
    const { as, sheetOf, unitOf, cartridgeOf } = here()
    const unitId = unitOf('ann', { model: 'merrin-5', serial: '' })
    const { number } = sheetOf('ann', { ...COIL, armMass: '11' }, { unitId, cartridgeId: null })
    const stood = 'plugs.30_slide.56'
    setPositions(as('ann'), { unitId, known: 'yes', left: stood, right: stood })
    const copy = copySheetWithCartridge(as('ann'), { number, cartridgeId: '' })
    expect(copy.path).toMatch(/^\/check\/cartridge\?/)
    expect(answersOf(copy.path)).toEqual({ preamp: 'merrin-5', present: 'known', left: stood, right: stood, unit: unitId, next: 'line', armMass: '11' })
    const own = cartridgeOf('ann', 'vireo-lark')
    const other = copySheetWithCartridge(as('ann'), { number, cartridgeId: own })
    expect(other.path).toMatch(/^\/check\/plays-into\?/)
    expect(answersOf(other.path)).toMatchObject({ own, name: 'Vireo Lark', armMass: '11', unit: unitId })
  })

  test('an empty place begins with both filled in, and with the arm and amplifier of the unit’s newest sheet', () => {
    const { as, sheetOf, unitOf, cartridgeOf } = here()
    const unitId = unitOf('ann', { model: 'merrin-5', serial: '' })
    const cartridgeId = cartridgeOf('ann', 'vireo-lark')
    const start = () => answersOf(checkFromShelf(as('ann'), { unitId, cartridgeId }).path)
    expect(start()).toMatchObject({ preamp: 'merrin-5', unit: unitId, own: cartridgeId, name: 'Vireo Lark' })
    expect(start()).not.toHaveProperty('armMass')
    sheetOf('ann', { ...COIL, armMass: '11', nextMax: '3.4' }, { unitId, cartridgeId: null })
    expect(start()).toMatchObject({ armMass: '11', nextMax: '3.4', name: 'Vireo Lark' })
  })

  test('a check is offered what is one’s own and not put away; a visitor nothing', () => {
    const { as, at, unitOf, cartridgeOf } = here()
    const unitId = unitOf('ann')
    const cartridgeId = cartridgeOf('ann')
    unitOf('bob')
    setPositions(as('ann'), { unitId, known: 'yes', left: 'bank.10000010', right: 'bank.10000010' })
    expect(unitOffers(as('ann'))).toMatchObject([{ id: unitId, name: 'Tarn 2', note: 'serial ending 418', answers: { preamp: 'tarn-2', board: 'second', present: 'known', left: 'bank.10000010', unit: unitId } }])
    expect(cartridgeOffers(as('ann'))).toMatchObject([{ id: cartridgeId, answers: { own: cartridgeId, cart: 'calloway-finch' } }])
    expect([unitOffers(at()), cartridgeOffers(at()), cartridgeOffers(as('bob'))]).toEqual([[], [], []])
    archiveUnit(as('ann'), { unitId })
    expect(unitOffers(as('ann'))).toEqual([])
  })
})

test('when an account goes, its shelf goes and its sheets stay under their codes with no name', () => {
  const { db, as, at, person, sheetOf, unitOf, cartridgeOf } = here()
  const { id } = person('ann')
  const place = { unitId: unitOf('ann', { model: 'sedge-1', serial: '' }), cartridgeId: cartridgeOf('ann') }
  const { number, code } = sheetOf('ann', FINCH, place)
  nameSheet(as('ann'), { number, name: 'Sunday records' })
  db.update(people).set({ deletionAskedAt: NOW - DELETION_WAITS_MS }).where(eq(people.id, id)).run()
  expect(deleteDueAccounts(at())).toBe(1)
  const row = db.select().from(sheets).get()
  expect(row).toMatchObject({ ownerId: null, name: null, unitId: null, cartridgeId: null })
  expect(JSON.stringify(row)).not.toContain('Sunday')
  for (const table of ['units', 'unit_positions', 'owned_cartridges']) {
    expect(db.$client.prepare(`select count(*) as so from ${table}`).get()).toEqual({ so: 0 })
  }
  expect(getSheet(at(), code).number).toBe(number)
})
