'use client'

import { useContainerWidth } from '../plots/use-container-width'
import { PanelDrawing, type PanelDrawingProps } from './panel-drawing'

/** The width of the drawing column of a sheet at 1440, and of a page at 390. */
const LIKELY_WIDTH = 928
const LIKELY_ON_PHONE = 354

/**
 * A panel that takes the width it is given. The page arrives with one drawing for a desk and one for a phone, of which
 * the style sheet shows the likelier; once the box is measured there is one, drawn for it. Without script a phone thus
 * has switches of a size to read.
 */
export function FittedPanel({ initialWidth = LIKELY_WIDTH, ...panel }: Omit<PanelDrawingProps, 'width'> & { initialWidth?: number }) {
  const { ref, width, measured } = useContainerWidth<HTMLDivElement>(initialWidth)
  return (
    <div className="fit" ref={ref} data-measured={measured ? '' : undefined}>
      {measured ? (
        <PanelDrawing {...panel} width={width} />
      ) : (
        <>
          <div className="at-desk">
            <PanelDrawing {...panel} width={initialWidth} />
          </div>
          <div className="at-phone">
            <PanelDrawing {...panel} width={Math.min(initialWidth, LIKELY_ON_PHONE)} />
          </div>
        </>
      )}
    </div>
  )
}
