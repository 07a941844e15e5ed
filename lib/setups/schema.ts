import { z } from 'zod'
import { readAnswers, type Answers as ReadAnswers } from './answers'
import type { RawAnswers } from './trouble'
import { ANSWER_KEYS, DEFAULT_ANSWERS, MAX_ANSWER_LENGTH, MAX_LEAFLET_LENGTH, type AnswerKey } from './terms'

const limitOf = (key: AnswerKey) => (key === 'leaflet' ? MAX_LEAFLET_LENGTH : MAX_ANSWER_LENGTH)
const shape = Object.fromEntries(
  ANSWER_KEYS.map((key) => [key, z.string().max(limitOf(key), `At most ${limitOf(key)} characters.`).optional()]),
) as Record<AnswerKey, z.ZodOptional<z.ZodString>>

/**
 * Everything that was answered, as typed: a flat record of short texts under the keys of `terms.ts`. This is what
 * travels in the address, is kept on the device and is stored with a sheet. Unknown keys are dropped.
 */
export const AnswersInput = z.object(shape)
export type AnswersInput = RawAnswers

/** The same, read: every value in its unit. Refuses with one sentence for each answer that needs putting right. */
export const Answers = AnswersInput.transform((input, context) => {
  const { answers, troubles } = readAnswers(input)
  for (const { key, sentence } of troubles) context.addIssue({ code: 'custom', path: [key], message: sentence, input: input[key] })
  return answers
})
export type Answers = ReadAnswers

/** Whatever of it are answers; texts that are too long are cut, everything else is kept as typed. Never refuses. */
export function answersFrom(values: Readonly<Record<string, unknown>>): AnswersInput {
  const answers: AnswersInput = {}
  for (const key of ANSWER_KEYS) {
    const value = values[key]
    const text: unknown = Array.isArray(value) ? value.at(-1) : value
    if (typeof text === 'string' && text !== '') answers[key] = text.slice(0, limitOf(key))
  }
  return answers
}

/**
 * The answers as a query, without a question mark. In a fixed order and without what stands at its default anyway, so
 * that equal answers give equal links.
 */
export function toQuery(answers: AnswersInput): string {
  const query = new URLSearchParams()
  for (const key of ANSWER_KEYS) {
    const text = answers[key]
    if (text !== undefined && text !== '' && text !== DEFAULT_ANSWERS[key]) query.append(key, text)
  }
  return query.toString()
}

/** @see answersFrom */
export function fromQuery(query: string | URLSearchParams): AnswersInput {
  return answersFrom(Object.fromEntries(new URLSearchParams(query)))
}
