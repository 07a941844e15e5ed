'use client'

import type { ComponentType } from 'react'
import type { ArmCurves } from './arm-facts'
import { ArmPlot } from './arm-plot'
import type { PlotForm } from './geometry'
import { LevelDiagram } from './level-diagram'
import type { LevelPicture } from './level-facts'
import type { LoadingPlotData } from './loading-plot'
import { LoadingPlot } from './loading-plot'
import type { NoiseLevels } from './noise-facts'
import { NoiseLine } from './noise-line'
import type { OverloadCurves } from './overload-facts'
import { OverloadPlot } from './overload-plot'
import type { Turns } from './turns-facts'
import { joinedStretches } from './turns-facts'
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

/** The width of the drawing column of a sheet at 1440. */
const LIKELY_WIDTH = 928

/**
 * A drawing that takes the width it is given. The page arrives with one drawn at `initialWidth`; as soon as the box is
 * measured it is drawn anew. Its height is kept free beforehand, and curves follow a change of data.
 */
export function FitPlot({ initialWidth = LIKELY_WIDTH, ...drawing }: FittedPlot & { initialWidth?: number }) {
  const { ref, width, measured } = useContainerWidth<HTMLDivElement>(initialWidth)
  return (
    <div className="fit" ref={ref} data-measured={measured ? '' : undefined}>
      <div className={`kept ${keptHeight(drawing)}`}>
        <Drawing drawing={drawing} width={width} />
      </div>
    </div>
  )
}

/** The class in `plots.css` that keeps this drawing's height free. */
function keptHeight(drawing: FittedPlot): string {
  switch (drawing.kind) {
    case 'loading':
      return drawing.plot.size === 'panel' ? 'kept-loading-panel' : 'kept-loading'
    case 'overload':
      return 'kept-room'
    case 'turns':
      return `kept-turns kept-rows-${joinedStretches(drawing.plot).length}`
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
