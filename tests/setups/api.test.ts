import { beforeEach, describe, expect, test, vi } from 'vitest'
import { GET as describeCheck, POST } from '@/app/api/check/route'
import { GET } from '@/app/api/sheets/[code]/route'
import { sheets } from '@/db/schema/setups'
import { loadDemoCatalogue } from '@/lib/catalogue/load-demo'
import type { Context } from '@/lib/kernel/context'
import { world } from '../support/world'

let context: Context
vi.mock('@/lib/server/request-context', () => ({ requestContext: () => context }))
vi.mock('@/lib/server/env', () => ({ env: () => ({ appSecret: 'a secret of the tests alone, 32 long' }) }))
beforeEach(() => {
  context = world().at()
  loadDemoCatalogue(context)
})

const ANSWERS = {
  preamp: 'sedge-1',
  type: 'moving-magnet',
  name: 'Calloway Finch',
  output: '4.5',
  velocity: '5',
  meaning: 'peak-lateral',
  coil: '700',
  load: '47k',
  capacitance: '150-400',
  next: 'line',
}

async function check(body: unknown, headers: Record<string, string> = {}) {
  const text = typeof body === 'string' ? body : JSON.stringify(body)
  const answer = await POST(new Request('http://localhost/api/check', { method: 'POST', body: text, headers }))
  return { status: answer.status, headers: answer.headers, body: await answer.json() }
}

async function open(code: string, query = '', headers: Record<string, string> = {}) {
  const answer = await GET(new Request(`http://localhost/api/sheets/${code}${query}`, { headers }), { params: Promise.resolve({ code }) })
  return { status: answer.status, headers: answer.headers, body: await answer.json() }
}

describe('checking', () => {
  test('answers come back with verdict, sentences, figures and what they rest on; nothing is kept', async () => {
    const { status, headers, body } = await check({ answers: ANSWERS })
    expect(status).toBe(200)
    expect(headers.get('cache-control')).toBe('no-store')
    expect(body).toMatchObject({ sheet: null, verdict: 'suits', title: 'It suits. There is nothing to set.', answers: ANSWERS, moves: [] })
    expect(body.chosen.figures.worstMarginDecibels).toMatchObject({ low: expect.any(Number), nominal: expect.any(Number), high: expect.any(Number) })
    for (const finding of body.chosen.findings) expect(finding.sentence).toMatch(/^[A-Z].*\.$/)
    expect(body.curves.loading.hertz.length).toBe(body.curves.loading.nominal.length)
    expect(context.db.select().from(sheets).all()).toEqual([])
  })

  test('numbers are taken as well as texts', async () => {
    expect((await check({ answers: { ...ANSWERS, output: 4.5 } })).body.chosen).toEqual((await check({ answers: ANSWERS })).body.chosen)
  })

  test('with save it is kept, and the sheet reads the same', async () => {
    const saved = await check({ answers: ANSWERS, save: true })
    expect(saved.body.sheet).toMatchObject({ number: 1001, revision: 'A', revisions: ['A'] })
    const { code, path } = saved.body.sheet
    expect(path).toBe(`/sheets/${code}`)
    const read = await open(code)
    expect(read.status).toBe(200)
    expect(read.headers.get('cache-control')).toBe('no-store')
    expect(read.body.sheet).toEqual(saved.body.sheet)
    expect(Object.keys(read.body)).toEqual(Object.keys(saved.body))
    expect(read.body.title).toBe(saved.body.title)
    // The answers of a sheet can be sent back as they are.
    expect((await check({ answers: read.body.answers })).body.verdict).toBe(read.body.verdict)
  })

  test('a retry with the same key makes one sheet', async () => {
    const one = await check({ answers: ANSWERS, save: true, key: 'a-key-of-the-caller' })
    const two = await check({ answers: ANSWERS, save: true, key: 'a-key-of-the-caller' })
    expect(two.body.sheet).toEqual(one.body.sheet)
  })

  test('a cartridge of another kind gets its answer without figures', async () => {
    const { status, body } = await check({ answers: { preamp: 'sedge-1', type: 'other', other: 'ceramic' } })
    expect(status).toBe(200)
    expect(body).toMatchObject({ gate: { reason: 'not-magnetic', type: 'ceramic' }, chosen: null, curves: null })
  })

  test('what is wrong is said by the name of the answer', async () => {
    const { status, headers, body } = await check({ answers: { ...ANSWERS, output: '4.5 V', coil: 'plenty' } })
    expect(status).toBe(422)
    expect(headers.get('cache-control')).toBe('no-store')
    expect(body.error.code).toBe('bad_input')
    expect(Object.keys(body.error.fields).sort()).toEqual(['coil', 'output'])
    expect((await check({ answers: { ...ANSWERS, coil: ['700'] } })).body.error.fields).toHaveProperty('coil')
    expect((await check({ answers: ANSWERS, save: 'yes' })).body.error.fields).toEqual({ save: 'save is true or false.' })
    expect((await check({ answers: { type: 'moving-magnet' } })).body.error.fields).toHaveProperty('preamp')
    expect((await check([])).status).toBe(422)
    expect((await check('{"answers":')).status).toBe(422)
    expect((await check('')).status).toBe(422)
  })

  test('a body over 32 KB is refused, with and without its length said', async () => {
    const large = JSON.stringify({ answers: { ...ANSWERS, name: 'a'.repeat(33 * 1024) } })
    expect((await check(large)).status).toBe(413)
    const stream = new ReadableStream({
      start(controller) {
        for (let k = 0; k < 40; k++) controller.enqueue(new TextEncoder().encode('a'.repeat(1024)))
        controller.close()
      },
    })
    const request = new Request('http://localhost/api/check', { method: 'POST', body: stream, duplex: 'half' } as RequestInit)
    const answer = await POST(request)
    expect(answer.status).toBe(413)
    expect((await answer.json()).error.code).toBe('too_large')
  })

  test('what a check takes is described, one answer at a time', async () => {
    const answer = await describeCheck(new Request('http://localhost/api/check'))
    const schema = await answer.json()
    expect(schema.properties.answers.properties.output.description).toBe('Output, in mV where no unit is written.')
    expect(schema.properties.answers.properties.outputHow.examples).toEqual(['one', 'between', 'above', 'unknown'])
    expect(schema.properties.answers.required).toEqual(['preamp'])
  })
})

describe('opening', () => {
  test.each(['1001', 'k7m2-w9qd-h4tx-p3rt', 'nothing', '%00'])('"%s" opens nothing', async (code) => {
    await check({ answers: ANSWERS, save: true })
    const { status, headers, body } = await open(code)
    expect(status).toBe(404)
    expect(headers.get('cache-control')).toBe('no-store')
    expect(body.error.code).toBe('not_found')
  })

  test('an earlier revision is named by its letter', async () => {
    const { code } = (await check({ answers: ANSWERS, save: true })).body.sheet
    expect((await open(code, '?revision=A')).body.sheet.revision).toBe('A')
    expect((await open(code, '?revision=B')).status).toBe(404)
  })
})

describe('how often', () => {
  test('one address is stopped, told when to ask again, and others go on', async () => {
    const from = (address: string) => ({ 'x-forwarded-for': address })
    for (let k = 0; k < 60; k++) expect((await open('1001', '', from('192.0.2.1'))).status).toBe(404)
    const stopped = await open('1001', '', from('192.0.2.1'))
    expect(stopped.status).toBe(429)
    const seconds = Number(stopped.headers.get('retry-after'))
    expect(seconds).toBeGreaterThan(0)
    expect(seconds).toBeLessThanOrEqual(60)
    expect(stopped.body.error.code).toBe('too_many')
    expect((await check({ answers: ANSWERS }, from('192.0.2.1'))).status).toBe(429)
    expect((await open('1001', '', from('198.51.100.7'))).status).toBe(404)
  })

  test('the count is kept in the database, without the address itself', async () => {
    await open('1001', '', { 'x-forwarded-for': '203.0.113.9, 192.0.2.44' })
    const rows = context.db.$client.prepare('select key, points from rate_limits order by key').all() as { key: string; points: number }[]
    expect(rows.map(({ points }) => points)).toEqual([1, 1])
    expect(rows.some(({ key }) => key.includes('192.0.2') || key.includes('203.0'))).toBe(false)
  })
})
