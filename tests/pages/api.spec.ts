import { expect, test } from '@playwright/test'
import { anyAddress, CHECKS, makeSheet } from '../support/sheets'

test('answers in, verdict out, over the wire', async ({ request }) => {
  const response = await request.post('/api/check', { data: { answers: CHECKS.changes }, headers: { 'x-forwarded-for': anyAddress() } })
  expect(response.status()).toBe(200)
  expect(response.headers()['cache-control']).toBe('no-store')
  expect(await response.json()).toMatchObject({ sheet: null, verdict: 'suits-with-changes', title: 'It suits, once you move two switches.' })
})

test('a saved sheet reads the same under its code, and not under its number', async ({ request }) => {
  const { code, number } = await makeSheet(request, CHECKS.limit)
  const headers = { 'x-forwarded-for': anyAddress() }
  const read = await request.get(`/api/sheets/${code}`, { headers })
  expect(read.status()).toBe(200)
  expect(read.headers()['referrer-policy']).toBe('no-referrer')
  expect((await read.json()).sheet).toMatchObject({ number, code, revision: 'A' })
  expect((await request.get(`/api/sheets/${number}`, { headers })).status()).toBe(404)
})

test('a body over 32 KB is refused', async ({ request }) => {
  const answers = { ...CHECKS.limit, name: 'a'.repeat(40 * 1024) }
  const response = await request.post('/api/check', { data: { answers }, headers: { 'x-forwarded-for': anyAddress() } })
  expect(response.status()).toBe(413)
})

test('one address asks so often in a minute, and is told when to ask again', async ({ request }) => {
  const headers = { 'x-forwarded-for': anyAddress() }
  const statuses: number[] = []
  for (let k = 0; k < 61; k++) statuses.push((await request.get('/api/sheets/1001', { headers })).status())
  expect(statuses.at(-1)).toBe(429)
  const refused = await request.get('/api/sheets/1001', { headers })
  expect(Number(refused.headers()['retry-after'])).toBeGreaterThan(0)
})
