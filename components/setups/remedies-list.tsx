import { CautionBox } from '../shell/caution-box'
import { tied } from '@/lib/setups/format'

interface Props {
  heading: string
  sentences: readonly string[]
  /** True where doing it means moving a plug. */
  plugs: boolean
  /** True where this is what the page has to say, so that it comes right after the verdict. */
  first?: boolean
}

/** What would do it. Where that moves a plug, its caution comes first. */
export function RemediesList({ heading, sentences, plugs, first = false }: Props) {
  return (
    <section className={first ? 'rem-w first' : 'rem-w no-p'}>
      {plugs && <CautionBox act="plug" />}
      <div className="fig rem">
        <div className="say">
          <span className="fn">What would do</span>
          <h2>{heading}</h2>
        </div>
        <ul className="plain">
          {sentences.map((sentence) => (
            <li key={sentence}>{tied(sentence)}</li>
          ))}
        </ul>
      </div>
    </section>
  )
}
