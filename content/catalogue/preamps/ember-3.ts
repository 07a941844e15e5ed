import type { PreampEntry } from '@/lib/catalogue/schema-preamp'
import { percent, plain, plusMinus, span } from '../figures'

/**
 * Valve, MM and MC by front buttons. MC passes a transformer of 1:12.6; its load resistors stand behind it, so that
 * the cartridge sees about the figure on the button: 2 Ω + (400 Ω + R)/12.6² is 39.9, 99 and 403 Ω. Bass is equalised
 * in the first stage, 75 µs after it.
 */
export const EMBER_3: PreampEntry = {
  id: 'ember-3',
  maker: 'Oskerby',
  name: 'Ember 3',
  listOrder: 4,
  technology: 'valve',
  inputMode: 'voltage',
  source: 'Manual and bench sheet',
  boards: [
    {
      id: 'only',
      name: '',
      serials: { from: null, to: null },
      topology: 'first-stage-bass',
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
            { id: '40', label: '40 Ω' },
            { id: '100', label: '100 Ω' },
            { id: '400', label: '400 Ω' },
          ],
        },
        { kind: 'buttons', id: 'rumble', label: 'Filter', place: 'front', latch: 'each', buttons: [{ id: 'rumble', label: 'Rumble' }] },
        { kind: 'buttons', id: 'mono', label: 'Output', place: 'front', latch: 'each', buttons: [{ id: 'mono', label: 'Mono' }] },
      ],
      groups: [
        {
          id: 'input',
          label: 'Input',
          control: 'input',
          members: null,
          sets: 'input',
          how: 'choice',
          options: { mm: { pathId: 'mm' }, mc: { pathId: 'mc' } },
        },
        {
          id: 'mc-load',
          label: 'MC load',
          control: 'mc-load',
          members: null,
          sets: 'load',
          how: 'choice',
          options: {
            '40': { loadOhms: percent(5620, 1) },
            '100': { loadOhms: percent(15_000, 1) },
            '400': { loadOhms: percent(63_400, 1) },
          },
          onlyWhen: { group: 'input', options: ['mc'] },
        },
        { id: 'rumble', label: 'Rumble', control: 'rumble', members: [1], sets: 'filter', how: 'on-off', filter: { cornerHertz: 18, order: 2 } },
        { id: 'mono', label: 'Mono', control: 'mono', members: [1], sets: 'other', how: 'on-off' },
      ],
      exclusions: [],
      asDelivered: { input: 'mm', 'mc-load': '100', rumble: '0', mono: '0' },
      paths: [
        { id: 'mm', label: 'MM', loadKilohms: percent(47, 1), inputPicofarads: span(105, 140, 'measured'), stepUp: null },
        {
          id: 'mc',
          label: 'MC',
          loadKilohms: percent(63.4, 1),
          inputPicofarads: span(105, 140, 'measured'),
          stepUp: {
            name: 'built-in transformer',
            ratio: percent(12.6, 1),
            primaryOhms: percent(2, 10),
            secondaryOhms: percent(400, 10),
            primaryHenries: percent(0.9, 25, 'measured'),
            secondaryPicofarads: percent(90, 20, 'measured'),
          },
        },
      ],
      gains: [
        {
          id: '40',
          pathId: 'mm',
          gainDecibels: plusMinus(40, 0.4),
          overload: [{ hertz: 1000, millivolts: plain(160, 'measured') }],
          voltageNoiseNanovoltsPerRootHertz: percent(4, 25, 'measured'),
          currentNoisePicoamperesPerRootHertz: span(0.01, 0.04, 'typical'),
        },
        {
          id: '62',
          pathId: 'mc',
          gainDecibels: plusMinus(62, 0.4),
          overload: [{ hertz: 1000, millivolts: plain(12.7, 'measured') }],
          voltageNoiseNanovoltsPerRootHertz: percent(4, 25, 'measured'),
          currentNoisePicoamperesPerRootHertz: span(0.01, 0.04, 'typical'),
        },
      ],
      maximumOutputVolts: percent(22, 8, 'measured'),
      outputOhms: percent(2200, 15, 'measured'),
      couplingMicrofarads: percent(0.47, 10),
      hasBalancedOutput: false,
      fixedFilter: null,
      iecBass: false,
    },
  ],
}
