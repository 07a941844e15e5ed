import { eq } from 'drizzle-orm'
import { beforeEach, expect, test } from 'vitest'
import { catalogueEntries } from '@/db/schema/catalogue'
import { DEMO_ENTRIES } from '@/lib/catalogue/demo'
import { loadDemoCatalogue } from '@/lib/catalogue/load-demo'
import { getCartridge } from '@/lib/catalogue/queries'
import { CATALOGUE_KINDS } from '@/lib/catalogue/terms'
import { NOW, world, type World } from '../support/world'

const HOUR = 3_600_000
const total = CATALOGUE_KINDS.reduce((sum, kind) => sum + DEMO_ENTRIES[kind].length, 0)

let here: World
beforeEach(() => {
  here = world()
})
const rows = () => here.db.select().from(catalogueEntries).orderBy(catalogueEntries.id).all()
const wren = { ...DEMO_ENTRIES.cartridges[0] }
const withWren = (change: object) => ({
  ...DEMO_ENTRIES,
  cartridges: [{ ...wren, ...change }, ...DEMO_ENTRIES.cartridges.slice(1)],
})
const edit = (data: string) => here.db.update(catalogueEntries).set({ data }).where(eq(catalogueEntries.id, wren.id)).run()

test('the first load adds everything, ids unique over all kinds', () => {
  expect(loadDemoCatalogue(here.at())).toEqual({ added: total, updated: 0, unchanged: 0, leftAlone: 0 })
  expect(rows()).toHaveLength(total)
})

test('there is enough of each kind to choose from', () => {
  expect(DEMO_ENTRIES.preamps).toHaveLength(4)
  expect(DEMO_ENTRIES.arms.length).toBeGreaterThanOrEqual(14)
  expect(DEMO_ENTRIES['step-ups'].length).toBeGreaterThanOrEqual(8)
  expect(DEMO_ENTRIES.leads.length).toBeGreaterThanOrEqual(8)
  expect(DEMO_ENTRIES.inputs.length).toBeGreaterThanOrEqual(14)
  expect(new Set(DEMO_ENTRIES.inputs.map(({ kind }) => kind))).toEqual(new Set(['line', 'digital', 'recorder', 'headphones', 'phono']))
})

test('every sign in it is in the fonts that ship', () => {
  // Source: character sets of the shipped Latin and Greek font files; superscripts, arrows and comparisons are not in them.
  const strange = JSON.stringify(DEMO_ENTRIES).match(/[^ -~\u00a0-\u00ff\u0391-\u03ce\u2013\u2014\u2018\u2019\u201c\u201d\u2212]/g)
  expect(strange).toBeNull()
})

test('a second load changes nothing', () => {
  loadDemoCatalogue(here.at())
  const before = rows()
  expect(loadDemoCatalogue(here.at(NOW + HOUR))).toEqual({ added: 0, updated: 0, unchanged: total, leftAlone: 0 })
  expect(rows()).toEqual(before)
})

test('a changed demo entry is brought up to date', () => {
  loadDemoCatalogue(here.at())
  const loaded = loadDemoCatalogue(here.at(NOW + HOUR), withWren({ source: 'Leaflet, 2024' }))
  expect(loaded).toMatchObject({ updated: 1, leftAlone: 0 })
  expect(getCartridge(here.at(), wren.id).source).toBe('Leaflet, 2024')
  expect(rows().find(({ id }) => id === wren.id)).toMatchObject({ createdAt: NOW, updatedAt: NOW + HOUR })
})

test('an entry that someone edited stays as they left it, also when the demo changes', () => {
  loadDemoCatalogue(here.at())
  edit(JSON.stringify({ ...wren, source: 'Measured here' }))
  expect(loadDemoCatalogue(here.at(NOW + HOUR))).toMatchObject({ updated: 0, leftAlone: 1 })
  expect(loadDemoCatalogue(here.at(NOW + HOUR), withWren({ source: 'Leaflet, 2024' }))).toMatchObject({ updated: 0, leftAlone: 1 })
  expect(getCartridge(here.at(), wren.id).source).toBe('Measured here')
})

test('an entry that people made under a name of the demo’s is theirs', () => {
  loadDemoCatalogue(here.at())
  here.db.update(catalogueEntries).set({ demoHash: null }).where(eq(catalogueEntries.id, wren.id)).run()
  expect(loadDemoCatalogue(here.at())).toMatchObject({ leftAlone: 1 })
})

test('one impossible entry and nothing is written', () => {
  expect(() => loadDemoCatalogue(here.at(), withWren({ coilOhms: { low: -1 } }))).toThrow()
  expect(rows()).toEqual([])
})

test('a row that its schema does not allow is not handed out', () => {
  loadDemoCatalogue(here.at())
  edit(JSON.stringify({ ...wren, type: 'moving-target' }))
  expect(() => getCartridge(here.at(), wren.id)).toThrow()
})
