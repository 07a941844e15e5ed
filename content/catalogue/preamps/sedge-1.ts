import type { PreampEntry } from '@/lib/catalogue/schema-preamp'
import { percent, plain, plusMinus } from '../figures'

/** MM, transistor, feedback equalisation, nothing to set. */
export const SEDGE_1: PreampEntry = {
  id: 'sedge-1',
  maker: 'Oskerby',
  name: 'Sedge 1',
  listOrder: 1,
  technology: 'transistor',
  inputMode: 'voltage',
  source: 'Manual, second printing',
  boards: [
    {
      id: 'only',
      name: '',
      serials: { from: null, to: null },
      topology: 'output-limited',
      controls: [],
      groups: [],
      exclusions: [],
      asDelivered: {},
      paths: [
        { id: 'mm', label: 'MM', loadKilohms: percent(47, 1), inputPicofarads: percent(100, 10), stepUp: null },
      ],
      gains: [
        {
          id: '40',
          pathId: 'mm',
          gainDecibels: plusMinus(40, 0.2),
          overload: [{ hertz: 1000, millivolts: plain(90) }],
          voltageNoiseNanovoltsPerRootHertz: percent(5.5, 15, 'measured'),
          currentNoisePicoamperesPerRootHertz: percent(0.6, 25, 'measured'),
        },
      ],
      maximumOutputVolts: percent(9, 5),
      outputOhms: percent(220, 5),
      couplingMicrofarads: percent(4.7, 20),
      hasBalancedOutput: false,
      fixedFilter: null,
      iecBass: false,
    },
  ],
}
