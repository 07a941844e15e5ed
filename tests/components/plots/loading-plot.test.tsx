// @vitest-environment jsdom
import { expect, test } from 'vitest'
import { LoadingPlot } from '@/components/plots/loading-plot'
import { LoadingTable } from '@/components/plots/loading-table'
import { drawn, logSpaced } from './drawn'

// Invented curves: a bump at 12 kHz, and the same bump 1 dB lower and higher.
const hertz = [...logSpaced(100, 40_000, 80), 200, 500, 1000, 2000, 5000, 10_000, 20_000].sort((a, b) => a - b)
const nominal = hertz.map((f) => 2 * Math.exp(-((Math.log(f / 12_000) / 0.5) ** 2)))
const low = nominal.map((value) => value - 1)
const high = nominal.map((value) => value + 1)

test('a range is drawn as a screen with its edges and a middle line, and said at worst and in the middle', () => {
  const plot = drawn(<LoadingPlot hertz={hertz} low={low} nominal={nominal} high={high} label="as set" width={928} />)
  expect(plot.points('.c-mid')).toHaveLength(hertz.length)
  expect(plot.all('.edge')).toHaveLength(2)
  expect(plot.label).toBe(
    'Treble, relative to 1 kHz. Below 20 kHz it rises at worst by 3.0 dB at 12 kHz, in the middle by 2.0 dB. At 20 kHz it stands between −0.3 and +1.7 dB.',
  )
  expect(plot.words).toContain('as set')
})

test('what is known is a line only', () => {
  const plot = drawn(<LoadingPlot hertz={hertz} low={null} nominal={nominal} high={null} width={928} />)
  expect(plot.points('.c-mid')).toHaveLength(hertz.length)
  expect(plot.all('.edge')).toHaveLength(0)
  expect(plot.label).toContain('it rises by 2.0 dB at 12 kHz')
})

test('a guess about the type itself has no middle line', () => {
  const plot = drawn(<LoadingPlot hertz={hertz} low={low} nominal={null} high={high} width={928} />)
  expect(plot.all('.c-mid')).toHaveLength(0)
  expect(plot.all('.edge')).toHaveLength(2)
  expect(plot.label).toContain('up to 3.0 dB')
})

test('something to compare with is dashed and named', () => {
  const compare = { label: 'as you have it now', decibels: high }
  const plot = drawn(<LoadingPlot hertz={hertz} low={null} nominal={nominal} high={null} compare={compare} width={928} />)
  expect(plot.points('.c-ref')).toHaveLength(hertz.length)
  expect(plot.words).toContain('as you have it now')
})

test('0 dB stands in the middle of the frame, and 20 kHz between 10 and 40 on a logarithmic axis', () => {
  // Frame at 928 wide and 340 high: x 42 to 927, y 26 to 296, 100 Hz to 40 kHz.
  const plot = drawn(<LoadingPlot hertz={[100, 20_000, 40_000]} low={null} nominal={[0, 0, 0]} high={null} width={928} />)
  const across = 42 + (885 * Math.log(200)) / Math.log(400)
  expect(plot.points('.c-mid')).toEqual([[42, 161], [Math.round(across * 10) / 10, 161], [927, 161]])
})

test('under 480 px it starts at 200 Hz with fewer figures, at the same size of text', () => {
  const plot = drawn(<LoadingPlot hertz={hertz} low={low} nominal={nominal} high={high} width={354} />)
  expect(plot.words.filter((word) => /^\d+k?$/.test(word) && word !== '0')).toEqual(['200', '1k', '5k', '20k'])
  expect(plot.all('svg')[0]?.getAttribute('viewBox')).toBe('0 0 354 260')
  expect(plot.all('svg')[0]?.getAttribute('width')).toBe('354')
})

test('the screen is coarser on paper', () => {
  const onPaper = drawn(<LoadingPlot hertz={hertz} low={low} nominal={nominal} high={high} width={590} print />)
  expect(onPaper.all('pattern')[0]?.getAttribute('width')).toBe('6.4')
  expect(onPaper.all('pattern')[1]?.getAttribute('width')).toBe('7')
})

test('the table has a row for each frequency under the axis, with the numbers of the curves', () => {
  const table = drawn(<LoadingTable hertz={hertz} low={low} nominal={nominal} high={high} />)
  expect(table.rows.map(([f]) => f)).toEqual(
    ['100 Hz', '200 Hz', '500 Hz', '1 kHz', '2 kHz', '5 kHz', '10 kHz', '20 kHz', '40 kHz'],
  )
  // At 10 kHz the invented bump is 2·exp(−(ln(10/12)/0.5)²) = 1.75 dB.
  expect(table.rows[6]).toEqual(['10 kHz', '+0.8', '+1.8', '+2.8'])
})
