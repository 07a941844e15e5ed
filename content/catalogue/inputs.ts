import type { InputEntry } from '@/lib/catalogue/schema'
import { asPrinted, percent, plain, span } from './figures'

/** What a preamp plays into, invented. Volts RMS at which the input distorts. */

const from = (maker: string, name: string, id: string) => ({ id, maker, name, takesBalanced: false, notes: [] as string[] })

export const INPUTS: InputEntry[] = [
  { ...from('Fairlow', 'Integrated 30, line', 'fairlow-integrated-30'), kind: 'line', maximumVolts: percent(3.4, 5), inputKilohms: percent(47, 5) },
  { ...from('Fairlow', 'Integrated 60, line', 'fairlow-integrated-60'), kind: 'line', maximumVolts: plain(5), inputKilohms: percent(22, 5) },
  {
    ...from('Fairlow', 'Separate Pre, line', 'fairlow-separate-pre'),
    kind: 'line',
    maximumVolts: plain(9.5),
    inputKilohms: percent(47, 5),
    takesBalanced: true,
  },
  { ...from('Greywether', 'Line One, aux', 'greywether-line-one'), kind: 'line', maximumVolts: plain(8), inputKilohms: percent(100, 5) },
  {
    ...from('Greywether', 'Passive control', 'greywether-passive'),
    kind: 'line',
    maximumVolts: asPrinted('20 V', plain(20)),
    inputKilohms: percent(10, 10),
    notes: ['A volume control without an amplifier: it hardly distorts at all.'],
  },
  {
    ...from('Greywether', 'Valve Line, line', 'greywether-valve-line'),
    kind: 'line',
    maximumVolts: span(2.2, 3),
    inputKilohms: percent(250, 10),
    notes: ['A valve line stage.'],
  },
  {
    ...from('Harkstead', 'Receiver 2, CD', 'harkstead-receiver-2'),
    kind: 'line',
    maximumVolts: plain(2.1),
    inputKilohms: percent(20, 10),
    notes: ['It turns every input into digits, so it distorts early.'],
  },
  {
    ...from('Harkstead', 'Receiver 2, phono', 'harkstead-receiver-2-phono'),
    kind: 'phono',
    maximumVolts: asPrinted('100 mV', plain(0.1)),
    inputKilohms: percent(47, 5),
    notes: ['A phono input has a phono stage of its own. A preamp belongs into a line input.'],
  },
  {
    ...from('Harkstead', 'Active 6, line', 'harkstead-active-6'),
    kind: 'line',
    maximumVolts: asPrinted('2.5 V RMS at the lower sensitivity', plain(2.5)),
    inputKilohms: percent(10, 10),
    takesBalanced: true,
    notes: ['An active loudspeaker.'],
  },
  { ...from('Pinfold', 'Streamer, analogue in', 'pinfold-streamer'), kind: 'digital', maximumVolts: plain(2), inputKilohms: percent(47, 10) },
  {
    ...from('Pinfold', 'Two-in interface, line', 'pinfold-two-in'),
    kind: 'digital',
    maximumVolts: asPrinted('+8 dBu', plain(1.95)),
    inputKilohms: percent(10, 10),
    takesBalanced: true,
    notes: ['A recording interface. Keep phantom supply off.'],
  },
  {
    ...from('Pinfold', 'Eight-in interface, line', 'pinfold-eight-in'),
    kind: 'digital',
    maximumVolts: asPrinted('+20 dBu', plain(7.75)),
    inputKilohms: percent(20, 10),
    takesBalanced: true,
  },
  { ...from('Candlemoor', 'Reel, line', 'candlemoor-reel'), kind: 'recorder', maximumVolts: span(3, 4.5), inputKilohms: percent(100, 10) },
  {
    ...from('Candlemoor', 'Cassette, line', 'candlemoor-cassette'),
    kind: 'recorder',
    maximumVolts: null,
    inputKilohms: percent(47, 10),
    notes: ['Its level control comes first: it hardly distorts at the socket.'],
  },
  { ...from('Candlemoor', 'Desk headphone stage', 'candlemoor-desk'), kind: 'headphones', maximumVolts: plain(4), inputKilohms: percent(10, 10) },
  { ...from('Candlemoor', 'Valve headphone stage', 'candlemoor-valve'), kind: 'headphones', maximumVolts: span(2.5, 3.5), inputKilohms: percent(50, 10) },
]
