import { fixed, hertzText, signed } from './numbers'
import { extreme, valueAt } from './series'

/** Treble relative to 1 kHz, in decibels at each frequency. */
export interface LoadingCurves {
  hertz: number[]
  /** Lowest and highest over everything not known; null when all is known. */
  low: number[] | null
  /** With middle values; null while the range is a guess about the cartridge's type itself. */
  nominal: number[] | null
  high: number[] | null
  /** Something to compare with, such as the switches as they stand now. */
  compare?: { label: string; decibels: number[] } | null
}

export const LOADING_AXIS = [100, 200, 500, 1000, 2000, 5000, 10_000, 20_000, 40_000] as const
export const LOADING_AXIS_PHONE = [200, 1000, 5000, 20_000] as const
/** From here up nothing is heard. */
export const HEARING_ENDS = 20_000
const LEAST_WORTH_SAYING = 0.05

/** What the drawing shows, in a sentence or two. */
export function loadingSentence({ hertz, low, nominal, high }: LoadingCurves): string {
  const top = high ?? nominal
  const lift = extreme(hertz, top, 1000, HEARING_ENDS)
  const middle = extreme(hertz, nominal, 1000, HEARING_ENDS)
  if (!lift) return 'Treble, relative to 1 kHz. There is nothing to draw yet.'
  const worst = `${fixed(lift.value)} dB at ${hertzText(lift.hertz)}`
  const rise =
    lift.value < LEAST_WORTH_SAYING
      ? 'It does not rise below 20 kHz.'
      : high && middle
        ? `Below 20 kHz it rises at worst by ${worst}, in the middle by ${fixed(Math.max(0, middle.value))} dB.`
        : `Below 20 kHz it rises by ${high ? 'up to ' : ''}${worst}.`
  const [from, to] = [valueAt(hertz, low ?? nominal, HEARING_ENDS), valueAt(hertz, top, HEARING_ENDS)]
  const end =
    from === null || to === null
      ? ''
      : signed(from, 1) === signed(to, 1)
        ? ` At 20 kHz it stands at ${signed(to, 1)} dB.`
        : ` At 20 kHz it stands between ${signed(from, 1)} and ${signed(to, 1)} dB.`
  return `Treble, relative to 1 kHz. ${rise}${end}`
}
