import { eq } from 'drizzle-orm'
import { describe, expect, test, vi } from 'vitest'
import type { Database } from '@/db/client'
import { people } from '@/db/schema/accounts'
import { UNTOUCHED } from '@/lib/forms/terms'
import { sealSession, sessionCookieName } from '@/lib/server/session-cookie'
import { doors, outcomeOf } from '../support/doors'
import { shelfWorlds, type ShelfWorld } from '../support/shelf'
import { NOW } from '../support/world'
import { CAST, ELSEWHERE, TABLE, WHO, type Fields, type Who } from './door-table'

/** The request that is being answered: whose cookie it carries, and the database it reaches. */
const request = vi.hoisted(() => ({ db: undefined as Database | undefined, cookie: undefined as { name: string; value: string } | undefined }))

vi.mock('@/lib/server/database', () => ({ database: () => request.db }))
vi.mock('@/lib/kernel/clock', () => ({ currentTime: () => NOW }))
vi.mock('next/headers', () => ({
  headers: async () => new Headers({ 'user-agent': 'A test', 'x-forwarded-for': '203.0.113.7' }),
  cookies: async () => ({
    get: (name: string) => (request.cookie?.name === name ? request.cookie : undefined),
    set: () => undefined,
    delete: () => undefined,
  }),
}))
vi.mock('next/cache', () => ({ refresh: () => undefined, revalidatePath: () => undefined }))
vi.mock('next/navigation', async () => {
  const { FoundNothing, WentTo } = await import('../support/doors')
  return {
    redirect: (path: string) => {
      throw new WentTo(path)
    },
    notFound: () => {
      throw new FoundNothing()
    },
  }
})

const here = shelfWorlds()
/** From now on requests carry someone's cookie. */
async function knockAs(who: Who, world: ShelfWorld) {
  request.cookie = undefined
  if (who === 'visitor') return
  const { actor } = world.as(CAST[who])
  const sessionId = actor.kind === 'person' ? actor.sessionId : ''
  request.cookie = { name: sessionCookieName(), value: await sealSession(sessionId, 3600) }
  if (who === 'Ann, closed') world.db.update(people).set({ disabledAt: NOW }).where(eq(people.id, world.person('ann').id)).run()
}

async function knock(door: string, fields: Fields, params: Record<string, string> = {}): Promise<unknown> {
  const [file, name] = door.split(/\.ts |, /)
  const found = (await import(/* @vite-ignore */ `../../${file}.ts`)) as Record<string, (...given: unknown[]) => unknown>
  const open = found[name]
  const form = new FormData()
  for (const [key, value] of Object.entries(fields)) form.set(key, value)
  if (!file.endsWith('/route')) return open.length === 1 ? open(form) : open(UNTOUCHED, form)
  const url = `http://localhost:3000/?${new URLSearchParams(fields)}`
  const body = name === 'GET' ? undefined : (fields.json ?? form)
  return open(new Request(url, { method: name, body }), { params: Promise.resolve({ ...fields, ...params }) })
}

test('the table speaks of every server action and every route handler', () => {
  const spokenOf = new Set([...Object.keys(TABLE), ...ELSEWHERE].map((door) => door.split(', ')[0]))
  expect([...spokenOf].sort()).toEqual(doors().sort())
})

describe.each(Object.entries(TABLE))('%s', (door, { send, outcomes, params }) => {
  test.each(WHO)('%s', { timeout: 60_000 }, async (who) => {
    const world = here()
    request.db = world.db
    for (const each of ['ann', 'bob', 'ruth', 'iris'] as const) world.person(each)
    const fields = await send(world)
    await knockAs(who, world)
    expect(await outcomeOf(() => knock(door, fields, params))).toBe(outcomes[who] ?? outcomes.others)
  })
})
