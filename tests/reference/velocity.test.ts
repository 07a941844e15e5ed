import { describe, test } from 'vitest'
import { dbuOf, dbvOf } from '@/lib/match/physics/level'
import { nominalFactor } from '@/lib/match/physics/printed-condition'
import { RECORD_ENVELOPES, amplitudeCornerHertz } from '@/lib/match/physics/record-envelope'
import { perChannelRms, sensitivity, velocityAs, velocityLevelDecibels, velocityOfAmplitude } from '@/lib/match/physics/velocity'
import { expectWithin } from '../support/tolerances'

const at = (cm: number, kind: 'peak' | 'rms', direction: 'lateral' | 'perChannel') => ({ metresPerSecond: cm / 100, kind, direction })

describe('published velocity and level values', () => {
  // Source: read (a test record's sheet and a comparison of conventions).
  test('3.54 cm/s peak of one channel is 5 cm/s peak lateral, and 5 cm/s peak at 45° is 3 dB more', () => {
    expectWithin(velocityAs(at(3.54, 'peak', 'perChannel'), { kind: 'peak', direction: 'lateral' }), 0.05, { relative: 0.002 })
    expectWithin(velocityLevelDecibels(at(5, 'peak', 'perChannel'), at(5, 'peak', 'lateral')), 3.01, { db: 0.005 })
  })

  // Source: read. 1 mV per cm/s is 0.1 V per m/s.
  test('2.5 mV at 3.54 peak 45° is 0.9987 mV per cm/s RMS', () => {
    expectWithin(sensitivity({ outputVolts: 2.5e-3, velocity: at(3.54, 'peak', 'perChannel') }) * 10, 0.9987, { absolute: 0.0001 })
  })

  // Source: read.
  test('8 cm/s peak is 5.657 RMS, and 300 Hz at 50 µm is 9.42 cm/s peak', () => {
    expectWithin(perChannelRms(at(8, 'peak', 'perChannel')) * 100, 5.657, { absolute: 0.0005 })
    expectWithin(velocityOfAmplitude({ hertz: 300, amplitudeMetres: 50e-6 }) * 100, 9.42, { absolute: 0.005 })
  })

  // Source: read (+20 dB re 5 cm/s; amplitude meets velocity at 1592 Hz).
  test('the extreme envelope is 20 dB up and 50 µm meets 50 cm/s at 1592 Hz', () => {
    const { velocityMetresPerSecond } = RECORD_ENVELOPES.extreme
    expectWithin(velocityLevelDecibels(at(velocityMetresPerSecond * 100, 'peak', 'lateral'), at(5, 'peak', 'lateral')), 20, { db: 1e-9 })
    expectWithin(amplitudeCornerHertz(RECORD_ENVELOPES.extreme), 1592, { absolute: 0.5 })
  })

  // Source: definitions.
  test('−10 dBV is 0.316 V and +4 dBu is 1.23 V', () => {
    expectWithin(dbvOf(0.316), -10, { db: 0.01 })
    expectWithin(dbuOf(1.228), 4, { db: 0.01 })
  })

  // Source: reckoned from the conventions above; the spreads of the silent rows are common practice, no source.
  test.each([
    ['3.54 cm/s peak per channel', nominalFactor({ form: 'atVelocity', metresPerSecond: 0.0354, kind: 'peak', direction: 'perChannel' }), [1, 1, 1]],
    ['5 cm/s peak lateral', nominalFactor({ form: 'atVelocity', metresPerSecond: 0.05, kind: 'peak', direction: 'lateral' }), [1, 1, 1]],
    ['5 cm/s RMS lateral', nominalFactor({ form: 'atVelocity', metresPerSecond: 0.05, kind: 'rms', direction: 'lateral' }), [0.707, 0.707, 0.707]],
    ['5 cm/s peak per channel', nominalFactor({ form: 'atVelocity', metresPerSecond: 0.05, kind: 'peak', direction: 'perChannel' }), [0.707, 0.707, 0.707]],
    ['3.54 cm/s RMS per channel', nominalFactor({ form: 'atVelocity', metresPerSecond: 0.0354, kind: 'rms', direction: 'perChannel' }), [0.707, 0.707, 0.707]],
    ['5 cm/s RMS per channel', nominalFactor({ form: 'atVelocity', metresPerSecond: 0.05, kind: 'rms', direction: 'perChannel' }), [0.5, 0.5, 0.5]],
    ['10 cm/s peak lateral', nominalFactor({ form: 'atVelocity', metresPerSecond: 0.1, kind: 'peak', direction: 'lateral' }), [0.5, 0.5, 0.5]],
    ['5 cm/s', nominalFactor({ form: 'atVelocity', metresPerSecond: 0.05 }), [0.707, 1, 1]],
    ['3.54 cm/s', nominalFactor({ form: 'atVelocity', metresPerSecond: 0.0354 }), [0.707, 1, 1]],
    ['5 cm/s peak', nominalFactor({ form: 'atVelocity', metresPerSecond: 0.05, kind: 'peak' }), [0.707, 1, 1]],
    ['5 cm/s RMS', nominalFactor({ form: 'atVelocity', metresPerSecond: 0.05, kind: 'rms' }), [0.5, 0.707, 0.707]],
    ['no velocity', nominalFactor({ form: 'none' }), [0.5, 1, 1.414]],
  ])('a printed "%s" gives its factor', (_printed, { low, nominal, high }, expected) => {
    for (const [i, value] of [low, nominal, high].entries()) expectWithin(value, expected[i], { relative: 0.0015 })
  })

  // Source: IEC way of stating, read: mV per cm/s, both RMS of one channel; × 2.5 cm/s.
  test('1.2 mV per cm/s is 3 mV nominal', () => {
    expectWithin(0.12 * nominalFactor({ form: 'perVelocity' }).nominal, 3e-3, { relative: 1e-12 })
  })
})
