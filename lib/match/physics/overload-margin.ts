/**
 * Room between what a record asks for and what the preamp takes.
 *
 * | symbol | name                                          | unit     | source              |
 * |--------|-----------------------------------------------|----------|---------------------|
 * | s      | sensitivity, output per velocity, one channel | V/(m/s)  | velocity.ts         |
 * | v(f)   | record envelope as peak of one channel        | m/s      | record-envelope.ts  |
 * | |H(f)| | loading, and step-up where there is one       | 1        | loading.ts, step-up.ts |
 * | m(f)   | 20·log10(√2·V_allowed/(s·v·|H|))              | dB       | ratio of peaks      |
 *
 * The cartridge's own loading peak is in |H|, so it eats into the margin where it stands.
 */
import { AUDIO_HIGH_HERTZ, AUDIO_LOW_HERTZ } from './constants'
import { toDecibels } from './decibels'
import { logSpacedHertz } from './grid'
import { loadingMagnitude, peakHertz } from './loading'
import type { NoiseNetwork } from './noise'
import { allowedInputVolts, type OverloadLimit } from './overload'
import {
  accelerationCornerHertz,
  amplitudeAccelerationCornerHertz,
  amplitudeCornerHertz,
  envelopeVelocityPerChannel,
  type RecordEnvelope,
} from './record-envelope'
import { equivalentLoading, netGain } from './step-up'

export interface OverloadChain {
  readonly network: NoiseNetwork
  /** EMF per velocity of one channel; 1 mV per cm/s is 0.1. */
  readonly sensitivityVoltSecondsPerMetre: number
  readonly envelope: RecordEnvelope
  readonly limit: OverloadLimit
}

/** Peak voltage at the preamp input that the envelope asks for. @returns volts peak */
export function demandedInputVolts({ network, sensitivityVoltSecondsPerMetre, envelope }: Omit<OverloadChain, 'limit'>, hertz: number): number {
  const gain = 'turnsRatio' in network ? netGain(network, hertz) : loadingMagnitude(network, hertz)
  return sensitivityVoltSecondsPerMetre * envelopeVelocityPerChannel(envelope, hertz) * gain
}

/** Margin against the envelope at one frequency, both as peaks. Infinity where nothing is asked for. @returns dB */
export function overloadMarginDecibels(chain: OverloadChain, hertz: number): number {
  return toDecibels((Math.SQRT2 * allowedInputVolts(chain.limit, hertz)) / demandedInputVolts(chain, hertz))
}

/** Margin at 1 kHz of a nominal input, both RMS: what leaflets call headroom re 5 cm/s. @returns dB */
export function marginReNominalDecibels({ nominalInputVolts, limit }: { nominalInputVolts: number; limit: OverloadLimit }): number {
  return toDecibels(allowedInputVolts(limit, 1000) / nominalInputVolts)
}

export interface WorstMargin {
  readonly decibels: number
  readonly hertz: number
}

const GRID = logSpacedHertz({ low: AUDIO_LOW_HERTZ, high: AUDIO_HIGH_HERTZ, count: 49 })
const STEP = Math.log(AUDIO_HIGH_HERTZ / AUDIO_LOW_HERTZ) / (GRID.length - 1)
const GOLDEN = (Math.sqrt(5) - 1) / 2

/**
 * Least margin from 20 Hz to 20 kHz and where it lies, to better than 0.001 dB. A grid finds the neighbourhood; the
 * places where the curve has a corner (envelope, measured points) or a sharp top (the loading peak) are looked at by
 * name; the best of them is refined by golden section.
 */
export function worstMargin(chain: OverloadChain): WorstMargin {
  let best = { hertz: AUDIO_LOW_HERTZ, decibels: Infinity }
  const look = (hertz: number) => {
    const decibels = overloadMarginDecibels(chain, hertz)
    if (decibels < best.decibels) best = { hertz, decibels }
    return decibels
  }
  for (let i = 0; i < GRID.length; i += 1) look(GRID[i])
  for (const hertz of namedFrequencies(chain)) {
    if (hertz > AUDIO_LOW_HERTZ && hertz < AUDIO_HIGH_HERTZ) look(hertz)
  }

  let low = Math.max(Math.log(AUDIO_LOW_HERTZ), Math.log(best.hertz) - STEP)
  let high = Math.min(Math.log(AUDIO_HIGH_HERTZ), Math.log(best.hertz) + STEP)
  let left = high - GOLDEN * (high - low)
  let right = low + GOLDEN * (high - low)
  let atLeft = look(Math.exp(left))
  let atRight = look(Math.exp(right))
  for (let round = 0; round < 18; round += 1) {
    if (atLeft < atRight) {
      high = right
      right = left
      atRight = atLeft
      left = high - GOLDEN * (high - low)
      atLeft = look(Math.exp(left))
    } else {
      low = left
      left = right
      atLeft = atRight
      right = low + GOLDEN * (high - low)
      atRight = look(Math.exp(right))
    }
  }
  return best
}

function namedFrequencies({ network, envelope, limit }: OverloadChain): number[] {
  const loading = 'turnsRatio' in network ? equivalentLoading(network) : network
  const corners = [amplitudeCornerHertz(envelope), accelerationCornerHertz(envelope), amplitudeAccelerationCornerHertz(envelope)]
  const peak = peakHertz(loading)
  if (peak !== null) corners.push(peak)
  if ('points' in limit.limit) for (const point of limit.limit.points) corners.push(point.hertz)
  return corners
}
