import { expect, test } from 'vitest'
import { newId, randomLetters } from '@/lib/kernel/ids'

test('an id says its kind and is never the same twice', () => {
  const ids = Array.from({ length: 1000 }, () => newId('set'))
  expect(ids.every((id) => /^set_[2-9b-z]{22}$/.test(id))).toBe(true)
  expect(new Set(ids).size).toBe(1000)
})

test('no letter reads two ways, and none makes a word', () => {
  expect(randomLetters(5000)).not.toMatch(/[aeiou01l]/)
})

test('every letter comes about as often as any other', () => {
  const drawn = randomLetters(28_000)
  const counts = new Map<string, number>()
  for (const letter of drawn) counts.set(letter, (counts.get(letter) ?? 0) + 1)
  expect(counts.size).toBe(28)
  // 1000 expected of each, standard deviation 31 (binomial); seven of those is out of reach of chance.
  for (const count of counts.values()) expect(Math.abs(count - 1000)).toBeLessThan(7 * 31)
})
