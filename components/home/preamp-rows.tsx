import { MiniPanel } from '@/components/panel/mini-panel'
import { PlaceLink } from '@/components/shell/place-link'
import { controlsInWords, gainsInWords, takesInWords } from '@/lib/catalogue/format'
import type { PreampView } from '@/lib/catalogue/views'

/** The maker's preamps as their backs look, each leading into the check. */
export function PreampRows({ preamps }: { preamps: PreampView[] }) {
  return (
    <ul className="mod">
      {preamps.map((preamp) => (
        <li key={preamp.id}>
          <PlaceLink href={`/check?preamp=${preamp.id}`}>
            <b>{preamp.name}</b>
            <em>
              <MiniPanel preamp={preamp.boards[preamp.boards.length - 1].preamp} />
            </em>
            <span>
              {takesInWords(preamp)}
              <u>, </u>
              <br />
              {gainsInWords(preamp)}
            </span>
            <span>{controlsInWords(preamp)}</span>
            <i>Start</i>
          </PlaceLink>
        </li>
      ))}
    </ul>
  )
}
