import { describe, expect, test } from 'vitest'
import { match, TYPICAL_ARM, TYPICAL_LEAD_FARADS, typicalCartridge } from '@/lib/match'
import { readAnswers } from '@/lib/setups/answers'
import { toMatchInputs } from '@/lib/setups/inputs'
import { writePositions } from '@/lib/setups/positions'
import { Answers, type AnswersInput } from '@/lib/setups/schema'
import { bankPreamp } from '../support/preamps'
import { expectWithin } from '../support/tolerances'

const preamp = bankPreamp()
const inputsOf = (input: AnswersInput) => toMatchInputs(Answers.parse({ type: 'moving-magnet', ...input }), preamp)

describe('units become SI', () => {
  const inputs = inputsOf({
    output: '4.5 mV',
    velocity: '5',
    meaning: 'peak-lateral',
    coil: '0.7k',
    inductance: '0.45 H',
    load: '47',
    capacitance: '150-300',
    mass: '6.2',
    compliance: '20',
    complianceAt: '10-hz',
    force: '2',
    armMass: '11',
    armWiring: '20',
    fixings: '0.8',
    lead: '120',
    nextMax: '2',
    nextLoad: '10',
    cable: '100',
    wish: '300-1000',
  })
  test('4.5 mV is 0.0045 V, with its text and condition kept', () => {
    const { outputVolts } = inputs.cartridge
    expect(outputVolts).toMatchObject({ origin: 'owner', printed: '4.5 mV', condition: '5 cm/s peak, sideways' })
    for (const end of ['low', 'nominal', 'high'] as const) expectWithin(outputVolts[end], 0.0045, { relative: 1e-12 })
  })

  test('and so are all the others', () => {
    const { cartridge, arm, next } = inputs
    for (const [quantity, value] of [
      [cartridge.coilOhms, 700],
      [cartridge.coilHenries, 0.45],
      [cartridge.massKilograms, 0.0062],
      [cartridge.complianceMetresPerNewton, 0.02],
      [arm.effectiveMassKilograms, 0.011],
      [arm.wiringFarads, 20e-12],
      [arm.fixingsKilograms, 0.8e-3],
      [arm.leadFarads, 120e-12],
      [next.maximumVolts, 2],
      [next.inputOhms, 10_000],
      [next.cableFarads, 100e-12],
    ] as const) {
      expectWithin(quantity.low, value, { relative: 1e-12 })
      expectWithin(quantity.high, value, { relative: 1e-12 })
    }
    // A gram-force is 9.80665 mN (definition).
    expectWithin(cartridge.trackingForceNewtons?.nominal, 0.0196133, { relative: 1e-9 })
    expect(cartridge.recommendedLoadOhms).toEqual({ low: 47_000, high: 47_000 })
    expectWithin(cartridge.recommendedFarads?.low, 150e-12, { relative: 1e-12 })
    expectWithin(cartridge.recommendedFarads?.high, 300e-12, { relative: 1e-12 })
    expectWithin(inputs.wishedVolts?.low, 0.3, { relative: 1e-12 })
    expectWithin(inputs.wishedVolts?.high, 1, { relative: 1e-12 })
  })
})

describe('output is brought to 5 cm/s peak, sideways', () => {
  // Factors: reference level table of the engine (geometry of the groove: one channel is lateral/√2; RMS is peak/√2).
  test.each<[string, AnswersInput, number, number, number]>([
    ['5 cm/s peak, sideways', { velocity: '5', meaning: 'peak-lateral' }, 1, 1, 1],
    ['5 cm/s RMS, sideways', { velocity: '5', meaning: 'rms-lateral' }, 0.7071, 0.7071, 0.7071],
    ['5 cm/s peak, one channel', { velocity: '5', meaning: 'peak-channel' }, 0.7071, 0.7071, 0.7071],
    ['5 cm/s RMS, one channel', { velocity: '5', meaning: 'rms-channel' }, 0.5, 0.5, 0.5],
    ['5 cm/s, not said of what', { velocity: '5' }, 0.7071, 1, 1],
    ['3.54 cm/s peak, one channel', { velocity: '3.54', meaning: 'peak-channel' }, 0.9987, 0.9987, 0.9987],
    ['3.54 cm/s RMS, one channel', { velocity: '3.54', meaning: 'rms-channel' }, 0.7062, 0.7062, 0.7062],
    ['10 cm/s peak, sideways', { velocity: 'other', velocityOther: '10', meaning: 'peak-lateral' }, 0.5, 0.5, 0.5],
    ['per cm/s RMS, one channel', { velocity: 'per-cm' }, 2.5, 2.5, 2.5],
    ['per cm/s peak, one channel', { velocity: 'per-cm', meaning: 'peak-channel' }, 3.5355, 3.5355, 3.5355],
    ['groove speed not stated', { velocity: 'none' }, 0.5, 1, 1.4142],
    ['groove speed not stated', {}, 0.5, 1, 1.4142],
  ])('%s', (condition, said, low, nominal, high) => {
    const { outputVolts } = inputsOf({ output: '2', ...said }).cartridge
    expectWithin(outputVolts.low, 2e-3 * low, { relative: 1e-3 })
    expectWithin(outputVolts.nominal, 2e-3 * nominal, { relative: 1e-3 })
    expectWithin(outputVolts.high, 2e-3 * high, { relative: 1e-3 })
    expect(outputVolts.condition).toBe(condition)
  })

  test('doubt of the value and doubt of the footing both count', () => {
    const { outputVolts } = inputsOf({ output: '4-5', velocity: '5' }).cartridge
    expectWithin(outputVolts.low, 4e-3 * Math.SQRT1_2, { relative: 1e-9 })
    expectWithin(outputVolts.high, 5e-3, { relative: 1e-9 })
  })
})

describe('what is not known is filled with what is usual', () => {
  test('and named so', () => {
    const { cartridge, arm } = inputsOf({ output: '5.4', velocity: '5', meaning: 'peak-lateral' })
    expect(cartridge.coilHenries).toEqual(typicalCartridge('moving-magnet', { outputVolts: cartridge.outputVolts }).coilHenries)
    expect(cartridge.coilHenries.origin).toBe('typical')
    expect(arm.leadFarads).toEqual(TYPICAL_LEAD_FARADS)
    expect(arm.effectiveMassKilograms).toEqual(TYPICAL_ARM.effectiveMassKilograms)
    expect(cartridge.recommendedFarads).toBeNull()
  })

  test('a value in trouble counts as not known', () => {
    const { answers, troubles } = readAnswers({ type: 'moving-magnet', inductance: '0.5' })
    expect(troubles).toHaveLength(1)
    expect(toMatchInputs(answers, preamp).cartridge.coilHenries).toEqual(typicalCartridge('moving-magnet').coilHenries)
  })
})

describe('compliance is brought to 10 Hz', () => {
  // Static about twice the 10 Hz value, 10 Hz about 1.5 to 2 times the 100 Hz value: rule of thumb, no standard.
  test.each<[AnswersInput, number, number]>([
    [{ complianceAt: '10-hz' }, 20, 20],
    [{ complianceAt: 'static' }, 10, 10],
    [{ complianceAt: '100-hz' }, 30, 40],
    [{}, 10, 40],
  ])('%o', (said, low, high) => {
    const { complianceMetresPerNewton: compliance } = inputsOf({ compliance: '20', ...said }).cartridge
    expectWithin(compliance.low, low * 1e-3, { relative: 1e-9 })
    expectWithin(compliance.high, high * 1e-3, { relative: 1e-9 })
  })
})

describe('leads and cables', () => {
  test('metres times the capacitance of a metre', () => {
    const { leadFarads } = inputsOf({ leadAs: 'metres', leadMetres: '1.2', leadPerMetre: '90-100' }).arm
    expectWithin(leadFarads.low, 108e-12, { relative: 1e-9 })
    expectWithin(leadFarads.high, 120e-12, { relative: 1e-9 })
    expect(leadFarads.printed).toBe('1.2 m of 90-100 pF/m')
  })

  test('a length alone takes the usual metre, and is named typical', () => {
    // Cable 66 to 100 pF/m (published range).
    const { leadFarads } = inputsOf({ leadAs: 'metres', leadMetres: '2' }).arm
    expectWithin(leadFarads.low, 132e-12, { relative: 1e-9 })
    expectWithin(leadFarads.high, 200e-12, { relative: 1e-9 })
    expect(leadFarads.origin).toBe('typical')
  })

  test('a lead that is not known is the usual one, whatever stands in its box', () => {
    expect(inputsOf({ leadAs: 'unknown', lead: '120' }).arm.leadFarads).toEqual(TYPICAL_LEAD_FARADS)
  })
})

describe('what follows the preamp', () => {
  test('several inputs on one output share its resistance', () => {
    const { inputOhms } = inputsOf({ nextLoad: '20', alsoRecorder: '20', alsoSubwoofer: '10k' }).next
    // 20 kΩ ‖ 20 kΩ ‖ 10 kΩ = 5 kΩ (definition).
    expectWithin(inputOhms.nominal, 5000, { relative: 1e-9 })
  })

  test('one wished level is met within 3 dB either way', () => {
    const { wishedVolts } = inputsOf({ wish: '500' })
    expectWithin(wishedVolts?.low, 0.3536, { relative: 1e-3 })
    expectWithin(wishedVolts?.high, 0.7071, { relative: 1e-3 })
  })

  test('a balanced output is only used where there is one', () => {
    expect(inputsOf({ out: 'balanced' }).output).toBe('unbalanced')
    expect(toMatchInputs(Answers.parse({ out: 'balanced' }), { ...preamp, hasBalancedOutput: true }).output).toBe('balanced')
  })

  test('a step-up transformer by its label', () => {
    const { stepUp } = inputsOf({ stepUp: 'yes', ratio: '150 : 50k', primaryCoil: '3' })
    expectWithin(stepUp?.ratio.nominal, Math.sqrt(50_000 / 150), { relative: 1e-5 })
    expect(stepUp?.primaryOhms.nominal).toBe(3)
    expect(stepUp?.primaryHenries).toBeNull()
    expect(inputsOf({ stepUp: 'no', ratio: '10' }).stepUp).toBeNull()
  })
})

describe('how the switches stand', () => {
  const state = { bank: '10000010' }

  test('known, as delivered, not known', () => {
    const texts = writePositions({ left: state, right: state }, preamp)
    expect(inputsOf({ present: 'known', ...texts }).present).toEqual({ left: state, right: state })
    expect(inputsOf({ present: 'delivered' }).present).toEqual({ left: preamp.asDelivered, right: preamp.asDelivered })
    expect(inputsOf({ present: 'unknown', ...texts }).present).toBeNull()
  })

  test('positions that fit no such board count as not known', () => {
    expect(inputsOf({ present: 'known', left: 'bank.1', right: 'bank.1' }).present).toBeNull()
    // Switches 3 and 4 exclude each other.
    expect(inputsOf({ present: 'known', left: 'bank.00110000', right: 'bank.00110000' }).present).toBeNull()
  })
})

// Whole checks with nearly nothing known take their time on a busy machine.
test('the engine takes what comes out, from nothing answered on', { timeout: 60_000 }, () => {
  for (const input of [{}, { type: 'moving-coil' }, { type: 'other', other: 'optical' }, { output: '5.4', velocity: '5' }]) {
    const result = match(toMatchInputs(Answers.parse(input), preamp))
    expect(result.rulesVersion).toBeGreaterThan(0)
  }
})
