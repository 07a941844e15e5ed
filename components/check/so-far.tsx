import { FitPlot } from '@/components/plots/container-plot'
import { LoadingTable } from '@/components/plots/loading-table'
import { RangeBar } from '@/components/plots/range-bar'
import type { SoFarView } from '@/lib/setups/views-so-far'

/** Ends of the scale that capacitance stands on, picofarads. */
export const CAPACITANCE_ENDS = { min: 20, max: 600 }
/** Width of the column at 1440, less its padding. */
const LIKELY_WIDTH = 359

/** What can be said after the answers so far; on a phone it follows the form. */
export function SoFar({ view }: { view: SoFarView }) {
  const { heading, sentences, treble, capacitance, settled, open } = view
  const curves = treble && { ...treble, nominal: null }
  return (
    <aside className="side" id="so-far" aria-labelledby="so-far-h" tabIndex={-1}>
      <p className="lab">What we can say so far</p>
      <div aria-live="polite">
        <h2 id="so-far-h">{heading}</h2>
        {sentences.map((sentence) => (
          <p key={sentence}>{sentence}</p>
        ))}
      </div>
      {curves && (
        <figure>
          <FitPlot kind="loading" plot={{ ...curves, size: 'panel' }} initialWidth={LIKELY_WIDTH} />
          <figcaption>
            Treble, with what is known so far. <span className="key scr ln" aria-hidden="true" /> Anywhere in here: it
            narrows with each answer.
          </figcaption>
          <LoadingTable {...curves} />
        </figure>
      )}
      {capacitance && (
        <div className="sfc">
          <RangeBar {...CAPACITANCE_ENDS} low={capacitance.low} high={capacitance.high} unit="pF" />
          <p className="note">{capacitance.note}</p>
        </div>
      )}
      <ul className="nar">
        <Line name="Settled" words={settled} />
        <Line name="Still open" words={open} />
      </ul>
    </aside>
  )
}

function Line({ name, words }: { name: string; words: readonly string[] }) {
  if (words.length === 0) return null
  return (
    <li>
      <b>{name}:</b> {words.join(', ')}
    </li>
  )
}
