import { beforeEach, expect, test, vi } from 'vitest'
import { POST } from '@/app/(site)/sheets/[code]/[act]/route'
import { revisions } from '@/db/schema/setups'
import { loadDemoCatalogue } from '@/lib/catalogue/load-demo'
import type { Context } from '@/lib/kernel/context'
import { getSheet } from '@/lib/setups/queries'
import { saveSheet } from '@/lib/setups/save-sheet'
import { numberTrouble, troubleSentence } from '@/lib/setups/sentences/troubles'
import { SHEET_TROUBLES } from '@/lib/setups/terms-sheet'
import { world } from '../support/world'

let context: Context
let address: string
vi.mock('@/lib/server/request-context', () => ({ requestContext: () => Promise.resolve(context) }))
vi.mock('@/lib/server/env', () => ({ env: () => ({ appSecret: 'a secret of the tests alone, 32 long' }) }))
vi.mock('next/headers', () => ({ headers: () => Promise.resolve(new Headers({ 'x-forwarded-for': address })) }))
beforeEach(() => {
  context = world().at()
  address = '192.0.2.1'
  loadDemoCatalogue(context)
})

const OPEN = { preamp: 'merrin-5', type: 'moving-coil', name: 'Brightwater No. 3', present: 'delivered', next: 'line' }

async function press(code: string, act: string, fields: Record<string, string> = {}) {
  const request = new Request(`http://localhost/sheets/${code}/${act}`, { method: 'POST', body: new URLSearchParams(fields) })
  const answer = await POST(request, { params: Promise.resolve({ code, act }) })
  const location = answer.headers.get('location') ?? ''
  return { status: answer.status, path: location.split('?')[0], query: Object.fromEntries(new URLSearchParams(location.split('?')[1])) }
}

test('a number that was found leads to the sheet with its next revision', async () => {
  const { code } = saveSheet(context, { answers: OPEN })
  const found = { unknown: 'output', value: '0,4', velocity: '5', meaning: 'peak-lateral' }
  expect(await press(code, 'number', found)).toEqual({ status: 303, path: `/sheets/${code}`, query: {} })
  expect(getSheet(context, code)).toMatchObject({ letter: 'B', answers: { output: '0,4' } })
})

test('a number that cannot be read comes back with what stood there', async () => {
  const { code } = saveSheet(context, { answers: OPEN })
  const back = await press(code, 'number', { unknown: 'output', value: '0.4 V', velocity: '5', meaning: 'not-said' })
  expect(back).toEqual({ status: 303, path: `/sheets/${code}`, query: { trouble: 'number', value: '0.4 V', velocity: '5', meaning: 'not-said' } })
  expect(numberTrouble('output', '0.4 V', OPEN)).toMatch(/mV/)
  expect(numberTrouble('output', '', OPEN)).toBe('Type the output as it stands there, such as 0.4.')
  expect(getSheet(context, code).revisions).toHaveLength(1)
})

test('moves that are made, a new code, and nothing by any other name', async () => {
  const { code } = saveSheet(context, { answers: OPEN })
  expect((await press(code, 'moved')).path).toBe(`/sheets/${code}`)
  expect(getSheet(context, code).letter).toBe('B')
  const fresh = (await press(code, 'new-code')).path
  expect(fresh).toMatch(/^\/sheets\/[2-9b-z-]{19}$/)
  expect(fresh).not.toBe(`/sheets/${code}`)
  expect((await press(code, 'anew')).query).toEqual({ trouble: 'refused' })
  expect((await press(code, 'delete')).status).toBe(404)
})

test('a full sheet says so', async () => {
  const { code } = saveSheet(context, { answers: OPEN })
  context.db.update(revisions).set({ letter: 'Z', rulesVersion: 0 }).run()
  expect((await press(code, 'anew')).query).toEqual({ trouble: 'full' })
})

test('who presses too often is told to wait, and what was typed is kept', async () => {
  const { code } = saveSheet(context, { answers: OPEN })
  for (let k = 0; k < 60; k++) await press('nothing', 'anew')
  expect((await press(code, 'number', { unknown: 'output', value: '0.4' })).query).toEqual({ trouble: 'wait', value: '0.4' })
})

test('every trouble but a number has its sentence', () => {
  for (const trouble of SHEET_TROUBLES) {
    if (trouble !== 'number') expect(troubleSentence(trouble)).toMatch(/^[A-Z].*\.$/)
  }
})
