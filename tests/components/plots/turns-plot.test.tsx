// @vitest-environment jsdom
import { expect, test } from 'vitest'
import type { Turns, TurnStretch } from '@/components/plots/turns-facts'
import { joinedStretches } from '@/components/plots/turns-facts'
import { TurnsPlot } from '@/components/plots/turns-plot'
import { TurnsTable } from '@/components/plots/turns-table'
import { drawn } from './drawn'

const stretches: TurnStretch[] = [
  { from: 0.15, to: 0.35, verdict: 'suits', text: 'As it is set now' },
  { from: 0.35, to: 0.85, verdict: 'changes', text: 'Gain to 56 dB' },
  { from: 0.85, to: 1.7, verdict: 'limit', text: '56 dB; the loudest distort' },
  { from: 1.7, to: 4, verdict: 'no', text: 'Too strong' },
]
const output: Turns = { min: 0.15, max: 4, unit: 'mV', low: 0.2, high: 2.5, ticks: [0.15, 0.3, 0.5, 1, 2, 4], stretches }

test('each stretch has its verdict and what to do; a heavy line stands where the advice changes', () => {
  const plot = drawn(<TurnsPlot {...output} width={928} />)
  expect(plot.all('svg.vm')).toHaveLength(4)
  expect(plot.all('.ceil')).toHaveLength(3)
  expect(plot.words).toEqual(expect.arrayContaining(['Suits', 'With changes', 'With a limit', 'Does not suit', 'Gain to 56 dB', '4 mV']))
  expect(plot.label).toBe(
    'Where our advice changes. It is somewhere from 0.2 to 2.5 mV. under 0.35 mV: Suits, As it is set now. 0.35 to 0.85 mV: With changes, Gain to 56 dB. 0.85 to 1.7 mV: With a limit, 56 dB; the loudest distort. over 1.7 mV: Does not suit, Too strong.',
  )
})

test('it stands up on a phone, and wherever a stretch is too short for its words', () => {
  const phone = drawn(<TurnsPlot {...output} width={354} />)
  expect(phone.words).toContain('0.35 to 0.85 mV')
  const short = [
    { from: 0.15, to: 0.35, verdict: 'suits', text: '' },
    { from: 0.35, to: 0.37, verdict: 'changes', text: 'Gain to 56 dB' },
    { from: 0.37, to: 4, verdict: 'no', text: '' },
  ] satisfies TurnStretch[]
  expect(drawn(<TurnsPlot {...output} stretches={short} width={928} />).words).toContain('0.35 to 0.37 mV')
})

test('more than four stretches are joined, the shortest first, without a gap', () => {
  const many: TurnStretch[] = Array.from({ length: 9 }, (_, i) => ({
    from: 1 + i ** 2,
    to: 1 + (i + 1) ** 2,
    verdict: i % 2 ? 'suits' : 'no',
    text: `${i}`,
  }))
  const joined = joinedStretches({ ...output, min: 1, max: 82, stretches: many })
  expect(joined).toHaveLength(4)
  expect(joined[0]?.from).toBe(1)
  expect(joined.at(-1)?.to).toBe(82)
  joined.slice(1).forEach((stretch, i) => expect(stretch.from).toBe(joined[i]?.to))
})

test('neighbours that say the same are one stretch', () => {
  const [first] = stretches
  const same = [
    { ...first, from: 0.15, to: 0.3 },
    { ...first, from: 0.3, to: 4 },
  ] as TurnStretch[]
  expect(joinedStretches({ ...output, stretches: same })).toHaveLength(1)
})

test('the table has a row for each stretch', () => {
  expect(drawn(<TurnsTable {...output} />).rows).toEqual([
    ['under 0.35 mV', 'Suits', 'As it is set now'],
    ['0.35 to 0.85 mV', 'With changes', 'Gain to 56 dB'],
    ['0.85 to 1.7 mV', 'With a limit', '56 dB; the loudest distort'],
    ['over 1.7 mV', 'Does not suit', 'Too strong'],
  ])
})
