'use client'

import { useContainerWidth } from '../plots/use-container-width'
import { PanelDrawing, type PanelDrawingProps } from './panel-drawing'

/** The width of the drawing column of a sheet at 1440. */
const LIKELY_WIDTH = 928

/** A panel that takes the width it is given: it arrives drawn at `initialWidth` and is drawn anew once measured. */
export function FittedPanel({ initialWidth = LIKELY_WIDTH, ...panel }: Omit<PanelDrawingProps, 'width'> & { initialWidth?: number }) {
  const { ref, width, measured } = useContainerWidth<HTMLDivElement>(initialWidth)
  return (
    <div className="fit" ref={ref} data-measured={measured ? '' : undefined}>
      <PanelDrawing {...panel} width={width} />
    </div>
  )
}
