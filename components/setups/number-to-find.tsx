import { FitPlot } from '../plots/container-plot'
import { TurnsPlot } from '../plots/turns-plot'
import { TurnsTable } from '../plots/turns-table'
import type { Turns } from '../plots/turns-facts'
import { FoundForm, type FoundFormProps } from './found-form'
import { ScreenKey } from './figure-block'

const PAPER_WIDTH = 640

interface Props {
  title: string
  turns: Turns
  whereToRead: string
  /** Null where it cannot be typed here, or at an earlier revision. */
  form: FoundFormProps | null
}

/** The one value that would do most: where it may be, where our advice changes, where to read it, a box to type it. */
export function NumberToFind({ title, turns, whereToRead, form }: Props) {
  return (
    <section className="num1" aria-labelledby="number-to-find">
      <span className="fn">The number to find next</span>
      <h2 id="number-to-find">{title}</h2>
      <p className="key-line">
        <ScreenKey />
        It is somewhere in here. Each heavy line is where our advice changes.
      </p>
      <div className="no-p">
        <FitPlot kind="turns" plot={turns} initialWidth={740} />
      </div>
      <div className="p-only">
        <TurnsPlot {...turns} width={PAPER_WIDTH} print />
      </div>
      <TurnsTable {...turns} />
      <div className="how">
        <div>
          <h3>Where to read it</h3>
          <p>{whereToRead}</p>
        </div>
        {form && (
          <div className="no-p">
            <h3>Found it?</h3>
            <FoundForm {...form} />
          </div>
        )}
      </div>
    </section>
  )
}
