import { FigureBlock, LineKey, ScreenKey } from '@/components/setups/figure-block'
import { loadingPlot } from '@/components/setups/plot-data'
import { FitPlot } from '@/components/plots/container-plot'
import { LoadingTable } from '@/components/plots/loading-table'
import type { ComparisonView } from '@/lib/shelf/views-compare'

interface Props {
  treble: NonNullable<ComparisonView['treble']>
  labels: { a: string; b: string }
}

/** The treble of both: the first dashed, the second solid with all that is not known about it. */
export function CompareTreble({ treble: { a, b, inputs, curves, heading }, labels }: Props) {
  const plot = loadingPlot({ ...curves, loading: b }, inputs, labels.b, { label: labels.a, decibels: a.nominal })
  return (
    <FigureBlock label="Figure 1. Treble" heading={heading}>
      <figure>
        <FitPlot kind="loading" plot={plot} />
        <figcaption>
          <LineKey dashed /> {labels.a}, middle values. <LineKey /> {labels.b}
          {plot.low ? (
            <>
              , with <ScreenKey /> anywhere in here.
            </>
          ) : (
            '.'
          )}{' '}
          A real coil peaks less than this, and the cartridge&rsquo;s own response comes on top.
        </figcaption>
        <LoadingTable {...plot} />
      </figure>
    </FigureBlock>
  )
}
