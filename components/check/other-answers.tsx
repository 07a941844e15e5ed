import type { AnswersInput } from '@/lib/setups/schema'
import { ANSWER_KEYS, DEFAULT_ANSWERS, ENTRY_KEYS, type AnswerKey } from '@/lib/setups/terms'

/** The answers that have no box on this step, along in the form so that it is whole without script. */
export function OtherAnswers({ raw, here }: { raw: AnswersInput; here: readonly AnswerKey[] }) {
  const hasBox = (key: AnswerKey) => here.includes(key) && !ENTRY_KEYS.includes(key)
  return ANSWER_KEYS.filter((key) => !hasBox(key) && raw[key] && raw[key] !== DEFAULT_ANSWERS[key]).map((key) => (
    <input type="hidden" key={key} name={key} value={raw[key]} readOnly />
  ))
}
