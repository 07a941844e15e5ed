import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { equalisationTiltDecibels, recogniseStages } from '@/lib/match/physics/equalisation'
import { playbackDecibels } from '@/lib/match/physics/riaa'
import { expectWithin } from '../../support/tolerances'
import { hertz } from './arbitraries'

describe('phono stages in the path', () => {
  // Source: reckoned; the record carries the inverse of one stage.
  test('none leaves the bass 19.3 dB down and the treble 19.6 dB up, two the other way about', () => {
    expectWithin(equalisationTiltDecibels(20, 0), -19.274, { db: 0.001 })
    expectWithin(equalisationTiltDecibels(20_000, 0), 19.62, { db: 0.001 })
    expectWithin(equalisationTiltDecibels(20, 2), 19.274, { db: 0.001 })
    expectWithin(equalisationTiltDecibels(20, 2, { with7950: true }), 16.261, { db: 0.001 })
  })

  test('one is flat, and none and two mirror each other', () => {
    fc.assert(
      fc.property(hertz, (f) => {
        expect(equalisationTiltDecibels(f, 1)).toBe(0)
        expectWithin(equalisationTiltDecibels(f, 0), -equalisationTiltDecibels(f, 2), { db: 1e-9 })
        expectWithin(equalisationTiltDecibels(f, 2), playbackDecibels(f), { db: 1e-9 })
      }),
    )
  })

  // Source: common practice, no source; the tone follows from the tilt above.
  test.each([
    [{ thin: true, tinny: true, quiet: true }, 0],
    [{ thin: true }, 0],
    [{ boomy: true, loud: true, noTreble: true }, 2],
    [{ noTreble: true }, 2],
    [{ boomy: true, loud: true }, 2],
    [{}, 1],
    [{ quiet: true }, 1],
    [{ loud: true }, 1],
    [{ thin: true, boomy: true }, 1],
    [{ thin: true, boomy: true, quiet: true }, 0],
  ] as const)('%o speaks for %d', (heard, stages) => {
    expect(recogniseStages(heard)).toBe(stages)
  })
})
