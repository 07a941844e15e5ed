import { MiniPanel } from '@/components/panel/mini-panel'
import { PlaceLink } from '@/components/shell/place-link'
import type { PreampView } from '@/lib/catalogue/views'

/** Which model it is: one row each, as their backs look. */
export function ModelsToAdd({ preamps }: { preamps: readonly PreampView[] }) {
  return (
    <ul className="mod short">
      {preamps.map(({ id, name, boards }) => (
        <li key={id}>
          <PlaceLink href={`/shelf/units/new?model=${id}`}>
            <b>{name}</b>
            <em>
              <MiniPanel preamp={boards[boards.length - 1].preamp} />
            </em>
            <i>This one</i>
          </PlaceLink>
        </li>
      ))}
    </ul>
  )
}
