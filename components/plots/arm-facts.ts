import { finiteRange, spanText } from './numbers'

/** How strongly the arm passes each frequency on, in decibels. */
export interface ArmCurves {
  hertz: number[]
  low: number[]
  nominal: number[]
  high: number[]
  /** The middle with the rumble filter behind it; null when the preamp has none. */
  filtered: number[] | null
  /** Resonance of arm and cartridge, hertz. */
  resonance: { low: number; nominal: number; high: number }
  filterOn: boolean
}

export const ARM_AXIS = [2, 3, 5, 8, 10, 12, 20, 30, 50] as const
export const ARM_AXIS_PHONE = [2, 5, 10, 20, 50] as const

/** Where things are, in hertz (common practice, no source). */
export const ARM_PLACES = { from: 2, warpsEnd: 7, goodFrom: 8, goodTo: 12, musicFrom: 20, to: 60 } as const

/** "9.4 to 10.8 Hz". Null when the resonance is not known. */
export function resonanceText(resonance: ArmCurves['resonance']): string | null {
  return finiteRange(resonance) && `${spanText(resonance.low, resonance.high)} Hz`
}

export function armSentence({ resonance, filtered, filterOn }: ArmCurves): string {
  const text = resonanceText(resonance)
  const { goodFrom, goodTo } = ARM_PLACES
  if (!text) return 'Arm and rumble, 2 to 60 Hz. The resonance is not known.'
  const place =
    resonance.high < goodFrom
      ? 'That is under the good place'
      : resonance.low > goodTo
        ? 'That is above the good place'
        : resonance.low >= goodFrom && resonance.high <= goodTo
          ? 'That is in the good place'
          : 'Part of that is outside the good place'
  const filter = filtered && filterOn ? ' The rumble filter is on.' : ''
  return `Arm and rumble, 2 to 60 Hz. Arm and cartridge resonate at ${text}. ${place}, ${goodFrom} to ${goodTo} Hz.${filter}`
}
