import type { LoadingNetwork } from '../../lib/match/physics/loading'
import type { NoiseNetwork } from '../../lib/match/physics/noise'
import type { StepUpNetwork } from '../../lib/match/physics/step-up'

/** Inputs of a case as they stand in the file: unit in the key, prefixes and all. */
export type Inputs = Readonly<Record<string, unknown>>

/** @throws Error with a sentence when the input is missing or not a number */
export function numberOf(inputs: Inputs, key: string): number {
  const value = inputs[key]
  if (typeof value !== 'number' || !Number.isFinite(value)) throw new Error(`Input "${key}" is missing or not a number.`)
  return value
}

/** The number, or `otherwise` when the input is absent or null. */
export function numberOr(inputs: Inputs, key: string, otherwise: number): number {
  return inputs[key] === undefined || inputs[key] === null ? otherwise : numberOf(inputs, key)
}

export function flagOf(inputs: Inputs, key: string): boolean {
  return inputs[key] === true
}

/** One of the words, turned into ours. @throws Error with a sentence for any other */
export function wordOf<T>(inputs: Inputs, key: string, words: Readonly<Record<string, T>>): T {
  const value = inputs[key]
  const found = typeof value === 'string' && Object.hasOwn(words, value) ? words[value] : undefined
  if (found === undefined) throw new Error(`Input "${key}" must be one of ${Object.keys(words).join(', ')}.`)
  return found
}

/** Coil and load; no load resistance means that nothing loads the coil. */
export function loadingOf(inputs: Inputs): LoadingNetwork {
  return {
    coilOhms: numberOf(inputs, 'coil_resistance_ohm'),
    coilHenries: numberOf(inputs, 'coil_inductance_mH') * 1e-3,
    loadOhms: numberOr(inputs, 'load_resistance_ohm', Infinity),
    loadFarads: numberOr(inputs, 'load_capacitance_total_pF', 0) * 1e-12,
  }
}

export function stepUpOf(inputs: Inputs): StepUpNetwork {
  const primaryHenries = numberOr(inputs, 'primary_inductance_H', Infinity)
  return {
    ...loadingOf(inputs),
    turnsRatio: numberOf(inputs, 'transformer_ratio_n'),
    primaryOhms: numberOr(inputs, 'primary_resistance_ohm', 0),
    secondaryOhms: numberOr(inputs, 'secondary_resistance_ohm', 0),
    primaryHenries: Number.isFinite(primaryHenries) ? primaryHenries : null,
  }
}

/** With a transformer where the case has one. */
export function networkOf(inputs: Inputs): NoiseNetwork {
  const ratio = inputs['transformer_ratio_n']
  return ratio === undefined || ratio === null ? loadingOf(inputs) : stepUpOf(inputs)
}
