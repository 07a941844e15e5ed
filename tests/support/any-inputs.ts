import fc from 'fast-check'
import { between, exactly, within, type MatchInputs, type Preamp, type Quantity } from '@/lib/match'

/** A made-up preamp with two inputs, a bank of six and every kind of group, for properties of the engine. */
export function samplePreamp(over: Partial<Preamp> = {}): Preamp {
  const gain = (id: string, pathId: 'mm' | 'mc', decibels: number, nanovolts: number, picoamperes: number) => ({
    id,
    pathId,
    gainDecibels: { low: decibels - 0.2, nominal: decibels, high: decibels + 0.2, origin: 'printed' as const },
    overload: [{ hertz: 1000, volts: 8 / 10 ** (decibels / 20) }],
    voltageNoise: within(nanovolts * 1e-9, 0.2),
    currentNoise: within(picoamperes * 1e-12, 0.3),
  })
  return {
    modelId: 'sample',
    modelName: 'Sample',
    boardId: 'only',
    boardName: '',
    technology: 'transistor',
    inputMode: 'voltage',
    topology: 'output-limited',
    controls: [{ kind: 'bank', id: 'bank', label: 'Switches', place: 'back', switchCount: 6 }],
    groups: [
      { id: 'gain', label: 'Gain', control: 'bank', members: [1, 2], sets: 'gain', how: 'choice', options: { '00': { gainId: 'g36' }, '10': { gainId: 'g42' }, '01': { gainId: 'g60' }, '11': { gainId: 'g66' } } },
      { id: 'load', label: 'Load', control: 'bank', members: [3, 4], sets: 'load', how: 'parallel', resistorsOhms: [within(1000, 0.01), within(100, 0.01)] },
      { id: 'capacitance', label: 'Capacitance', control: 'bank', members: [5], sets: 'capacitance', how: 'sum', capacitorsFarads: [within(150e-12, 0.05)] },
      { id: 'rumble', label: 'Rumble', control: 'bank', members: [6], sets: 'filter', how: 'on-off', filter: { cornerHertz: 20, order: 3 } },
    ],
    exclusions: [{ control: 'bank', members: [3, 4] }],
    asDelivered: { bank: '000000' },
    paths: [
      { id: 'mm', label: 'MM', loadOhms: within(47_000, 0.01), inputFarads: within(70e-12, 0.1), stepUp: null },
      { id: 'mc', label: 'MC', loadOhms: within(47_000, 0.01), inputFarads: within(70e-12, 0.1), stepUp: null },
    ],
    gains: [gain('g36', 'mm', 36, 4.5, 0.4), gain('g42', 'mm', 42, 4.5, 0.4), gain('g60', 'mc', 60, 0.9, 3), gain('g66', 'mc', 66, 0.9, 3)],
    maximumOutputVolts: within(8, 0.03),
    outputOhms: within(100, 0.05),
    couplingFarads: null,
    hasBalancedOutput: false,
    fixedFilter: null,
    iecBass: false,
    offers: { stepUpInput: false, lowestLoadOhms: 90 },
    ...over,
  }
}

/** Everything known: a moving magnet of 5 mV into an ordinary amplifier. */
export function sampleInputs(over: Partial<MatchInputs> = {}): MatchInputs {
  return {
    preamp: samplePreamp(),
    present: null,
    cartridge: {
      name: 'Sample',
      type: 'moving-magnet',
      outputVolts: exactly(5e-3),
      coilOhms: exactly(700),
      coilHenries: exactly(0.45),
      recommendedLoadOhms: { low: 47_000, high: 47_000 },
      recommendedFarads: { low: 150e-12, high: 300e-12 },
      massKilograms: exactly(6e-3),
      complianceMetresPerNewton: exactly(14e-3),
      trackingForceNewtons: null,
      channels: 'stereo',
    },
    arm: { effectiveMassKilograms: exactly(11e-3), fixingsKilograms: exactly(1e-3), wiringFarads: exactly(20e-12), leadFarads: exactly(100e-12) },
    stepUp: null,
    output: 'unbalanced',
    next: { kind: 'line', name: 'Amplifier', maximumVolts: exactly(5), inputOhms: exactly(47_000), cableFarads: exactly(100e-12) },
    wishedVolts: null,
    temperatureKelvin: 298.15,
    ...over,
  }
}

/** A quantity somewhere in low–high: known, or doubtful by a ratio of up to `widest`. */
function quantity(low: number, high: number, widest: number): fc.Arbitrary<Quantity> {
  return fc
    .tuple(fc.double({ min: 0, max: 1, noNaN: true }), fc.double({ min: 0, max: 1, noNaN: true }), fc.boolean())
    .map(([place, width, known]) => {
      const value = low * (high / low) ** place
      return known ? exactly(value) : between(value, value * (1 + (widest - 1) * (0.05 + 0.95 * width)))
    })
}

type Topology = Preamp['topology']

/** Inputs over every type, topology, with and without a transformer, each quantity known or in doubt. */
export const anyInputs: fc.Arbitrary<MatchInputs> = fc
  .record({
    type: fc.constantFrom('moving-magnet' as const, 'moving-iron' as const, 'moving-coil' as const),
    topology: fc.constantFrom<Topology>('output-limited', 'first-stage-flat', 'first-stage-bass'),
    iecBass: fc.boolean(),
    coupled: fc.boolean(),
    transformer: fc.boolean(),
    magnet: fc.record({ output: quantity(2e-3, 8e-3, 2), coil: quantity(300, 1500, 2), henries: quantity(0.03, 0.9, 2) }),
    coil: fc.record({ output: quantity(0.1e-3, 2e-3, 3), coil: quantity(2, 150, 3), henries: quantity(2e-6, 1e-3, 4) }),
    lead: quantity(60e-12, 200e-12, 2.5),
    wiring: quantity(8e-12, 40e-12, 3),
    mass: quantity(6e-3, 25e-3, 2),
    compliance: quantity(6e-3, 30e-3, 2),
    ratio: quantity(5, 30, 1.1),
    maximum: quantity(1.5, 10, 3),
    resistance: quantity(10e3, 100e3, 3),
    cable: quantity(50e-12, 1e-9, 3),
  })
  .map((drawn) => {
    const electrics = drawn.type === 'moving-coil' ? drawn.coil : drawn.magnet
    const base = sampleInputs()
    return sampleInputs({
      preamp: samplePreamp({
        topology: drawn.topology,
        iecBass: drawn.iecBass,
        couplingFarads: drawn.coupled ? within(0.47e-6, 0.1) : null,
        outputOhms: within(drawn.coupled ? 2200 : 100, 0.1),
      }),
      cartridge: { ...base.cartridge, type: drawn.type, outputVolts: electrics.output, coilOhms: electrics.coil, coilHenries: electrics.henries, complianceMetresPerNewton: drawn.compliance, recommendedLoadOhms: null, recommendedFarads: null },
      arm: { ...base.arm, effectiveMassKilograms: drawn.mass, wiringFarads: drawn.wiring, leadFarads: drawn.lead },
      stepUp:
        drawn.transformer && drawn.type === 'moving-coil'
          ? { name: 'Sample', ratio: drawn.ratio, primaryOhms: within(2, 0.2), secondaryOhms: within(300, 0.2), primaryHenries: within(1, 0.3), secondaryFarads: within(120e-12, 0.3) }
          : null,
      next: { ...base.next, maximumVolts: drawn.maximum, inputOhms: drawn.resistance, cableFarads: drawn.cable },
    })
  })
