import 'server-only'
import { createHash } from 'node:crypto'
import { getPreamp, listPreamps } from '../catalogue/queries'
import type { Context } from '../kernel/context'
import { Fault, type FieldSentences } from '../kernel/errors'
import type { MatchInputs } from '../match/inputs'
import { match, tryOut } from '../match/match'
import type { Preamp } from '../match/preamp'
import type { Evaluation, FindingCode, MatchResult } from '../match/result'
import { toMatchInputs } from './inputs'
import { Answers, AnswersInput, toQuery } from './schema'
import type { Alternative } from './sentences/remedies'
import { toStored } from './stored'
import { SHELF_KEYS } from './terms'
import type { SheetResult } from './views'

/** Answers, checked: what the engine was given and all that a sheet keeps of what it said. */
export interface Reckoned {
  answers: AnswersInput
  inputs: MatchInputs
  result: SheetResult
  dataHash: string
}

type Reader = Pick<Context, 'db'>

/**
 * Reads answers and runs the check on the catalogue as it stands.
 * @throws Fault bad_input with a sentence for each answer that needs putting right
 */
export function reckon(context: Reader, given: unknown): Reckoned {
  const { answers, inputs } = readInputs(context, given)
  const result = match(inputs)
  const tonight = result.tonight && tryOut(inputs, result.tonight.state)
  return {
    answers,
    inputs,
    dataHash: hashOf(inputs),
    result: { match: result, tonight, alternatives: alternativesTo(context, inputs, result) },
  }
}

/** @throws Fault bad_input */
export function readInputs(context: Reader, given: unknown): { answers: AnswersInput; inputs: MatchInputs } {
  const texts = AnswersInput.safeParse(given)
  if (!texts.success) throw refused(texts.error.issues)
  const read = Answers.safeParse(texts.data)
  if (!read.success) throw refused(read.error.issues)
  const { preamp, board } = read.data
  if (!preamp) throw refused([{ path: ['preamp'], message: 'Choose your preamp first.' }])
  return { answers: withoutShelf(texts.data), inputs: toMatchInputs(read.data, preampOf(context, preamp, board)) }
}

/** Which unit and cartridge of a shelf it was is nobody's business who opens the sheet by its code. */
function withoutShelf(answers: AnswersInput): AnswersInput {
  return Object.fromEntries(Object.entries(answers).filter(([key]) => !SHELF_KEYS.some((own) => own === key)))
}

function refused(issues: readonly { path: PropertyKey[]; message: string }[]): Fault {
  const fields: FieldSentences = {}
  for (const { path, message } of issues) fields[path.map(String).join('.') || 'answers'] ??= message
  return new Fault('bad_input', issues[0].message, { fields })
}

/** The board asked for; where none was said, the newest. */
function preampOf(context: Reader, modelId: string, boardId: string | null): Preamp {
  try {
    const { boards } = getPreamp(context, modelId, boardId ?? undefined)
    return boards[boards.length - 1].preamp
  } catch (trouble) {
    if (!(trouble instanceof Fault) || trouble.code !== 'not_found') throw trouble
    const field = boardId === null ? 'preamp' : 'board'
    throw new Fault('bad_input', trouble.message, { fields: { [field]: trouble.message }, cause: trouble })
  }
}

/** A short name for what went in: it changes when the catalogue says something else than it did. */
export function hashOf(inputs: MatchInputs): string {
  return createHash('sha256').update(toStored(inputs)).digest('hex').slice(0, 32)
}

/** A short name for answers under a key from the form: one press, one sheet. */
export function requestKeyOf(key: string, answers: AnswersInput): string {
  return createHash('sha256').update(`${key}\n${toQuery(answers)}`).digest('hex')
}

const NEEDS_ANOTHER: ReadonlySet<FindingCode> = new Set([
  'headroom-tight',
  'headroom-loud-records',
  'level-low',
  'hiss',
  'load-below-recommended',
  'load-near-coil',
  'magnet-into-mc',
])

/** Other models of the maker that suit the same answers without a limit, those with most room first. */
function alternativesTo(context: Reader, inputs: MatchInputs, result: MatchResult): Alternative[] {
  if (result.verdict !== 'does-not-suit' && result.verdict !== 'suits-with-a-limit') return []
  const ruling = result.chosen?.findings[0]
  if (!result.gate && !(ruling && NEEDS_ANOTHER.has(ruling.code))) return []
  if (result.gate && result.gate.reason !== 'current-input') return []
  const others = listPreamps(context).filter(({ id }) => id !== inputs.preamp.modelId)
  return others
    .flatMap(({ name, boards }) => {
      const preamp = boards[boards.length - 1].preamp
      const output = preamp.hasBalancedOutput ? inputs.output : 'unbalanced'
      const { verdict, chosen } = match({ ...inputs, preamp, present: null, output })
      if (!chosen || (verdict !== 'suits' && verdict !== 'suits-with-changes')) return []
      return [{ modelName: name, verdict, gainDecibels: chosen.setting.gainDecibels, roomDecibels: roomOf(chosen) }]
    })
    .sort((a, b) => b.roomDecibels - a.roomDecibels)
}

const roomOf = ({ figures }: Evaluation) => Math.min(figures.worstMarginDecibels.low, figures.nextMarginDecibels.low)
