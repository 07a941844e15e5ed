/** The 20 worked cases, every figure. Source: reckoned by a separate program and a circuit simulator, see fixtures/reference. */
import { readFileSync } from 'node:fs'
import { describe, expect, test } from 'vitest'
import { casesOf, evaluateCase, type Case } from '../../scripts/evaluate/evaluate-cases'
import { expectWithin, type Tolerance } from '../support/tolerances'

const cases = casesOf(JSON.parse(readFileSync(new URL('../fixtures/reference/cases.json', import.meta.url), 'utf8')))

/** Limits as stated with the cases; plain ratios, masses and compliances as the other quantities. */
function toleranceOf(kind: string, key: string): Tolerance {
  if (key === 'worst_margin_frequency_Hz') return { relative: 0.02 }
  if (key === 'worst_margin_20_20k_dB') return { db: 0.01 }
  if (key === 'peak_frequency_Hz') return { relative: 0.002 }
  if (/_(dB|dBV|dBu)$/.test(key)) return kind === 'noise' ? { db: 0.01 } : { db: 0.005 }
  return { relative: 0.001 }
}

/** Near Q = 0.707 the peak is so flat that its frequency says nothing. */
function isIllConditioned(item: Case, key: string): boolean {
  const height = item.expected?.['peak_height_re_lf_dB']
  return key === 'peak_frequency_Hz' && typeof height === 'number' && height < 0.05
}

describe('worked cases', () => {
  test('all 20 are there', () => {
    expect(cases).toHaveLength(20)
  })

  test.each(cases)('$id agrees in every figure', (item) => {
    const unknown: string[] = []
    const result = evaluateCase(item, (key) => unknown.push(key))
    expect(unknown).toEqual([])
    expect(Object.keys(result)).toEqual(Object.keys(item.expected ?? {}))
    for (const [key, value] of Object.entries(result)) {
      const expected = item.expected?.[key]
      if (expected === null) expect(value, key).toBeNull()
      else if (!isIllConditioned(item, key)) expectWithin(value, Number(expected), toleranceOf(item.kind, key), key)
    }
  })
})
