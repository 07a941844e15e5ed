import type { LoadingCurves } from './loading-facts'
import { LOADING_AXIS } from './loading-facts'
import { hertzText, signed } from './numbers'
import { covered, valueAt } from './series'
import { TableBehind } from './table-behind'

/** The treble drawing as figures: a row for each frequency named under its axis. */
export function LoadingTable({ hertz, low, nominal, high, compare }: LoadingCurves) {
  const shown = [
    { heading: 'At least, dB', values: low },
    { heading: low ? 'Middle, dB' : 'Level, dB', values: nominal },
    { heading: 'At most, dB', values: high },
    { heading: `${compare?.label ?? ''}, dB`, values: compare?.decibels ?? null },
  ].filter((column) => column.values !== null)
  return (
    <TableBehind
      caption="Treble relative to 1 kHz"
      columns={['Frequency', ...shown.map((column) => column.heading)]}
      rows={covered(hertz, LOADING_AXIS).map((f) => [
        hertzText(f),
        ...shown.map(({ values }) => {
          const value = valueAt(hertz, values, f)
          return value === null ? 'not known' : signed(value, 1)
        }),
      ])}
    />
  )
}
