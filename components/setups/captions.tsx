import type { Quantity } from '@/lib/match/quantity'
import type { LevelStage } from '@/lib/match/result'
import { hertz, tied } from '@/lib/setups/format'
import { LineKey, ScreenKey } from './figure-block'

/** What each drawing shows, with its marks explained by swatches. */

/** Where limits were taken, by pitch; both pitches where preamp and next input differ. */
function limitsAt(stages: readonly LevelStage[]): string {
  const preamp = stages.find(({ key }) => key === 'into-preamp')?.limitHertz
  const next = stages.find(({ key }) => key === 'into-next')?.limitHertz
  if (!preamp || !next) return ''
  const [a, b] = [hertz(preamp), hertz(next)]
  return a === b ? `at ${a}` : `at ${a} for the preamp and ${b} after it`
}

export function LevelCaption({ stages }: { stages: readonly LevelStage[] }) {
  const ranged = stages.some(({ limitDecibels }) => limitDecibels && limitDecibels.high - limitDecibels.low > 0.1)
  return (
    <figcaption>
      Decibels against 5 cm/s peak, sideways; volts are RMS. <ScreenKey />
      {ranged ? 'Where records peak, and how far a limit may lie: solid lines are the worst case. ' : 'Where records peak: ordinary 25 cm/s to loud 38 cm/s. '}
      {tied(`Limits are taken ${limitsAt(stages)}, where loud records come closest. `)}
      Room is drawn as arrows; the tightest is filled in.
    </figcaption>
  )
}

export function RoomCaption({ gain }: { gain: string }) {
  return (
    <figcaption>
      {tied(`Room left above the record, at each frequency, at ${gain}. `)}
      <LineKey />
      {tied('Loud records, 38 cm/s, 50 µm, 4000 g. ')}
      <LineKey dashed />
      {tied('Extreme, 50 cm/s, 5000 g, at worst. ')}
      <ScreenKey />
      Anywhere in here, over what is not known.
    </figcaption>
  )
}

export function LoadingCaption({ low, nominal }: { low: number[] | null; nominal: number[] | null }) {
  return (
    <figcaption>
      Loading only, and a real coil peaks less than this: the cartridge&rsquo;s own response comes on top.{' '}
      {low && (
        <>
          <ScreenKey />
          Anywhere in here.{' '}
        </>
      )}
      {low && nominal && (
        <>
          <LineKey />
          Middle values.
        </>
      )}
    </figcaption>
  )
}

export function ArmCaption({ filterOn, compliance }: { filterOn: boolean; compliance: Quantity }) {
  const why =
    compliance.origin === 'typical' || compliance.origin === 'unknown'
      ? 'Compliance is an estimate, so a range.'
      : compliance.condition && compliance.low < compliance.high
        ? `Compliance is printed ${compliance.condition.replace('condition not said', 'without its condition')}, so a range.`
        : 'Anywhere in here.'
  return (
    <figcaption>
      How strongly the arm passes each frequency. <ScreenKey />
      {tied(`${why} `)}
      <LineKey />
      Middle value, rumble filter {filterOn ? 'on' : 'off'}.
    </figcaption>
  )
}

export function NoiseCaption({ temperatureKelvin, isRange }: { temperatureKelvin: number; isRange: boolean }) {
  return (
    <figcaption>
      {tied(`Decibels under 5 cm/s, A-weighted, 20 Hz to 20 kHz, at ${Math.round(temperatureKelvin - 273.15)} °C. `)}
      {isRange && (
        <>
          <ScreenKey />
          Anywhere in here.
        </>
      )}
    </figcaption>
  )
}
