import { hertzText, isOver, roomText } from './numbers'

/** Room above the record in decibels at each frequency, on the footing of the level diagram. */
export interface OverloadCurves {
  hertz: number[]
  /** Loud records; `low` is the worst over everything not known. */
  loud: { low: number[]; nominal: number[]; high: number[] }
  /** Extreme records, at worst. */
  extreme: { low: number[] }
  /** Where `loud.low` has least room. */
  worst: { decibels: number; hertz: number }
}

export const ROOM_AXIS = [20, 50, 100, 200, 500, 1000, 2000, 5000, 10_000, 20_000] as const
export const ROOM_AXIS_PHONE = [20, 100, 1000, 10_000] as const

/** "3.1 dB at 1.2 kHz", "over by 0.9 dB at 1.2 kHz". Null when the worst is not known. */
export function worstText({ decibels, hertz }: OverloadCurves['worst']): string | null {
  if (!Number.isFinite(decibels) || !Number.isFinite(hertz) || hertz <= 0) return null
  return `${roomText(decibels)} dB at ${hertzText(hertz)}`
}

export function overloadSentence({ worst }: OverloadCurves): string {
  const text = worstText(worst)
  if (!text) return 'Room above loud records, 20 Hz to 20 kHz.'
  return isOver(worst.decibels)
    ? `Room above loud records, 20 Hz to 20 kHz. At worst they go ${text}.`
    : `Room above loud records, 20 Hz to 20 kHz. At worst ${text} is left.`
}
