import type { GainEntry, PreampEntry } from '@/lib/catalogue/schema-preamp'
import { percent, plain, plusMinus } from '../figures'

/**
 * MC only, transistor. A flat first stage, passive equalisation, a second stage of 11 dB. Measured on the bench: at
 * 100 Hz the second stage runs out first, above that the first does, alike at every frequency.
 */
function gain(decibels: number, [at100, at1000, at10000]: [number, number, number], voltageNoise: number): GainEntry {
  return {
    id: String(decibels),
    pathId: 'mc',
    gainDecibels: plusMinus(decibels, 0.2),
    overload: [
      { hertz: 100, millivolts: plain(at100, 'measured') },
      { hertz: 1000, millivolts: plain(at1000, 'measured') },
      { hertz: 10_000, millivolts: plain(at10000, 'measured') },
    ],
    voltageNoiseNanovoltsPerRootHertz: percent(voltageNoise, 10, 'measured'),
    currentNoisePicoamperesPerRootHertz: percent(3, 20, 'measured'),
  }
}

export const MERRIN_5: PreampEntry = {
  id: 'merrin-5',
  maker: 'Oskerby',
  name: 'Merrin 5',
  listOrder: 3,
  technology: 'transistor',
  inputMode: 'voltage',
  source: 'Manual and bench sheet',
  boards: [
    {
      id: 'only',
      name: '',
      serials: { from: null, to: null },
      topology: 'first-stage-flat',
      controls: [
        {
          kind: 'plugs',
          id: 'plugs',
          label: 'Load',
          place: 'back',
          // A pair of each is in the box. Without a plug the input is open, so an empty socket is no position.
          positions: [
            { id: '10', label: '10 Ω' },
            { id: '30', label: '30 Ω' },
            { id: '100', label: '100 Ω' },
            { id: '300', label: '300 Ω' },
            { id: '1k', label: '1 kΩ' },
          ],
        },
        {
          kind: 'slide',
          id: 'slide',
          label: 'Gain',
          place: 'back',
          positions: [
            { id: '56', label: '56 dB' },
            { id: '64', label: '64 dB' },
            { id: '72', label: '72 dB' },
          ],
        },
      ],
      groups: [
        {
          id: 'load',
          label: 'Load',
          control: 'plugs',
          members: null,
          sets: 'load',
          how: 'choice',
          options: {
            '10': { loadOhms: percent(10, 1) },
            '30': { loadOhms: percent(30, 1) },
            '100': { loadOhms: percent(100, 1) },
            '300': { loadOhms: percent(300, 1) },
            '1k': { loadOhms: percent(1000, 1) },
          },
        },
        {
          id: 'gain',
          label: 'Gain',
          control: 'slide',
          members: null,
          sets: 'gain',
          how: 'choice',
          options: { '56': { gainId: '56' }, '64': { gainId: '64' }, '72': { gainId: '72' } },
        },
      ],
      exclusions: [],
      asDelivered: { plugs: '100', slide: '64' },
      paths: [
        // Across an empty socket; the plug in it decides.
        { id: 'mc', label: 'MC', loadKilohms: percent(47, 5), inputPicofarads: percent(220, 10), stepUp: null },
      ],
      gains: [
        gain(56, [4.2, 11.2, 11], 1),
        gain(64, [1.7, 4.5, 4.4], 0.6),
        gain(72, [0.67, 1.78, 1.75], 0.55),
      ],
      maximumOutputVolts: percent(12, 5),
      outputOhms: percent(75, 5),
      couplingMicrofarads: null,
      hasBalancedOutput: true,
      fixedFilter: null,
      iecBass: false,
    },
  ],
}
