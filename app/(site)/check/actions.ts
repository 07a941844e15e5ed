'use server'

import { redirect } from 'next/navigation'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { countFormPress } from '@/lib/server/form-press'
import { requestContext } from '@/lib/server/request-context'
import { answersFrom, toQuery, type AnswersInput } from '@/lib/setups/schema'
import { ANSWER_KEYS } from '@/lib/setups/terms'
import { STEP_PATHS, stepOf } from '@/lib/setups/views-steps'
import { keepCheck } from '@/lib/shelf/keep-check'
import { sentWith, wayOn } from './go-on'

/** Holds the whole check against its schema once more, makes the sheet and goes there; or back to what is wrong. */
export async function makeSheet(data: FormData): Promise<void> {
  const answers = answersFrom(Object.fromEntries(data))
  const context = await requestContext()
  const path = wayOn(context, { ...sentWith(data, answers), step: 'plays-into' })
  if (path) redirect(path)
  const key = data.get('key')
  redirect(await pathOfSheet(context, answers, typeof key === 'string' ? key : undefined))
}

async function pathOfSheet(context: Context, answers: AnswersInput, key: string | undefined): Promise<string> {
  try {
    await countFormPress(context)
    return `/sheets/${keepCheck(context, { answers, key }).code}`
  } catch (trouble) {
    if (!(trouble instanceof Fault)) throw trouble
    if (trouble.code === 'too_many') return `${STEP_PATHS['plays-into']}?${toQuery(answers)}&show=wait`
    if (trouble.code !== 'bad_input') throw trouble
    // Only what the server alone can know is left: a preamp or a board that is no longer in the catalogue.
    const wrong = ANSWER_KEYS.find((name) => name in trouble.fields) ?? 'preamp'
    return `${STEP_PATHS[stepOf({ key: wrong })]}?${toQuery(answers)}&show=all`
  }
}
