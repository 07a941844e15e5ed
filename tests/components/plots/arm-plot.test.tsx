// @vitest-environment jsdom
import { expect, test } from 'vitest'
import { ArmPlot } from '@/components/plots/arm-plot'
import { ArmTable } from '@/components/plots/arm-table'
import { drawn, logSpaced } from './drawn'

const hertz = logSpaced(2, 60, 50)
const at = (shift: number) => hertz.map((f) => shift - 40 * Math.max(0, Math.log10(9 / f)))
const arm = {
  hertz,
  low: at(-2),
  nominal: at(0),
  high: at(2),
  filtered: at(-12),
  resonance: { low: 7.8, nominal: 9.2, high: 11 },
}

test('with the filter on it is the solid line, and the arm alone is dashed', () => {
  const plot = drawn(<ArmPlot {...arm} filterOn width={928} />)
  expect(plot.points('.c-mid')).toHaveLength(hertz.length)
  expect(plot.points('.c-ref')).toHaveLength(hertz.length)
  expect(plot.words).toContain('with the rumble filter on')
  expect(plot.label).toBe(
    'Arm and rumble, 2 to 60 Hz. Arm and cartridge resonate at 7.8 to 11.0 Hz. Part of that is outside the good place, 8 to 12 Hz. The rumble filter is on.',
  )
})

test('without it the arm itself is solid', () => {
  const plot = drawn(<ArmPlot {...arm} filterOn={false} width={928} />)
  expect(plot.points('.c-mid')).toHaveLength(hertz.length)
  expect(plot.all('.c-ref')).toHaveLength(0)
  expect(plot.words).not.toContain('with the rumble filter on')
  expect(plot.label).not.toContain('filter')
})

test('the range of the resonance is reversed out; a point reads as one value', () => {
  expect(drawn(<ArmPlot {...arm} filterOn={false} width={928} />).all('.mgt')[0]?.textContent).toBe('7.8 to 11.0 Hz')
  const point = { low: 9.42, nominal: 9.42, high: 9.42 }
  const plot = drawn(<ArmPlot {...arm} resonance={point} filterOn={false} width={928} />)
  expect(plot.all('.mgt')[0]?.textContent).toBe('9.4 Hz')
  expect(plot.label).toContain('in the good place')
})

test.each([[928], [354], [284]])('at %d px the tag stays on the drawing, wherever the resonance is', (width) => {
  for (const nominal of [0.5, 2.4, 9, 30, 55, 900]) {
    const resonance = { low: nominal * 0.8, nominal, high: nominal * 1.2 }
    const tag = drawn(<ArmPlot {...arm} resonance={resonance} filterOn width={width} />).all('.tagt')[0]
    const left = Number(tag?.getAttribute('x'))
    expect(left).toBeGreaterThan(0)
    expect(left + Number(tag?.getAttribute('width'))).toBeLessThan(width)
  }
})

test('a resonance that is not known has no tag and is not said', () => {
  const plot = drawn(<ArmPlot {...arm} resonance={{ low: NaN, nominal: NaN, high: NaN }} filterOn={false} width={928} />)
  expect(plot.all('.tagt')).toHaveLength(0)
  expect(plot.label).toContain('The resonance is not known.')
})

test('the table has a row for each frequency under the axis', () => {
  const table = drawn(<ArmTable {...arm} filterOn />)
  expect(table.rows.map(([f]) => f)).toEqual(['2 Hz', '3 Hz', '5 Hz', '8 Hz', '10 Hz', '12 Hz', '20 Hz', '30 Hz', '50 Hz'])
  // At 2 Hz: 40·log10(9/2) = 26.1 dB down; above 9 Hz nothing is lost.
  expect(table.rows[0]).toEqual(['2 Hz', '−28.1', '−26.1', '−24.1', '−38.1'])
  expect(table.rows[6]).toEqual(['20 Hz', '−2.0', '0.0', '+2.0', '−12.0'])
})
