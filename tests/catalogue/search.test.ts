import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { leaflet } from '@/content/catalogue/cartridges/leaflet'
import { openDatabase, type Database } from '@/db/client'
import { migrateDatabase } from '@/db/migrate'
import { catalogueEntries } from '@/db/schema/catalogue'
import { VISITOR } from '@/lib/access/actor'
import { findArms, findCartridges, findInputs, findLeads, findStepUps, getCartridge, getPreamp, listPreamps } from '@/lib/catalogue/queries'
import { loadDemoCatalogue } from '@/lib/catalogue/load-demo'
import { toColumns } from '@/lib/catalogue/rows'
import { NOW } from '../support/world'

/** Sounds to make names of, so that thousands differ and many share their beginnings. */
const FIRST = ['Bran', 'Cor', 'Dell', 'Ever', 'Fal', 'Gar', 'Hol', 'Ister', 'Jas', 'Kel']
const SECOND = ['wick', 'mere', 'ford', 'low', 'ney', 'stane', 'combe', 'hurst', 'den', 'by']
const MODELS = ['Ash', 'Birch', 'Cedar', 'Elm', 'Fir']
const TYPES = ['moving-magnet', 'moving-iron', 'moving-coil'] as const

/** 5,000 invented cartridges: 100 makers, 5 models, 10 numbers. */
const MADE_UP = FIRST.flatMap((first) => SECOND.map((second) => first + second)).flatMap((maker, m) =>
  MODELS.flatMap((model, k) =>
    Array.from({ length: 10 }, (_, i) =>
      leaflet({ maker, name: `${model} ${i + 1}`, type: TYPES[(m + k + i) % 3], source: 'Made up for a test' }),
    ),
  ),
)
/** What people really type about: accents, dots, an odd letter. */
const AWKWARD = [
  leaflet({ maker: 'Ängström & Søn', name: 'Éclat Nº 3', type: 'moving-coil', source: 'Made up for a test' }),
  leaflet({ maker: 'Ängström & Søn', name: 'Éclat Nº 30', type: 'moving-coil', source: 'Made up for a test' }),
]

let folder: string
let db: Database
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'setdown-search-'))
  db = openDatabase(join(folder, 'catalogue.db'))
  migrateDatabase(db)
  loadDemoCatalogue({ db, actor: VISITOR, now: NOW })
  db.transaction((tx) => {
    for (const entry of [...MADE_UP, ...AWKWARD]) {
      tx.insert(catalogueEntries).values({ ...toColumns('cartridges', entry), demoHash: null, createdAt: NOW, updatedAt: NOW }).run()
    }
  })
})
afterAll(() => {
  db.$client.close()
  rmSync(folder, { recursive: true, force: true })
})

const names = (text: string, more: { type?: (typeof TYPES)[number]; limit?: number } = {}) =>
  findCartridges({ db }, { text, limit: 8, ...more }).entries.map(({ name }) => name)

describe('finding a cartridge among five thousand', () => {
  test.each(['calloway wren', 'wren calloway', 'WREN   Calloway', 'callo wr', 'callowaywren', 'calloway-wren', 'call oway wren'])(
    '"%s" finds the Wren first',
    (text) => expect(names(text)[0]).toBe('Calloway Wren'),
  )

  test.each(['brightwater no 3', 'brightwater no. 3', 'Brightwater No.3', 'no3 brightwater', 'bright water 3'])('"%s" finds the No. 3 first', (text) =>
    expect(names(text)[0]).toBe('Brightwater No. 3'),
  )

  test.each(['angstrom eclat 3', 'ÄNGSTRÖM ÉCLAT 3', 'eclat 3 son', 'Ängström Søn Éclat Nº 3', 'ängstrom'])('"%s" finds it with or without accents', (text) =>
    expect(names(text)[0]).toBe('Ängström & Søn Éclat Nº 3'),
  )

  test('every word must be there', () => {
    expect(names('calloway dunlin')).toEqual([])
    expect(names('wren zzz')).toEqual([])
    expect(names('…')).toEqual([])
  })

  test('a name that begins with the word comes before one that holds it', () => {
    const found = names('elm', { limit: 20 })
    expect(found).toHaveLength(20)
    for (const name of found) expect(name).toMatch(/\bElm /)
  })

  test('words of the type narrow, and a type narrows', () => {
    expect(names('calloway mc')).toEqual([])
    expect(names('saltern moving coil').length).toBeGreaterThanOrEqual(3)
    expect(names('78')).toContain('Mirefold Coarse')
    const irons = findCartridges({ db }, { text: 'branwick', type: 'moving-iron', limit: 20 }).entries
    expect(irons.length).toBeGreaterThan(5)
    for (const { type } of irons) expect(type).toBe('moving-iron')
  })

  test.each(['', 'ash', 'branwick elm'])('pages of "%s" follow each other without a gap or a repeat', (text) => {
    const seen: string[] = []
    let cursor: string | undefined
    for (let page = 0; page < 6; page++) {
      const found = findCartridges({ db }, { text, limit: 7, cursor })
      seen.push(...found.entries.map(({ id }) => id))
      if (found.next === null) break
      cursor = found.next
    }
    const whole = findCartridges({ db }, { text, limit: 42 }).entries.map(({ id }) => id)
    expect(seen).toEqual(whole)
    expect(new Set(seen).size).toBe(seen.length)
  })

  test('without a text everything is listed by name', () => {
    const listed = names('', { limit: 12 })
    expect(listed).toEqual([...listed].sort((a, b) => a.localeCompare(b, 'en')))
  })

  test('a cursor that is not ours is refused in words', () => {
    for (const cursor of ['nonsense', Buffer.from('[1]').toString('base64url')]) {
      expect(() => findCartridges({ db }, { text: '', limit: 5, cursor })).toThrow('not a place in this list')
    }
  })

  test('letters that mean something to a database are letters', () => {
    expect(names("wren'; drop table catalogue_entries; --")).toEqual([])
    expect(names('wren" or ""="')).toEqual([])
    expect(names('%')).toEqual([])
    expect(names('_')).toEqual([])
  })

  test('what leaves is the leaflet, and nothing kept beside it', () => {
    const wren = findCartridges({ db }, { text: 'wren', limit: 1 }).entries[0]
    expect(wren).toMatchObject({ id: 'calloway-wren', maker: 'Calloway', model: 'Wren', coilOhms: { printed: '700 Ω', low: 700 } })
    expect(Object.keys(wren)).not.toContain('odd')
    expect(getCartridge({ db }, 'calloway-wren')).toEqual(wren)
  })
})

describe('the other lists', () => {
  test('arms, transformers and inputs are found by their words', () => {
    expect(findArms({ db }, { text: 'yarrow 12', limit: 3 }).entries[0].name).toBe('Fennimark Yarrow 12')
    expect(findStepUps({ db }, { text: 'ironlatch 150', limit: 3 }).entries[0].taps[0].ratio.nominal).toBeCloseTo(Math.sqrt(50_000 / 150), 2)
    expect(findInputs({ db }, { text: 'headphone', limit: 3 }).entries.map(({ kind }) => kind)).toEqual(['headphones', 'headphones'])
  })

  test('a lead for either use is found for each', () => {
    const uses = (type: 'arm-lead' | 'cable') => new Set(findLeads({ db }, { text: '', type, limit: 20 }).entries.map(({ use }) => use))
    expect(uses('arm-lead')).toEqual(new Set(['arm-lead', 'either']))
    expect(uses('cable')).toEqual(new Set(['cable', 'either']))
  })

  test('a lead gives its capacitance at each length', () => {
    const [lead] = findLeads({ db }, { text: 'spindlewick arm lead', limit: 1 }).entries
    expect(lead.lengths.map(({ metres, picofarads }) => [metres, picofarads?.nominal])).toEqual([
      [0.8, 72 * 0.8],
      [1.2, 72 * 1.2],
      [1.5, 72 * 1.5],
    ])
  })
})

describe('the maker’s own preamps', () => {
  test('come in the order of the list, each with its boards', () => {
    const listed = listPreamps({ db })
    expect(listed.map(({ name, boards }) => [name, boards.length])).toEqual([
      ['Sedge 1', 1],
      ['Tarn 2', 2],
      ['Merrin 5', 1],
      ['Ember 3', 1],
    ])
  })

  test('are fetched whole or by board, and not found by a wrong name', () => {
    expect(getPreamp({ db }, 'tarn-2').boards.map(({ id }) => id)).toEqual(['first', 'second'])
    expect(getPreamp({ db }, 'tarn-2', 'second').boards[0].preamp.boardName).toBe('second board, from serial 19000')
    expect(() => getPreamp({ db }, 'tarn-3')).toThrow('nothing by that name')
    expect(() => getPreamp({ db }, 'tarn-2', 'third')).toThrow('no such board')
    expect(() => getPreamp({ db }, 'calloway-wren')).toThrow('nothing by that name')
  })
})
