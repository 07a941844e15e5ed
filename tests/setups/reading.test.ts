import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { readField } from '@/lib/setups/field-reading'
import { parseNumber } from '@/lib/setups/numerals'
import { readText } from '@/lib/setups/reading'
import type { CartridgeChoice, NumberField } from '@/lib/setups/terms'
import type { RawAnswers } from '@/lib/setups/trouble'
import { written, writtenRange } from '@/lib/setups/units'

// Ways of writing are those of leaflets and forms in several countries: common practice, no source.
// A gram-force is 9.80665 mN by definition; 0 dBu is √0.6 V by definition.

const MAGNET: CartridgeChoice = 'moving-magnet'
const COIL: CartridgeChoice = 'moving-coil'
const read = (field: NumberField, text: string, type: CartridgeChoice = MAGNET, others: RawAnswers = {}) =>
  readField(field, { [field]: text, ...others }, type)

describe('one value', () => {
  test.each<[NumberField, string, CartridgeChoice, number]>([
    ['output', '5.4', MAGNET, 5.4],
    ['output', '4,5', MAGNET, 4.5],
    ['output', '4.5mV', MAGNET, 4.5],
    ['output', ' 4.5  mV ', MAGNET, 4.5],
    ['output', '.4 mV', COIL, 0.4],
    ['output', ',4mv', COIL, 0.4],
    ['output', '0,0045 V', MAGNET, 4.5],
    ['output', '200 µV', COIL, 0.2],
    ['output', '200 μV', COIL, 0.2],
    ['output', '200uV', COIL, 0.2],
    ['output', '5.5 mVrms', MAGNET, 5.5],
    ['output', '0.3mV/ch', COIL, 0.3],
    ['output', 'about 5', MAGNET, 5],
    ['output', '−64 dBV', COIL, 0.630957],
    ['coil', '700', MAGNET, 700],
    ['coil', '1,400', MAGNET, 1400],
    ['coil', '1 400 Ω', MAGNET, 1400],
    ['coil', '1 400', MAGNET, 1400],
    ['coil', "1'400", MAGNET, 1400],
    ['coil', '1.4 kΩ', MAGNET, 1400],
    ['coil', '1.4 kΩ', MAGNET, 1400],
    ['coil', '1,4 kohm', MAGNET, 1400],
    ['coil', '1k4', MAGNET, 1400],
    ['coil', '10R', COIL, 10],
    ['coil', '4R7', COIL, 4.7],
    ['inductance', '0.3 H', MAGNET, 300],
    ['inductance', '300 mH', MAGNET, 300],
    ['inductance', '460 mH (1 kHz)', MAGNET, 460],
    ['inductance', '50 µH', COIL, 0.05],
    ['load', '47', MAGNET, 47_000],
    ['load', '47k', MAGNET, 47_000],
    ['load', '47 kΩ', MAGNET, 47_000],
    ['load', '47kohm', MAGNET, 47_000],
    ['load', '47 K Ohms', MAGNET, 47_000],
    ['load', '47,000 ohms', MAGNET, 47_000],
    ['load', '100', COIL, 100],
    ['load', '0.047 MΩ', COIL, 47_000],
    ['capacitance', '0.2 nF', MAGNET, 200],
    ['capacitance', '200 pF total', MAGNET, 200],
    ['mass', '6,2 g', MAGNET, 6.2],
    ['compliance', '20 µm/mN', MAGNET, 20],
    ['compliance', '20×10⁻⁶ cm/dyne', MAGNET, 20],
    ['compliance', '20 x 10-6 cm/dyn', MAGNET, 20],
    ['compliance', '20x10–6', MAGNET, 20],
    ['compliance', '12 cu', MAGNET, 12],
    ['compliance', '15 mm/N', MAGNET, 15],
    ['force', '2', MAGNET, 2],
    ['force', '1¾ p', MAGNET, 1.75],
    ['force', '20 mN', MAGNET, 2.0394],
    ['leadMetres', '120 cm', MAGNET, 1.2],
    ['leadMetres', '4 ft', MAGNET, 1.2192],
    ['leadPerMetre', '30 pF/ft', MAGNET, 98.425],
    ['nextMax', '+24 dBu', MAGNET, 12.277],
    ['nextLoad', '600 ohm', MAGNET, 0.6],
    ['wish', '0.5 V', MAGNET, 500],
    ['ratio', '10', COIL, 10],
    ['ratio', '1:10', COIL, 10],
    ['ratio', '10 : 1', COIL, 10],
    ['ratio', 'x20', COIL, 20],
    ['ratio', '26 dB', COIL, 19.953],
    // Label 150 : 50k is 1:18 (published, read).
    ['ratio', '150 : 50k', COIL, 18.257],
    ['ratio', '150 Ω : 50 kΩ', COIL, 18.257],
  ])('%s "%s" with a %s', (field, text, type, value) => {
    const { given, trouble } = read(field, text, type)
    expect(trouble).toBeNull()
    expect(given?.nominal).toBeCloseTo(value, value > 1000 ? 6 : 3)
    expect(given?.low).toBe(given?.high)
  })

  test('an empty box and a value under "Don\'t know" say nothing', () => {
    expect(read('output', '')).toEqual({ given: null, trouble: null, understood: null })
    expect(read('output', '  ')).toEqual({ given: null, trouble: null, understood: null })
    expect(read('inductance', 'nonsense', MAGNET, { inductanceHow: 'unknown' }).trouble).toBeNull()
  })

  test('the text is kept as it stood, its unit beside it', () => {
    expect(read('output', '4,5').given?.text).toBe('4,5 mV')
    expect(read('coil', '1k4').given?.text).toBe('1k4')
    expect(read('load', '100 or more', COIL).given?.text).toBe('100 Ω or more')
  })
})

describe('ranges', () => {
  test.each<[NumberField, string, CartridgeChoice, number, number]>([
    ['inductance', '400-550', MAGNET, 400, 550],
    ['inductance', '400–550 mH', MAGNET, 400, 550],
    ['inductance', '400 to 550 mH', MAGNET, 400, 550],
    ['inductance', '0.4 to 0.55 H', MAGNET, 400, 550],
    ['inductance', '400 mH - 0.55 H', MAGNET, 400, 550],
    ['capacitance', '150–300 pF', MAGNET, 150, 300],
    ['capacitance', '150…300', MAGNET, 150, 300],
    ['capacitance', 'up to 500', MAGNET, 0, 500],
    ['capacitance', '≤ 500 pF', MAGNET, 0, 500],
    ['load', '100-1k', COIL, 100, 1000],
    ['load', '1k-47k', COIL, 1000, 47_000],
    ['load', '1–47 kΩ', COIL, 1000, 47_000],
    ['load', '10–50 Ω', COIL, 10, 50],
    ['load', '> 100 Ω', COIL, 100, Infinity],
    ['load', '100 Ω or more', COIL, 100, Infinity],
    ['output', '2.5 mV ±2 dB', MAGNET, 1.98582, 3.14731],
    ['output', '2.5 mV +-2 dB', MAGNET, 1.98582, 3.14731],
    ['coil', '12 Ω ±20 %', COIL, 9.6, 14.4],
    ['force', '18 ± 2 mN', MAGNET, 1.63155, 2.03943],
    ['ratio', '5-10', COIL, 5, 10],
  ])('%s "%s" with a %s', (field, text, type, low, high) => {
    const { given, trouble } = read(field, text, type)
    expect(trouble).toBeNull()
    expect(given?.low).toBeCloseTo(low, 4)
    if (high === Infinity) expect(given?.high).toBe(Infinity)
    else expect(given?.high).toBeCloseTo(high, 4)
  })

  test('a tolerance keeps the printed value as its middle', () => {
    expect(read('output', '2.5 mV ±2 dB').given?.nominal).toBe(2.5)
  })

  test('two boxes make a range, each with its own unit', () => {
    const both = read('inductance', '400', MAGNET, { inductanceHow: 'between', inductanceTo: '0.55 H' })
    expect(both.given).toMatchObject({ low: 400, high: 550, text: '400 to 0.55 H' })
    expect(both.understood).toBe('400 to 550 mH')
  })

  test('a range typed into the first of two boxes is enough', () => {
    expect(read('inductance', '400-550', MAGNET, { inductanceHow: 'between' }).given).toMatchObject({ low: 400, high: 550 })
  })

  test('"or more" in its own choice leaves the upper end open', () => {
    const above = read('load', '100', COIL, { loadHow: 'above' })
    expect(above.given).toMatchObject({ low: 100, high: Infinity })
    expect(above.understood).toBe('100 Ω or more')
  })
})

describe('wrong input: one sentence and a way out', () => {
  test.each<[NumberField, string, CartridgeChoice, RegExp, RawAnswers]>([
    ['output', '4.5 V', MAGNET, /^4\.5 V would be a thousand times too strong for a cartridge\. Did you mean 4\.5 mV\?$/, { output: '4.5 mV' }],
    ['output', '45', MAGNET, /ten times too strong.*Did you mean 4\.5 mV\?/, { output: '4.5 mV' }],
    ['output', '200', COIL, /Did you mean 200 µV\?/, { output: '200 µV' }],
    ['output', '0', MAGNET, /^Output is always above zero\. Most moving magnets are 2 to 8 mV\.$/, { outputHow: 'unknown' }],
    ['output', '-3', MAGNET, /always above zero/, { outputHow: 'unknown' }],
    ['output', 'loud', MAGNET, /^We cannot read a number out of “loud”\./, { outputHow: 'unknown' }],
    ['output', '5 mV or so', MAGNET, /cannot read/, { output: '5 mV' }],
    ['output', '> 2 mV', MAGNET, /leaves one end open/, { output: '2 mV' }],
    ['output', '550-400', MAGNET, /^The second value is lower than the first\. Swap them\?$/, { output: '400 to 550' }],
    ['output', '5.0 mV (1 kHz, 5 cm/s)', MAGNET, /groove speed goes into the row beside/, { output: '5.0 mV', velocity: '5' }],
    ['output', '6 mV at 7 cm/s', MAGNET, /groove speed goes into the row beside/, { output: '6 mV', velocity: 'other', velocityOther: '7' }],
    ['output', '1 mV per cm/s', MAGNET, /for each cm\/s/, { output: '1 mV', velocity: 'per-cm' }],
    ['inductance', '0.5', MAGNET, /^0\.5 mH is a thousand times too little for a moving magnet\. Did you mean 0\.5 H\?$/, { inductance: '0.5 H' }],
    ['inductance', '500 µH', MAGNET, /Did you mean 500 mH\?/, { inductance: '500 mH' }],
    ['inductance', '500 H', MAGNET, /Did you mean 500 mH\?/, { inductance: '500 mH' }],
    ['inductance', '50 mH', COIL, /a thousand times too much for a moving coil\. Did you mean 50 µH\?/, { inductance: '50 µH' }],
    ['inductance', '0', MAGNET, /^Inductance is always above zero\. Most moving magnets are 200 to 900 mH\.$/, { inductanceHow: 'unknown' }],
    ['coil', '3.2 kΩ', MAGNET, /looks like the impedance at 1 kHz/, { coilHow: 'unknown' }],
    ['load', '47 ohm', MAGNET, /Did you mean 47 kΩ\?/, { load: '47 kΩ' }],
    ['load', '47000', MAGNET, /Did you mean 47 kΩ\?/, { load: '47 kΩ' }],
    ['force', '20 g', MAGNET, /^20 g would press ten times too hard on the record\. Did you mean 20 mN\?$/, { force: '20 mN' }],
    ['force', '2 mN', MAGNET, /Did you mean 2 g\?/, { force: '2 g' }],
    ['mass', '62', MAGNET, /^62 g is ten times too heavy for a cartridge\. Did you mean 6\.2 g\?$/, { mass: '6.2 g' }],
    ['compliance', '200', MAGNET, /Did you mean 20 µm\/mN\?/, { compliance: '20 µm/mN' }],
    ['leadMetres', '120', MAGNET, /Did you mean 1\.2 m\?/, { leadMetres: '1.2 m' }],
    ['nextLoad', '10000', MAGNET, /Did you mean 10 kΩ\?/, { nextLoad: '10 kΩ' }],
    ['wish', '0.5', MAGNET, /Did you mean 0\.5 V\?/, { wish: '0.5 V' }],
    ['ratio', '500', COIL, /is not one that is made/, { ratioHow: 'unknown' }],
    ['ratio', '3 Ω / 40 Ω', COIL, /cannot read/, { ratioHow: 'unknown' }],
  ])('%s "%s" with a %s', (field, text, type, sentence, set) => {
    const { given, trouble } = read(field, text, type)
    expect(given).toBeNull()
    expect(trouble?.sentence).toMatch(sentence)
    expect(trouble?.fix?.set).toEqual(set)
  })

  test('every fix leads to a value that is understood, or to "Don\'t know"', () => {
    for (const [field, text, type] of [
      ['output', '4.5 V', MAGNET],
      ['inductance', '0.5', MAGNET],
      ['force', '20', MAGNET],
      ['load', '47000', MAGNET],
      ['output', '5.0 mV (1 kHz, 5 cm/s)', MAGNET],
      ['inductance', '550-400', MAGNET],
    ] as const) {
      const fix = read(field, text, type).trouble?.fix
      const after = readField(field, { [field]: text, ...fix?.set }, type)
      expect(after.trouble).toBeNull()
      expect(after.given).not.toBeNull()
    }
  })

  test('two boxes the wrong way round are swapped as typed', () => {
    const { trouble } = read('capacitance', '300', MAGNET, { capacitanceHow: 'between', capacitanceTo: '150' })
    expect(trouble).toEqual({
      key: 'capacitanceTo',
      sentence: 'The second value is lower than the first. Swap them?',
      fix: { label: 'Swap', set: { capacitance: '150', capacitanceTo: '300' } },
    })
  })

  test('a second box left empty offers to keep to one value', () => {
    const { trouble } = read('inductance', '400', MAGNET, { inductanceHow: 'between', inductanceTo: '' })
    expect(trouble?.fix?.set).toEqual({ inductance: '400', inductanceTo: '', inductanceHow: 'one' })
  })

  test('an impedance becomes a resistance where the inductance is known', () => {
    // |Z| = √(R² + (2π·1000·L)²): 1.4 kΩ and 0.5 H make 3.4 kΩ (definition).
    const { trouble } = read('coil', '3.44 kΩ', MAGNET, { inductance: '0.5 H' })
    expect(trouble?.fix?.set).toEqual({ coil: '1.4 kΩ', coilTo: '', coilHow: 'one' })
  })
})

describe('any number in any accepted form is read back', () => {
  const amount = fc.integer({ min: 1, max: 99_999 }).map((n) => n / 100)
  const units: [string, number][] = [
    ['mH', 1],
    [' mH', 1],
    ['mh', 1],
    [' H', 1000],
    ['H', 1000],
    [' µH', 1e-3],
    [' μH', 1e-3],
    ['uH', 1e-3],
    ['', 1],
  ]
  const decimals = fc.constantFrom<(n: number) => string>(
    (n) => String(n),
    (n) => String(n).replace('.', ','),
    (n) => (n < 1 ? String(n).replace(/^0/, '') : String(n)),
    (n) => ` ${n} `,
    (n) => n.toExponential().replace('e+', 'e'),
  )
  test('with every decimal sign and unit', () => {
    fc.assert(
      fc.property(amount, decimals, fc.constantFrom(...units), (value, write, [unit, size]) => {
        const result = readText(`${write(value)}${unit}`, { dimension: 'henries', unit: 'mh' })
        expect(result.kind).toBe('figure')
        if (result.kind === 'figure') expect(result.figure.nominal / (value * size)).toBeCloseTo(1, 9)
      }),
    )
  })

  test('as a range with every separator', () => {
    fc.assert(
      fc.property(amount, amount, decimals, fc.constantFrom('-', ' - ', '–', ' to ', '…', ' … '), fc.constantFrom(...units), (a, b, write, dash, [unit, size]) => {
        const [low, high] = [Math.min(a, b), Math.max(a, b)]
        const result = readText(`${write(low)}${dash}${write(high)}${unit}`, { dimension: 'henries', unit: 'mh' })
        expect(result.kind).toBe('figure')
        if (result.kind !== 'figure') return
        expect(result.figure.low / (low * size)).toBeCloseTo(1, 9)
        expect(result.figure.high / (high * size)).toBeCloseTo(1, 9)
      }),
    )
  })

  test('thousands in ohms, grouped in every way', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1000, max: 999_999 }), fc.constantFrom(',', ' ', "'"), (value, gap) => {
        const grouped = `${Math.floor(value / 1000)}${gap}${String(value % 1000).padStart(3, '0')}`
        expect(parseNumber(grouped, 'ohms')).toBe(value)
      }),
    )
  })

  test('what is written for a figure reads as that figure, to three places', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-6, max: 5, noNaN: true }), (henries) => {
        const result = readText(written(henries, 'henries'), { dimension: 'henries', unit: 'h' })
        expect(result.kind === 'figure' && result.figure.nominal / henries).toBeCloseTo(1, 2)
      }),
    )
  })

  test('no text makes it throw', () => {
    fc.assert(
      fc.property(fc.string(), fc.constantFrom<NumberField>('output', 'coil', 'ratio', 'force', 'lead'), (text, field) => {
        read(field, text)
        read(field, text, COIL, { [`${field}How`]: 'between', [`${field}To`]: text })
      }),
    )
  })
})

describe('figures written back', () => {
  test.each([
    [written(5.4e-3, 'volts'), '5.4 mV'],
    [written(0.34, 'volts'), '340 mV'],
    [written(47_000, 'ohms'), '47 kΩ'],
    [written(0.55, 'henries'), '550 mH'],
    [written(50e-6, 'henries'), '50 µH'],
    [written(170e-12, 'farads'), '170 pF'],
    [writtenRange(0.4, 0.55, 'henries'), '400 to 550 mH'],
    [writtenRange(100, 1000, 'ohms'), '100 Ω to 1 kΩ'],
    [writtenRange(100, Infinity, 'ohms'), '100 Ω or more'],
    [writtenRange(0, 500e-12, 'farads'), 'up to 500 pF'],
  ])('%s', (text, expected) => expect(text).toBe(expected))
})
