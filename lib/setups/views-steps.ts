import { choiceOf, readAnswers, type Answers } from './answers'
import type { RawAnswers, Trouble } from './trouble'
import { counted, sentenceCase } from './format'
import { TYPE_WORDS } from './sentences/title-block'
import { STEP_KEYS, STEPS, type CartridgeChoice, type NextKind, type Step } from './terms'

/** The four steps as their names, and where each stands. */
export const STEP_NAMES: Record<Step, string> = {
  preamp: 'Preamp',
  cartridge: 'Cartridge',
  arm: 'Arm and cable',
  'plays-into': 'Plays into',
}
export const STEP_PATHS: Record<Step, string> = {
  preamp: '/check',
  cartridge: '/check/cartridge',
  arm: '/check/arm',
  'plays-into': '/check/plays-into',
}
const ASKED: Record<Step, string> = {
  preamp: 'Model and switches',
  cartridge: 'Output, coil, load',
  arm: 'Capacitance, if you know it',
  'plays-into': 'Amplifier or other input',
}

export interface StepView {
  step: Step
  name: string
  path: string
  /** The answer given, or what will be asked. */
  line: string
  answered: boolean
}

export const stepOf = ({ key }: Pick<Trouble, 'key'>): Step => STEPS.find((step) => STEP_KEYS[step].includes(key)) ?? 'preamp'
export const nextStep = (step: Step): Step | null => STEPS[STEPS.indexOf(step) + 1] ?? null
export const stepBefore = (step: Step): Step | null => STEPS[STEPS.indexOf(step) - 1] ?? null

/** @param modelName of the preamp chosen; null where none is */
export function stepViews(raw: RawAnswers, modelName: string | null): StepView[] {
  const { troubles } = readAnswers(raw)
  const given = answerLines(raw, modelName)
  return STEPS.map((step) => {
    const wrong = troubles.filter((trouble) => stepOf(trouble) === step).length
    const putRight = wrong > 0 ? `${counted(wrong, 'value', 'values')} to put right` : ''
    const parts = [given[step], putRight].filter(Boolean)
    const line = parts.length > 0 ? sentenceCase(parts.join(', ')) : ASKED[step]
    return { step, name: STEP_NAMES[step], path: STEP_PATHS[step], line, answered: parts.length > 0 }
  })
}

const NEXT: Record<NextKind, string> = {
  line: 'amplifier',
  digital: 'digital input',
  recorder: 'recorder',
  headphones: 'headphone stage',
  phono: 'a phono input',
  unknown: 'not known',
}

const PRESENT: Record<string, string> = { known: ', as you set it', delivered: ', as it came' }

function answerLines(raw: RawAnswers, modelName: string | null): Record<Step, string> {
  const { answers } = readAnswers(raw)
  const { cartridge, arm, next } = answers
  const type = choiceOf(raw)
  const lead = 'metres' in arm.lead ? arm.lead.metres.text : arm.lead.picofarads?.text
  return {
    preamp: modelName ? `${modelName}${PRESENT[answers.present.kind] ?? ''}` : '',
    cartridge: cartridge.name || (raw.type ? (type === 'unknown' ? 'type not known' : TYPE_WORDS[cartridge.type]) : ''),
    arm: [arm.name, lead].filter(Boolean).join(', '),
    'plays-into': next.name || (raw.next ? NEXT[next.kind] : ''),
  }
}

/** All answers read at once, with the type that the form goes by. */
export function readForm(raw: RawAnswers): { answers: Answers; type: CartridgeChoice; troubles: Trouble[] } {
  return { ...readAnswers(raw), type: choiceOf(raw) }
}
