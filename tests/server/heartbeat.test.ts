import { expect, test } from 'vitest'
import { meta } from '@/db/schema/meta'
import { beat } from '@/lib/server/heartbeat'
import { NOW, world } from '../support/world'

test('a beat leaves the present time in the one row', () => {
  const { db, at } = world()
  beat(at())
  beat(at(NOW + 1000))
  expect(db.select().from(meta).all()).toEqual([{ key: 'heartbeat', value: String(NOW + 1000), updatedAt: NOW + 1000 }])
})

test('a database that takes no write fails the beat', () => {
  const { db, at } = world()
  db.$client.pragma('query_only = ON')
  expect(() => beat(at())).toThrow(/readonly/)
})
