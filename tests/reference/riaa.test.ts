import { readFileSync } from 'node:fs'
import { describe, expect, test } from 'vitest'
import { addedBassCutDecibels, playbackDecibels, recordingDecibels } from '@/lib/match/physics/riaa'
import { expectWithin } from '../support/tolerances'

const table = readFileSync(new URL('../fixtures/reference/riaa-table.csv', import.meta.url), 'utf8')
  .trim()
  .split('\n')
  .slice(1)
  .map((line) => line.split(',').map(Number))

describe('disc equalisation', () => {
  // Source: reckoned apart from this project from the time constants of IEC 60098, to 0.001 dB; see fixtures/reference.
  test.each(table)('agrees with the table at %d Hz', (hertz, playback, with7950, recording) => {
    expectWithin(playbackDecibels(hertz), playback, { db: 0.001 })
    expectWithin(playbackDecibels(hertz, { with7950: true }), with7950, { db: 0.001 })
    expectWithin(recordingDecibels(hertz), recording, { db: 0.001 })
  })

  test('the table has 54 frequencies', () => expect(table).toHaveLength(54))

  // Source: memory, as printed to one decimal in application note AN-346, table 1; printed tables compare to ±0.06 dB.
  test.each([
    [20, 19.3],
    [50, 17.0],
    [100, 13.1],
    [200, 8.2],
    [500, 2.6],
    [1000, 0],
    [2000, -2.6],
    [5000, -8.2],
    [10_000, -13.7],
    [20_000, -19.6],
  ])('agrees with the printed table at %d Hz', (hertz, printed) => {
    expectWithin(playbackDecibels(hertz), printed, { db: 0.06 })
  })

  // Source: memory, low end of IEC 98 amendment 4, printed to one decimal.
  test.each([
    [2, -0.2],
    [4, 5.7],
    [8, 11.2],
    [16, 15.4],
    [20, 16.3],
    [30, 17.0],
    [40, 16.8],
    [50, 16.3],
    [100, 12.9],
  ])('with 7950 µs agrees with the printed low end at %d Hz', (hertz, printed) => {
    expectWithin(playbackDecibels(hertz, { with7950: true }), printed, { db: 0.06 })
  })

  // Source: reckoned. The corner of 318 and 75 µs, and what 7950 µs costs.
  test('stands at −2.867 dB at 2122.07 Hz and loses 3.013 dB at 20 Hz to 7950 µs', () => {
    expectWithin(playbackDecibels(2122.07), -2.867, { db: 0.001 })
    expectWithin(playbackDecibels(2122.07, { with7950: true }), -2.865, { db: 0.001 })
    expectWithin(playbackDecibels(20, { with7950: true }) - playbackDecibels(20), -3.013, { db: 0.001 })
    expectWithin(addedBassCutDecibels(1000), -0.0017, { db: 0.0001 })
  })

  // Source: reckoned. What the equalisation does to mains hum.
  test.each([
    [50, 16.95],
    [60, 16.1],
    [100, 13.09],
    [120, 11.85],
  ])('lifts %d Hz by %d dB', (hertz, lift) => {
    expectWithin(playbackDecibels(hertz), lift, { db: 0.006 })
  })
})
