import type { AddUnitInput } from './schema'

/** What an owner says of a unit, as it is kept. What was left empty is not known. */
export function saidOf({ name, boughtOn, boughtFrom, secondHand }: Pick<AddUnitInput, 'name' | 'boughtOn' | 'boughtFrom' | 'secondHand'>) {
  return {
    name: name || null,
    boughtOn: boughtOn || null,
    boughtFrom: boughtFrom || null,
    secondHand: secondHand === 'not-said' ? null : secondHand === 'yes',
  }
}
