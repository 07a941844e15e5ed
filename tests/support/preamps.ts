import { exactly, within, type Preamp } from '@/lib/match'

/** What every made-up preamp of these tests shares; its controls, groups and inputs are what they are about. */
const base = {
  boardId: 'first',
  boardName: '',
  technology: 'transistor',
  inputMode: 'voltage',
  topology: 'output-limited',
  exclusions: [],
  maximumOutputVolts: exactly(8),
  outputOhms: exactly(100),
  couplingFarads: null,
  hasBalancedOutput: false,
  fixedFilter: null,
  iecBass: false,
  offers: { stepUpInput: false, lowestLoadOhms: 100 },
} satisfies Partial<Preamp>

const gain = (id: string, pathId: 'mm' | 'mc', decibels: number): Preamp['gains'][number] => ({
  id,
  pathId,
  gainDecibels: exactly(decibels),
  overload: [{ hertz: 1000, volts: 8 / 10 ** (decibels / 20) }],
  voltageNoise: exactly(1e-9),
  currentNoise: exactly(1e-12),
})

const path = (id: 'mm' | 'mc', ohms = 47_000, farads = 70e-12): Preamp['paths'][number] => ({
  id,
  label: id.toUpperCase(),
  loadOhms: within(ohms, 0.01),
  inputFarads: within(farads, 0.1),
  stepUp: null,
})

/** Two banks of eight: gain on 1 and 2, loads on 3 to 5 (3 and 4 exclude each other), capacitance on 6 and 7, filter on 8. */
export function bankPreamp(): Preamp {
  return {
    ...base,
    modelId: 'bank-model',
    modelName: 'Bank model',
    controls: [{ kind: 'bank', id: 'bank', label: 'Switches', place: 'back', switchCount: 8 }],
    groups: [
      {
        id: 'gain',
        label: 'Gain',
        control: 'bank',
        members: [1, 2],
        sets: 'gain',
        how: 'choice',
        options: { '00': { gainId: 'g36' }, '10': { gainId: 'g42' }, '01': { gainId: 'g60' }, '11': { gainId: 'g66' } },
      },
      {
        id: 'load',
        label: 'Load',
        control: 'bank',
        members: [3, 4, 5],
        sets: 'load',
        how: 'parallel',
        resistorsOhms: [within(1000, 0.01), within(100, 0.01), within(470, 0.01)],
      },
      {
        id: 'capacitance',
        label: 'Capacitance',
        control: 'bank',
        members: [6, 7],
        sets: 'capacitance',
        how: 'sum',
        capacitorsFarads: [within(100e-12, 0.05), within(220e-12, 0.05)],
      },
      { id: 'rumble', label: 'Rumble', control: 'bank', members: [8], sets: 'filter', how: 'on-off', filter: { cornerHertz: 18, order: 2 } },
    ],
    exclusions: [{ control: 'bank', members: [3, 4] }],
    asDelivered: { bank: '00000000' },
    paths: [path('mm'), path('mc')],
    gains: [gain('g36', 'mm', 36), gain('g42', 'mm', 42), gain('g60', 'mc', 60), gain('g66', 'mc', 66)],
  }
}

/** Load plugs on each side and a slide for the gain of both. */
export function plugPreamp(): Preamp {
  return {
    ...base,
    modelId: 'plug-model',
    modelName: 'Plug model',
    controls: [
      {
        kind: 'plugs',
        id: 'load',
        label: 'Load',
        place: 'back',
        positions: [
          { id: 'p10', label: '10 Ω' },
          { id: 'p100', label: '100 Ω' },
          { id: 'p1000', label: '1 kΩ' },
        ],
      },
      {
        kind: 'slide',
        id: 'gain',
        label: 'Gain',
        place: 'back',
        positions: [
          { id: 'low', label: '56 dB' },
          { id: 'middle', label: '64 dB' },
          { id: 'high', label: '72 dB' },
        ],
      },
    ],
    groups: [
      {
        id: 'load',
        label: 'Load',
        control: 'load',
        members: null,
        sets: 'load',
        how: 'choice',
        options: { p10: { loadOhms: within(10, 0.01) }, p100: { loadOhms: within(100, 0.01) }, p1000: { loadOhms: within(979, 0.01) } },
      },
      {
        id: 'gain',
        label: 'Gain',
        control: 'gain',
        members: null,
        sets: 'gain',
        how: 'choice',
        options: { low: { gainId: 'g56' }, middle: { gainId: 'g64' }, high: { gainId: 'g72' } },
      },
    ],
    asDelivered: { load: 'p1000', gain: 'middle' },
    paths: [path('mc')],
    gains: [gain('g56', 'mc', 56), gain('g64', 'mc', 64), gain('g72', 'mc', 72)],
  }
}

/** A valve preamp with front buttons: input and MC load let each other out, rumble and mono stand by themselves. */
export function buttonPreamp(): Preamp {
  return {
    ...base,
    modelId: 'button-model',
    modelName: 'Button model',
    technology: 'valve',
    controls: [
      {
        kind: 'buttons',
        id: 'input',
        label: 'Input',
        place: 'front',
        latch: 'one-in',
        buttons: [
          { id: 'mm', label: 'MM' },
          { id: 'mc', label: 'MC' },
        ],
      },
      {
        kind: 'buttons',
        id: 'mc-load',
        label: 'MC load',
        place: 'front',
        latch: 'one-in',
        buttons: [
          { id: 'l40', label: '40 Ω' },
          { id: 'l100', label: '100 Ω' },
          { id: 'l400', label: '400 Ω' },
        ],
      },
      {
        kind: 'buttons',
        id: 'extra',
        label: 'Filter and output',
        place: 'front',
        latch: 'each',
        buttons: [
          { id: 'rumble', label: 'Rumble' },
          { id: 'mono', label: 'Mono' },
        ],
      },
    ],
    groups: [
      { id: 'input', label: 'Input', control: 'input', members: null, sets: 'input', how: 'choice', options: { mm: { pathId: 'mm' }, mc: { pathId: 'mc' } } },
      {
        id: 'mc-load',
        label: 'MC load',
        control: 'mc-load',
        members: null,
        sets: 'load',
        how: 'choice',
        options: { l40: { loadOhms: within(40, 0.02) }, l100: { loadOhms: within(100, 0.02) }, l400: { loadOhms: within(400, 0.02) } },
        onlyWhen: { group: 'input', options: ['mc'] },
      },
      { id: 'rumble', label: 'Rumble', control: 'extra', members: [1], sets: 'filter', how: 'on-off', filter: { cornerHertz: 20, order: 1 } },
      { id: 'mono', label: 'Mono', control: 'extra', members: [2], sets: 'other', how: 'on-off' },
    ],
    asDelivered: { input: 'mm', 'mc-load': 'l100', extra: '00' },
    paths: [path('mm'), path('mc', 1000)],
    gains: [gain('g40', 'mm', 40), gain('g62', 'mc', 62)],
  }
}

/** Two banks of six and a slide for the input, a combination that no demo model has. Switch 6 does nothing. */
export function mixedPreamp(): Preamp {
  return {
    ...base,
    modelId: 'mixed-model',
    modelName: 'Mixed model',
    controls: [
      { kind: 'bank', id: 'six', label: 'Switches', place: 'back', switchCount: 6 },
      {
        kind: 'slide',
        id: 'input',
        label: 'Input',
        place: 'back',
        positions: [
          { id: 'mm', label: 'MM' },
          { id: 'mc', label: 'MC' },
        ],
      },
    ],
    groups: [
      { id: 'input', label: 'Input', control: 'input', members: null, sets: 'input', how: 'choice', options: { mm: { pathId: 'mm' }, mc: { pathId: 'mc' } } },
      {
        id: 'mm-gain',
        label: 'MM gain',
        control: 'six',
        members: [1],
        sets: 'gain',
        how: 'choice',
        options: { '0': { gainId: 'g38' }, '1': { gainId: 'g44' } },
        onlyWhen: { group: 'input', options: ['mm'] },
      },
      {
        id: 'mc-gain',
        label: 'MC gain',
        control: 'six',
        members: [1],
        sets: 'gain',
        how: 'choice',
        options: { '0': { gainId: 'g58' }, '1': { gainId: 'g64' } },
        onlyWhen: { group: 'input', options: ['mc'] },
      },
      {
        id: 'mc-load',
        label: 'MC load',
        control: 'six',
        members: [2, 3],
        sets: 'load',
        how: 'parallel',
        resistorsOhms: [within(100, 0.01), within(470, 0.01)],
        onlyWhen: { group: 'input', options: ['mc'] },
      },
      {
        id: 'capacitance',
        label: 'Capacitance',
        control: 'six',
        members: [4, 5],
        sets: 'capacitance',
        how: 'sum',
        capacitorsFarads: [within(100e-12, 0.05), within(150e-12, 0.05)],
        onlyWhen: { group: 'input', options: ['mm'] },
      },
    ],
    asDelivered: { six: '000000', input: 'mm' },
    paths: [path('mm'), path('mc', 1000)],
    gains: [gain('g38', 'mm', 38), gain('g44', 'mm', 44), gain('g58', 'mc', 58), gain('g64', 'mc', 64)],
  }
}

/** Nothing to set. */
export function fixedPreamp(): Preamp {
  return {
    ...base,
    modelId: 'fixed-model',
    modelName: 'Fixed model',
    controls: [],
    groups: [],
    asDelivered: {},
    paths: [path('mm', 47_000, 100e-12)],
    gains: [gain('g40', 'mm', 40)],
  }
}

export const PREAMPS: Preamp[] = [bankPreamp(), plugPreamp(), buttonPreamp(), mixedPreamp(), fixedPreamp()]
