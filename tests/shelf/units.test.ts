import { describe, expect, test } from 'vitest'
import { units } from '@/db/schema/shelf'
import { catalogueEntries } from '@/db/schema/catalogue'
import { eq } from 'drizzle-orm'
import { addUnit } from '@/lib/shelf/add-unit'
import { archiveUnit } from '@/lib/shelf/archive-unit'
import { changeUnit } from '@/lib/shelf/change-unit'
import { getUnit, listUnits } from '@/lib/shelf/queries'
import { restoreUnit } from '@/lib/shelf/restore-unit'
import { AddUnitInput, ChangeUnitInput } from '@/lib/shelf/schema'
import { setPositions } from '@/lib/shelf/set-positions'
import { undoPositions } from '@/lib/shelf/undo-positions'
import { faultOf } from '../support/fault'
import { shelfWorlds } from '../support/shelf'
import { NOW } from '../support/world'

const here = shelfWorlds()
const add = (given: object) => AddUnitInput.parse({ model: 'tarn-2', ...given })

describe('adding one', () => {
  test('the serial number settles the board, and only how it ends comes back', () => {
    const { as, db } = here()
    const { id } = addUnit(as('ann'), add({ serial: ' 19.418 ', boughtOn: '2019', boughtFrom: 'A shop in Brandreth', secondHand: 'yes' }))
    const unit = getUnit(as('ann'), id)
    expect(unit).toMatchObject({ serialEnding: '418', board: { id: 'second' }, boughtOn: '2019', secondHand: 'yes', standing: null })
    expect(JSON.stringify(unit)).not.toContain('19418')
    expect(db.select().from(units).get()?.serial).toBe('19418')
    expect(getUnit(as('ann'), addUnit(as('ann'), add({ serial: '18999' })).id).board?.id).toBe('first')
  })

  test('the number settles it whatever board was chosen', () => {
    const { as } = here()
    expect(getUnit(as('ann'), addUnit(as('ann'), add({ serial: '19418', board: 'first' })).id).board?.id).toBe('second')
  })

  test('without a number the board may stay open; a model with one board has that', () => {
    const { as } = here()
    const open = getUnit(as('ann'), addUnit(as('ann'), add({})).id)
    expect(open).toMatchObject({ board: null, serialEnding: null })
    // Drawn as the newest until it is known.
    expect(open.preamp?.boardId).toBe('second')
    expect(getUnit(as('ann'), addUnit(as('ann'), add({ board: 'first' })).id).board?.id).toBe('first')
    expect(getUnit(as('ann'), addUnit(as('ann'), add({ model: 'sedge-1' })).id).board).not.toBeNull()
  })

  test.each([
    [{ serial: 'about nineteen' }, 'serial'],
    [{ model: 'nobody-9' }, 'model'],
    [{ board: 'third' }, 'board'],
  ])('%o is refused at its field, and nothing is kept', async (given, field) => {
    const { as, db } = here()
    const fault = await faultOf(() => addUnit(as('ann'), add(given)))
    expect(fault.code).toBe('bad_input')
    expect(Object.keys(fault.fields)).toEqual([field])
    expect(db.select().from(units).all()).toEqual([])
  })

  test('a fault never holds the number', async () => {
    const { as } = here()
    const fault = await faultOf(() => addUnit(as('ann'), add({ serial: '12-34x5' })))
    expect(JSON.stringify([fault.message, fault.detail, fault.fields])).not.toContain('1234')
  })
})

describe('changing one', () => {
  test('an empty number keeps the one that is there; it can be forgotten', () => {
    const { as, unitOf, db } = here()
    const unitId = unitOf('ann')
    changeUnit(as('ann'), ChangeUnitInput.parse({ unitId, name: 'In the study' }))
    expect(getUnit(as('ann'), unitId)).toMatchObject({ name: 'In the study', serialEnding: '418', board: { id: 'second' } })
    changeUnit(as('ann'), ChangeUnitInput.parse({ unitId, board: 'first', forgetSerial: 'yes' }))
    expect(getUnit(as('ann'), unitId)).toMatchObject({ name: null, serialEnding: null, board: { id: 'first' } })
    expect(db.select().from(units).get()?.serial).toBeNull()
  })

  test('on another board nobody knows any more how it stands', () => {
    const { as, unitOf } = here()
    const unitId = unitOf('ann')
    setPositions(as('ann'), { unitId, known: 'yes', left: 'bank.10000010', right: 'bank.10000010' })
    expect(getUnit(as('ann'), unitId).standing?.left).toBe('bank.10000010')
    changeUnit(as('ann'), ChangeUnitInput.parse({ unitId, serial: '4321' }))
    expect(getUnit(as('ann'), unitId)).toMatchObject({ board: { id: 'first' }, standing: null })
  })

  test('a model that the maker took out of the list is still on the shelf', () => {
    const { as, unitOf, db } = here()
    const unitId = unitOf('ann')
    db.delete(catalogueEntries).where(eq(catalogueEntries.id, 'tarn-2')).run()
    expect(getUnit(as('ann'), unitId)).toMatchObject({ model: { id: 'tarn-2', name: 'tarn-2' }, preamp: null })
    expect(listUnits(as('ann'), { archived: false })).toHaveLength(1)
  })
})

describe('how it stands', () => {
  const [first, second, third] = ['bank.10000010', 'bank.00000000', 'bank.01000000']
  const tell = (text: string | null) => (text === null ? { known: 'no' as const, left: '', right: '' } : { known: 'yes' as const, left: text, right: text })

  test('each word on it is kept, and undoing goes back one at a time', () => {
    const { as, unitOf } = here()
    const unitId = unitOf('ann')
    for (const [index, text] of [first, second, third].entries()) setPositions(as('ann', NOW + index), { unitId, ...tell(text) })
    const standing = () => getUnit(as('ann'), unitId).standing
    const undo = () => undoPositions(as('ann'), { unitId, positionsId: getUnit(as('ann'), unitId).lastStep?.id ?? '' })
    expect(standing()).toMatchObject({ left: third, since: NOW + 2, source: 'told', sheet: null })
    undo()
    expect(standing()?.left).toBe(second)
    undo()
    expect(standing()).toMatchObject({ left: first, since: NOW })
    undo()
    expect(standing()).toBeNull()
    expect(getUnit(as('ann'), unitId).lastStep).toBeNull()
  })

  test('after undoing, a new word follows what counts again', () => {
    const { as, unitOf } = here()
    const unitId = unitOf('ann')
    setPositions(as('ann'), { unitId, ...tell(first) })
    setPositions(as('ann'), { unitId, ...tell(second) })
    undoPositions(as('ann'), { unitId, positionsId: getUnit(as('ann'), unitId).lastStep?.id ?? '' })
    setPositions(as('ann'), { unitId, ...tell(third) })
    undoPositions(as('ann'), { unitId, positionsId: getUnit(as('ann'), unitId).lastStep?.id ?? '' })
    expect(getUnit(as('ann'), unitId).standing?.left).toBe(first)
  })

  test('pressing undo twice undoes once; something newer is not undone by an old page', async () => {
    const { as, unitOf } = here()
    const unitId = unitOf('ann')
    setPositions(as('ann'), { unitId, ...tell(first) })
    setPositions(as('ann'), { unitId, ...tell(second) })
    const positionsId = getUnit(as('ann'), unitId).lastStep?.id ?? ''
    undoPositions(as('ann'), { unitId, positionsId })
    undoPositions(as('ann'), { unitId, positionsId })
    expect(getUnit(as('ann'), unitId).standing?.left).toBe(first)
    const old = getUnit(as('ann'), unitId).lastStep?.id ?? ''
    setPositions(as('ann'), { unitId, ...tell(third) })
    expect((await faultOf(() => undoPositions(as('ann'), { unitId, positionsId: old }))).code).toBe('conflict')
    expect(getUnit(as('ann'), unitId).standing?.left).toBe(third)
  })

  test('saying the same again adds nothing to undo', () => {
    const { as, unitOf } = here()
    const unitId = unitOf('ann')
    setPositions(as('ann'), { unitId, ...tell(first) })
    setPositions(as('ann', NOW + 9), { unitId, ...tell(first) })
    undoPositions(as('ann'), { unitId, positionsId: getUnit(as('ann'), unitId).lastStep?.id ?? '' })
    expect(getUnit(as('ann'), unitId).standing).toBeNull()
  })

  test('an owner may say that they do not know any more, and take that back', () => {
    const { as, unitOf } = here()
    const unitId = unitOf('ann')
    setPositions(as('ann'), { unitId, ...tell(first) })
    setPositions(as('ann'), { unitId, ...tell(null) })
    expect(getUnit(as('ann'), unitId)).toMatchObject({ standing: null, lastStep: { source: 'told' } })
    undoPositions(as('ann'), { unitId, positionsId: getUnit(as('ann'), unitId).lastStep?.id ?? '' })
    expect(getUnit(as('ann'), unitId).standing?.left).toBe(first)
  })

  test('two switches that exclude each other are refused, and so is another board’s text', async () => {
    const { as, unitOf } = here()
    const unitId = unitOf('ann')
    const clash = await faultOf(() => setPositions(as('ann'), { unitId, ...tell('bank.00110000') }))
    expect(clash.fields.positions).toMatch(/cannot both|cannot be ON together/)
    expect((await faultOf(() => setPositions(as('ann'), { unitId, ...tell('plugs.100_slide.56') }))).fields.positions).toMatch(/another board/)
  })

  test('a preamp with nothing to set has no such thing', async () => {
    const { as, unitOf } = here()
    const unitId = unitOf('ann', { model: 'sedge-1', serial: '' })
    expect((await faultOf(() => setPositions(as('ann'), { unitId, known: 'yes', left: '', right: '' }))).code).toBe('conflict')
  })
})

test('one that was put away is in the other list, and comes back as it was', () => {
  const { as, unitOf } = here()
  const unitId = unitOf('ann')
  archiveUnit(as('ann'), { unitId })
  archiveUnit(as('ann'), { unitId })
  expect(listUnits(as('ann'), { archived: false })).toEqual([])
  expect(listUnits(as('ann'), { archived: true }).map(({ id }) => id)).toEqual([unitId])
  restoreUnit(as('ann'), { unitId })
  expect(listUnits(as('ann'), { archived: false })).toMatchObject([{ id: unitId, archived: false, serialEnding: '418' }])
})
