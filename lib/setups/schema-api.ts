import { z } from 'zod'
import { FIELDS } from './fields'
import {
  ANSWER_KEYS,
  CARTRIDGE_CHOICES,
  COMPLIANCE_CONDITIONS,
  HOWS,
  MEANINGS,
  NEXT_KINDS,
  OTHER_TYPES,
  PRESENTS,
  VALUE_FIELDS,
  VELOCITIES,
  WIRES,
  type AnswerKey,
  type NumberField,
} from './terms'
import { factorOf, unitSign } from './units'

/** Largest body that a check takes. */
export const MAX_CHECK_BYTES = 32 * 1024

/** What a check by JSON takes: the answers of a check as typed, and whether to keep them as a sheet. */
export const CheckRequest = z.object(
  {
    answers: z.record(
      z.string(),
      z.union([z.string(), z.number().transform(String)], 'An answer is a short text or a number.'),
      'Send the answers as an object of short texts.',
    ),
    save: z.boolean('save is true or false.').default(false),
    key: z.string().min(8, 'A key has 8 to 200 characters.').max(200, 'A key has 8 to 200 characters.').optional(),
  },
  'Send an object with the answers.',
)
export type CheckRequest = z.infer<typeof CheckRequest>

const CHOICES: Partial<Record<AnswerKey, readonly string[]>> = {
  type: CARTRIDGE_CHOICES,
  other: OTHER_TYPES,
  velocity: VELOCITIES,
  meaning: MEANINGS,
  complianceAt: COMPLIANCE_CONDITIONS,
  present: PRESENTS,
  leadAs: WIRES,
  cableAs: WIRES,
  next: NEXT_KINDS,
  out: ['unbalanced', 'balanced'],
  mono: ['yes', 'no'],
  stepUp: ['yes', 'no'],
}

const WORDS: Partial<Record<AnswerKey, string>> = {
  preamp: 'Model, by its id in the catalogue. The one answer that is always needed.',
  board: 'Board of the model, by its id; the newest where it is left out.',
  present: 'How the unit stands now. With "known", left and right say how.',
  left: 'Positions of the left channel, such as "bank.10000010".',
  right: 'Positions of the right channel.',
  name: 'What the cartridge is called.',
  cart: 'The cartridge, by its id in the catalogue. Its figures are not filled in: send them as answers.',
  type: 'Type of the cartridge; with "other", the answer other says which.',
  velocity: 'Groove speed that the output was printed for, in cm/s; with "other", velocityOther says it.',
  meaning: 'What that speed means: peak or RMS, sideways or one channel.',
  complianceAt: 'How the compliance was measured.',
  unit: 'Not used by a check.',
  own: 'Not used by a check.',
  sheet: 'Not used by a check.',
  leaflet: 'Marks of values filled in from the catalogue.',
}

const isNumber = (key: string): key is Exclude<NumberField, 'ratio'> => Object.hasOwn(FIELDS, key)

function signOf(key: Exclude<NumberField, 'ratio'>): string {
  const { dimension, unit } = FIELDS[key]
  return unitSign(factorOf(dimension, unit) ?? 1, dimension) ?? unit
}

function descriptionOf(key: AnswerKey): string {
  const words = WORDS[key]
  if (words) return words
  const field = VALUE_FIELDS.find((one) => key === `${one}To` || key === `${one}How`)
  if (field && key.endsWith('To')) return `Upper end of ${field}, with ${field}How "between".`
  if (field) return `How ${field} is known.`
  if (key === 'ratio') return 'Ratio of a step-up transformer, such as "1:10" or "20 dB".'
  if (isNumber(key)) return `${FIELDS[key].noun}, in ${signOf(key)} where no unit is written.`
  return 'As chosen or typed in a check.'
}

/** The request as JSON Schema (2020-12), one description for each answer. */
export function checkRequestSchema() {
  const answers = ANSWER_KEYS.map((key) => {
    const choices = key.endsWith('How') ? HOWS : CHOICES[key]
    return [key, { type: 'string', description: descriptionOf(key), ...(choices ? { examples: choices } : {}) }] as const
  })
  const request = z.toJSONSchema(CheckRequest, { io: 'input' })
  return {
    ...request,
    title: 'Check a cartridge against a preamp',
    properties: { ...request.properties, answers: { type: 'object', properties: Object.fromEntries(answers), required: ['preamp'] } },
  }
}
