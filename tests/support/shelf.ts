import { copyFileSync, mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, afterEach, beforeEach } from 'vitest'
import { openDatabase, type Database } from '@/db/client'
import { migrateDatabase } from '@/db/migrate'
import { VISITOR } from '@/lib/access/actor'
import { loadDemoCatalogue } from '@/lib/catalogue/load-demo'
import { getCartridge } from '@/lib/catalogue/queries'
import { saveSheet, type SavedSheet, type SheetPlace } from '@/lib/setups/save-sheet'
import { answersFromCartridge } from '@/lib/setups/schema-picked'
import type { AnswersInput } from '@/lib/setups/schema'
import { addCartridge } from '@/lib/shelf/add-cartridge'
import { addUnit } from '@/lib/shelf/add-unit'
import { AddCartridgeInput, AddUnitInput } from '@/lib/shelf/schema'
import { NOW, world, type CastName, type World } from './world'

/** A fixed preamp: one combination, so a check is quick. */
export const FINCH: AnswersInput = {
  preamp: 'sedge-1',
  type: 'moving-magnet',
  name: 'Calloway Finch',
  output: '4.5 mV',
  velocity: '5',
  meaning: 'peak-lateral',
  coil: '700',
  next: 'line',
}
/** Something to move: the unit stands as it was delivered. */
export const COIL: AnswersInput = {
  preamp: 'merrin-5',
  type: 'moving-coil',
  name: 'Brightwater No. 3',
  present: 'delivered',
  output: '0.4',
  velocity: '5',
  meaning: 'peak-lateral',
  coil: '12',
  next: 'line',
}

export interface ShelfWorld extends World {
  /** Puts a preamp on someone's shelf; a Tarn 2 of the second board unless said. */
  unitOf: (who: CastName, given?: Partial<AddUnitInput>) => string
  /** Puts a cartridge of the catalogue on someone's shelf. */
  cartridgeOf: (who: CastName, catalogueId?: string) => string
  /** A sheet that someone made while signed in; a visitor's without a name. */
  sheetOf: (who: CastName | null, answers?: AnswersInput, place?: SheetPlace) => SavedSheet
}

/** For a file of tests: a database file of its own for each, with the demo's catalogue in it. */
export function shelfWorlds(): () => ShelfWorld {
  const folder = mkdtempSync(join(tmpdir(), 'setdown-shelf-'))
  const image = join(folder, 'image.db')
  const db = openDatabase(image)
  migrateDatabase(db)
  loadDemoCatalogue({ db, actor: VISITOR, now: NOW })
  // Everything into the one file that is copied.
  db.$client.pragma('wal_checkpoint(TRUNCATE)')
  db.$client.close()

  let open: Database | undefined
  let count = 0
  beforeEach(() => {
    const file = join(folder, `${++count}.db`)
    copyFileSync(image, file)
    open = openDatabase(file)
  })
  afterEach(() => open?.$client.close())
  afterAll(() => rmSync(folder, { recursive: true, force: true }))

  return () => {
    if (!open) throw new Error('The world of a test is there only within it.')
    const made = world(open)
    return {
      ...made,
      unitOf: (who, given = {}) => addUnit(made.as(who), AddUnitInput.parse({ model: 'tarn-2', serial: '19 418', ...given })).id,
      cartridgeOf: (who, catalogueId = 'calloway-finch') =>
        addCartridge(made.as(who), AddCartridgeInput.parse(answersFromCartridge(getCartridge(made.at(), catalogueId)))).id,
      sheetOf: (who, answers = FINCH, place) => saveSheet(who ? made.as(who) : made.at(), { answers, place }),
    }
  }
}
