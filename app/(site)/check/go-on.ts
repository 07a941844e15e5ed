import 'server-only'
import {
  findArms,
  findCartridges,
  findInputs,
  findLeads,
  findStepUps,
  listPreamps,
} from '@/lib/catalogue/queries'
import type { Context } from '@/lib/kernel/context'
import type { Preamp } from '@/lib/match'
import { readPositionFields } from '@/lib/match/state-fields'
import { readAnswers } from '@/lib/setups/answers'
import { readPositions, writePositions } from '@/lib/setups/positions'
import {
  answersFromArm,
  answersFromCartridge,
  answersFromInput,
  answersFromLead,
  answersFromStepUp,
} from '@/lib/setups/schema-picked'
import { toQuery, type AnswersInput } from '@/lib/setups/schema'
import { STEPS, type Step } from '@/lib/setups/terms'
import { boardOfSerial, pickPreamp } from '@/lib/setups/views-preamp'
import { nextStep, STEP_PATHS, stepOf } from '@/lib/setups/views-steps'

/** What a form of the check was sent with, besides its answers. All of it works without script. */
export interface Sent {
  step: Step
  answers: AnswersInput
  /** `next`, `stay`, `fix:<key>` or `look-up:<key>`: which button was pressed. */
  go: string
  /** Only to settle the board. It goes no further than this. */
  serial: string
  /** Every value of a field: the drawn switches are checkboxes. */
  valuesOf: (name: string) => string[]
}

const textOf = (data: FormData, name: string) => {
  const value = data.get(name)
  return typeof value === 'string' ? value : ''
}

export function sentWith(data: FormData, answers: AnswersInput): Sent {
  const step = STEPS.find((each) => each === data.get('step')) ?? 'preamp'
  const valuesOf = (name: string) => data.getAll(name).filter((value) => typeof value === 'string')
  return { step, answers, go: textOf(data, 'go') || 'next', serial: textOf(data, 'serial'), valuesOf }
}

/** Where the browser goes from here, with every answer along; null when all steps are done and the sheet can be made. */
export function wayOn(context: Context, sent: Sent): string | null {
  const { step, go } = sent
  const { answers, flag } = step === 'preamp' ? withUnit(context, sent) : { answers: sent.answers, flag: '' }
  const to = (path: string, more: AnswersInput = {}, flags = '') => `${path}?${toQuery({ ...answers, ...more })}${flags}`
  const here = STEP_PATHS[step]
  const { troubles } = readAnswers(answers)

  if (go.startsWith('fix:')) return to(here, troubles.find(({ key }) => `fix:${key}` === go)?.fix?.set)
  if (go.startsWith('look-up:')) return to(here, lookedUp(context, answers, go.slice('look-up:'.length)))
  if (go === 'stay') return to(here)
  if (flag) return to(here, {}, flag)
  if (troubles.some((trouble) => stepOf(trouble) === step)) return to(here, {}, '&show=all')
  const following = nextStep(step)
  if (following) return to(STEP_PATHS[following])
  if (!answers.preamp) return to(STEP_PATHS.preamp, {}, '&show=all')
  return troubles.length > 0 ? to(STEP_PATHS[stepOf(troubles[0])], {}, '&show=all') : null
}

/** The board that a serial number settles, and the switches as they were ticked. */
function withUnit(context: Context, { answers, serial, valuesOf }: Sent): { answers: AnswersInput; flag: string } {
  const models = listPreamps(context)
  const { model } = pickPreamp(models, answers)
  if (!model) return { answers, flag: '&show=all' }
  const settled = boardOfSerial(model, serial)
  if (settled && 'reason' in settled) return { answers, flag: `&serial=${settled.reason}` }
  const withBoard = settled ? { ...answers, board: settled.board.id } : answers
  const { board } = pickPreamp(models, withBoard)
  const ticked = board && readPositionFields(board.preamp, valuesOf)
  if (!board || !ticked) return { answers: withBoard, flag: '' }
  const withSwitches = { ...withBoard, ...writePositions(ticked, board.preamp) }
  const clash = withSwitches.present === 'known' && presentOf(withSwitches, board.preamp) === null
  return { answers: withSwitches, flag: clash ? '&show=all' : '' }
}

const presentOf = ({ left = '', right = '' }: AnswersInput, preamp: Preamp) => readPositions({ left, right }, preamp)

/** The first entry of the catalogue by the name typed; without one everything stays as it is. */
function lookedUp(context: Context, answers: AnswersInput, key: string): AnswersInput {
  const search = (text: string | undefined) => ({ text: text ?? '', limit: 1 })
  switch (key) {
    case 'name': {
      const [entry] = answers.name ? findCartridges(context, search(answers.name)).entries : []
      return entry ? answersFromCartridge(entry, answers) : {}
    }
    case 'arm': {
      const [entry] = answers.arm ? findArms(context, search(answers.arm)).entries : []
      return entry ? answersFromArm(entry, answers) : {}
    }
    case 'leadName': {
      const [entry] = answers.leadName ? findLeads(context, { ...search(answers.leadName), type: 'arm-lead' }).entries : []
      return entry ? answersFromLead(entry, entry.lengths[0], answers) : {}
    }
    case 'stepUpName': {
      const [entry] = answers.stepUpName ? findStepUps(context, search(answers.stepUpName)).entries : []
      return entry ? answersFromStepUp(entry, entry.taps[0], answers) : {}
    }
    case 'nextName': {
      const [entry] = answers.nextName ? findInputs(context, search(answers.nextName)).entries : []
      return entry ? answersFromInput(entry, answers) : {}
    }
    default:
      return {}
  }
}
