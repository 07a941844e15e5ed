import type { Candidate } from './candidates'
import { rangeOf } from './ensemble'
import { orderThatCounts, toFinding, type Judgement } from './judge'
import type { Preamp } from './preamp'
import type { OtherSetting } from './result'
import { summarise } from './settings'

/** Every other combination, neighbours first, each with what decides against it or when it is worth a try. */
export function otherSettings(chosen: Candidate, candidates: Candidate[], preamp: Preamp): OtherSetting[] {
  return candidates
    .filter((candidate) => candidate.state !== chosen.state)
    .map((candidate) => {
      const against = decidesAgainst(candidate, chosen)
      const distance = settingDistance(candidate, chosen)
      return {
        setting: summarise(preamp, candidate.state),
        outputVolts: rangeOf(candidate.figures.outputVolts),
        roomDecibels: rangeOf(tighter(candidate)),
        worthATry: against || distance !== 1 ? null : reasonToTry(candidate, chosen),
        against: against ? toFinding(against, null) : null,
        distance,
      }
    })
    .sort((a, b) => a.distance - b.distance || Number(a.against !== null) - Number(b.against !== null))
}

/** The rule in which this setting is heavier than a limit, or heavier than the advice, if any. */
function decidesAgainst(candidate: Candidate, chosen: Candidate): Judgement | null {
  let decisive: Judgement | null = null
  let most = 0
  candidate.judgements.forEach((judgement) => {
    const order = orderThatCounts(judgement)
    const same = chosen.judgements.find(({ code, figure }) => code === judgement.code && figure === judgement.figure)
    const advised = same ? orderThatCounts(same) : 0
    if (order >= 2 && order > advised && order > most) {
      most = order
      decisive = judgement
    }
  })
  return decisive
}

/** In how many of gain, load, capacitance, filter and input the two differ. */
function settingDistance({ setting: a }: Candidate, { setting: b }: Candidate): number {
  return [
    a.path.id !== b.path.id,
    a.gain.gainDecibels.nominal !== b.gain.gainDecibels.nominal,
    a.loadOhms.nominal !== b.loadOhms.nominal,
    a.inputFarads.nominal !== b.inputFarads.nominal,
    (a.filter === null) !== (b.filter === null),
  ].filter(Boolean).length
}

/** The tighter of the preamp's and the next input's worst margin, draw by draw. */
function tighter({ figures }: Candidate): Float64Array {
  const preamp = figures.worstMarginDecibels as Float64Array
  const next = figures.nextMarginDecibels as Float64Array
  return preamp.map((value, i) => Math.min(value, next[i]))
}

function reasonToTry({ setting: a, figures }: Candidate, { setting: b, figures: advised }: Candidate): OtherSetting['worthATry'] {
  if (a.filter && !b.filter) return 'if-rumble'
  if (a.gain.gainDecibels.nominal !== b.gain.gainDecibels.nominal) {
    return a.gain.gainDecibels.nominal > b.gain.gainDecibels.nominal ? 'if-quiet' : 'if-loud'
  }
  if (a.loadOhms.nominal !== b.loadOhms.nominal) return 'if-load'
  if (a.inputFarads.nominal === b.inputFarads.nominal) return null
  const lift = (draws: Candidate['figures']) => (draws.liftDecibels as Float64Array)[0] + (draws.fallDecibels as Float64Array)[0]
  return lift(figures) > lift(advised) ? 'if-dull' : 'if-bright'
}
