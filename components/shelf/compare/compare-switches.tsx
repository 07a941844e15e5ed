import { FittedPanel } from '@/components/panel/fitted-panel'
import type { ComparedSide, ComparisonView } from '@/lib/shelf/views-compare'
import { labelsOf } from './labels'

/** A third of the page at 1440. */
const LIKELY_WIDTH = 450

/** Both settings drawn, a thick edge where they differ. */
export function CompareSwitches({ comparison }: { comparison: ComparisonView }) {
  const { a, b, shown, sameBoard } = comparison
  const labels = labelsOf(comparison)
  if (a.preamp.controls.length + b.preamp.controls.length === 0) return null
  return (
    <section className="bk2" aria-labelledby="switches">
      <div>
        <h2 id="switches">Switches</h2>
        <p className="note">
          {shown === 'stood' ? 'As each stood when it was reckoned.' : 'As each advises.'}{' '}
          {sameBoard ? 'A thick edge: differs.' : 'They are two different panels, so nothing is held against the other.'}
        </p>
      </div>
      <Drawn side={a} label={labels.a} against={sameBoard ? b.state : null} />
      <Drawn side={b} label={labels.b} against={sameBoard ? a.state : null} />
    </section>
  )
}

function Drawn({ side: { preamp, state, letter }, label, against }: { side: ComparedSide; label: string; against: ComparedSide['state'] }) {
  return (
    <figure>
      <figcaption className="chn">
        <span className="rv" aria-hidden="true">
          <b className="on">{letter}</b>
        </span>
        {label === letter ? <span className="vh">{label}</span> : label}
      </figcaption>
      {state ? (
        <FittedPanel preamp={preamp} present={null} target={state} comparedWith={against ?? state} compact initialWidth={LIKELY_WIDTH} />
      ) : (
        <p className="note">There is no setting to draw.</p>
      )}
    </figure>
  )
}
