import { describe, expect, test } from 'vitest'
import { addRevision } from '@/lib/setups/add-revision'
import { archiveSheet } from '@/lib/shelf/archive-sheet'
import { getComparison } from '@/lib/shelf/compare'
import { takeUpPositions } from '@/lib/shelf/take-up-positions'
import { responseOn } from '@/lib/shelf/views-treble'
import { faultOf } from '../support/fault'
import { COIL, FINCH, shelfWorlds, type ShelfWorld } from '../support/shelf'

const here = shelfWorlds()
const TARN = { ...FINCH, preamp: 'tarn-2', board: 'second', present: 'known', left: 'bank.10000010', right: 'bank.10000010', inductance: '450' }

/** A sheet with a second revision in which the lead was read off. */
function withTwo(world: ShelfWorld) {
  const { code } = world.sheetOf('ann', TARN)
  addRevision(world.as('ann'), code, (answers) => ({ ...answers, lead: '130' }))
  return code
}
const rowOf = (rows: { label: string; a: string; b: string; differs: boolean }[], label: string) => rows.find((row) => row.label === label)

describe('two revisions of one sheet', () => {
  test('what went in differs where it was answered otherwise, and only there', () => {
    const world = here()
    const code = withTwo(world)
    const { a, b, sameSheet, inputs, rulesDiffer } = getComparison(world.as('ann'), { a: `${code}.A`, b: `${code}.B`, shown: null })
    expect([a.letter, b.letter, sameSheet, rulesDiffer]).toEqual(['A', 'B', true, false])
    expect(inputs.filter(({ differs }) => differs).map(({ label }) => label)).toEqual(['Arm and lead'])
    expect(rowOf(inputs, 'Arm and lead')?.a).toMatch(/ pF, estimated$/)
    expect(rowOf(inputs, 'Inductance')).toEqual({ label: 'Inductance', a: '450 mH', b: '450 mH', differs: false })
    expect(rowOf(inputs, 'How it stood')?.a).toMatch(/Gain 42 dB/)
  })

  test('what came out has the figures of both, and a treble to draw on one axis', () => {
    const world = here()
    const code = withTwo(world)
    const { outcome, treble } = getComparison(world.as('ann'), { a: `${code}.A`, b: `${code}.B`, shown: 'advised' })
    expect(rowOf(outcome, 'Capacitance, all told')?.differs).toBe(true)
    expect(rowOf(outcome, 'Rules used')?.differs).toBe(false)
    expect(treble?.a.hertz).toEqual(treble?.b.hertz)
    expect(treble?.a.nominal).toHaveLength(treble?.b.hertz.length ?? 0)
    expect(treble?.heading).toMatch(/^[A-Z][a-z ,]+$/)
  })

  test('where only the switches were moved, it holds how they stood against each other', () => {
    const world = here()
    const { code } = world.sheetOf('ann', TARN)
    takeUpPositions(world.as('ann'), { code })
    const ask = (shown: 'advised' | 'stood' | null) => getComparison(world.as('ann'), { a: `${code}.A`, b: `${code}.B`, shown })
    const found = ask(null)
    expect(found).toMatchObject({ shown: 'stood', stoodKnown: true, sameBoard: true })
    expect(found.a.state).toEqual({ bank: '10000010' })
    expect(found.b.state).not.toEqual(found.a.state)
    expect(rowOf(found.outcome, 'Gain')).toMatchObject({ a: '42 dB', differs: true })
    // The advice is the same in both.
    expect(ask('advised').a.state).toEqual(ask('advised').b.state)
  })

  test('how it stood is held against nothing where it is not known', () => {
    const world = here()
    const { code } = world.sheetOf('ann', { ...TARN, present: 'unknown' })
    expect(getComparison(world.as('ann'), { a: code, b: code, shown: 'stood' })).toMatchObject({ shown: 'advised', stoodKnown: false })
  })
})

describe('two sheets', () => {
  test('of two models: no switch is held against another’s, figures are', () => {
    const world = here()
    const [one, other] = [world.sheetOf('ann', TARN).code, world.sheetOf('ann', COIL).code]
    const found = getComparison(world.as('ann'), { a: one, b: other, shown: null })
    expect(found).toMatchObject({ sameSheet: false, sameBoard: false })
    expect(rowOf(found.inputs, 'Preamp')).toEqual({ label: 'Preamp', a: 'Tarn 2', b: 'Merrin 5', differs: true })
    expect(rowOf(found.inputs, 'Output used')?.a).toBe('none')
  })

  test('with one that has no figures there is nothing to draw, and the rest stands', () => {
    const world = here()
    const strain = world.sheetOf('ann', { preamp: 'tarn-2', type: 'other', other: 'strain-gauge' }).code
    const found = getComparison(world.as('ann'), { a: strain, b: world.sheetOf('ann').code, shown: null })
    expect(found).toMatchObject({ treble: null, a: { state: null, verdict: 'does-not-suit' } })
    expect(rowOf(found.outcome, 'Gain')).toMatchObject({ a: 'none', differs: true })
  })

  test('the newest revision where no letter is named; no such letter and no such code are not found', async () => {
    const world = here()
    const code = withTwo(world)
    expect(getComparison(world.as('ann'), { a: `${code}.a`, b: code, shown: null })).toMatchObject({ a: { letter: 'A' }, b: { letter: 'B' } })
    for (const b of [`${code}.C`, 'aaaa-aaaa-aaaa-aaaa.A', '1001.A', '', '.A']) {
      expect((await faultOf(() => getComparison(world.as('ann'), { a: code, b, shown: null }))).code, b).toBe('not_found')
    }
  })

  test('someone else’s by its code, as whoever holds it may read it; not one that was put away', async () => {
    const world = here()
    const [bobs, anns] = [world.sheetOf('bob'), world.sheetOf('ann')]
    expect(getComparison(world.as('ann'), { a: anns.code, b: bobs.code, shown: null }).sameSheet).toBe(false)
    archiveSheet(world.as('bob'), { number: bobs.number })
    expect((await faultOf(() => getComparison(world.as('ann'), { a: anns.code, b: bobs.code, shown: null }))).code).toBe('not_found')
  })
})

test('a response drawn on other frequencies is read off along the logarithmic axis', () => {
  // A straight line over log f: 6 dB an octave.
  const curve = { hertz: [100, 400], low: [0, 12], nominal: [0, 12], high: [0, 12] }
  expect(responseOn([50, 200, 800], curve).nominal).toEqual([0, 6, 12])
  expect(responseOn([100, 400], curve).nominal).toEqual([0, 12])
})
