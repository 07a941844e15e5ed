import fc from 'fast-check'
import { expect, test } from 'vitest'
import { blend } from '@/components/plots/use-tween'

test('numbers move, words and new shapes are there at once', () => {
  const from = { hertz: [20, 40], low: null, label: 'as it is', compare: { decibels: [0, 0] } }
  const to = { hertz: [20, 80], low: [1], label: 'after', compare: { decibels: [2, 2, 2] } }
  expect(blend<object>(from, to, 0.5)).toEqual({ hertz: [20, 60], low: [1], label: 'after', compare: { decibels: [2, 2, 2] } })
})

test('all the way is exactly the target, whatever it holds', () => {
  const value = fc.oneof(fc.integer(), fc.constantFrom(NaN, Infinity), fc.string(), fc.constant(null))
  const tree = fc.dictionary(fc.string(), fc.oneof(value, fc.array(value)))
  fc.assert(fc.property(tree, tree, (from, to) => void expect(blend(from, to, 1)).toBe(to)))
})
