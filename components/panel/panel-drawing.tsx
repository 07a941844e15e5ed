import type { Preamp } from '@/lib/match'
import { movesBetween } from '@/lib/match/moves'
import { endStateLines, moveLines } from './move-words'
import { fixedFace, middleFace, narrowFace, wideFace, type Face, type Place } from './panel-face'
import { panelView, shownPositions, type PanelSource, type PanelView } from './panel-view'
import type { Flip } from './piece'
import { positionsInWords } from './state-words'

const PLACES: Place[] = ['back', 'front', 'underside']
const PLACE_NAMES: Record<Place, string> = { back: 'Back', front: 'Front', underside: 'Underside' }
const PRINT_WIDTH = 590

export interface PanelDrawingProps extends PanelSource {
  /** The drawing is made for the width it has; it is never scaled. */
  width: number
  /** Parts only, whatever the width. */
  compact?: boolean
  /** At the width and in the form of a printed page. */
  print?: boolean
  /** Outlines one group, while its data is edited or talked about. */
  focusGroup?: string
  /** Makes every drawn switch, place, plug and button something to press. Both channels move together. */
  onFlip?: (flip: Flip) => void
}

/**
 * The panel of a preamp, drawn from its control data: a case for every side that has controls. From 900 wide with
 * sockets, from 560 without, under that the parts alone.
 */
export function PanelDrawing({ width: given, compact = false, print = false, focusGroup, onFlip, ...source }: PanelDrawingProps) {
  const { preamp, comparedWith } = source
  const width = print ? PRINT_WIDTH : given
  const view = panelView(source)
  const hand = onFlip && !print ? onFlip : null
  const places = PLACES.filter((place) => preamp.controls.some((control) => control.place === place))
  const faces = facesOf({ preamp, view, hand, focusGroup }, places, width, compact)
  const height = faces.reduce((sum, face) => sum + face.height, 0) + FACE_GAP * (faces.length - 1)
  const tops = faces.map((_, index) => faces.slice(0, index).reduce((sum, face) => sum + face.height + FACE_GAP, 0))
  return (
    <svg
      className={comparedWith ? 'plot panel cmp' : 'plot panel'}
      role={hand ? 'group' : 'img'}
      aria-label={labelOf(source, view, places)}
      viewBox={`0 0 ${width} ${height}`}
      width={width}
      height={height}
    >
      <g aria-hidden="true">
        {faces.map((face, index) => (
          <g key={index} transform={`translate(0,${tops[index]})`}>
            {face.drawing}
          </g>
        ))}
      </g>
      {hand &&
        faces.map((face, index) => (
          <g key={index} transform={`translate(0,${tops[index]})`}>
            {face.targets}
          </g>
        ))}
    </svg>
  )
}

const FACE_GAP = 16

interface FaceSource {
  preamp: Preamp
  view: PanelView
  hand: ((flip: Flip) => void) | null
  focusGroup?: string
}

function facesOf(source: FaceSource, places: Place[], width: number, compact: boolean): Face[] {
  if (places.length === 0) return [fixedFace({ ...source, controls: [] }, width)]
  return places.map((place) => {
    const face = { ...source, controls: source.preamp.controls.filter((control) => control.place === place) }
    if (compact || width < 560) return narrowFace(face, place, width, places.length > 1)
    return width < 900 ? middleFace(face, place, width, places.length > 1) : wideFace(face, place, width)
  })
}

/** What the drawing says, for those who cannot see it: the moves where there are any, and the whole setting. */
function labelOf(source: PanelSource, view: PanelView, places: Place[]): string {
  const { preamp, present, target, trying, comparedWith } = source
  const which = places.length === 1 ? PLACE_NAMES[places[0]] : places.length > 1 ? 'Panels' : PLACE_NAMES.back
  const name = `${which}${places.length > 1 ? '' : ' panel'} of the ${preamp.modelName}.`
  const marked = present && target && !trying && !comparedWith
  const moves = marked ? moveLines(preamp, movesBetween(preamp, present, target)) : []
  const unknown = !present && target && !trying ? endStateLines(preamp, target) : []
  const lead = (moves.length > 0 ? moves : unknown).map(({ title }) => `${title}.`)
  return [name, ...lead, ...(moves.length > 0 ? ['Then:'] : []), positionsInWords(preamp, shownPositions(view))].join(' ')
}
