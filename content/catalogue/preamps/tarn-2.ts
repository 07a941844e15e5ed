import type { BoardEntry, GainEntry, PreampEntry } from '@/lib/catalogue/schema-preamp'
import { percent, plain, plusMinus } from '../figures'

/**
 * MM and MC, transistor, feedback equalisation, a bank of eight switches for each channel. The legends moved on the
 * second board: the serial number decides which is right.
 */

/** 36 and 42 dB run through the MM input stage alone. */
const MM_NOISE = {
  voltageNoiseNanovoltsPerRootHertz: percent(4.5, 10, 'measured'),
  currentNoisePicoamperesPerRootHertz: percent(0.4, 25, 'measured'),
} satisfies Partial<GainEntry>
/** 60 and 66 dB put the low-noise pair in front of it. */
const MC_NOISE = {
  voltageNoiseNanovoltsPerRootHertz: percent(0.9, 10, 'measured'),
  currentNoisePicoamperesPerRootHertz: percent(2.5, 20, 'measured'),
} satisfies Partial<GainEntry>

/** Everything that did not change between the boards. Output limit 7.9 V RMS at every gain. */
const SAME_ON_BOTH = {
  topology: 'output-limited',
  controls: [{ kind: 'bank', id: 'bank', label: 'Switches', place: 'back', switchCount: 8 }],
  asDelivered: { bank: '00000000' },
  paths: [
    { id: 'mm', label: 'MM', loadKilohms: percent(47, 1), inputPicofarads: percent(70, 10, 'measured'), stepUp: null },
    { id: 'mc', label: 'MC', loadKilohms: percent(47, 1), inputPicofarads: percent(70, 10, 'measured'), stepUp: null },
  ],
  gains: [
    { id: '36', pathId: 'mm', gainDecibels: plusMinus(36, 0.2), overload: [{ hertz: 1000, millivolts: plain(125) }], ...MM_NOISE },
    { id: '42', pathId: 'mm', gainDecibels: plusMinus(42, 0.2), overload: [{ hertz: 1000, millivolts: plain(63) }], ...MM_NOISE },
    { id: '60', pathId: 'mc', gainDecibels: plusMinus(60, 0.2), overload: [{ hertz: 1000, millivolts: plain(7.9) }], ...MC_NOISE },
    { id: '66', pathId: 'mc', gainDecibels: plusMinus(66, 0.2), overload: [{ hertz: 1000, millivolts: plain(4) }], ...MC_NOISE },
  ],
  maximumOutputVolts: percent(7.9, 4),
  outputOhms: percent(100, 5),
  couplingMicrofarads: null,
  hasBalancedOutput: false,
  fixedFilter: null,
  iecBass: false,
} satisfies Partial<BoardEntry>

/** Bits in the order of the switches: the first adds 6 dB, the second 24 dB. */
const GAINS = { '00': { gainId: '36' }, '10': { gainId: '42' }, '01': { gainId: '60' }, '11': { gainId: '66' } }
const LOADS = [percent(1000, 1), percent(400, 1), percent(100, 1)]
const ADDS_100 = percent(100, 5)
const ADDS_200 = percent(200, 5)
const RUMBLE = { cornerHertz: 20, order: 3 } as const

export const TARN_2: PreampEntry = {
  id: 'tarn-2',
  maker: 'Oskerby',
  name: 'Tarn 2',
  listOrder: 2,
  technology: 'transistor',
  inputMode: 'voltage',
  source: 'Manual and bench sheets, both boards',
  boards: [
    {
      ...SAME_ON_BOTH,
      id: 'first',
      name: 'first board, to serial 18999',
      serials: { from: null, to: 18999 },
      groups: [
        { id: 'load', label: 'Load', control: 'bank', members: [1, 2, 3], sets: 'load', how: 'parallel', resistorsOhms: LOADS },
        { id: 'gain', label: 'Gain', control: 'bank', members: [4, 5], sets: 'gain', how: 'choice', options: GAINS },
        { id: 'capacitance', label: 'Capacitance', control: 'bank', members: [6, 7], sets: 'capacitance', how: 'sum', capacitorsPicofarads: [ADDS_200, ADDS_100] },
        { id: 'rumble', label: 'Rumble', control: 'bank', members: [8], sets: 'filter', how: 'on-off', filter: RUMBLE },
      ],
      exclusions: [],
    },
    {
      ...SAME_ON_BOTH,
      id: 'second',
      name: 'second board, from serial 19000',
      serials: { from: 19000, to: null },
      groups: [
        { id: 'gain', label: 'Gain', control: 'bank', members: [1, 2], sets: 'gain', how: 'choice', options: GAINS },
        { id: 'load', label: 'Load', control: 'bank', members: [3, 4, 5], sets: 'load', how: 'parallel', resistorsOhms: LOADS },
        { id: 'capacitance', label: 'Capacitance', control: 'bank', members: [6, 7], sets: 'capacitance', how: 'sum', capacitorsPicofarads: [ADDS_100, ADDS_200] },
        { id: 'rumble', label: 'Rumble', control: 'bank', members: [8], sets: 'filter', how: 'on-off', filter: RUMBLE },
      ],
      exclusions: [{ control: 'bank', members: [3, 4] }],
    },
  ],
}
