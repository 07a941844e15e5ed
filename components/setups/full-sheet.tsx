import { LevelDiagram } from '../plots/level-diagram'
import { LoadingPlot } from '../plots/loading-plot'
import type { MatchInputs } from '@/lib/match/inputs'
import type { MatchResult } from '@/lib/match/result'
import { countWord } from '@/lib/setups/format'
import { presentToCompare } from '@/lib/setups/sentences/headings'
import { numberMatters } from '@/lib/setups/sentences/number-to-find'
import { otherRows } from '@/lib/setups/sentences/others'
import { movesAPlug, remedySentence } from '@/lib/setups/sentences/remedies'
import { restRows } from '@/lib/setups/sentences/rests'
import { afterMovesLabel } from '@/lib/setups/sentences/verdict'
import type { Outcome } from '@/lib/setups/views'
import { ArmFigure, LevelFigure, NoiseFigure, RoomFigure, TrebleFigure } from './figures'
import { OthersTable } from './others-table'
import { PaperLine } from './paper'
import { levelPicture, loadingPlot, type Compared } from './plot-data'
import { RemediesList } from './remedies-list'
import { RestsTable } from './rests-table'
import { canAct, neighboursOf } from './sheet-facts'
import { SheetHead } from './sheet-head'
import type { SheetParts } from './sheet-parts'
import { SwitchCard } from './switch-card'
import { FollowStrip } from './try-strip'

const PAPER_WIDTH = 590

/** A sheet with a verdict: what to move, then every figure that speaks for it, then what it rests on. */
export function FullSheet({ advice, ...parts }: SheetParts & { advice: Outcome }) {
  const { sheet, paths } = parts
  const { inputs, result, code } = sheet
  const { match, alternatives } = result
  const suits = match.verdict !== 'does-not-suit'
  const others = otherRows(match, inputs)
  const present = presentToCompare(match)
  const compared = presentCurve(match)
  const after = afterMovesLabel(match)
  const remedies = match.remedies.length > 0 && (
    <RemediesList
      heading={suits ? 'To go without the limit' : 'To make it fit'}
      sentences={[...new Set(match.remedies.map((remedy) => remedySentence(remedy, inputs, alternatives)))]}
      plugs={match.remedies.some(movesAPlug)}
      first={!suits}
    />
  )
  return (
    <>
      <SheetHead {...parts} />
      {!suits && remedies}
      <SwitchCard
        preamp={inputs.preamp}
        present={suits ? inputs.present : null}
        target={advice.evaluation.setting.state}
        moves={suits ? match.moves : []}
        instead={suits ? undefined : leastBad(match)}
        label={switchLabel(inputs)}
        code={code}
        tellPath={paths.tellPresent}
        canAct={canAct(sheet)}
        unitName={sheet.unitName}
      />
      <div>
        <FollowStrip />
        <LevelFigure neighbours={neighboursOf(match)}>
          <div className="p-only">
            <LevelDiagram {...levelPicture(advice.stages, inputs)} width={PAPER_WIDTH} print />
          </div>
        </LevelFigure>
        <RoomFigure />
        <TrebleFigure present={present} presentCurve={compared} label={after}>
          <div className="p-only">
            <LoadingPlot {...loadingPlot(advice.curves, inputs, after, compared)} width={PAPER_WIDTH} print />
          </div>
        </TrebleFigure>
        <ArmFigure />
        <NoiseFigure />
      </div>
      <PaperLine evaluation={advice.evaluation} />
      <RestsTable
        label="Table 1. What this rests on"
        rows={restRows(inputs, advice.evaluation.figures)}
        next={numberMatters(match.next, inputs)}
        enterPath={paths.enter}
      />
      {suits && remedies}
      {others.all.length > 0 && <OthersTable label="Table 2. Other settings" {...others} combinations={match.combinations} />}
    </>
  )
}

function switchLabel({ preamp }: MatchInputs): string {
  const banks = preamp.controls.filter(({ kind }) => kind === 'bank').length
  return banks === 1 ? 'Figure 1. Switches, both banks' : 'Figure 1. Switches'
}

/** What does not suit is not worth a hand at the switches. */
function leastBad({ combinations }: MatchResult) {
  return {
    heading: 'Nothing to move',
    text: combinations > 1 ? `This is the least bad of all ${countWord(combinations)} settings. The figures below are for it.` : 'Nothing here can be set.',
  }
}

function presentCurve({ presentCurves }: MatchResult): Compared | null {
  return presentCurves && { label: 'as you have it now', decibels: presentCurves.loading.nominal }
}
