import { readFileSync } from 'node:fs'
import { describe, test } from 'vitest'
import { aWeightingDecibels } from '@/lib/match/physics/weighting'
import { expectWithin } from '../support/tolerances'

const table = readFileSync(new URL('../fixtures/reference/riaa-table.csv', import.meta.url), 'utf8')
  .trim()
  .split('\n')
  .slice(1)
  .map((line) => line.split(',').map(Number))

describe('A-weighting', () => {
  // Source: reckoned apart from this project from IEC 61672-1, 0 dB at exactly 1 kHz; see fixtures/reference.
  test.each(table)('agrees with the table at %d Hz', (hertz, _playback, _with7950, _recording, weight) => {
    expectWithin(aWeightingDecibels(hertz), weight, { db: 0.001 })
  })

  // Source: IEC 61672-1, third-octave table, read. It is printed for exact base-ten centres, 10^(n/10) Hz, to 0.1 dB.
  test.each([
    [15, -39.4],
    [18, -26.2],
    [21, -16.1],
    [24, -8.6],
    [27, -3.2],
    [30, 0],
    [33, 1.2],
    [36, 1.0],
    [39, -1.1],
    [42, -6.6],
  ])('agrees with the printed table at band %d', (band, printed) => {
    expectWithin(aWeightingDecibels(10 ** (band / 10)), printed, { db: 0.06 })
  })
})
