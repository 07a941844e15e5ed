import Link from 'next/link'
import { CautionBox } from '../shell/caution-box'
import { MoveList } from '../panel/move-list'
import { cautionFor } from '../panel/move-words'
import { PanelDrawing } from '../panel/panel-drawing'
import type { ControlState, Positions } from '@/lib/match/controls'
import type { Preamp } from '@/lib/match/preamp'
import type { Move } from '@/lib/match/result'
import { SheetForm } from './sheet-form'
import { TryPanel } from './try-panel'

interface Props {
  preamp: Preamp
  present: Positions | null
  target: ControlState
  /** Null when nobody knows how the unit stands: then the whole end state is asked for. */
  moves: Move[] | null
  label: string
  /** Said in place of the moves, where none are worth making. */
  instead?: { heading: string; text: string }
  /** Under the moves, such as how to bring the volume up. */
  after?: string
  code: string
  /** Where to say how they stand now. */
  tellPath: string
  /** True at the newest revision: only that one can be acted on. */
  canAct: boolean
  /** The unit on the owner's shelf that the moves set; null where there is none. */
  unitName: string | null
}

/** For the owner behind the preamp: the caution in view, the moves in words, the panel with what to move. */
export function SwitchCard(props: Props) {
  const { preamp, present, target, moves, label } = props
  const act = cautionFor(moves, preamp)
  const words = props.instead ? (
    <>
      <h2>{props.instead.heading}</h2>
      <p>{props.instead.text}</p>
    </>
  ) : (
    <MoveList preamp={preamp} moves={moves} target={target} />
  )
  if (!act) {
    return (
      <section className="fig f1">
        <div className="say">
          <span className="fn">{label}</span>
          {words}
        </div>
        <Drawing {...props} />
      </section>
    )
  }
  const done = props.canAct && moves && moves.length > 0
  return (
    <section className="f1w">
      <CautionBox act={act} dock />
      <div className="fig f1">
        <div className="say">
          <span className="fn">{label}</span>
          {words}
          {props.after && <p className="then">{props.after}</p>}
          {done && (
            <div className="d-only no-p">
              <Moved {...props} />
            </div>
          )}
        </div>
        <Drawing {...props}>
          {done && (
            <div className="m-only no-p">
              <Moved {...props} />
            </div>
          )}
          {moves === null && present === null && (
            <figcaption className="no-p">
              Nothing is marked as a move. <Link href={props.tellPath}>Tell us how they stand now</Link> and we mark only those.
            </figcaption>
          )}
        </Drawing>
      </div>
    </section>
  )
}

function Moved({ code, unitName }: Props) {
  return (
    <>
      <SheetForm act="moved" code={code} button="b pri moved">
        I have moved them
      </SheetForm>
      <p className="note">
        Starts the next revision from there. This one is kept, so you can go back.
        {unitName && ` Your ${unitName} then stands so on your shelf, and you can undo it there.`}
      </p>
    </>
  )
}

function Drawing({ preamp, present, target, moves, children }: Props & { children?: React.ReactNode }) {
  const marked = moves !== null && moves.length > 0
  const front = preamp.controls.some(({ place }) => place === 'front')
  return (
    <figure>
      <div className="panelwrap">
        <div className="no-p">
          <TryPanel present={present} target={target} />
        </div>
        <div className="p-only">
          <PanelDrawing preamp={preamp} present={present} target={target} width={590} print />
        </div>
      </div>
      <figcaption>
        {front ? 'Seen from the front. ' : 'Seen from behind. '}
        {marked && 'Filled: move it there. Dashed: where it is now. '}
        {preamp.controls.length > 0 && <span className="no-p">Press a drawn one to try it out.</span>}
      </figcaption>
      {children}
    </figure>
  )
}
