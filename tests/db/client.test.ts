import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, expect, test } from 'vitest'
import { openDatabase } from '@/db/client'
import { migrateDatabase } from '@/db/migrate'
import { meta } from '@/db/schema/meta'
import { world } from '../support/world'

let folder: string
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'setdown-test-'))
})
afterEach(() => rmSync(folder, { recursive: true, force: true }))

test('a database on disk is opened with every pragma it needs', () => {
  const db = openDatabase(join(folder, 'setdown.db'))
  const pragma = (name: string) => db.$client.pragma(name, { simple: true })
  expect(pragma('journal_mode')).toBe('wal')
  expect(pragma('foreign_keys')).toBe(1)
  expect(pragma('busy_timeout')).toBe(5000)
  // 1 is NORMAL: https://sqlite.org/pragma.html#pragma_synchronous
  expect(pragma('synchronous')).toBe(1)
  db.$client.close()
})

test('migrating twice leaves the tables and what is in them alone', () => {
  const file = join(folder, 'setdown.db')
  const db = openDatabase(file)
  const tables = () => db.$client.prepare("select name, sql from sqlite_master where type = 'table' order by name").all()
  migrateDatabase(db)
  const first = tables()
  db.insert(meta).values({ key: 'kept', value: 'yes', updatedAt: 1 }).run()
  migrateDatabase(db)
  expect(tables()).toEqual(first)
  db.$client.close()

  const again = openDatabase(file)
  migrateDatabase(again)
  expect(again.select().from(meta).all()).toEqual([{ key: 'kept', value: 'yes', updatedAt: 1 }])
  again.$client.close()
})

test('a transaction that fails leaves nothing behind', () => {
  const { db } = world()
  expect(() =>
    db.transaction((tx) => {
      tx.insert(meta).values({ key: 'half', value: 'done', updatedAt: 1 }).run()
      throw new Error('stopped half-way')
    }),
  ).toThrow('stopped half-way')
  expect(db.select().from(meta).all()).toEqual([])
})

test('two worlds share nothing', () => {
  const [one, two] = [world(), world()]
  one.db.insert(meta).values({ key: 'mine', value: 'yes', updatedAt: 1 }).run()
  expect(two.db.select().from(meta).all()).toEqual([])
})
