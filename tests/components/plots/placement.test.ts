import fc from 'fast-check'
import { expect, test } from 'vitest'
import { plotFrame } from '@/components/plots/geometry'
import { bestPlace, ledText, overlap, placeText } from '@/components/plots/placement'
import { textWidth, wrapText } from '@/components/plots/text-width'

const frame = plotFrame(400, 200, { left: 0, right: 0, top: 0, bottom: 0 })

test('the first free place is taken', () => {
  const [left, right] = [placeText('loud records', 20, 50), placeText('loud records', 200, 50)]
  expect(bestPlace([left, right], { frame, taken: [] })).toBe(left)
  expect(bestPlace([left, right], { frame, taken: [left.box] })).toBe(right)
})

test('a place outside the frame or on a curve is left for one that is free', () => {
  const [outside, onCurve, free] = [placeText('filter on', 390, 50), placeText('filter on', 20, 50), placeText('filter on', 20, 150)]
  const curve = [[0, 46], [400, 46]] as const
  expect(bestPlace([outside, onCurve, free], { frame, taken: [], curves: [curve] })).toBe(free)
})

test('a leader ends where the words begin', () => {
  const right = ledText('loud records', [100, 100], [20, -26])
  expect(right.leader).toBe('M100.0 100.0l20 -26h6')
  expect(right.box.x).toBe(131)
  const left = ledText('loud records', [100, 100], [-20, -26])
  expect(left.box.x + left.box.width).toBeCloseTo(69)
})

test('overlap is symmetric, and nothing for boxes that only touch', () => {
  const box = fc.record({ x: fc.integer(), y: fc.integer(), width: fc.nat(), height: fc.nat() })
  fc.assert(fc.property(box, box, (a, b) => void expect(overlap(a, b)).toBe(overlap(b, a))))
  expect(overlap({ x: 0, y: 0, width: 10, height: 10 }, { x: 10, y: 0, width: 5, height: 10 })).toBe(0)
})

test('wrapped lines hold every word in order and keep to the width where a word allows it', () => {
  const words = fc.array(fc.stringMatching(/^[a-z]{1,9}$/), { maxLength: 12 })
  fc.assert(
    fc.property(words, fc.integer({ min: 70, max: 300 }), (list, width) => {
      const lines = wrapText(list.join(' '), width)
      expect(lines.join(' ')).toBe(list.join(' '))
      for (const line of lines) expect(textWidth(line) <= width || !line.includes(' ')).toBe(true)
    }),
  )
})
