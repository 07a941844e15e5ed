import { hertzText, roomText } from './numbers'
import type { OverloadCurves } from './overload-facts'
import { ROOM_AXIS } from './overload-facts'
import { covered, valueAt } from './series'
import { TableBehind } from './table-behind'

/** Room at each pitch as figures: a row for each frequency named under the axis. */
export function OverloadTable({ hertz, loud, extreme }: OverloadCurves) {
  const columns = [loud.low, loud.nominal, loud.high, extreme.low]
  return (
    <TableBehind
      caption="Room above the record, in dB"
      columns={['Frequency', 'Loud, at worst', 'Loud, middle', 'Loud, at best', 'Extreme, at worst']}
      rows={covered(hertz, ROOM_AXIS).map((f) => [
        hertzText(f),
        ...columns.map((values) => {
          const value = valueAt(hertz, values, f)
          return value === null ? 'not known' : `${roomText(value)} dB`
        }),
      ])}
    />
  )
}
