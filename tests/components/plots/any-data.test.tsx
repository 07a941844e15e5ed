import fc from 'fast-check'
import { renderToStaticMarkup } from 'react-dom/server'
import { expect, test, vi } from 'vitest'
import { ArmPlot } from '@/components/plots/arm-plot'
import { ArmTable } from '@/components/plots/arm-table'
import { DoubtBar } from '@/components/plots/doubt-bar'
import { LevelDiagram } from '@/components/plots/level-diagram'
import { LevelTable } from '@/components/plots/level-table'
import { LoadingPlot } from '@/components/plots/loading-plot'
import { LoadingTable } from '@/components/plots/loading-table'
import { NoiseLine } from '@/components/plots/noise-line'
import { NoiseTable } from '@/components/plots/noise-table'
import { OverloadPlot } from '@/components/plots/overload-plot'
import { OverloadTable } from '@/components/plots/overload-table'
import { RangeBar } from '@/components/plots/range-bar'
import { TurnsPlot } from '@/components/plots/turns-plot'
import { TurnsTable } from '@/components/plots/turns-table'

// Many drawings in one test: a slow machine needs more than the usual five seconds.
vi.setConfig({ testTimeout: 60_000 })

/** Whatever numbers come in, none of these may come out. */
function expectClean(node: React.ReactNode) {
  expect(renderToStaticMarkup(node)).not.toMatch(/NaN|Infinity|undefined|null|style=|[→≈≤≥✓]/)
}

const number = fc.oneof(fc.double({ min: -120, max: 120, noNaN: true }), fc.double(), fc.constantFrom(0, NaN, Infinity, -Infinity))
const range = fc.record({ low: number, nominal: number, high: number })
const values = fc.array(number, { maxLength: 40 })
const frequencies = fc.oneof(
  fc.array(fc.double({ min: 1, max: 50_000, noNaN: true }), { maxLength: 40 }).map((all) => all.sort((a, b) => a - b)),
  values,
)
const form = fc.record({ width: fc.oneof(fc.integer({ min: 200, max: 1400 }), number), print: fc.boolean() })
const runs = { numRuns: 50 }

test('treble', () => {
  const compare = fc.option(fc.record({ label: fc.constant('as it is now'), decibels: values }))
  const curves = fc.record({ hertz: frequencies, low: fc.option(values), nominal: fc.option(values), high: fc.option(values), compare })
  fc.assert(
    fc.property(curves, form, (data, size) => {
      expectClean(<LoadingPlot {...data} {...size} label="as set" />)
      expectClean(<LoadingTable {...data} />)
    }),
    runs,
  )
})

test('room at each pitch', () => {
  const curves = fc.record({
    hertz: frequencies,
    loud: fc.record({ low: values, nominal: values, high: values }),
    extreme: fc.record({ low: values }),
    worst: fc.record({ decibels: number, hertz: number }),
  })
  fc.assert(
    fc.property(curves, form, (data, size) => {
      expectClean(<OverloadPlot {...data} {...size} />)
      expectClean(<OverloadTable {...data} />)
    }),
    runs,
  )
})

test('arm and rumble', () => {
  const curves = fc.record({
    hertz: frequencies, low: values, nominal: values, high: values,
    filtered: fc.option(values), resonance: range, filterOn: fc.boolean(),
  })
  fc.assert(
    fc.property(curves, form, (data, size) => {
      expectClean(<ArmPlot {...data} {...size} />)
      expectClean(<ArmTable {...data} />)
    }),
    runs,
  )
})

test('level', () => {
  const keys = ['record', 'into-preamp', 'out-of-preamp', 'into-next'] as const
  const one = fc.record({ limit: fc.option(range), floor: range, room: fc.option(range) })
  const picture = fc.record({
    stages: fc.tuple(one, one, one, one).map((stages) =>
      stages.map((stage, i) => ({ ...stage, key: keys[i] ?? 'record', title: `Place ${i}`, usual: '5.3 mV', peak: '40 mV' })),
    ),
    peaks: fc.record({ ordinary: fc.double({ min: 0, max: 20, noNaN: true }), loud: fc.double({ min: 0, max: 30, noNaN: true }) }),
  })
  fc.assert(
    fc.property(picture, form, (data, size) => {
      expectClean(<LevelDiagram {...data} {...size} />)
      expectClean(<LevelTable {...data} />)
    }),
    runs,
  )
})

test('noise', () => {
  fc.assert(
    fc.property(fc.record({ groove: number, yours: range, coil: number }), form, (data, size) => {
      expectClean(<NoiseLine {...data} {...size} />)
      expectClean(<NoiseTable {...data} />)
    }),
    runs,
  )
})

test('the number to find next, range and share', () => {
  const verdict = fc.constantFrom('suits', 'changes', 'limit', 'no', 'unsure')
  const stretch = fc.record({ from: number, to: number, verdict, text: fc.constantFrom('', 'Gain to 56 dB') })
  const axis = fc.record({ min: fc.double({ min: -10, max: 1, noNaN: true }), max: fc.double({ min: 2, max: 1e6, noNaN: true }) })
  const turns = fc.record({ low: number, high: number, stretches: fc.array(stretch, { maxLength: 8 }), ticks: values })
  fc.assert(
    fc.property(axis, turns, form, (ends, data, size) => {
      expectClean(<TurnsPlot {...ends} {...data} {...size} unit="mV" />)
      expectClean(<TurnsTable {...ends} {...data} unit="mV" />)
      expectClean(<RangeBar {...ends} low={data.low} high={data.high} unit="mV" />)
      expectClean(<DoubtBar share={data.low} />)
    }),
    runs,
  )
})
