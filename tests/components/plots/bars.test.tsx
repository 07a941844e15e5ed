// @vitest-environment jsdom
import { expect, test } from 'vitest'
import { DoubtBar, shareText } from '@/components/plots/doubt-bar'
import { RangeBar } from '@/components/plots/range-bar'
import { drawn } from './drawn'

test('a known value is a tick, a range the screen', () => {
  const known = drawn(<RangeBar min={0.1} max={10} low={5.4} high={5.4} unit="mV" />)
  expect(known.all('.c-mid')).toHaveLength(1)
  expect(known.label).toBe('5.4 mV, on a scale from 0.1 to 10 mV')
  const range = drawn(<RangeBar min={100} max={1000} low={400} high={550} unit="mH" />)
  expect(range.all('.c-mid')).toHaveLength(0)
  expect(range.all('.edge')).toHaveLength(1)
  expect(range.label).toBe('400 to 550 mH, on a scale from 100 to 1000 mH')
})

test('a value beyond the scale is held to its end', () => {
  const bar = drawn(<RangeBar min={10} max={100} low={1} high={9e9} unit="Ω" width={290} />)
  const screen = bar.all('svg > rect')[0]
  expect(Number(screen?.getAttribute('x'))).toBe(46)
  expect(Number(screen?.getAttribute('width'))).toBe(290 - 52 - 46)
})

test('shares are said in tenths and twentieths', () => {
  expect([0, 0.05, 0.1, 0.54, 0.88, 0.99].map(shareText)).toEqual([
    'next to none', 'about 1 in 20', 'about 1 in 10', 'about 5 in 10', 'about 9 in 10', 'nearly all',
  ])
  expect(drawn(<DoubtBar share={0.88} />).label).toBe('About 9 in 10 of the doubt')
})
