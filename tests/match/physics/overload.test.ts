import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { logSpacedHertz } from '@/lib/match/physics/grid'
import { playbackMagnitude } from '@/lib/match/physics/riaa'
import { allowedInputVolts, type OverloadTopology } from '@/lib/match/physics/overload'
import { marginReNominalDecibels, overloadMarginDecibels, worstMargin, type OverloadChain } from '@/lib/match/physics/overload-margin'
import { RECORD_ENVELOPES, envelopeVelocity, envelopeVelocityPerChannel } from '@/lib/match/physics/record-envelope'
import { expectWithin } from '../../support/tolerances'
import { hertz, logarithmic, stepUp, wholeLoading } from './arbitraries'

const topology = fc.constantFrom<OverloadTopology>('outputLimited', 'flatFirstStage', 'bassFirst')
const limit = fc.record({ topology, limit: fc.record({ voltsAt1k: logarithmic(1e-3, 1) }), with7950: fc.boolean() })
const envelope = fc.record({
  footing: fc.constantFrom('lateral' as const, 'perChannel' as const),
  amplitudeMetres: logarithmic(10e-6, 200e-6),
  velocityMetresPerSecond: logarithmic(0.1, 1),
  accelerationMetresPerSecondSquared: logarithmic(5000, 80_000),
})
const chain = fc.record({
  network: fc.oneof(wholeLoading, stepUp),
  sensitivityVoltSecondsPerMetre: logarithmic(0.005, 0.4),
  envelope,
  limit,
})

// Source of these checks: the definitions in the files' heads.
describe('allowed input', () => {
  test('is the printed figure at 1 kHz whatever the topology', () => {
    fc.assert(
      fc.property(limit, (any) => expectWithin(allowedInputVolts(any, 1000), any.limit.voltsAt1k, { relative: 1e-12 })),
    )
  })

  test('falls with the equalisation, stays, or takes the bass half', () => {
    const at = (kind: OverloadTopology, f: number) => allowedInputVolts({ topology: kind, limit: { voltsAt1k: 0.1 }, with7950: false }, f)
    expectWithin(at('outputLimited', 20), 0.1 / playbackMagnitude(20), { relative: 1e-12 })
    expectWithin(at('outputLimited', 20_000), 0.1 / playbackMagnitude(20_000), { relative: 1e-12 })
    expect(at('flatFirstStage', 20)).toBe(0.1)
    // Far above 500 Hz the bass half is level: 20 dB from end to end, of which 1 kHz has kept 0.92 dB.
    expectWithin(at('bassFirst', 1e6) / at('bassFirst', 1e-3), 10, { relative: 1e-4 })
  })

  test('goes through measured points and holds their ratio to the shape beyond them', () => {
    const points = [
      { hertz: 100, volts: 0.012 },
      { hertz: 1000, volts: 0.09 },
      { hertz: 10_000, volts: 0.3 },
    ]
    fc.assert(
      fc.property(topology, fc.boolean(), (kind, with7950) => {
        const measured = { topology: kind, with7950, limit: { points } }
        const plain = { topology: kind, with7950, limit: { voltsAt1k: 1 } }
        for (const point of points) expectWithin(allowedInputVolts(measured, point.hertz), point.volts, { relative: 1e-9 })
        const ratio = (f: number) => allowedInputVolts(measured, f) / allowedInputVolts(plain, f)
        expectWithin(ratio(20), ratio(100), { relative: 1e-9 })
        expectWithin(ratio(20_000), ratio(10_000), { relative: 1e-9 })
        expectWithin(ratio(Math.sqrt(100 * 1000)), Math.sqrt(ratio(100) * ratio(1000)), { relative: 1e-9 })
      }),
    )
  })

  test('one measured point at 1 kHz is the printed figure', () => {
    fc.assert(
      fc.property(limit, hertz, (any, f) => {
        const measured = { ...any, limit: { points: [{ hertz: 1000, volts: any.limit.voltsAt1k }] } }
        expectWithin(allowedInputVolts(measured, f), allowedInputVolts(any, f), { relative: 1e-9 })
      }),
    )
  })

  test('no point at all is an error', () => {
    expect(() => allowedInputVolts({ topology: 'outputLimited', with7950: false, limit: { points: [] } }, 1000)).toThrow(RangeError)
  })
})

describe('record envelope', () => {
  test('never exceeds any of its limits and is 3 dB less for one channel', () => {
    fc.assert(
      fc.property(hertz, (f) => {
        const loud = RECORD_ENVELOPES.loud
        const v = envelopeVelocity(loud, f)
        expect(v).toBeLessThanOrEqual(loud.velocityMetresPerSecond)
        expect(v / (2 * Math.PI * f)).toBeLessThanOrEqual(loud.amplitudeMetres * (1 + 1e-12))
        expect(v * 2 * Math.PI * f).toBeLessThanOrEqual(loud.accelerationMetresPerSecondSquared * (1 + 1e-12))
        expectWithin(envelopeVelocityPerChannel(loud, f), v / Math.SQRT2, { relative: 1e-12 })
        expect(envelopeVelocityPerChannel({ ...loud, footing: 'perChannel' }, f)).toBe(v)
      }),
    )
    expect(envelopeVelocity(RECORD_ENVELOPES.loud, 0)).toBe(0)
  })

  // Source: 20·log10(V/5 cm/s); the velocities themselves are collected practice.
  test('stands 14, 17.6 and 20 dB above the reference level', () => {
    for (const [name, level] of [['ordinary', 13.98], ['loud', 17.62], ['extreme', 20]] as const) {
      expectWithin(20 * Math.log10(RECORD_ENVELOPES[name].velocityMetresPerSecond / 0.05), level, { db: 0.01 })
    }
  })
})

describe('overload margin', () => {
  test('twice the sensitivity costs 6.02 dB everywhere', () => {
    fc.assert(
      fc.property(chain, hertz, (any, f) => {
        const louder: OverloadChain = { ...any, sensitivityVoltSecondsPerMetre: any.sensitivityVoltSecondsPerMetre * 2 }
        expectWithin(overloadMarginDecibels(any, f) - overloadMarginDecibels(louder, f), 20 * Math.log10(2), { db: 1e-9 })
      }),
    )
  })

  test('an envelope read per channel instead of lateral costs 3.01 dB', () => {
    fc.assert(
      fc.property(chain, hertz, (any, f) => {
        const as = (footing: 'lateral' | 'perChannel') => overloadMarginDecibels({ ...any, envelope: { ...any.envelope, footing } }, f)
        expectWithin(as('lateral') - as('perChannel'), 10 * Math.log10(2), { db: 1e-9 })
      }),
    )
  })

  test('the worst margin is the least of a fine sweep, to 0.01 dB', () => {
    const sweep = logSpacedHertz({ low: 20, high: 20_000, count: 4001 })
    fc.assert(
      fc.property(chain, (any) => {
        const worst = worstMargin(any)
        const least = Math.min(...sweep.map((f) => overloadMarginDecibels(any, f)))
        expect(Number.isFinite(worst.decibels)).toBe(true)
        expect(worst.decibels).toBeLessThanOrEqual(least + 0.01)
        expectWithin(overloadMarginDecibels(any, worst.hertz), worst.decibels, { db: 1e-9 })
      }),
      { numRuns: 150 },
    )
  })

  // Source: the fine sweep. The peak lies between two points of the search's own grid, far from where the rest is worst.
  test('a needle of a loading peak at the far end of the band is not stepped over', () => {
    const needle: OverloadChain = {
      network: { coilOhms: 300, coilHenries: 0.9, loadOhms: 20e6, loadFarads: 108e-12 },
      sensitivityVoltSecondsPerMetre: 0.1,
      envelope: { ...RECORD_ENVELOPES.loud, accelerationMetresPerSecondSquared: 20_000 },
      limit: { topology: 'outputLimited', with7950: false, limit: { voltsAt1k: 0.1 } },
    }
    const least = Math.min(...logSpacedHertz({ low: 20, high: 20_000, count: 40_001 }).map((f) => overloadMarginDecibels(needle, f)))
    expectWithin(worstMargin(needle).decibels, least, { db: 0.01 })
    expect(worstMargin(needle).hertz).toBeGreaterThan(15_000)
  })

  // Source: reckoned. 60 mV over 3 mV, both RMS at 1 kHz.
  test('re nominal is the printed figure over the nominal input', () => {
    expectWithin(
      marginReNominalDecibels({ nominalInputVolts: 3e-3, limit: { topology: 'flatFirstStage', with7950: false, limit: { voltsAt1k: 60e-3 } } }),
      26.02,
      { db: 0.001 },
    )
  })
})
