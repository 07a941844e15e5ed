import { describe, expect, test } from 'vitest'
import { getCartridge } from '@/lib/catalogue/queries'
import { isFromLeaflet } from '@/lib/setups/leaflet'
import { answersFromArm, answersFromCartridge } from '@/lib/setups/schema-picked'
import { getArm, findArms } from '@/lib/catalogue/queries'
import { addCartridge } from '@/lib/shelf/add-cartridge'
import { addHours } from '@/lib/shelf/add-hours'
import { archiveCartridge } from '@/lib/shelf/archive-cartridge'
import { changeCartridge } from '@/lib/shelf/change-cartridge'
import { getOwnedCartridge, getSheetHistory, listCartridges } from '@/lib/shelf/queries'
import { restoreCartridge } from '@/lib/shelf/restore-cartridge'
import { AddCartridgeInput, AddHoursInput, ChangeCartridgeInput } from '@/lib/shelf/schema'
import { cartridgeAnswersOf, withCartridge } from '@/lib/shelf/views-answers'
import { faultOf } from '../support/fault'
import { FINCH, shelfWorlds } from '../support/shelf'

const here = shelfWorlds()

describe('adding one', () => {
  test('out of the catalogue, with what its leaflet says and that it says so', () => {
    const { as, cartridgeOf } = here()
    const cartridge = getOwnedCartridge(as('ann'), cartridgeOf('ann', 'calloway-wren'))
    expect(cartridge).toMatchObject({ name: 'Calloway Wren', type: 'moving-magnet', fromCatalogue: true, stylusHours: null, notes: '' })
    expect(isFromLeaflet('output', cartridge.answers)).toBe(true)
    expect(cartridge.answers).not.toHaveProperty('armMass')
  })

  test('by hand, with hours and notes', () => {
    const { as } = here()
    const { id } = addCartridge(as('ann'), AddCartridgeInput.parse({ name: ' Old mono one ', type: 'moving-magnet', mono: 'yes', output: '5,4 mV', hours: '12,5', notes: 'No name on it, 78s.' }))
    expect(getOwnedCartridge(as('ann'), id)).toMatchObject({ name: 'Old mono one', fromCatalogue: false, stylusHours: 12.5, notes: 'No name on it, 78s.', answers: { output: '5,4 mV', mono: 'yes' } })
  })

  test('a value that cannot be is refused at its field', async () => {
    const { as } = here()
    const fault = await faultOf(() => addCartridge(as('ann'), AddCartridgeInput.parse({ name: 'Slip', type: 'moving-magnet', output: '4.5 V' })))
    expect(fault.fields.output).toMatch(/thousand times too strong/)
    expect(listCartridges(as('ann'), { archived: false })).toEqual([])
  })

  test.each([[{ name: '  ' }, /name/], [{ name: 'A', hours: 'many' }, /hours as a number/], [{ name: 'A', hours: '-1' }, /hours/], [{ name: 'A', hours: '99999' }, /any stylus/]])('%o is refused', (given, words) => {
    const read = AddCartridgeInput.safeParse(given)
    expect(read.error?.issues[0].message).toMatch(words)
  })

  test('taken over from a sheet, the sheet is about it', () => {
    const { as, sheetOf } = here()
    const { code, number } = sheetOf('ann')
    const { id } = addCartridge(as('ann'), AddCartridgeInput.parse({ ...FINCH, fromSheet: code }))
    expect(getSheetHistory(as('ann'), number).cartridgeId).toBe(id)
  })

  test('over a sheet that is not theirs nothing is kept', async () => {
    const { as, sheetOf } = here()
    const { code } = sheetOf('bob')
    expect((await faultOf(() => addCartridge(as('ann'), AddCartridgeInput.parse({ ...FINCH, fromSheet: code })))).code).toBe('not_allowed')
    expect(listCartridges(as('ann'), { archived: false })).toEqual([])
  })
})

test('changing one replaces its values and keeps what is not of the form', () => {
  const { as, cartridgeOf } = here()
  const cartridgeId = cartridgeOf('ann')
  changeCartridge(as('ann'), ChangeCartridgeInput.parse({ cartridgeId, name: 'The old Finch', type: 'moving-magnet', output: '4', hours: '380' }))
  expect(getOwnedCartridge(as('ann'), cartridgeId)).toMatchObject({ name: 'The old Finch', stylusHours: 380, answers: { output: '4' }, fromCatalogue: false })
})

describe('stylus hours', () => {
  const add = (cartridgeId: string, hours: string, counted: string) => AddHoursInput.parse({ cartridgeId, hours, counted })

  test('add up; pressing twice adds once', () => {
    const { as, cartridgeOf } = here()
    const id = cartridgeOf('ann')
    addHours(as('ann'), add(id, '380', ''))
    addHours(as('ann'), add(id, '0.3', '380'))
    addHours(as('ann'), add(id, '0.3', '380'))
    expect(getOwnedCartridge(as('ann'), id).stylusHours).toBe(380.3)
  })

  test('counted elsewhere meanwhile, nothing is added', async () => {
    const { as, cartridgeOf } = here()
    const id = cartridgeOf('ann')
    addHours(as('ann'), add(id, '10', ''))
    expect((await faultOf(() => addHours(as('ann'), add(id, '5', '')))).code).toBe('conflict')
    expect(getOwnedCartridge(as('ann'), id).stylusHours).toBe(10)
  })

  test('more than any stylus lasts is refused', async () => {
    const { as, cartridgeOf } = here()
    const id = cartridgeOf('ann')
    addHours(as('ann'), add(id, '20000', ''))
    expect((await faultOf(() => addHours(as('ann'), add(id, '1', '20000')))).fields).toHaveProperty('hours')
  })
})

test('one that was put away is in the other list, and comes back', () => {
  const { as, cartridgeOf } = here()
  const cartridgeId = cartridgeOf('ann')
  archiveCartridge(as('ann'), { cartridgeId })
  expect(listCartridges(as('ann'), { archived: false })).toEqual([])
  expect(listCartridges(as('ann'), { archived: true })).toHaveLength(1)
  restoreCartridge(as('ann'), { cartridgeId })
  expect(listCartridges(as('ann'), { archived: false })).toHaveLength(1)
})

describe('answers of a check, parted', () => {
  test('another cartridge takes the place of all of the first one, and of nothing else', () => {
    const { at } = here()
    const arm = getArm(at(), findArms(at(), { text: '', limit: 1 }).entries[0].id)
    const wren = answersFromCartridge(getCartridge(at(), 'calloway-wren'))
    const whole = answersFromArm(arm, { ...wren, preamp: 'tarn-2', next: 'line' })
    const third = cartridgeAnswersOf(answersFromCartridge(getCartridge(at(), 'brightwater-no-3')))
    const both = withCartridge(whole, third)
    expect(both).toMatchObject({ preamp: 'tarn-2', next: 'line', name: 'Brightwater No. 3', arm: arm.name })
    expect(cartridgeAnswersOf(both)).toEqual(third)
    expect(both.inductance).toBe(third.inductance)
    // What came out of the catalogue about the arm is still known to.
    expect(isFromLeaflet('armMass', both)).toBe(isFromLeaflet('armMass', whole))
    expect(withCartridge(whole, null)).not.toHaveProperty('output')
  })
})
