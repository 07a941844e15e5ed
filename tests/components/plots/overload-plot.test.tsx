// @vitest-environment jsdom
import { expect, test } from 'vitest'
import { OverloadPlot } from '@/components/plots/overload-plot'
import { OverloadTable } from '@/components/plots/overload-table'
import { drawn, logSpaced } from './drawn'

const hertz = logSpaced(20, 20_000, 31)

/** Invented room with its least at 1.2 kHz. */
function room(least: number) {
  const nominal = hertz.map((f) => least + 1 + 6 * Math.abs(Math.log10(f / 1200)))
  const shifted = (by: number) => nominal.map((value) => value + by)
  return {
    hertz,
    loud: { low: shifted(-1), nominal, high: shifted(2) },
    extreme: { low: shifted(-3.4) },
    worst: { decibels: least, hertz: 1200 },
  }
}

test('the least room is reversed out with its frequency, and said', () => {
  const plot = drawn(<OverloadPlot {...room(10.4)} width={928} />)
  expect(plot.all('.mgt').map((text) => text.textContent)).toEqual(['10.4 dB at 1.2 kHz'])
  expect(plot.label).toBe('Room above loud records, 20 Hz to 20 kHz. At worst 10.4 dB at 1.2 kHz is left.')
  expect(plot.points('.c-mid')).toHaveLength(hertz.length)
  expect(plot.points('.c-ref')).toHaveLength(hertz.length)
  expect(plot.all('.edge')).toHaveLength(2)
})

test('under 0 it is over by so much, never a negative number', () => {
  const plot = drawn(<OverloadPlot {...room(-0.9)} width={928} />)
  expect(plot.all('.mgt')[0]?.textContent).toBe('over by 0.9 dB at 1.2 kHz')
  expect(plot.label).toContain('At worst they go over by 0.9 dB at 1.2 kHz.')
})

test('room that rounds to nothing is not over', () => {
  expect(drawn(<OverloadPlot {...room(-0.04)} width={928} />).all('.mgt')[0]?.textContent).toBe('0.0 dB at 1.2 kHz')
})

test.each([[-30], [-3], [4], [55]])('with least room of %d dB the curve and the line at 0 are both in the frame', (least) => {
  const plot = drawn(<OverloadPlot {...room(least)} width={928} />)
  const zero = Number(/^M42 (-?[\d.]+)H/.exec(plot.all('.ceil')[0]?.getAttribute('d') ?? '')?.[1])
  const heights = [zero, ...plot.points('.c-mid').map(([, y]) => y).filter((_, i) => i > 10 && i < 24)]
  for (const y of heights) {
    expect(y).toBeGreaterThanOrEqual(26)
    expect(y).toBeLessThanOrEqual(274)
  }
})

test.each([[928], [590], [354], [284]])('at %d px the tag stays on the drawing, wherever the worst is', (width) => {
  for (const at of [20, 150, 1200, 9000, 20_000]) {
    const plot = drawn(<OverloadPlot {...room(2)} worst={{ decibels: 2, hertz: at }} width={width} />)
    const tag = plot.all('.tagt')[0]
    const left = Number(tag?.getAttribute('x'))
    expect(left).toBeGreaterThan(0)
    expect(left + Number(tag?.getAttribute('width'))).toBeLessThan(width)
  }
})

test('the table has a row for each frequency under the axis, as room', () => {
  const table = drawn(<OverloadTable {...room(-0.9)} hertz={[20, 1200, 20_000]} loud={{ low: [9, -0.9, 12], nominal: [10, 0.6, 13], high: [11, 2.1, 14] }} extreme={{ low: [8, -2, 10] }} />)
  expect(table.rows).toHaveLength(10)
  expect(table.rows[0]).toEqual(['20 Hz', '9.0 dB', '10.0 dB', '11.0 dB', '8.0 dB'])
  expect(table.rows[9]).toEqual(['20 kHz', '12.0 dB', '13.0 dB', '14.0 dB', '10.0 dB'])
  expect(table.rows[5]?.[1]).toBe('over by 0.5 dB') // 1 kHz, read off along the logarithmic axis: 9 − 9.9·ln 50/ln 60 = −0.46
})
