import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { eq } from 'drizzle-orm'
import { afterEach, beforeEach, describe, expect, test } from 'vitest'
import { openDatabase, type Database } from '@/db/client'
import { migrateDatabase } from '@/db/migrate'
import { catalogueEntries } from '@/db/schema/catalogue'
import { revisions, sheets } from '@/db/schema/setups'
import { VISITOR } from '@/lib/access/actor'
import { loadDemoCatalogue } from '@/lib/catalogue/load-demo'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { answerNumber } from '@/lib/setups/answer-number'
import { readSheetCode } from '@/lib/setups/codes'
import { computeAnew } from '@/lib/setups/compute-anew'
import { markMoved } from '@/lib/setups/mark-moved'
import { makeNewCode } from '@/lib/setups/new-code'
import { getSheet } from '@/lib/setups/queries'
import { saveSheet } from '@/lib/setups/save-sheet'
import type { AnswersInput } from '@/lib/setups/schema'
import { NOW } from '../support/world'

/** A fixed preamp: one combination, so a check is quick. */
const FINCH: AnswersInput = {
  preamp: 'sedge-1',
  type: 'moving-magnet',
  name: 'Calloway Finch',
  output: '4.5 mV',
  velocity: '5',
  meaning: 'peak-lateral',
  coil: '700',
  next: 'line',
}
const COIL: AnswersInput = { preamp: 'merrin-5', type: 'moving-coil', name: 'Brightwater No. 3', present: 'delivered', next: 'line' }

let folder: string
let db: Database
const at = (now = NOW): Context => ({ db, actor: VISITOR, now })

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'setdown-sheets-'))
  db = openDatabase(join(folder, 'setdown.db'))
  migrateDatabase(db)
  loadDemoCatalogue(at())
})
afterEach(() => {
  db.$client.close()
  rmSync(folder, { recursive: true, force: true })
})

function faultOf(run: () => unknown): Fault {
  try {
    run()
  } catch (trouble) {
    if (trouble instanceof Fault) return trouble
    throw trouble
  }
  throw new Error('Nothing was refused.')
}

describe('saving', () => {
  test('the first sheet is 1001, the next one 1002, each with a code of its own', () => {
    const first = saveSheet(at(), { answers: FINCH })
    const second = saveSheet(at(), { answers: FINCH })
    expect([first.number, second.number]).toEqual([1001, 1002])
    expect(first.code).toMatch(/^[2-9b-z]{4}(-[2-9b-z]{4}){3}$/)
    expect(second.code).not.toBe(first.code)
  })

  test('a sheet holds what was answered, what went in and what was said', () => {
    const { code } = saveSheet(at(), { answers: FINCH })
    const sheet = getSheet(at(), code)
    expect(sheet.answers).toEqual(FINCH)
    expect(sheet.letter).toBe('A')
    expect(sheet.createdAt).toBe(NOW)
    expect(sheet.inputs.cartridge.outputVolts.nominal).toBeCloseTo(4.5e-3, 9)
    expect(sheet.result.match.verdict).toBe('suits')
    expect(sheet.result.match.curves?.loading.hertz.length).toBeGreaterThan(50)
    expect(sheet.changed).toEqual({ rules: false, engine: false, data: false, canComputeAnew: true })
  })

  test('a second press of the same form makes no second sheet', () => {
    const key = 'one-press-of-one-form'
    const first = saveSheet(at(), { answers: FINCH, key })
    expect(saveSheet(at(NOW + 40), { answers: FINCH, key })).toEqual(first)
    expect(db.select().from(sheets).all()).toHaveLength(1)
    expect(db.select().from(revisions).all()).toHaveLength(1)
  })

  test('the same form with another answer is another sheet', () => {
    const key = 'one-press-of-one-form'
    const first = saveSheet(at(), { answers: FINCH, key })
    const second = saveSheet(at(), { answers: { ...FINCH, output: '5' }, key })
    expect(second.number).toBe(first.number + 1)
  })

  test('a sheet whose revision cannot be written is not made either', () => {
    db.$client.exec("create trigger refuse before insert on revisions begin select raise(abort, 'no room'); end")
    expect(() => saveSheet(at(), { answers: FINCH })).toThrow('no room')
    expect(db.select().from(sheets).all()).toEqual([])
  })

  test('answers that need putting right are refused by their names, and nothing is kept', () => {
    const fault = faultOf(() => saveSheet(at(), { answers: { ...FINCH, output: '4.5 V', coil: 'plenty' } }))
    expect(fault.code).toBe('bad_input')
    expect(Object.keys(fault.fields).sort()).toEqual(['coil', 'output'])
    expect(faultOf(() => saveSheet(at(), { answers: { type: 'moving-magnet' } })).fields).toHaveProperty('preamp')
    expect(faultOf(() => saveSheet(at(), { answers: { ...FINCH, preamp: 'nobody-9' } })).fields).toHaveProperty('preamp')
    expect(faultOf(() => saveSheet(at(), { answers: { ...FINCH, board: 'third' } })).fields).toHaveProperty('board')
    expect(db.select().from(sheets).all()).toEqual([])
  })
})

describe('opening', () => {
  test('a code is read with any case, gaps and hyphens', () => {
    const { code } = saveSheet(at(), { answers: FINCH })
    expect(readSheetCode(` ${code.toUpperCase().replaceAll('-', ' ')} `)).toBe(code)
    expect(getSheet(at(), code.replaceAll('-', '')).number).toBe(1001)
  })

  test.each(['1001', '', 'k7m2-w9qd-h4tx', 'aaaa-aaaa-aaaa-aaaa', "' or 1=1 --", 'k7m2-w9qd-h4tx-p3rt'])('"%s" opens nothing', (text) => {
    saveSheet(at(), { answers: FINCH })
    expect(faultOf(() => getSheet(at(), text)).code).toBe('not_found')
  })

  test('a sheet that was put away opens no more', () => {
    const { code } = saveSheet(at(), { answers: FINCH })
    db.update(sheets).set({ archivedAt: NOW }).run()
    expect(faultOf(() => getSheet(at(), code)).code).toBe('not_found')
  })

  test('a new code opens the sheet, and the old one no longer does', () => {
    const { code } = saveSheet(at(), { answers: FINCH })
    const fresh = makeNewCode(at(), { code })
    expect(fresh.code).not.toBe(code)
    expect(getSheet(at(), fresh.code).number).toBe(1001)
    expect(faultOf(() => getSheet(at(), code)).code).toBe('not_found')
    expect(faultOf(() => makeNewCode(at(), { code })).code).toBe('not_found')
  })
})

describe('revisions', () => {
  test('nothing new to say adds no revision', () => {
    const { code } = saveSheet(at(), { answers: FINCH })
    expect(computeAnew(at(), { code }).letter).toBe('A')
    expect(getSheet(at(), code).revisions.map(({ letter }) => letter)).toEqual(['A'])
  })

  test('after the rules changed it says so, and computing anew keeps what was said then', () => {
    const { code } = saveSheet(at(), { answers: FINCH })
    db.update(revisions).set({ rulesVersion: 0 }).run()
    expect(getSheet(at(), code).changed).toMatchObject({ rules: true, engine: false, data: false })
    expect(computeAnew(at(NOW + 1000), { code }).letter).toBe('B')
    expect(computeAnew(at(NOW + 2000), { code }).letter).toBe('B')
    const newest = getSheet(at(), code)
    expect(newest.letter).toBe('B')
    expect(newest.changed.rules).toBe(false)
    expect(getSheet(at(), code, 'A')).toMatchObject({ letter: 'A', createdAt: NOW, rulesVersion: 0 })
    expect(faultOf(() => getSheet(at(), code, 'C')).code).toBe('not_found')
  })

  test('after the catalogue changed it says so; a change to another preamp is none', () => {
    const { code } = saveSheet(at(), { answers: FINCH })
    const change = (id: string, from: string, to: string) => {
      const row = db.select().from(catalogueEntries).where(eq(catalogueEntries.id, id)).get()
      if (!row?.data.includes(from)) throw new Error(`${id} has no ${from}`)
      db.update(catalogueEntries).set({ data: row.data.replaceAll(from, to) }).where(eq(catalogueEntries.id, id)).run()
    }
    change('tarn-2', '"iecBass":false', '"iecBass":true')
    expect(getSheet(at(), code).changed.data).toBe(false)
    change('sedge-1', '"iecBass":false', '"iecBass":true')
    expect(getSheet(at(), code).changed).toMatchObject({ data: true, canComputeAnew: true })
  })

  test('a preamp that is no longer listed leaves the sheet readable', () => {
    const { code } = saveSheet(at(), { answers: FINCH })
    db.delete(catalogueEntries).where(eq(catalogueEntries.id, 'sedge-1')).run()
    const sheet = getSheet(at(), code)
    expect(sheet.result.match.verdict).toBe('suits')
    expect(sheet.changed).toMatchObject({ data: true, canComputeAnew: false })
    expect(faultOf(() => computeAnew(at(), { code })).code).toBe('bad_input')
  })

  test('the number that was found makes the next revision, and the question is settled', () => {
    const { code } = saveSheet(at(), { answers: COIL })
    expect(getSheet(at(), code).result.match).toMatchObject({ verdict: 'cannot-say', next: { unknown: 'output' } })
    const found = { code, unknown: 'output' as const, value: '0.4', velocity: '5' as const, meaning: 'peak-lateral' as const }
    expect(answerNumber(at(), found).letter).toBe('B')
    expect(answerNumber(at(), found).letter).toBe('B')
    const sheet = getSheet(at(), code)
    expect(sheet.answers).toMatchObject({ output: '0.4', outputHow: 'one', velocity: '5' })
    expect(sheet.result.match.verdict).not.toBe('cannot-say')
  })

  test('a number that cannot be read is refused and adds nothing', () => {
    const { code } = saveSheet(at(), { answers: COIL })
    expect(faultOf(() => answerNumber(at(), { code, unknown: 'output', value: 'quite a lot' })).fields).toHaveProperty('output')
    expect(getSheet(at(), code).revisions).toHaveLength(1)
  })

  test('what was moved is where the next revision starts from, so nothing is left to move', () => {
    const answers = { ...COIL, output: '0.4', velocity: '5', meaning: 'peak-lateral', coil: '12' }
    const { code } = saveSheet(at(), { answers })
    expect(getSheet(at(), code).result.match.moves?.length).toBeGreaterThan(0)
    expect(markMoved(at(), { code }).letter).toBe('B')
    expect(getSheet(at(), code).result.match).toMatchObject({ moves: [], verdict: 'suits' })
    expect(getSheet(at(), code, 'A').result.match.verdict).toBe('suits-with-changes')
  })

  test('after Z a sheet is full', () => {
    const { code } = saveSheet(at(), { answers: FINCH })
    db.update(revisions).set({ letter: 'Z', rulesVersion: 0 }).run()
    expect(faultOf(() => computeAnew(at(), { code })).code).toBe('conflict')
  })
})
