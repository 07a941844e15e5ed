import 'server-only'
import { Fault, type FieldSentences } from '@/lib/kernel/errors'
import { Answers, type AnswersInput } from '@/lib/setups/schema'
import { cartridgeAnswersOf } from './views-answers'

/**
 * What is kept of a cartridge out of a filled-in form.
 * @throws Fault bad_input with a sentence for each value that needs putting right
 */
export function readCartridge({ name, answers: given, hours, notes }: { name: string; answers: AnswersInput; hours: number | null; notes: string }) {
  const answers = cartridgeAnswersOf({ ...given, name })
  const read = Answers.safeParse(answers)
  if (!read.success) {
    const fields: FieldSentences = {}
    for (const { path, message } of read.error.issues) fields[path.map(String).join('.')] ??= message
    throw new Fault('bad_input', read.error.issues[0].message, { fields })
  }
  return { name, catalogueId: answers.cart ?? null, answers: JSON.stringify(answers), stylusHours: hours, notes }
}
