import 'server-only'
import { getCartridge, getPreamp } from '../catalogue/queries'
import type { Context } from '../kernel/context'
import { Fault } from '../kernel/errors'
import type { MatchInputs } from '../match/inputs'
import { encodeState } from '../match/states'
import { reckon } from './reckon'
import { answersFromCartridge } from './schema-picked'
import type { SheetResult } from './views'

export interface Example {
  inputs: MatchInputs
  result: SheetResult
}

/** One pairing of the demo catalogue with something to move, and how its unit stands. */
const PREAMP = 'tarn-2'
const CARTRIDGE = 'calloway-wren'
const STANDS = '10000010'
const AMPLIFIER = { next: 'line', nextMax: '3.4', nextLoad: '47k' }

let known: { hash: string; example: Example } | null = null

/** A finished check to show what comes out, reckoned live; null where the catalogue does not hold the pair. */
export function exampleCheck(context: Pick<Context, 'db'>): Example | null {
  try {
    const { boards } = getPreamp(context, PREAMP)
    const { id: board, preamp } = boards[boards.length - 1]
    const bank = preamp.controls.find(({ kind }) => kind === 'bank')
    if (!bank) return null
    const stands = encodeState(preamp, { ...preamp.asDelivered, [bank.id]: STANDS })
    const leaflet = answersFromCartridge(getCartridge(context, CARTRIDGE))
    const answers = { ...leaflet, meaning: 'peak-lateral', preamp: PREAMP, board, present: 'known', left: stands, right: stands, ...AMPLIFIER }
    const hash = JSON.stringify([answers, preamp])
    if (known?.hash !== hash) {
      const { inputs, result } = reckon(context, answers)
      known = { hash, example: { inputs, result } }
    }
    return known.example
  } catch (trouble) {
    if (trouble instanceof Fault && (trouble.code === 'not_found' || trouble.code === 'bad_input')) return null
    throw trouble
  }
}
