import { nominalFactor, type NominalFactor, type PrintedCondition } from '../match/physics/printed-condition'
import type { Answers } from './answers'
import type { Meaning } from './terms'
import { written } from './units'

/** What stands beside an output on a leaflet, and what that makes of it at the reference level. */
export type Footing = Pick<Answers['cartridge'], 'velocity' | 'velocityCentimetresPerSecond' | 'meaning'>

const SAID: Record<Meaning, { kind?: 'peak' | 'rms'; direction?: 'lateral' | 'perChannel' }> = {
  'peak-lateral': { kind: 'peak', direction: 'lateral' },
  'rms-lateral': { kind: 'rms', direction: 'lateral' },
  'peak-channel': { kind: 'peak', direction: 'perChannel' },
  'rms-channel': { kind: 'rms', direction: 'perChannel' },
  peak: { kind: 'peak' },
  rms: { kind: 'rms' },
  lateral: { direction: 'lateral' },
  channel: { direction: 'perChannel' },
  'not-said': {},
}

/** Groove speed as printed, cm/s; null where none is. */
function speed({ velocity, velocityCentimetresPerSecond }: Footing): { low: number; nominal: number; high: number } | null {
  if (velocity === '5' || velocity === '3.54') {
    const value = Number(velocity)
    return { low: value, nominal: value, high: value }
  }
  return velocity === 'other' ? velocityCentimetresPerSecond : null
}

/**
 * Factor from the printed millivolts to the output at 5 cm/s peak lateral.
 * "Per cm/s" is a printed speed of 1 cm/s; both RMS and of one channel unless the leaflet says otherwise.
 */
export function footingOf(footing: Footing): Pick<NominalFactor, 'low' | 'nominal' | 'high'> {
  const said = SAID[footing.meaning]
  if (footing.velocity === 'per-cm') {
    return nominalFactor({ form: 'atVelocity', metresPerSecond: 0.01, ...SAID['rms-channel'], ...said })
  }
  const printed = speed(footing)
  if (!printed) return nominalFactor({ form: 'none' })
  const at = (centimetres: number): PrintedCondition => ({ form: 'atVelocity', metresPerSecond: centimetres / 100, ...said })
  return {
    low: nominalFactor(at(printed.high)).low,
    nominal: nominalFactor(at(printed.nominal)).nominal,
    high: nominalFactor(at(printed.low)).high,
  }
}

export const MEANING_WORDS: Record<Meaning, string> = {
  'peak-lateral': 'peak, sideways',
  'rms-lateral': 'RMS, sideways',
  'peak-channel': 'peak, one channel',
  'rms-channel': 'RMS, one channel',
  peak: 'peak, not said which way',
  rms: 'RMS, not said which way',
  lateral: 'sideways, not said if peak or RMS',
  channel: 'one channel, not said if peak or RMS',
  'not-said': 'not said of what',
}

/** "5 cm/s peak, sideways", "5 cm/s, not said of what", "per cm/s RMS, one channel", "groove speed not stated". */
export function conditionText(footing: Footing): string {
  if (footing.velocity === 'per-cm') {
    return `per cm/s ${MEANING_WORDS[footing.meaning === 'not-said' ? 'rms-channel' : footing.meaning]}`
  }
  const printed = speed(footing)
  if (!printed) return 'groove speed not stated'
  const centimetres = written(printed.nominal / 100, 'velocity')
  return footing.meaning === 'not-said' ? `${centimetres}, not said of what` : `${centimetres} ${MEANING_WORDS[footing.meaning]}`
}
