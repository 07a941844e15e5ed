import type { MatchInputs } from '../../match/inputs'
import type { Evaluation, Finding, FindingCode, MatchResult, Move, Weight } from '../../match/result'
import { counted, countWord, listed, sentenceCase } from '../format'
import { findingSentence, soundOf } from './findings'
import { gateLead, gateTitle } from './gate'
import { handleOf, namesOf, type Handle } from './names'
import { leadToNumber } from './number-to-find'
import { alternativeSentence, type Alternative } from './remedies'

/** What a sheet's first two sentences rest on. */
export interface VerdictFacts {
  inputs: MatchInputs
  result: MatchResult
  /** Other models of the maker that would do it, best first. */
  alternatives: readonly Alternative[]
}

const WEIGHTS: Record<Weight, number> = { fine: 0, 'worth-knowing': 1, limit: 2, 'rules-it-out': 3 }

/** Switches, plugs and buttons that a hand has to touch; a row of which one is in counts once. */
export function countMoves(moves: readonly Move[]): number {
  return new Set(moves.map(({ control, member, side }) => `${control} ${member ?? ''} ${side}`)).size
}

/** "you move two switches", "you change the load plugs". */
function deed(moves: readonly Move[], inputs: MatchInputs): string {
  const handle = handleOf(inputs.preamp, moves.map(({ control }) => control))
  if (!handle) return 'you set it as below'
  if (handle.one === 'pair of plugs') return 'you change the load plugs'
  return `you ${handle.verb} ${counted(countMoves(moves), handle.one, handle.many)}`
}

const LIMITS: Partial<Record<FindingCode, string>> = {
  'headroom-tight': 'except on the very loudest records',
  'headroom-loud-records': 'except on the very loudest records',
  'next-input-tight': 'except on the very loudest records',
  'level-low': 'though the volume sits high',
  'level-high': 'though the volume sits low',
  'load-below-recommended': 'with a lower load than it asks for',
  'load-above-recommended': 'with a higher load than it asks for',
  'load-near-coil': 'though the load costs level',
  'capacitance-low': 'with less capacitance than it asks for',
  'capacitance-high': 'with more capacitance than it asks for',
  'treble-lift': 'though it sounds bright',
  'treble-fall': 'though it sounds dull',
  hiss: 'though you hear some hiss',
  'arm-resonance-low': 'though the arm is heavy for it',
  'arm-resonance-high': 'though the arm is light for it',
  'cable-loss': 'though the cable costs treble',
  'bass-loss': 'though it loses the deepest bass',
}

/** The finding that a limit or a no rests on: the heaviest that counts. */
function ruling(evaluation: Evaluation | null): Finding | null {
  return evaluation?.findings[0] ?? null
}

const leave = (handle: Handle | null) =>
  handle ? `Leave every ${handle.one === 'pair of plugs' ? 'plug' : handle.one} where it is.` : 'There is nothing to set.'

/** The verdict as a sentence that says what to do: the page's heading. */
export function verdictTitle({ inputs, result }: VerdictFacts): string {
  const { verdict, moves, chosen, gate } = result
  if (gate) return gateTitle(gate)
  if (verdict === 'cannot-say') return 'We cannot say yet.'
  if (verdict === 'does-not-suit') return 'It does not suit.'
  const handle = handleOf(inputs.preamp)
  const once = moves === null ? asDrawn(handle) : moves.length > 0 ? `, once ${deed(moves, inputs)}` : ''
  if (verdict === 'suits-with-a-limit') {
    const code = ruling(chosen)?.code
    const limit = (code && LIMITS[code]) ?? 'with a limit'
    return `It suits${once}, ${limit}.`
  }
  return once ? `It suits${once}.` : `It suits. ${leave(handle)}`
}

const asDrawn = (handle: Handle | null) => (handle ? `, with the ${handle.many === 'pairs of plugs' ? 'plugs' : handle.many} set as below` : '')

const PRESENT_FAULTS: Partial<Record<FindingCode, string>> = {
  'next-input-tight': 'too loud for {next}',
  'headroom-tight': 'too loud for {preamp} itself',
  'headroom-loud-records': 'too loud for {preamp} itself',
  'level-high': 'louder than it need be',
  'level-low': 'too quiet',
  'load-below-recommended': 'loaded more heavily than it asks',
  'load-above-recommended': 'loaded more lightly than it asks',
  'load-near-coil': 'loaded more heavily than is good for it',
  'capacitance-high': 'too bright',
  'treble-lift': 'too bright',
  'capacitance-low': 'too dull',
  'treble-fall': 'too dull',
  hiss: 'noisier than it need be',
  'magnet-into-mc': 'on the wrong input',
  'step-up-into-mc': 'on the wrong input',
  'double-step-up': 'on the wrong input',
}

/** What is worse as the unit stands than as advised, in a few words each: the two that weigh most. */
export function presentFaults({ inputs, result }: VerdictFacts): string[] {
  const { present, chosen } = result
  if (!present || !chosen) return []
  const names = namesOf(inputs)
  const advised = new Map(chosen.findings.map(({ code, worst }) => [code, WEIGHTS[worst]]))
  const worse = present.findings
    .filter(({ code, worst }) => WEIGHTS[worst] > (advised.get(code) ?? 0))
    .sort((a, b) => WEIGHTS[b.worst] - WEIGHTS[a.worst])
  const words = worse.flatMap(({ code }) => PRESENT_FAULTS[code] ?? [])
  const faults = words.map((text) => text.replace('{next}', names.next).replace('{preamp}', names.preamp))
  return [...new Set(faults)].slice(0, 2)
}

/** "Two switches put both right." */
function putsRight(moves: readonly Move[], inputs: MatchInputs, faults: number): string {
  const handle = handleOf(inputs.preamp, moves.map(({ control }) => control))
  const count = countMoves(moves)
  const what = faults === 2 ? 'both' : 'it'
  if (!handle || handle.one === 'pair of plugs') return `Other plugs put ${what} right.`
  return `${sentenceCase(counted(count, handle.one, handle.many))} ${count === 1 ? 'puts' : 'put'} ${what} right.`
}

/** The sentences under the heading: why, and what is good enough. First the one that a phone shows. */
export function verdictLead(facts: VerdictFacts): string[] {
  const { inputs, result } = facts
  if (result.gate) return gateLead(result.gate, inputs)
  if (result.verdict === 'cannot-say') return leadToNumber(facts)
  if (result.verdict === 'does-not-suit') return leadOfNo(facts)
  if (result.verdict === 'suits-with-a-limit') return leadOfLimit(facts)
  return [...leadOfChanges(facts), goodMatch(inputs), ...worthKnowing(facts)]
}

function goodMatch(inputs: MatchInputs): string {
  const { cartridge, preamp } = namesOf(inputs)
  return `${sentenceCase(cartridge)} and ${preamp} are a good match.`
}

function leadOfChanges(facts: VerdictFacts): string[] {
  const { inputs, result } = facts
  const { moves } = result
  if (moves === null) return ['We do not know how yours stand, so this is the whole end state.']
  if (moves.length === 0) return []
  if (result.presentSidesDiffer) return ['Your two sides are not alike. After this both are the same.']
  const faults = presentFaults(facts)
  if (faults.length === 0) return ['As you have it set it is not at its best.']
  return [`As you have it set, it is ${listed(faults)}. ${putsRight(moves, inputs, faults.length)}`]
}

/** The heaviest thing worth knowing, if any. */
function worthKnowing({ inputs, result }: VerdictFacts): string[] {
  const finding = ruling(result.chosen)
  if (!finding || finding.worst === 'fine') return []
  return [findingSentence(finding, inputs)]
}

function leadOfLimit(facts: VerdictFacts): string[] {
  const { inputs, result, alternatives } = facts
  const finding = ruling(result.chosen)
  const first = result.moves?.length === 0 ? ['Nothing to set.'] : leadOfChanges(facts)
  if (!finding) return first
  const more = alternatives[0] ? [alternativeSentence(alternatives[0], finding.code)] : []
  return [...first, findingSentence(finding, inputs), soundOf(finding.code), ...more].filter(Boolean)
}

function leadOfNo({ inputs, result, alternatives }: VerdictFacts): string[] {
  const finding = ruling(result.chosen)
  const why = finding ? findingSentence(finding, inputs) : `Nothing that ${namesOf(inputs).preamp} can be set to fits.`
  const others = result.combinations > 1 ? `We reckoned all ${countWord(result.combinations)} settings, and this is the least bad.` : ''
  const would = alternatives[0] && finding ? alternativeSentence(alternatives[0], finding.code) : ''
  return [why, would, others].filter(Boolean)
}

/** What the middle line of the treble is called: "after the two moves". */
export function afterMovesLabel({ moves }: MatchResult): string {
  if (!moves || moves.length === 0) return ''
  const count = countMoves(moves)
  return count === 1 ? 'after the move' : `after the ${countWord(count)} moves`
}
