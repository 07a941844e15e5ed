import type { ArmCurves } from './arm-facts'
import { ARM_AXIS } from './arm-facts'
import { hertzText, signed } from './numbers'
import { covered, valueAt } from './series'
import { TableBehind } from './table-behind'

/** Arm and rumble as figures: a row for each frequency named under the axis. */
export function ArmTable({ hertz, low, nominal, high, filtered, filterOn }: ArmCurves) {
  const columns = [
    { heading: 'Arm, at least, dB', values: low },
    { heading: 'Arm, middle, dB', values: nominal },
    { heading: 'Arm, at most, dB', values: high },
    { heading: 'With the rumble filter, dB', values: filterOn ? filtered : null },
  ].filter((column) => column.values !== null)
  return (
    <TableBehind
      caption="How strongly arm and cartridge pass each frequency"
      columns={['Frequency', ...columns.map((column) => column.heading)]}
      rows={covered(hertz, ARM_AXIS).map((f) => [
        hertzText(f),
        ...columns.map(({ values }) => {
          const value = valueAt(hertz, values, f)
          return value === null ? 'not known' : signed(value, 1)
        }),
      ])}
    />
  )
}
