import { randomBytes } from 'node:crypto'
import { expect, type APIRequestContext } from '@playwright/test'
import type { AnswersInput } from '@/lib/setups/schema'

/** Answers whose sheets show each form that a sheet can take. Figures follow the invented demo. */
export const CHECKS = {
  /** Stands one gain step too high, with too much capacitance: two switches to move. */
  changes: {
    preamp: 'tarn-2',
    board: 'second',
    present: 'known',
    left: 'bank.10000010',
    right: 'bank.10000010',
    type: 'moving-magnet',
    name: 'Calloway Wren',
    output: '5.4',
    velocity: '5',
    meaning: 'peak-lateral',
    coil: '700',
    load: '47k',
    capacitance: '150-300',
    leadAs: 'metres',
    leadMetres: '1.2',
    armMass: '11',
    next: 'line',
    nextMax: '3.5',
    nextLoad: '47',
  },
  /** Nothing is known of how it stands. */
  endState: { preamp: 'tarn-2', board: 'second', type: 'moving-magnet', output: '5.4', velocity: '5', meaning: 'peak-lateral', next: 'line' },
  /** Left and right stand apart in seven switches. */
  unlike: {
    preamp: 'tarn-2',
    board: 'second',
    present: 'known',
    left: 'bank.10010110',
    right: 'bank.01001011',
    type: 'moving-magnet',
    name: 'Calloway Wren',
    output: '5.4',
    velocity: '5',
    meaning: 'peak-lateral',
    coil: '700',
    load: '47k',
    capacitance: '150-300',
    next: 'line',
  },
  /** Fixed, and too small a limit for the hottest records. */
  limit: {
    preamp: 'sedge-1',
    type: 'moving-magnet',
    name: 'Calloway Finch',
    output: '12',
    velocity: '5',
    coil: '700',
    load: '47k',
    capacitance: '150-300',
    lead: '100',
    next: 'line',
    nextMax: '12',
  },
  /** Nothing but the type: the output decides. */
  open: { preamp: 'merrin-5', present: 'delivered', type: 'moving-coil', name: 'Brightwater No. 3', next: 'line', nextMax: '3.4' },
  /** Too little gain. */
  no: { preamp: 'sedge-1', type: 'moving-coil', name: 'Dunlin', output: '0.3', velocity: '5', meaning: 'peak-lateral', coil: '10', next: 'line' },
  gate: { preamp: 'tarn-2', type: 'other', other: 'ceramic' },
  buttons: {
    preamp: 'ember-3',
    present: 'delivered',
    type: 'moving-coil',
    name: 'Dunlin',
    output: '0.4',
    velocity: '5',
    meaning: 'peak-lateral',
    coil: '12',
    next: 'line',
  },
} as const satisfies Record<string, AnswersInput>

export interface MadeSheet {
  number: number
  code: string
  path: string
  title: string
  verdict: string
}

/** An address that nobody has (RFC 3849), so that no other test's requests count with these. */
export const anyAddress = () => `2001:db8::${randomBytes(2).toString('hex')}:${randomBytes(2).toString('hex')}`

/** Makes a sheet as a program would. Each call comes from an address of its own: no limit is reached. */
export async function makeSheet(request: APIRequestContext, answers: AnswersInput): Promise<MadeSheet> {
  const response = await request.post('/api/check', { data: { answers, save: true }, headers: { 'x-forwarded-for': anyAddress() } })
  expect(response.status()).toBe(200)
  const { sheet, title, verdict } = await response.json()
  return { ...sheet, title, verdict }
}
