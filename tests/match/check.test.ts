import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { between, exactly, match, tryOut, type MatchInputs } from '@/lib/match'
import { anyInputs, sampleInputs, samplePreamp } from '../support/any-inputs'

const delivered = { left: { bank: '000000' }, right: { bank: '000000' } }
const withCartridge = (over: Partial<MatchInputs['cartridge']>, rest: Partial<MatchInputs> = {}) =>
  sampleInputs({ present: delivered, cartridge: { ...sampleInputs().cartridge, ...over }, ...rest })

/** Low-output moving coil of 0.3 mV and 10 Ω, in the range of published low-output coils. */
const lowCoil = { type: 'moving-coil' as const, outputVolts: exactly(0.3e-3), coilOhms: exactly(10), coilHenries: exactly(20e-6), recommendedLoadOhms: { low: 100, high: null }, recommendedFarads: null }

describe('advice', () => {
  test('leaves a setting alone that is good enough', () => {
    const result = match(withCartridge({}))
    expect(result.verdict).toBe('suits')
    expect(result.moves).toEqual([])
  })

  test('moves a gain switch that is one step too loud for the next input', () => {
    const tooLoud = { left: { bank: '100000' }, right: { bank: '100000' } }
    const next = { ...sampleInputs().next, maximumVolts: exactly(3.5) }
    const result = match(withCartridge({}, { present: tooLoud, next }))
    expect(result.verdict).toBe('suits-with-changes')
    expect(result.moves?.map(({ member, from, to }) => ({ member, from, to }))).toEqual([{ member: 1, from: '1', to: '0' }])
  })

  test('says the whole end state where the present positions are not known', () => {
    const result = match(sampleInputs({ present: null }))
    expect(result.moves).toBeNull()
    expect(result.chosen?.setting.state).toEqual({ bank: '000000' })
  })

  test('raises the gain for a low-output moving coil', () => {
    const result = match(withCartridge(lowCoil))
    expect(result.chosen?.setting.gainDecibels).toBe(60)
    expect(result.chosen?.setting.pathId).toBe('mc')
  })

  test('judges a moving coil of magnet output by its numbers, not its name', () => {
    const result = match(withCartridge({ ...lowCoil, outputVolts: exactly(2.5e-3), coilOhms: exactly(140), coilHenries: exactly(1e-3), recommendedLoadOhms: { low: 47_000, high: 47_000 } }))
    expect(result.chosen?.setting.pathId).toBe('mm')
  })

  test('evaluates every real combination once', () => {
    // Four gains, loads 47k, 1k, 100 Ω (both at once exclude each other), two capacitances, filter on or off.
    expect(match(sampleInputs()).combinations).toBe(4 * 3 * 2 * 2)
  })

  test('never advises positions that exclude each other', () => {
    const { chosen, others } = match(withCartridge(lowCoil))
    for (const { state } of [chosen!.setting, ...others.map(({ setting }) => setting)]) expect(state.bank.slice(2, 4)).not.toBe('11')
  })

  test('switches the rumble filter in for a soft cartridge on a heavy arm', () => {
    const result = match(withCartridge({ complianceMetresPerNewton: exactly(30e-3) }, { arm: { ...sampleInputs().arm, effectiveMassKilograms: exactly(18e-3) } }))
    expect(result.chosen?.setting.filter).not.toBeNull()
    expect(result.chosen?.findings.map(({ code }) => code)).toContain('arm-resonance-low')
  })
})

describe('verdict', () => {
  test('does not suit when no gain is enough, and says what would do', () => {
    const fixed = samplePreamp({ controls: [], groups: [], exclusions: [], asDelivered: {}, paths: [samplePreamp().paths[0]], gains: [samplePreamp().gains[0]] })
    const result = match(withCartridge(lowCoil, { preamp: fixed, present: { left: {}, right: {} } }))
    expect(result.verdict).toBe('does-not-suit')
    const kinds = result.remedies.map(({ kind }) => kind)
    expect(kinds).toContain('more-gain')
    expect(kinds).toContain('step-up')
  })

  test('cannot be said while the one number that decides is open, and names it', () => {
    const result = match(withCartridge({ ...lowCoil, outputVolts: between(0.2e-3, 2.5e-3, 'typical') }, { next: { ...sampleInputs().next, maximumVolts: exactly(3) } }))
    expect(result.verdict).toBe('cannot-say')
    expect(result.next?.unknown).toBe('output')
    expect(result.next!.stretches.length).toBeGreaterThan(1)
    expect(result.tonight?.gainDecibels).toBe(36)
  })

  test('names stretches that join without a gap from end to end of the doubt', () => {
    const { next } = match(withCartridge({ ...lowCoil, outputVolts: between(0.2e-3, 2.5e-3, 'typical') }))
    expect(next!.stretches.length).toBeLessThanOrEqual(4)
    expect(next!.stretches[0].from).toBeCloseTo(0.2e-3, 9)
    expect(next!.stretches.at(-1)!.to).toBeCloseTo(2.5e-3, 9)
    next!.stretches.slice(1).forEach((stretch, k) => expect(stretch.from).toBe(next!.stretches[k].to))
  })

  test('asks for nothing that is built into the preamp', () => {
    const stepUp = { name: 'Sample', ratio: between(10, 11), primaryOhms: between(1, 3), secondaryOhms: between(200, 300), primaryHenries: between(0.5, 1), secondaryFarads: between(80e-12, 120e-12) }
    const preamp = samplePreamp({ paths: samplePreamp().paths.map((path) => (path.id === 'mc' ? { ...path, stepUp } : path)) })
    const { doubts } = match(withCartridge({ ...lowCoil, outputVolts: between(0.2e-3, 0.4e-3) }, { preamp }))
    expect(doubts.map(({ unknown }) => unknown)).toEqual(['output'])
  })

  test('the arm alone never rules a preamp out', () => {
    const result = match(withCartridge({ complianceMetresPerNewton: exactly(60e-3) }, { arm: { ...sampleInputs().arm, effectiveMassKilograms: exactly(40e-3) } }))
    expect(result.verdict).toBe('suits-with-a-limit')
  })

  test('a transformer into an MC gain is ruled out, and the MM input found', () => {
    const stepUp = { name: 'Sample', ratio: exactly(10), primaryOhms: exactly(2), secondaryOhms: exactly(200), primaryHenries: null, secondaryFarads: exactly(100e-12) }
    const result = match(withCartridge(lowCoil, { stepUp }))
    expect(result.chosen?.setting.pathId).toBe('mm')
    // Worked in the trade: 1:10 into 47 kΩ is 470 Ω to the cartridge (read in a published table), windings on top.
    expect(result.chosen!.figures.cartridgeLoadOhms.nominal).toBeCloseTo(474, 0)
  })

  test('a phono input behind a phono preamp is ruled out, with the way out', () => {
    const result = match(withCartridge({}, { next: { ...sampleInputs().next, kind: 'phono', maximumVolts: exactly(0.1) } }))
    expect(result.verdict).toBe('does-not-suit')
    expect(result.remedies.map(({ kind }) => kind)).toContain('line-input')
  })

  test.each(['ceramic', 'strain-gauge', 'optical'] as const)('%s closes the gate before any arithmetic', (type) => {
    const result = match(withCartridge({ type }))
    expect(result.gate).toEqual({ reason: 'not-magnetic', type })
    expect(result.chosen).toBeNull()
  })

  test('a current-mode input closes the gate', () => {
    expect(match(withCartridge(lowCoil, { preamp: samplePreamp({ inputMode: 'current' }) })).gate?.reason).toBe('current-input')
  })
})

const numbersIn = (value: unknown): number[] =>
  typeof value === 'number' ? [value] : value && typeof value === 'object' ? Object.values(value).flatMap(numbersIn) : []

describe('laws', () => {
  test('every number that comes out is finite, low ≤ middle ≤ high, and the same inputs give the same result', () => {
    fc.assert(
      fc.property(anyInputs, (inputs) => {
        const result = match(inputs)
        expect(numbersIn(result).every(Number.isFinite)).toBe(true)
        for (const range of Object.values(result.chosen!.figures)) {
          if (!range) continue
          expect(range.low).toBeLessThanOrEqual(range.nominal)
          expect(range.high).toBeGreaterThanOrEqual(range.nominal)
        }
        expect(match(inputs)).toEqual(result)
      }),
      { numRuns: 15, seed: 20261201 },
    )
  })

  test('a verdict that it suits is ruled out in at most a tenth of the doubt, and every other setting is accounted for', () => {
    fc.assert(
      fc.property(anyInputs, (inputs) => {
        const { chosen, others, verdict } = match(inputs)
        if (verdict === 'does-not-suit' || verdict === 'cannot-say') return
        expect(chosen!.shareRuledOut).toBeLessThanOrEqual(0.1)
        expect(others.length).toBe(match(inputs).combinations - 1)
      }),
      { numRuns: 15, seed: 20261202 },
    )
  })

  test('more output leaves less room and a better S/N, decibel for decibel', () => {
    const at = (volts: number) => tryOut(withCartridge({ outputVolts: exactly(volts) }), { bank: '000000' }).evaluation.figures
    const [quiet, loud] = [at(2.5e-3), at(5e-3)]
    const step = 20 * Math.log10(2)
    expect(quiet.worstMarginDecibels.nominal - loud.worstMarginDecibels.nominal).toBeCloseTo(step, 9)
    expect(loud.snrWeightedDecibels.nominal - quiet.snrWeightedDecibels.nominal).toBeCloseTo(step, 9)
    expect(quiet.nextMarginDecibels.nominal - loud.nextMarginDecibels.nominal).toBeCloseTo(step, 9)
  })

  test('scaling coil and load impedances together leaves the response as it is', () => {
    const response = (k: number) => {
      const preamp = samplePreamp({ paths: samplePreamp().paths.map((path) => ({ ...path, loadOhms: exactly(47_000 * k), inputFarads: exactly(70e-12 / k) })) })
      const base = sampleInputs()
      return tryOut(
        withCartridge({ coilOhms: exactly(700 * k), coilHenries: exactly(0.45 * k) }, { preamp, arm: { ...base.arm, wiringFarads: exactly(20e-12 / k), leadFarads: exactly(100e-12 / k) } }),
        { bank: '000000' },
      ).evaluation.figures
    }
    expect(response(3).at15kHzDecibels.nominal).toBeCloseTo(response(1).at15kHzDecibels.nominal, 9)
    expect(response(3).peakHertz!.nominal).toBeCloseTo(response(1).peakHertz!.nominal, 6)
  })

  test('widening an input never narrows what rests on it', () => {
    const width = (high: number) => {
      const { low, high: top } = tryOut(withCartridge({ outputVolts: between(4e-3, high) }), { bank: '000000' }).evaluation.figures.outputVolts
      return top - low
    }
    expect(width(5.5e-3)).toBeGreaterThan(width(5e-3))
    expect(width(5e-3)).toBeGreaterThan(width(4.2e-3))
  })

  test('limits: no capacitance and no inductance leave the response flat; an endless load takes nothing', () => {
    const flat = tryOut(withCartridge({ coilHenries: exactly(0) }, { arm: { ...sampleInputs().arm, leadFarads: exactly(0), wiringFarads: exactly(0) } }), { bank: '000000' }).evaluation.figures
    expect(Math.abs(flat.at15kHzDecibels.nominal)).toBeLessThan(0.01)
    const open = samplePreamp({ paths: samplePreamp().paths.map((path) => ({ ...path, loadOhms: exactly(1e12) })) })
    const unloaded = tryOut(withCartridge({ coilHenries: exactly(0) }, { preamp: open }), { bank: '000000' }).evaluation.figures
    expect(unloaded.levelLossDecibels.nominal).toBeCloseTo(0, 5)
  })
})
