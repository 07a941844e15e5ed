import 'server-only'
import { redirect } from 'next/navigation'
import type { z } from 'zod'
import type { Origin } from '@/lib/accounts/origin'
import type { FormAction, FormState } from '@/lib/forms/terms'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { faultOfIssues } from './answer-fault'
import { requestOrigin } from './origin'
import { requestContext } from './request-context'

type Verb<Input, Result> = (context: Context, input: Input, origin: Origin) => Result | Promise<Result>

type Texts = Record<string, string>

/** What follows when it went well: a page to go to, or words in place of the form. */
export type Outcome = { go: string } | { words: string; shown?: string[] }

/** These never come back to the page. */
const SECRET_FIELDS = new Set(['password', 'present', 'code', 'token'])

/**
 * Makes a server action of a verb: reads the form with the verb's schema, runs it for whoever asks, and says what is
 * wrong in the form's own words. What nobody foresaw rises to the error page.
 * @param then what follows; may set cookies
 */
export function action<Schema extends z.ZodType, Result>(
  schema: Schema,
  verb: Verb<z.output<Schema>, Result>,
  then: (result: Result, texts: Texts) => Outcome | Promise<Outcome>,
): FormAction {
  return async (_before, form) => {
    const texts = textsOf(form)
    let outcome: Outcome
    try {
      const input = schema.safeParse(texts)
      if (!input.success) throw faultOfIssues(input.error)
      outcome = await then(await verb(await requestContext(), input.data, await requestOrigin()), texts)
    } catch (trouble) {
      if (trouble instanceof Fault) return refusal(trouble, texts)
      throw trouble
    }
    if ('go' in outcome) redirect(outcome.go)
    return { done: true, words: outcome.words, fields: {}, values: {}, shown: outcome.shown }
  }
}

function textsOf(form: FormData): Texts {
  return Object.fromEntries([...form].flatMap(([name, value]) => (typeof value === 'string' && !name.startsWith('$') ? [[name, value]] : [])))
}

function refusal({ message, fields }: Fault, texts: Texts): FormState {
  const values = Object.fromEntries(Object.entries(texts).filter(([name]) => !SECRET_FIELDS.has(name)))
  return { done: false, words: Object.keys(fields).length > 0 ? null : message, fields, values }
}
