import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, test } from 'vitest'
import { MoveList } from '@/components/panel/move-list'
import type { ControlState, Positions, Preamp } from '@/lib/match'
import { movesBetween } from '@/lib/match/moves'
import { cataloguePreamp } from '../../support/catalogue-preamps'

const tarn = cataloguePreamp('tarn-2', 'second')
const words = (preamp: Preamp, present: Positions | null, target: ControlState) => {
  const moves = present && movesBetween(preamp, present, target)
  return renderToStaticMarkup(<MoveList preamp={preamp} moves={moves} target={target} />)
}

describe('what to do with a hand', () => {
  test('one line a move', () => {
    const present = { left: { bank: '10000010' }, right: { bank: '10000010' } }
    expect(words(tarn, present, { bank: '00000000' })).toBe(
      '<ol class="todo"><li><b>Switch 1 to OFF</b><span>Gain goes from 42 to 36 dB</span></li><li><b>Switch 7 to OFF</b><span>The preamp adds 70 pF, not 270 pF</span></li></ol>',
    )
  })

  test('the whole end state, and why', () => {
    const markup = words(tarn, null, { bank: '00000000' })
    expect(markup).toContain('<h2>All eight OFF, both sides</h2>')
    expect(markup).toContain('We do not know how yours stand, so this is the whole end state.')
  })

  test('sides that differ say so', () => {
    const markup = words(tarn, { left: { bank: '10000000' }, right: { bank: '00000000' } }, { bank: '00000000' })
    expect(markup).toContain('Your two sides are not alike')
    expect(markup).toContain('Left: 1 to OFF')
  })

  test('a valve preamp says when it goes off', () => {
    const ember = cataloguePreamp('ember-3', 'only')
    const present = { left: ember.asDelivered, right: ember.asDelivered }
    expect(words(ember, present, { ...ember.asDelivered, rumble: '1' })).toContain('it goes off after the amplifier, and its lid stays on.')
  })

  test('nothing to move, and nothing to set', () => {
    expect(words(tarn, { left: { bank: '00000000' }, right: { bank: '00000000' } }, { bank: '00000000' })).toContain('Leave every switch where it is')
    expect(words(cataloguePreamp('sedge-1', 'only'), null, {})).toContain('Leave it as it is')
  })
})
