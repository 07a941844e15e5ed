// @vitest-environment jsdom
import { expect, test } from 'vitest'
import { NoiseLine } from '@/components/plots/noise-line'
import { NoiseTable } from '@/components/plots/noise-table'
import { drawn } from './drawn'

const exactly = (value: number) => ({ low: value, nominal: value, high: value })

test('the gap to the groove is an arrow with its figure', () => {
  const plot = drawn(<NoiseLine groove={58} yours={exactly(79.6)} coil={82} width={928} />)
  expect(plot.words).toContain('22 dB')
  expect(plot.all('.tagt')).toHaveLength(0)
  expect(plot.all('.edge')).toHaveLength(0)
  expect(plot.label).toBe(
    'Noise of preamp and cartridge. It lies 80 dB under usual music, and 21.6 dB under the noise of the groove.',
  )
})

test('a range is solid at worst and screened up to its best', () => {
  const plot = drawn(<NoiseLine groove={58} yours={{ low: 57.3, nominal: 59, high: 60.4 }} coil={81} width={928} />)
  expect(plot.all('.edge')).toHaveLength(1)
  expect(plot.words).toContain('yours, at worst')
  expect(plot.all('.mgt')[0]?.textContent).toBe('louder by 0.7 dB')
  expect(plot.label).toContain('At worst it lies 57 dB under usual music, and louder than the groove by 0.7 dB.')
})

test.each([
  ['all in one place', 58, 58, 58.2],
  ['close together', 58, 62, 64.5],
  ['louder than the axis', 58, 28, 60],
  ['quieter than the axis', 58, 97, 104],
])('names keep apart and on the drawing: %s', (_case, groove, yours, coil) => {
  for (const width of [284, 354, 500, 928]) {
    const plot = drawn(<NoiseLine groove={groove} yours={exactly(yours)} coil={coil} width={width} />)
    const places = plot.all('.halo').map((text) => `${text.getAttribute('x')} ${text.getAttribute('y')} ${text.getAttribute('text-anchor')}`)
    expect(new Set(places).size).toBe(3)
    for (const tag of plot.all('.tagt, .tag')) {
      expect(Number(tag.getAttribute('x'))).toBeGreaterThan(0)
      expect(Number(tag.getAttribute('x')) + Number(tag.getAttribute('width'))).toBeLessThan(width)
    }
  }
})

test('the table says each of them, and the gap', () => {
  const table = drawn(<NoiseTable groove={58} yours={{ low: 77.6, nominal: 79, high: 80.6 }} coil={82.7} />)
  expect(table.rows).toEqual([
    ['the groove', '58.0 dB'],
    ['your preamp and cartridge, at worst', '77.6 dB'],
    ['your preamp and cartridge, middle', '79.0 dB'],
    ['your preamp and cartridge, at best', '80.6 dB'],
    ['the coil alone', '82.7 dB'],
    ['yours, under the groove by', '19.6 dB'],
  ])
})
