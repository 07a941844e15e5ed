import type { LevelPicture } from './level-facts'
import { drawable, roomAtWorst } from './level-facts'
import { roomText, signed } from './numbers'
import { TableBehind } from './table-behind'

/** "+16.7 to +19.7 dB", or one value where both ends read alike. */
function span(low: number, high: number): string {
  if (!Number.isFinite(low) || !Number.isFinite(high)) return 'not known'
  const [from, to] = [signed(low, 1), signed(high, 1)]
  return from === to ? `${from} dB` : `${from} to ${to} dB`
}

/** The level diagram as figures: a row for each place. Levels after the coil's loss into the load. */
export function LevelTable({ stages, peaks }: LevelPicture) {
  return (
    <TableBehind
      caption="Level at each place, in dB against 5 cm/s peak, sideways; room is at worst"
      columns={['Place', 'Usual', 'Peak', 'Limit', 'Room', 'Noise']}
      rows={stages.map(drawable).map((stage) => {
        const room = roomAtWorst(stage, peaks)
        return [
          stage.title,
          stage.usual,
          stage.peak,
          stage.limit ? span(stage.limit.low, stage.limit.high) : 'none',
          room === null ? 'no limit here' : `${roomText(room)} dB`,
          span(stage.floor.low, stage.floor.high),
        ]
      })}
    />
  )
}
