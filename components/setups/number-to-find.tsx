import { FitPlot } from '../plots/container-plot'
import { TurnsTable } from '../plots/turns-table'
import { joinedStretches, stretchText, TURN_WORDS, type Turns } from '../plots/turns-facts'
import { FoundForm, type FoundFormProps } from './found-form'
import { ScreenKey } from './figure-block'

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
      <StretchRows turns={turns} />
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

/** On paper the drawing gives way to its rows, so that the sheet keeps to one page. */
function StretchRows({ turns }: { turns: Turns }) {
  return (
    <table className="prn p-tab">
      <tbody>
        {joinedStretches(turns).map((stretch) => (
          <tr key={stretch.from}>
            <th scope="row">{stretchText(stretch, turns)}</th>
            <td>{TURN_WORDS[stretch.verdict]}</td>
            <td>{stretch.text}</td>
          </tr>
        ))}
      </tbody>
    </table>
  )
}
