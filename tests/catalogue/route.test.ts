import { beforeEach, expect, test, vi } from 'vitest'
import { GET } from '@/app/api/catalogue/[kind]/route'
import { loadDemoCatalogue } from '@/lib/catalogue/load-demo'
import type { Context } from '@/lib/kernel/context'
import { world } from '../support/world'

let context: Context
vi.mock('@/lib/server/request-context', () => ({ requestContext: () => context }))
beforeEach(() => {
  context = world().at()
  loadDemoCatalogue(context)
})

const ask = async (kind: string, query = '') => {
  const answer = await GET(new Request(`http://localhost/api/catalogue/${kind}${query}`), { params: Promise.resolve({ kind }) })
  return { status: answer.status, cache: answer.headers.get('cache-control'), body: await answer.json() }
}

test.each(['cartridges', 'arms', 'step-ups', 'leads', 'inputs'])('%s are listed, eight at a time', async (kind) => {
  const { status, cache, body } = await ask(kind)
  expect(status).toBe(200)
  expect(cache).toBe('private, max-age=30')
  expect(body.entries).toHaveLength(8)
  expect(typeof body.next).toBe('string')
})

test('words, type, limit and cursor', async () => {
  const first = await ask('cartridges', '?q=brightwater&type=moving-coil&limit=2')
  expect(first.body.entries.map(({ name }: { name: string }) => name)).toEqual(['Brightwater No. 1', 'Brightwater No. 2'])
  const second = await ask('cartridges', `?q=brightwater&type=moving-coil&limit=2&cursor=${first.body.next}`)
  expect(second.body.entries.map(({ name }: { name: string }) => name)).toEqual(['Brightwater No. 3', 'Brightwater No. 7'])
})

test('what is wrong is said field by field', async () => {
  const { status, cache, body } = await ask('cartridges', '?limit=21&type=moving-target')
  expect(status).toBe(422)
  expect(cache).toBe('no-store')
  expect(body.error.code).toBe('bad_input')
  expect(Object.keys(body.error.fields).sort()).toEqual(['limit', 'type'])
  expect(body.error.fields.limit).toBe('Ask for 1 to 20 at a time.')
  expect((await ask('arms', '?type=long')).body.error.fields).toEqual({ type: 'This list has no types. Leave it out.' })
  expect((await ask('arms', '?limit=ten')).body.error.fields).toEqual({ limit: 'Ask for 1 to 20 at a time.' })
  expect((await ask('arms', '?cursor=zzz')).body.error.fields).toHaveProperty('cursor')
  expect((await ask('arms', `?q=${'a'.repeat(81)}`)).body.error.fields).toEqual({ q: 'Use 80 letters or fewer.' })
})

test.each(['preamps', 'people', '__proto__'])('there is no list of %s here', async (kind) => {
  expect((await ask(kind)).status).toBe(404)
})
