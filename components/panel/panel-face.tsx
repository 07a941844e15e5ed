import type { ReactNode } from 'react'
import type { Control } from '@/lib/match'
import { faradsInWords, gainInWords, ohmsInWords } from '@/lib/match/setting-words'
import { summarise } from '@/lib/match/settings'
import { listed } from './words'
import { arrange, stack, type Arrangement } from './arrange'
import { CaseBox, GroundPost, PowerKnob, Sockets } from './case-parts'
import { casePieces, narrowPieces, type PieceSource } from './control-pieces'
import { px } from './piece'

/** One side of the case with the controls on it, at one of three forms. */
export interface Face {
  height: number
  drawing: ReactNode
  targets: ReactNode
}

export type Place = Control['place']
const LEGENDS: Record<Place, string> = { back: 'BACK', front: 'FRONT', underside: 'UNDERNEATH' }

/** Words at the lower right corner, over the line. */
function ModelName({ name, x, y }: { name: string; x: number; y: number }) {
  return (
    <text className="pl" x={x} y={y} textAnchor="end">
      {name}
    </text>
  )
}

function Layer({ of, layer }: { of: Arrangement; layer: 'drawing' | 'targets' }) {
  return of.placed.map(({ piece, x, y }, index) =>
    piece[layer] ? (
      <g key={index} transform={`translate(${x},${y})`}>
        {piece[layer]}
      </g>
    ) : null,
  )
}

/** 900 wide and up: the case with its sockets. */
export function wideFace(source: PieceSource, place: Place, width: number): Face {
  const isBack = place === 'back'
  const left = isBack ? (width < 980 ? 150 : 168) : place === 'front' ? Math.round(width * 0.16) : 24
  const region = { x: left, y: 34, width: (isBack ? width - 140 : width - 24) - left, spread: 'start' as const, widestGap: isBack ? 66 : 40 }
  const laid = arrange(casePieces(source, { width: region.width, widestSwitch: width < 980 ? 31 : 33, leastButton: 62 }), region)
  const height = Math.max(isBack ? 220 : 180, 34 + laid.height + (isBack ? 32 : 14))
  return {
    height,
    drawing: (
      <>
        <CaseBox width={width} height={height} />
        {isBack ? (
          <>
            <Sockets x={44} apart={64} y={92} legend="IN" />
            <GroundPost x={44} y={height - 58} />
            <Sockets x={width - 104} apart={62} y={92} legend="OUT" />
          </>
        ) : (
          <text className="pl" x="24" y="45">
            {LEGENDS[place]}
          </text>
        )}
        {place === 'front' && <PowerKnob x={58} y={106} />}
        {laid.lines.map((x) => (
          <path key={x} className="hair" d={`M${x} 24V${height - 24}`} />
        ))}
        <Layer of={laid} layer="drawing" />
        <ModelName name={source.preamp.modelName} x={width - 22} y={height - 26} />
      </>
    ),
    targets: <Layer of={laid} layer="targets" />,
  }
}

/** 560 to 899 wide: the case without its sockets. */
export function middleFace(source: PieceSource, place: Place, width: number, named: boolean): Face {
  const top = named ? 52 : 26
  const region = { x: 14, y: top, width: width - 26, spread: 'even' as const, widestGap: 66 }
  const laid = arrange(casePieces(source, { width: region.width, widestSwitch: 38, leastButton: 54 }), region)
  const height = top + laid.height + (place === 'back' ? 18 : 22)
  return {
    height,
    drawing: (
      <>
        <CaseBox width={width} height={height} />
        {named && (
          <text className="pl" x="18" y="34">
            {LEGENDS[place]}
          </text>
        )}
        {laid.lines.map((x) => (
          <path key={x} className="hair" d={`M${x} 20V${height - 20}`} />
        ))}
        <Layer of={laid} layer="drawing" />
      </>
    ),
    targets: <Layer of={laid} layer="targets" />,
  }
}

/** Under 560 wide: the parts alone. */
export function narrowFace(source: PieceSource, place: Place, width: number, named: boolean): Face {
  const top = named ? 34 : 3
  const rows = new Map(narrowRows(source, width))
  const laid = stack([...rows.keys()], width - 2, (piece, before) => rows.get(piece) === true && rows.get(before) === true)
  return {
    height: top + laid.height + 4,
    drawing: (
      <>
        {named && (
          <text className="pl tk" x="1" y="14">
            {LEGENDS[place]}
          </text>
        )}
        <g transform={`translate(1,${top})`}>
          {laid.rules.map((y) => (
            <path key={y} className="g1" d={`M0 ${y}H${width - 2}`} />
          ))}
          <Layer of={laid} layer="drawing" />
        </g>
      </>
    ),
    targets: (
      <g transform={`translate(1,${top})`}>
        <Layer of={laid} layer="targets" />
      </g>
    ),
  }
}

/** Pieces with whether they are rows of buttons, which may stand side by side. */
function narrowRows(source: PieceSource, width: number) {
  return source.controls.flatMap((control) =>
    narrowPieces({ ...source, controls: [control] }, width - 2).map((piece) => [piece, control.kind === 'buttons'] as const),
  )
}

/** Under this the frame would run into what stands beside it. */
const LEAST_FRAMED = 660

/** A case without controls says what is fixed. */
export function fixedFace({ preamp }: PieceSource, width: number): Face {
  const narrow = width < LEAST_FRAMED
  const { loadOhms, inputFarads, gainDecibels } = summarise(preamp, preamp.asDelivered)
  const fixed = `${listed([ohmsInWords(loadOhms), faradsInWords(inputFarads), gainInWords(gainDecibels)])} are fixed`
  const height = narrow ? 150 : 176
  const middle = width / 2 + (narrow ? 10 : Math.max(0, (900 - width) / 6))
  return {
    height,
    targets: null,
    drawing: (
      <>
        <CaseBox width={width} height={height} />
        <Sockets x={narrow ? 38 : 44} apart={narrow ? 52 : 64} y={narrow ? 78 : 92} radius={narrow ? 16 : 19} legend="IN" />
        <GroundPost x={narrow ? 142 : 184} y={narrow ? 78 : 92} under={narrow} />
        <Sockets x={narrow ? width - 82 : width - 104} apart={narrow ? 50 : 62} y={narrow ? 78 : 92} radius={narrow ? 16 : 19} legend="OUT" />
        {narrow ? (
          <text className="swn tk" x={px(middle)} y={height - 18} textAnchor="middle">
            no switches
          </text>
        ) : (
          <>
            <rect className="hair dots" x={px(middle - 140)} y="62" width="280" height="60" />
            <text className="an strong" x={px(middle)} y="86" textAnchor="middle">
              Nothing to set
            </text>
            <text className="tk" x={px(middle)} y="107" textAnchor="middle">
              {fixed}
            </text>
            <ModelName name={preamp.modelName} x={width - 170} y={height - 22} />
          </>
        )}
      </>
    ),
  }
}
