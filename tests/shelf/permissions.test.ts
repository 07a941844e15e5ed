import { describe, expect, test } from 'vitest'
import { Fault, type FaultCode } from '@/lib/kernel/errors'
import type { Context } from '@/lib/kernel/context'
import { addCartridge } from '@/lib/shelf/add-cartridge'
import { addHours } from '@/lib/shelf/add-hours'
import { addUnit } from '@/lib/shelf/add-unit'
import { archiveCartridge } from '@/lib/shelf/archive-cartridge'
import { archiveSheet } from '@/lib/shelf/archive-sheet'
import { archiveUnit } from '@/lib/shelf/archive-unit'
import { changeCartridge } from '@/lib/shelf/change-cartridge'
import { changeUnit } from '@/lib/shelf/change-unit'
import { checkFromShelf } from '@/lib/shelf/check-from-shelf'
import { claimSheet } from '@/lib/shelf/claim-sheet'
import { getComparison } from '@/lib/shelf/compare'
import { copySheetWithCartridge } from '@/lib/shelf/copy-sheet-with-cartridge'
import { findSheets } from '@/lib/shelf/find-sheets'
import { nameSheet } from '@/lib/shelf/name-sheet'
import { placeSheet } from '@/lib/shelf/place-sheet'
import { getOwnedCartridge, getSheetHistory, getShelf, getUnit, listCartridges, listUnits } from '@/lib/shelf/queries'
import { restoreCartridge } from '@/lib/shelf/restore-cartridge'
import { restoreSheet } from '@/lib/shelf/restore-sheet'
import { restoreUnit } from '@/lib/shelf/restore-unit'
import { AddCartridgeInput, AddUnitInput, ChangeCartridgeInput, ChangeUnitInput, SheetSearch } from '@/lib/shelf/schema'
import { setPositions } from '@/lib/shelf/set-positions'
import { takeUpPositions } from '@/lib/shelf/take-up-positions'
import { undoPositions } from '@/lib/shelf/undo-positions'
import { COIL, shelfWorlds, type ShelfWorld } from '../support/shelf'

const here = shelfWorlds()

/** Ann's things, of every kind. */
function annsThings({ unitOf, cartridgeOf, sheetOf, as }: ShelfWorld) {
  const unitId = unitOf('ann', { model: 'merrin-5', serial: '' })
  const stood = 'plugs.100_slide.56'
  setPositions(as('ann'), { unitId, known: 'yes', left: stood, right: stood })
  const cartridgeId = cartridgeOf('ann', 'brightwater-no-3')
  const sheet = sheetOf('ann', COIL, { unitId, cartridgeId })
  const positionsId = getUnit(as('ann'), unitId).lastStep?.id ?? ''
  return { unitId, cartridgeId, positionsId, stood, ...sheet }
}
type Things = ReturnType<typeof annsThings>

const HIDDEN: FaultCode = 'not_found'
const NEW_CARTRIDGE = { name: 'Old mono one', type: 'unknown' }

interface Asked {
  run: (context: Context, things: Things) => unknown
  visitor: FaultCode
  /** Of another owner, staff and an admin: a shelf of their own, or nothing of Ann's. */
  others: FaultCode | 'their own'
}

const ASKED: Record<string, Asked> = {
  addUnit: { run: (context) => addUnit(context, AddUnitInput.parse({ model: 'tarn-2' })), visitor: 'sign_in', others: 'their own' },
  changeUnit: { run: (context, { unitId }) => changeUnit(context, ChangeUnitInput.parse({ unitId, name: 'Study' })), visitor: HIDDEN, others: HIDDEN },
  archiveUnit: { run: archiveUnit, visitor: HIDDEN, others: HIDDEN },
  restoreUnit: { run: restoreUnit, visitor: HIDDEN, others: HIDDEN },
  setPositions: { run: (context, { unitId, stood }) => setPositions(context, { unitId, known: 'yes', left: stood, right: stood }), visitor: HIDDEN, others: HIDDEN },
  undoPositions: { run: undoPositions, visitor: HIDDEN, others: HIDDEN },
  getUnit: { run: (context, { unitId }) => getUnit(context, unitId), visitor: HIDDEN, others: HIDDEN },
  listUnits: { run: (context) => listUnits(context, { archived: false }), visitor: 'sign_in', others: 'their own' },
  addCartridge: { run: (context) => addCartridge(context, AddCartridgeInput.parse(NEW_CARTRIDGE)), visitor: 'sign_in', others: 'their own' },
  'addCartridge of a sheet': {
    run: (context, { code }) => addCartridge(context, AddCartridgeInput.parse({ ...NEW_CARTRIDGE, fromSheet: code })),
    visitor: 'sign_in',
    // Whoever holds the code may read the sheet, and may not place it.
    others: 'not_allowed',
  },
  changeCartridge: {
    run: (context, { cartridgeId }) => changeCartridge(context, ChangeCartridgeInput.parse({ ...NEW_CARTRIDGE, cartridgeId })),
    visitor: HIDDEN,
    others: HIDDEN,
  },
  addHours: { run: (context, { cartridgeId }) => addHours(context, { cartridgeId, hours: 4, counted: null }), visitor: HIDDEN, others: HIDDEN },
  archiveCartridge: { run: archiveCartridge, visitor: HIDDEN, others: HIDDEN },
  restoreCartridge: { run: restoreCartridge, visitor: HIDDEN, others: HIDDEN },
  getOwnedCartridge: { run: (context, { cartridgeId }) => getOwnedCartridge(context, cartridgeId), visitor: HIDDEN, others: HIDDEN },
  listCartridges: { run: (context) => listCartridges(context, { archived: false }), visitor: 'sign_in', others: 'their own' },
  claimSheet: { run: (context, { code }) => claimSheet(context, { sheet: code }), visitor: 'sign_in', others: 'conflict' },
  nameSheet: { run: (context, { number }) => nameSheet(context, { number, name: 'Mine' }), visitor: HIDDEN, others: HIDDEN },
  placeSheet: { run: (context, { number }) => placeSheet(context, { number, unitId: '', cartridgeId: '' }), visitor: HIDDEN, others: HIDDEN },
  archiveSheet: { run: archiveSheet, visitor: HIDDEN, others: HIDDEN },
  restoreSheet: { run: restoreSheet, visitor: HIDDEN, others: HIDDEN },
  copySheetWithCartridge: { run: (context, { number }) => copySheetWithCartridge(context, { number, cartridgeId: '' }), visitor: HIDDEN, others: HIDDEN },
  takeUpPositions: { run: takeUpPositions, visitor: 'sign_in', others: 'not_allowed' },
  checkFromShelf: { run: checkFromShelf, visitor: HIDDEN, others: HIDDEN },
  getShelf: { run: getShelf, visitor: 'sign_in', others: 'their own' },
  getSheetHistory: { run: (context, { number }) => getSheetHistory(context, number), visitor: 'sign_in', others: HIDDEN },
  findSheets: { run: (context) => findSheets(context, SheetSearch.parse({})), visitor: 'sign_in', others: 'their own' },
  // A sheet is read by its code, so whoever holds it may hold it against another.
  getComparison: { run: (context, { code }) => getComparison(context, { a: code, b: code, shown: null }), visitor: 'sign_in', others: 'their own' },
}

const codeOf = (run: () => unknown): FaultCode | 'their own' => {
  try {
    run()
    return 'their own'
  } catch (trouble) {
    if (trouble instanceof Fault) return trouble.code
    throw trouble
  }
}

describe.each(Object.entries(ASKED))('%s', (_name, { run, visitor, others }) => {
  test('its owner may, nobody else; what is not theirs is not there', () => {
    const world = here()
    const things = annsThings(world)
    expect(codeOf(() => run(world.at(), things))).toBe(visitor)
    for (const who of ['bob', 'ruth', 'iris'] as const) expect(codeOf(() => run(world.as(who), things)), who).toBe(others)
    expect(codeOf(() => run(world.as('ann'), things))).toBe('their own')
  })
})

test('the thing of another owner is refused in the same words as one that never was', () => {
  const world = here()
  const { unitId, cartridgeId, number } = annsThings(world)
  const wordsOf = (run: () => unknown) => {
    try {
      run()
      return 'nothing'
    } catch (trouble) {
      return trouble instanceof Fault ? [trouble.code, trouble.message] : 'unforeseen'
    }
  }
  const bob = world.as('bob')
  expect(wordsOf(() => getSheetHistory(bob, number))).toEqual(wordsOf(() => getSheetHistory(bob, 999_999)))
  expect(wordsOf(() => getUnit(bob, unitId))).toEqual(wordsOf(() => getUnit(bob, 'unt_nothing')))
  expect(wordsOf(() => getOwnedCartridge(bob, cartridgeId))).toEqual(wordsOf(() => getOwnedCartridge(bob, 'crt_nothing')))
})
