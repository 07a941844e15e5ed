import { createContext, use } from 'react'
import type { UseFormRegisterReturn } from 'react-hook-form'
import type { Answers, AnswersInput } from '@/lib/setups/schema'
import type { AnswerKey, CartridgeChoice } from '@/lib/setups/terms'

/** What every field of the check draws on. */
export interface CheckFormContext {
  /** As it stood when the page arrived: what the server drew, and the browser first draws as well. */
  initial: AnswersInput
  /** As it stands now. */
  raw: AnswersInput
  answers: Answers
  type: CartridgeChoice
  field: (key: AnswerKey) => UseFormRegisterReturn<AnswerKey>
  /** Whether what is wrong with one of these is to be shown by now: after it was left, or after Next. */
  showsTrouble: (keys: readonly AnswerKey[]) => boolean
  /** Puts answers in, as if typed; the field named gets the focus. */
  apply: (answers: AnswersInput, focus?: AnswerKey) => void
  /** Whether what the groove speed means could turn the advice. */
  meaningMatters: boolean
}

export const CheckForm = createContext<CheckFormContext | null>(null)

export function useCheckForm(): CheckFormContext {
  const form = use(CheckForm)
  if (!form) throw new Error('A field of the check stands outside its form.')
  return form
}
