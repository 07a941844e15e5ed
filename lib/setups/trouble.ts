import type { AnswerKey } from './terms'

/** Answers as typed, by key. */
export type RawAnswers = Partial<Record<AnswerKey, string>>

/** A value that was read, in the field's own unit. `text` is what stood in the boxes. */
export interface Given {
  low: number
  nominal: number
  high: number
  text: string
}

/** What is wrong with one answer, and a way out: answers that put it right, under a short label. */
export interface Trouble {
  key: AnswerKey
  sentence: string
  fix: { label: string; set: RawAnswers } | null
}

