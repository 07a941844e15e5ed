// @vitest-environment jsdom
import { expect, test } from 'vitest'
import { LevelDiagram } from '@/components/plots/level-diagram'
import type { LevelStageDrawn } from '@/components/plots/level-facts'
import { LevelTable } from '@/components/plots/level-table'
import { drawn } from './drawn'

// 25 and 38 cm/s against 5 cm/s: 20·log10(5) and 20·log10(7.6).
const peaks = { ordinary: 13.98, loud: 17.62 }
const exactly = (value: number) => ({ low: value, nominal: value, high: value })

function stage(key: LevelStageDrawn['key'], limit: LevelStageDrawn['limit'], floor = exactly(-79.6)): LevelStageDrawn {
  const title = { record: 'Record', 'into-preamp': 'Into preamp', 'out-of-preamp': 'Out of preamp', 'into-next': 'Into amplifier' }[key]
  const room = limit && { low: limit.low - peaks.loud, nominal: limit.nominal - peaks.loud, high: limit.high - peaks.loud }
  return { key, title, usual: key === 'record' ? '5 cm/s' : '4.9 to 6.9 mV', peak: '38 cm/s', limit, floor, room }
}
const record = stage('record', null, exactly(-58))
const chain = (preamp: LevelStageDrawn['limit'], next: LevelStageDrawn['limit'], floor = exactly(-79.6)) => ({
  peaks,
  stages: [record, stage('into-preamp', preamp, floor), stage('out-of-preamp', preamp, floor), stage('into-next', next, floor)],
})
const reversed = (plot: ReturnType<typeof drawn>) => plot.all('.mgt').map((text) => text.textContent)

test('room is written at each limit; the tightest under 6 dB is reversed out, and said', () => {
  const plot = drawn(<LevelDiagram {...chain(exactly(28.04), exactly(20.73))} width={928} />)
  expect(plot.words.filter((word) => word === '10.4 dB')).toHaveLength(2)
  expect(reversed(plot)).toEqual(['3.1 dB'])
  expect(plot.label).toBe(
    'Level from the record to where it plays into. Tightest is Into amplifier: at worst 3.1 dB of room. Hiss stays 22 dB under the noise of the groove.',
  )
})

test('over the limit it says by how much, and the hatch lies over the peaks', () => {
  const plot = drawn(<LevelDiagram {...chain(exactly(28.04), exactly(14.7))} width={928} />)
  expect(reversed(plot)).toEqual(['over by 2.9 dB'])
  expect(plot.label).toContain('loud records go over by 2.9 dB')
})

test('of a range the worst is the solid line, and the screen reaches to the best', () => {
  const limit = { low: 28, nominal: 29.5, high: 31 }
  const plot = drawn(<LevelDiagram {...chain(limit, limit, { low: -80, nominal: -79, high: -77 })} width={928} />)
  // One edge for each of three limits and three noises, and one path for the band of peaks.
  expect(plot.all('.edge')).toHaveLength(7)
  expect(plot.words).toContain('10.4 dB')
  expect(plot.label).toContain('Hiss stays 19 dB')
})

test('a limit off the top has an arrow with the real number, and no line', () => {
  const plot = drawn(<LevelDiagram {...chain(exactly(45.5), exactly(150))} width={928} />)
  expect(plot.all('.ceil')).toHaveLength(0)
  expect(plot.words).toContain('27.9 dB')
  expect(plot.words).toContain('132.4 dB')
  expect(plot.words).not.toContain('Distorts above this line')
})

test('hiss louder than the groove is reversed out', () => {
  const plot = drawn(<LevelDiagram {...chain(exactly(45), exactly(45), exactly(-54.8))} width={928} />)
  expect(reversed(plot)).toEqual(['louder by 3 dB', 'louder by 3 dB', 'louder by 3 dB'])
  expect(plot.label).toContain('Hiss is louder than the groove by 3 dB.')
})

test('the empty middle is cut out, unless noise or a limit stands in it', () => {
  expect(drawn(<LevelDiagram {...chain(exactly(28), exactly(28))} width={928} />).all('.br-e')).toHaveLength(1)
  expect(drawn(<LevelDiagram {...chain(exactly(28), exactly(28), exactly(-20))} width={928} />).all('.br-e')).toHaveLength(0)
  expect(drawn(<LevelDiagram {...chain(exactly(28), exactly(-20))} width={928} />).all('.br-e')).toHaveLength(0)
})

test('a narrow column drops the unit, and a phone shortens the words', () => {
  const phone = drawn(<LevelDiagram {...chain(exactly(28.04), exactly(14.7))} width={354} />)
  expect(phone.words).toContain('10.4')
  expect(phone.words).toContain('over 2.9')
  expect(phone.words).toContain('to 6.9 mV')
  expect(phone.words).toContain('Distorts')
})

test('a name too long for its column gives way to a shorter one', () => {
  const { peaks: same, stages } = chain(exactly(28), exactly(28))
  const long = stages.map((one) => (one.key === 'into-next' ? { ...one, title: 'Into headphone amplifier' } : one))
  const plot = drawn(<LevelDiagram peaks={same} stages={long} width={354} />)
  expect(plot.words).toContain('Into next')
  expect(plot.label).toContain('Tightest is Into preamp')
})

test('the table has a row for each place', () => {
  const table = drawn(<LevelTable {...chain(exactly(14.7), { low: 16.7, nominal: 18, high: 19.7 })} />)
  expect(table.rows).toEqual([
    ['Record', '5 cm/s', '38 cm/s', 'none', 'no limit here', '−58.0 dB'],
    ['Into preamp', '4.9 to 6.9 mV', '38 cm/s', '+14.7 dB', 'over by 2.9 dB', '−79.6 dB'],
    ['Out of preamp', '4.9 to 6.9 mV', '38 cm/s', '+14.7 dB', 'over by 2.9 dB', '−79.6 dB'],
    ['Into amplifier', '4.9 to 6.9 mV', '38 cm/s', '+16.7 to +19.7 dB', 'over by 0.9 dB', '−79.6 dB'],
  ])
})
