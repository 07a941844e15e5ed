'use client'

import { useMemo } from 'react'
import { ArmTable } from '../plots/arm-table'
import { FitPlot } from '../plots/container-plot'
import { LevelTable } from '../plots/level-table'
import { LoadingTable } from '../plots/loading-table'
import { OverloadTable } from '../plots/overload-table'
import type { Evaluation, OtherSetting } from '@/lib/match/result'
import { gainText } from '@/lib/setups/format'
import { armFinding, levelFinding, noiseFinding, roomFinding, trebleFinding } from '@/lib/setups/sentences/headings'
import { ArmCaption, LevelCaption, LoadingCaption, NoiseCaption, RoomCaption } from './captions'
import { FigureBlock } from './figure-block'
import { NoiseDetails } from './noise-details'
import { armCurves, levelPicture, loadingPlot, noiseLevels, overloadCurves, type Compared } from './plot-data'
import { useWhatIf } from './what-if'

/** Figures that follow the drawn switches. Each states its finding, and has its numbers in a table behind it. */

/** @param neighbours settings one step away, to say what the next gain up would do */
export function LevelFigure({ neighbours, children }: { neighbours: readonly OtherSetting[]; children?: React.ReactNode }) {
  const { inputs, shown, trying } = useWhatIf()
  const { heading, paragraphs } = levelFinding(shown, inputs, trying ? [] : neighbours)
  const plot = useMemo(() => levelPicture(shown.stages, inputs), [shown, inputs])
  return (
    <FigureBlock label="Figure 2. Level" heading={heading} paragraphs={paragraphs}>
      <figure>
        <div className="no-p">
          <FitPlot kind="level" plot={plot} />
        </div>
        {children}
        <LevelCaption stages={shown.stages} />
        <LevelTable {...plot} />
      </figure>
    </FigureBlock>
  )
}

export function RoomFigure() {
  const { inputs, shown } = useWhatIf()
  const { heading, paragraphs } = roomFinding(shown.evaluation, inputs)
  const plot = useMemo(() => overloadCurves(shown), [shown])
  return (
    <FigureBlock label="Figure 3. Room at each pitch" heading={heading} paragraphs={paragraphs} screenOnly>
      <figure>
        <FitPlot kind="overload" plot={plot} />
        <RoomCaption gain={gainText(shown.evaluation.setting.gainDecibels)} />
        <OverloadTable {...plot} />
      </figure>
    </FigureBlock>
  )
}

/** @param present how it is now, and its curve, where that differs from the advice */
export function TrebleFigure({ present, presentCurve, label, children }: { present: Evaluation | null; presentCurve: Compared | null; label: string; children?: React.ReactNode }) {
  const { inputs, shown, advice, trying } = useWhatIf()
  const { heading, paragraphs } = trebleFinding(shown.evaluation, trying ? null : present)
  const plot = useMemo(() => {
    const compare = trying ? { label: 'the advice', decibels: advice.curves.loading.nominal } : presentCurve
    return loadingPlot(shown.curves, inputs, trying ? 'trying out' : label, compare)
  }, [shown, inputs, advice, trying, presentCurve, label])
  return (
    <FigureBlock label="Figure 4. Treble" paperLabel="Figure 3. Treble" heading={heading} paragraphs={paragraphs} yields>
      <figure>
        <div className="no-p">
          <FitPlot kind="loading" plot={plot} />
        </div>
        {children}
        <LoadingCaption {...plot} />
        <LoadingTable {...plot} />
      </figure>
    </FigureBlock>
  )
}

export function ArmFigure() {
  const { inputs, shown } = useWhatIf()
  const { heading, paragraphs } = armFinding(shown.evaluation, inputs)
  const plot = useMemo(() => armCurves(shown), [shown])
  return (
    <FigureBlock label="Figure 5. Arm and rumble" heading={heading} paragraphs={paragraphs} screenOnly>
      <figure>
        <FitPlot kind="arm" plot={plot} />
        <ArmCaption filterOn={plot.filterOn} compliance={inputs.cartridge.complianceMetresPerNewton} />
        <ArmTable {...plot} />
      </figure>
    </FigureBlock>
  )
}

export function NoiseFigure() {
  const { inputs, shown } = useWhatIf()
  const { heading, paragraphs } = noiseFinding(shown.evaluation)
  const plot = useMemo(() => noiseLevels(shown), [shown])
  return (
    <FigureBlock label="Figure 6. Noise" heading={heading} paragraphs={paragraphs} screenOnly>
      <figure>
        <FitPlot kind="noise" plot={plot} />
        <NoiseCaption temperatureKelvin={inputs.temperatureKelvin} isRange={plot.yours.high - plot.yours.low > 0.1} />
        <NoiseDetails evaluation={shown.evaluation} levels={plot} temperatureKelvin={inputs.temperatureKelvin} />
      </figure>
    </FigureBlock>
  )
}
