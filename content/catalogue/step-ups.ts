import type { StepUpEntry } from '@/lib/catalogue/schema'
import { asPrinted, percent, plain, span } from './figures'

/**
 * Transformers, invented. Where only impedances are printed, the ratio is √(secondary / primary): 150 Ω : 50 kΩ is 1:18.3.
 * Where only a coil is named, the ratio is what such labels usually mean, as a range.
 */
export const STEP_UPS: StepUpEntry[] = [
  {
    id: 'woolmarrow-ten',
    maker: 'Woolmarrow',
    name: 'Ten',
    taps: [
      {
        id: 'only',
        label: '1 : 10',
        ratio: percent(10, 1),
        primaryOhms: percent(3, 10),
        secondaryOhms: percent(260, 10),
        primaryHenries: percent(1.2, 25),
        secondaryPicofarads: percent(80, 20),
      },
    ],
    notes: [],
  },
  {
    id: 'woolmarrow-twenty',
    maker: 'Woolmarrow',
    name: 'Twenty',
    taps: [
      {
        id: 'only',
        label: '1 : 20',
        ratio: percent(20, 1),
        primaryOhms: percent(1.3, 10),
        secondaryOhms: percent(670, 10),
        primaryHenries: percent(0.45, 25),
        secondaryPicofarads: percent(120, 20),
      },
    ],
    notes: [],
  },
  {
    id: 'woolmarrow-three-way',
    maker: 'Woolmarrow',
    name: 'Three Way',
    taps: [
      { id: 'low', label: '3 Ω', ratio: plain(36), primaryOhms: percent(0.5, 15), secondaryOhms: percent(900, 10), primaryHenries: null, secondaryPicofarads: percent(160, 25) },
      { id: 'middle', label: '12 Ω', ratio: plain(18), primaryOhms: percent(1.1, 15), secondaryOhms: percent(900, 10), primaryHenries: null, secondaryPicofarads: percent(160, 25) },
      { id: 'high', label: '40 Ω', ratio: plain(9), primaryOhms: percent(4, 15), secondaryOhms: percent(900, 10), primaryHenries: null, secondaryPicofarads: percent(160, 25) },
    ],
    notes: ['The figure at the switch names the coil it is meant for. It is not the load.'],
  },
  {
    id: 'ironlatch-150',
    maker: 'Ironlatch',
    name: '150',
    taps: [
      {
        id: 'only',
        label: '150 Ω : 50 kΩ',
        ratio: asPrinted('150 Ω : 50 kΩ', percent(18.257, 2)),
        primaryOhms: percent(9, 15),
        secondaryOhms: percent(2800, 15),
        primaryHenries: null,
        secondaryPicofarads: null,
      },
    ],
    notes: ['Made for microphones.'],
  },
  {
    id: 'ironlatch-600',
    maker: 'Ironlatch',
    name: '600',
    taps: [
      {
        id: 'only',
        label: '600 Ω : 60 kΩ',
        ratio: asPrinted('600 Ω : 60 kΩ', percent(10, 2)),
        primaryOhms: percent(28, 15),
        secondaryOhms: percent(3100, 15),
        primaryHenries: percent(4, 30),
        secondaryPicofarads: null,
      },
    ],
    notes: ['Its windings are long: into a low coil they cost some level and hiss.'],
  },
  {
    id: 'brightwater-companion',
    maker: 'Brightwater',
    name: 'Companion',
    taps: [
      {
        id: 'only',
        label: 'for coils of 3 to 15 Ω',
        ratio: asPrinted('for coils of 3 to 15 Ω', span(15, 26, 'typical')),
        primaryOhms: null,
        secondaryOhms: null,
        primaryHenries: null,
        secondaryPicofarads: null,
      },
    ],
    notes: ['No ratio is printed.'],
  },
  {
    id: 'varnholt-grove',
    maker: 'Varnholt',
    name: 'Grove',
    taps: [
      { id: 'in-series', label: '1 : 13', ratio: percent(13, 1), primaryOhms: percent(2, 10), secondaryOhms: percent(430, 10), primaryHenries: percent(1.6, 25), secondaryPicofarads: percent(95, 20) },
      { id: 'in-parallel', label: '1 : 26', ratio: percent(26, 1), primaryOhms: percent(0.5, 10), secondaryOhms: percent(430, 10), primaryHenries: percent(0.4, 25), secondaryPicofarads: percent(95, 20) },
    ],
    notes: [],
  },
  {
    id: 'saltern-creek',
    maker: 'Saltern',
    name: 'Creek',
    taps: [
      {
        id: 'only',
        label: '26 dB',
        ratio: asPrinted('26 dB', percent(19.95, 2)),
        primaryOhms: percent(0.8, 10),
        secondaryOhms: percent(320, 10),
        primaryHenries: percent(0.6, 25),
        secondaryPicofarads: percent(110, 20),
      },
    ],
    notes: [],
  },
  {
    id: 'tollard-gate',
    maker: 'Tollard',
    name: 'Gate',
    taps: [
      {
        id: 'only',
        label: '1 : 35',
        ratio: percent(35.4, 2),
        primaryOhms: percent(0.3, 20),
        secondaryOhms: null,
        primaryHenries: null,
        secondaryPicofarads: span(150, 300, 'typical'),
      },
    ],
    notes: ['For coils of 2 or 3 Ω. A coil of 40 Ω loses half its level in it.'],
  },
]
