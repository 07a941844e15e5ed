import type { NoiseLevels } from './noise-facts'
import { underGroove } from './noise-facts'
import { fixed } from './numbers'
import { TableBehind } from './table-behind'

/** The noise line as figures. */
export function NoiseTable(levels: NoiseLevels) {
  const { groove, yours, coil } = levels
  const range = yours.high > yours.low
  const under = (value: number) => (Number.isFinite(value) ? `${fixed(value)} dB` : 'not known')
  const gap = underGroove(levels)
  return (
    <TableBehind
      caption="Noise under the usual music level, A-weighted"
      columns={['Noise of', 'Under usual music']}
      rows={[
        ['the groove', under(groove)],
        ...(range
          ? [
              ['your preamp and cartridge, at worst', under(yours.low)],
              ['your preamp and cartridge, middle', under(yours.nominal)],
              ['your preamp and cartridge, at best', under(yours.high)],
            ]
          : [['your preamp and cartridge', under(yours.low)]]),
        ['the coil alone', under(coil)],
        [Number(gap.toFixed(1)) < 0 ? 'yours, louder than the groove by' : 'yours, under the groove by', under(Math.abs(gap))],
      ]}
    />
  )
}
