import type { CartridgeEntry } from '@/lib/catalogue/schema'
import { around, at, atLeast, between, conditionNotSaid, dynamic100Hz, dynamic10Hz, leaflet, LOAD_47K, one, output } from './leaflet'

const coil = (given: Omit<Parameters<typeof leaflet>[0], 'type'>) =>
  leaflet({ type: 'moving-coil', variety: 'high-output', ...given })

/** Moving coils strong enough for an MM input, invented. */
export const HIGH_OUTPUT_COILS: CartridgeEntry[] = [
  coil({
    maker: 'Brightwater',
    name: 'No. 9',
    source: 'Leaflet, 2015',
    outputMillivolts: output(one('2.5 mV', 2.5, '1 kHz, 5 cm/s'), at(5)),
    coilOhms: one('160 Ω', 160),
    loadOhms: LOAD_47K,
    massGrams: one('8.5 g', 8.5, 'without guard'),
    complianceMicrometresPerMillinewton: dynamic10Hz(one('15 µm/mN', 15, '10 Hz')),
    trackingForceGrams: around('1.8–2.2 g (2.0 g)', 1.8, 2, 2.2),
  }),
  coil({
    maker: 'Vireo',
    name: 'Oriole',
    source: 'Leaflet, 2009',
    outputMillivolts: output(one('2,0 mV', 2, '1 kHz, 3,54 cm/s peak per channel'), at(3.54, 'peak', 'perChannel')),
    coilOhms: one('100 Ω', 100),
    inductanceMillihenries: one('0.5 mH', 0.5),
    loadOhms: between('10k–47k', 10_000, 47_000),
    massGrams: one('7.8 g', 7.8),
    complianceMicrometresPerMillinewton: dynamic100Hz(one('8', 8, '100 Hz')),
    trackingForceGrams: between('1.8–2.2 g', 1.8, 2.2),
  }),
  coil({
    maker: 'Varnholt',
    name: 'Aspen H',
    source: 'Leaflet, 2020',
    outputMillivolts: output(one('1.6 mV', 1.6, '5 cm/s'), at(5)),
    coilOhms: around('130 Ω ±10 %', 117, 130, 143),
    loadOhms: between('1 kΩ to 47 kΩ', 1000, 47_000),
    massGrams: one('9.0 g', 9),
    complianceMicrometresPerMillinewton: conditionNotSaid(one('13', 13)),
    trackingForceGrams: one('2 g', 2),
  }),
  coil({
    maker: 'Saltern',
    name: 'Knot High',
    source: 'Leaflet, 2012',
    outputMillivolts: output(one('1.2 mV', 1.2, '1 kHz, 5 cm/s peak, lateral'), at(5, 'peak', 'lateral')),
    coilOhms: one('90 Ω', 90),
    inductanceMillihenries: one('70 µH', 0.07),
    loadOhms: atLeast('1 kΩ or more', 1000),
    massGrams: one('7 g', 7),
    complianceMicrometresPerMillinewton: dynamic10Hz(one('12', 12, 'dynamic, 10 Hz')),
    trackingForceGrams: between('19–21 mN', 1.94, 2.14),
  }),
  coil({
    maker: 'Ilverne',
    name: 'Upland',
    source: 'Leaflet, 1985',
    outputMillivolts: output(one('2.2 mV', 2.2, '1 kHz, 50 mm/s lateral'), at(5, null, 'lateral')),
    impedanceOhms: one('Z 120 Ω', 120, '1 kHz'),
    loadOhms: LOAD_47K,
    massGrams: one('5.3 g', 5.3),
    complianceMicrometresPerMillinewton: dynamic100Hz(one('9 × 10-6 cm/dyne', 9, '100 Hz')),
    trackingForceGrams: one('1.8 g', 1.8),
  }),
]
