'use client'

import type { ComponentType } from 'react'
import type { ArmCurves } from './arm-facts'
import { ArmPlot } from './arm-plot'
import type { PlotForm } from './geometry'
import { PHONE_BELOW } from './geometry'
import { LevelDiagram } from './level-diagram'
import type { LevelPicture } from './level-facts'
import type { LoadingPlotData } from './loading-plot'
import { LoadingPlot } from './loading-plot'
import type { NoiseLevels } from './noise-facts'
import { NoiseLine } from './noise-line'
import type { OverloadCurves } from './overload-facts'
import { OverloadPlot } from './overload-plot'
import type { Turns } from './turns-facts'
import { TurnsPlot } from './turns-plot'
import { useContainerWidth } from './use-container-width'
import { useTween } from './use-tween'

/** A drawing by name with its data: plain values, so that a server component can hand it over. */
export type FittedPlot =
  | { kind: 'loading'; plot: LoadingPlotData }
  | { kind: 'overload'; plot: OverloadCurves }
  | { kind: 'arm'; plot: ArmCurves }
  | { kind: 'level'; plot: LevelPicture }
  | { kind: 'noise'; plot: NoiseLevels }
  | { kind: 'turns'; plot: Turns }

/** The width of the drawing column of a sheet at 1440, and on a phone of 390. */
const LIKELY_WIDTH = 928
const LIKELY_PHONE_WIDTH = 354

/**
 * A drawing that takes the width it is given. The page arrives with one drawn at `initialWidth` and one in the phone
 * form, of which the box shows the one that suits it; as soon as it is measured it is drawn anew, once, at its width.
 * So a reader without script has a drawing to read on either. Curves follow a change of data.
 */
export function FitPlot({ initialWidth = LIKELY_WIDTH, ...drawing }: FittedPlot & { initialWidth?: number }) {
  const { ref, width, measured } = useContainerWidth<HTMLDivElement>(initialWidth)
  return (
    <div className="fit" ref={ref} data-measured={measured ? '' : undefined}>
      {measured ? (
        <Drawing drawing={drawing} width={width} />
      ) : (
        <>
          <div className={`fit-wide ${keptHeight(drawing)}`}>
            <Drawing drawing={drawing} width={Math.max(width, PHONE_BELOW)} />
          </div>
          <div className="fit-phone">
            <Drawing drawing={drawing} width={LIKELY_PHONE_WIDTH} />
          </div>
        </>
      )}
    </div>
  )
}

/** The class in `fit.css` that keeps free the height of the drawing to come. */
function keptHeight(drawing: FittedPlot): string {
  switch (drawing.kind) {
    case 'loading':
      return drawing.plot.size === 'panel' ? 'kept-loading-panel' : 'kept-loading'
    case 'overload':
      return 'kept-room'
    default:
      return `kept-${drawing.kind}`
  }
}

function Drawing({ drawing, width }: { drawing: FittedPlot; width: number }) {
  switch (drawing.kind) {
    case 'loading':
      return <Moving Plot={LoadingPlot} plot={drawing.plot} width={width} />
    case 'overload':
      return <Moving Plot={OverloadPlot} plot={drawing.plot} width={width} />
    case 'arm':
      return <Moving Plot={ArmPlot} plot={drawing.plot} width={width} />
    case 'level':
      return <Moving Plot={LevelDiagram} plot={drawing.plot} width={width} />
    case 'noise':
      return <Moving Plot={NoiseLine} plot={drawing.plot} width={width} />
    case 'turns':
      return <TurnsPlot {...drawing.plot} width={width} />
  }
}

function Moving<T extends object>({ Plot, plot, width }: { Plot: ComponentType<T & PlotForm>; plot: T; width: number }) {
  const shown = useTween(plot)
  return <Plot {...shown} width={width} />
}
