import type { AnswersInput } from '@/lib/setups/schema'
import type { AddUnitInput } from '@/lib/shelf/schema'

/** The shelf of the demo's owner. Everything on it is invented. */

export interface DemoCartridge {
  /** Its entry in the demo catalogue; without one the answers say it all. */
  catalogueId?: string
  answers?: AnswersInput
  hours: string
  notes: string
}

/** A sheet: of which unit and cartridge, how many days ago, with what else was answered, and what followed. */
export interface DemoSheet {
  unit: keyof typeof DEMO_UNITS
  cartridge: keyof typeof DEMO_CARTRIDGES
  daysAgo: number
  answers?: AnswersInput
  name?: string
  /** Answers found later: each makes the next revision, a day after the one before. */
  later?: AnswersInput[]
  /** Its owner did what it asked for in the end. */
  moved?: boolean
}

interface DemoUnit extends Partial<AddUnitInput> {
  model: string
  /** How both sides stood when it was put on the shelf. */
  stood: string
}

export const DEMO_UNITS = {
  tarn: { model: 'tarn-2', serial: '19418', boughtOn: 'March 2021', boughtFrom: 'The maker', secondHand: 'no', stood: 'bank.10000010' },
  merrin: { model: 'merrin-5', serial: '2077', boughtOn: '2023', boughtFrom: 'A friend', secondHand: 'yes', stood: 'plugs.100_slide.64' },
} as const satisfies Record<string, DemoUnit>

export const DEMO_CARTRIDGES = {
  wren: { catalogueId: 'calloway-wren', hours: '12', notes: 'On the arm now.' },
  lark: { catalogueId: 'vireo-lark', hours: '380', notes: '' },
  third: { catalogueId: 'brightwater-no-3', hours: '', notes: 'In its box.' },
  mono: {
    answers: { name: 'Old mono one', type: 'moving-magnet', mono: 'yes', output: '7', velocity: '5', meaning: 'not-said' },
    hours: '',
    notes: 'No name on it.',
  },
} as const satisfies Record<string, DemoCartridge>

/** What every one of them plays into. */
export const DEMO_AMPLIFIER: AnswersInput = { next: 'line', nextMax: '3.4', nextLoad: '47k' }

export const DEMO_SHEETS: DemoSheet[] = [
  { unit: 'tarn', cartridge: 'mono', daysAgo: 200, name: 'Sunday records', later: [{ lead: '130' }] },
  { unit: 'tarn', cartridge: 'lark', daysAgo: 120 },
  { unit: 'merrin', cartridge: 'lark', daysAgo: 90 },
  { unit: 'merrin', cartridge: 'third', daysAgo: 40 },
  { unit: 'merrin', cartridge: 'wren', daysAgo: 9 },
  { unit: 'tarn', cartridge: 'wren', daysAgo: 8, later: [{ lead: '140' }], moved: true },
]
