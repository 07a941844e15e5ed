import type { ControlState, Move, Preamp } from '@/lib/match'
import { endStateLines, moveLines, type MoveLine } from './move-words'

interface MoveListProps {
  preamp: Preamp
  /** From how the unit stands now; null when nobody knows; empty when nothing is to be moved. */
  moves: Move[] | null
  target: ControlState
}

/** What to do with a hand, in words, beside the drawing and under its caution. */
export function MoveList({ preamp, moves, target }: MoveListProps) {
  if (preamp.controls.length === 0 || moves?.length === 0) {
    return <h2>{preamp.controls.length === 0 ? 'Leave it as it is' : 'Leave every switch where it is'}</h2>
  }
  if (moves === null) return <EndState lines={endStateLines(preamp, target)} />
  const unlike = moves.some(({ side }) => side !== 'both')
  return (
    <>
      {unlike && <h2>Your two sides are not alike</h2>}
      <Lines lines={moveLines(preamp, moves)} />
      {unlike && <p className="then">After this both are the same.</p>}
      {preamp.technology === 'valve' && (
        <p className="then">The {preamp.modelName} is a valve preamp: it goes off after the amplifier, and its lid stays on.</p>
      )}
    </>
  )
}

function EndState({ lines }: { lines: MoveLine[] }) {
  return (
    <>
      {lines.length === 1 ? <h2>{lines[0].title}</h2> : <Lines lines={lines} />}
      {lines.length === 1 && lines[0].detail !== '' && <p className="then">{lines[0].detail}.</p>}
      <p className="then">We do not know how yours stand, so this is the whole end state. Set each of them to what is drawn.</p>
    </>
  )
}

function Lines({ lines }: { lines: MoveLine[] }) {
  return (
    <ol className="todo">
      {lines.map(({ title, detail }) => (
        <li key={title}>
          <b>{title}</b>
          {detail !== '' && <span>{detail}</span>}
        </li>
      ))}
    </ol>
  )
}
