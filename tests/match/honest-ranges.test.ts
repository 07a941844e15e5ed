import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { UNKNOWNS, tryOut, type MatchInputs } from '@/lib/match'
import { resolveSetting } from '@/lib/match/settings'
import type { Setting } from '@/lib/match/preamp'
import { anyInputs } from '../support/any-inputs'
import { boxOf } from '../support/plain-box'
import { plainFigures, type PlainFigures, type Point } from '../support/plain-check'

/**
 * A reported range is honest when nearly everything that could be true lies inside it, and it claims little more.
 * Held against plain random draws through the plain formulas. Source of the two bounds: the product's own promise.
 */
const DRAWS = 1000
const STATES = ['000000', '100010', '011001', '000100', '110011']

/** A fixed generator (a linear congruential one), so that a failure can be run again. */
function randoms(seed: number): () => number {
  let state = seed >>> 0 || 1
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0
    return state / 4294967296
  }
}

function sampled(inputs: MatchInputs, setting: Setting, seed: number): PlainFigures[] {
  const random = randoms(seed)
  const quantities = boxOf(inputs, setting)
  return Array.from({ length: DRAWS }, () => {
    const at = Object.fromEntries(
      UNKNOWNS.map((name) => [name, quantities[name].low + (quantities[name].high - quantities[name].low) * random()]),
    ) as Point
    return plainFigures(inputs, setting, at)
  })
}

describe('ranges of every figure', () => {
  test('hold 99 % of a thousand random draws and are at most a quarter wider than them', { timeout: 240_000 }, () => {
    fc.assert(
      fc.property(anyInputs, fc.constantFrom(...STATES), fc.integer({ min: 1, max: 2 ** 31 }), (inputs, bank, seed) => {
        const state = { bank }
        const setting = resolveSetting(inputs.preamp, state)
        if ('clash' in setting) throw new Error('the test picked a clash')
        const reported = tryOut(inputs, state).evaluation.figures
        const draws = sampled(inputs, setting, seed)
        for (const name of Object.keys(draws[0]) as (keyof PlainFigures)[]) {
          const range = reported[name]
          if (!range) throw new Error(`${name} is missing`)
          const values = draws.map((figures) => figures[name])
          const scale = Math.max(...values.map(Math.abs), 1e-30)
          // 0.01 dB or a thousandth: margins are found on a grid of frequencies, not refined.
          const slack = name.endsWith('Decibels') ? 0.01 : scale * 1e-3
          const inside = values.filter((value) => value >= range.low - slack && value <= range.high + slack).length
          const width = Math.max(...values) - Math.min(...values)
          expect({ name, inside: inside >= 0.99 * DRAWS }, `${name} holds ${inside} of ${DRAWS}`).toEqual({ name, inside: true })
          expect(range.high - range.low, `${name}: reported against drawn width ${width}`).toBeLessThanOrEqual(1.25 * width + 2 * slack)
        }
      }),
      { numRuns: 30, seed: 20261201, endOnFailure: true },
    )
  })

  test('with everything known are the formulas themselves', { timeout: 60_000 }, () => {
    fc.assert(
      fc.property(anyInputs, fc.constantFrom(...STATES), (inputs, bank) => {
        const setting = resolveSetting(inputs.preamp, { bank })
        if ('clash' in setting) throw new Error('the test picked a clash')
        const box = boxOf(inputs, setting)
        const middle = Object.fromEntries(UNKNOWNS.map((name) => [name, box[name].nominal])) as Point
        const reported = tryOut(inputs, { bank }).evaluation.figures
        for (const [name, value] of Object.entries(plainFigures(inputs, setting, middle))) {
          // Margins and tilts are found on a grid of pitches, noise by quadrature. The rest is closed form.
          const grid = /Margin|lift|fall/.test(name) ? 0.01 : /snr|Snr/.test(name) ? 0.001 : name.endsWith('Decibels') ? 1e-6 : Math.abs(value) * 1e-9
          expect(Math.abs(reported[name as keyof PlainFigures]!.nominal - value), name).toBeLessThanOrEqual(grid)
        }
      }),
      { numRuns: 100, seed: 20261203, endOnFailure: true },
    )
  })
})
