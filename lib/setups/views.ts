import type { MatchInputs } from '../match/inputs'
import type { Curves, Evaluation, LevelStage, MatchResult, VerdictKind } from '../match/result'
import type { Milliseconds } from '../kernel/clock'
import type { AnswersInput } from './schema'
import { findingSentence } from './sentences/findings'
import type { Alternative } from './sentences/remedies'
import { remedySentence } from './sentences/remedies'
import { verdictLead, verdictTitle } from './sentences/verdict'

/** What trying out a setting comes to: everything on a sheet that follows the switches. */
export interface Outcome {
  evaluation: Evaluation
  verdict: VerdictKind
  curves: Curves
  stages: LevelStage[]
}

/** All that a revision keeps of what was said. */
export interface SheetResult {
  match: MatchResult
  /** The careful setting to play with tonight, while the verdict is open. */
  tonight: Outcome | null
  alternatives: Alternative[]
}

export interface RevisionMark {
  letter: string
  createdAt: Milliseconds
}

/** What is not as it was when a revision was reckoned. */
export interface Changed {
  rules: boolean
  engine: boolean
  data: boolean
  /** False where the preamp or its board is no longer in the catalogue. */
  canComputeAnew: boolean
}

/** A sheet at one revision, for whoever holds its code. */
export interface SheetView {
  number: number
  code: string
  letter: string
  createdAt: Milliseconds
  /** Every revision, oldest first. */
  revisions: RevisionMark[]
  answers: AnswersInput
  inputs: MatchInputs
  result: SheetResult
  rulesVersion: number
  engineVersion: string
  changed: Changed
  /** False where an owner keeps it and someone else looks. */
  mayChange: boolean
  /** On the shelf of whoever looks, on nobody's, or on someone else's. */
  keeping: 'own' | 'nobody' | 'someone'
  /** What its owner calls the unit it is about; null for everyone else, and where it is about none. */
  unitName: string | null
}

/** Which sheet an answer of the API belongs to. */
export interface SheetReference {
  number: number
  code: string
  revision: string
  revisions: string[]
  createdAt: string
  path: string
}

/**
 * A result as the API gives it. Figures are SI and decibels, each low, nominal and high; margins are under the limit
 * when positive. `answers` can be sent back as they are.
 */
export function toCheckJson(checked: { answers: AnswersInput; inputs: MatchInputs; result: SheetResult }, sheet: SheetReference | null) {
  const { answers, inputs, result } = checked
  const { match, alternatives } = result
  const words = { inputs, result: match, alternatives }
  return {
    sheet,
    rulesVersion: match.rulesVersion,
    engineVersion: match.engineVersion,
    answers,
    preamp: { model: inputs.preamp.modelId, name: inputs.preamp.modelName, board: inputs.preamp.boardId },
    verdict: match.verdict,
    verdictShare: match.verdictShare,
    title: verdictTitle(words),
    lead: verdictLead(words),
    gate: match.gate,
    chosen: match.chosen && evaluationJson(match.chosen, inputs),
    present: match.present && evaluationJson(match.present, inputs),
    moves: match.moves,
    presentSidesDiffer: match.presentSidesDiffer,
    combinations: match.combinations,
    others: match.others,
    remedies: match.remedies.map((remedy) => ({ ...remedy, sentence: remedySentence(remedy, inputs, alternatives) })),
    alternatives,
    next: match.next,
    doubts: match.doubts,
    tonight: match.tonight,
    stages: match.stages,
    curves: match.curves,
  }
}
export type CheckJson = ReturnType<typeof toCheckJson>

function evaluationJson(evaluation: Evaluation, inputs: MatchInputs) {
  return { ...evaluation, findings: evaluation.findings.map((finding) => ({ ...finding, sentence: findingSentence(finding, inputs) })) }
}

export function toSheetReference({ number, code, letter, revisions, createdAt }: Pick<SheetView, 'number' | 'code' | 'letter' | 'revisions' | 'createdAt'>): SheetReference {
  return {
    number,
    code,
    revision: letter,
    revisions: revisions.map((revision) => revision.letter),
    createdAt: new Date(createdAt).toISOString(),
    path: `/sheets/${code}`,
  }
}
