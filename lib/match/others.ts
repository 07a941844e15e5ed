import { candidateOf, type Candidate } from './candidates'
import { rangeOf } from './ensemble'
import { each } from './figure-parts'
import type { FigureBench } from './figure-draws'
import { toFinding, type Judgement } from './judgement'
import type { Range } from './quantity'
import type { Finding, OtherSetting } from './result'
import { summaryOf } from './settings'

/**
 * Every other combination, neighbours first, each with what decides against it or when it is worth a try. `ranked`
 * is best first; neighbours of the best are worked out anew on the bench given, which has more draws.
 */
export function otherSettings(ranked: Candidate[], bench: FigureBench): OtherSetting[] {
  const advised = candidateOf(bench, ranked[0].state, () => 0)
  return ranked
    .slice(1)
    .map((candidate) => {
      const distance = settingDistance(candidate, advised)
      return distance <= 1 ? neighbour(candidateOf(bench, candidate.state, () => 0), advised, bench, distance) : distant(candidate, ranked[0], distance)
    })
    .sort((a, b) => a.distance - b.distance || Number(a.against !== null) - Number(b.against !== null))
}

function neighbour(candidate: Candidate, advised: Candidate, bench: FigureBench, distance: number): OtherSetting {
  const against = decidesAgainst(candidate, advised)
  return {
    setting: summaryOf(candidate.setting, candidate.state),
    outputVolts: rangeOf(candidate.figures.outputVolts),
    roomDecibels: rangeOf(tighter(candidate)),
    worthATry: against ? null : reasonToTry(candidate, advised),
    against: against && toFinding(against, bench.draws),
    distance,
  }
}

function distant(candidate: Candidate, advised: Candidate, distance: number): OtherSetting {
  const against = decidesAgainst(candidate, advised)
  return {
    setting: summaryOf(candidate.setting, candidate.state),
    outputVolts: point(candidate.figures.outputVolts[0]),
    roomDecibels: point(tighter(candidate)[0]),
    worthATry: null,
    against: against && inTheMiddle(against),
    distance,
  }
}

const point = (value: number): Range => ({ low: value, nominal: value, high: value })

function inTheMiddle(judgement: Judgement): Finding {
  const finding = toFinding(judgement, null)
  return { ...finding, range: judgement.values && point(judgement.values[0]) }
}

/** The rule in which this setting is at a limit and heavier than the advice, if any. */
function decidesAgainst(candidate: Candidate, advised: Candidate): Judgement | null {
  let decisive: Judgement | null = null
  let most = 1
  for (const judgement of candidate.judgements) {
    const order = judgement.counts
    if (order <= most) continue
    const same = advised.judgements.find(({ code, figure }) => code === judgement.code && figure === judgement.figure)
    if (same && same.counts >= order) continue
    most = order
    decisive = judgement
  }
  return decisive
}

/** In how many of gain, load, capacitance, filter and input the two differ. */
function settingDistance({ setting: a }: Candidate, { setting: b }: Candidate): number {
  return [
    a.path.id !== b.path.id && a.gain.id === b.gain.id,
    a.gain.id !== b.gain.id,
    a.loadOhms.nominal !== b.loadOhms.nominal,
    a.inputFarads.nominal !== b.inputFarads.nominal,
    (a.filter === null) !== (b.filter === null),
  ].filter(Boolean).length
}

/** The tighter of the preamp's and the next input's worst margin, draw by draw. */
function tighter({ figures }: Candidate): Float64Array {
  const preamp = figures.worstMarginDecibels as Float64Array
  const next = figures.nextMarginDecibels as Float64Array
  return each(preamp.length, (i) => Math.min(preamp[i], next[i]))
}

function reasonToTry({ setting: a, figures }: Candidate, { setting: b, figures: advised }: Candidate): OtherSetting['worthATry'] {
  if (a.filter && !b.filter) return 'if-rumble'
  if (a.gain.id !== b.gain.id) return a.gain.gainDecibels.nominal > b.gain.gainDecibels.nominal ? 'if-quiet' : 'if-loud'
  if (a.loadOhms.nominal !== b.loadOhms.nominal) return 'if-load'
  if (a.inputFarads.nominal === b.inputFarads.nominal) return null
  const tilt = (draws: Candidate['figures']) => (draws.liftDecibels as Float64Array)[0] + (draws.fallDecibels as Float64Array)[0]
  return tilt(figures) > tilt(advised) ? 'if-dull' : 'if-bright'
}
