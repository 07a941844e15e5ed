'use server'

import { redirect } from 'next/navigation'
import { Fault } from '@/lib/kernel/errors'
import { requestContext } from '@/lib/server/request-context'
import { saveSheet } from '@/lib/setups/save-sheet'
import { answersFrom, toQuery } from '@/lib/setups/schema'
import { ANSWER_KEYS } from '@/lib/setups/terms'
import { STEP_PATHS, stepOf } from '@/lib/setups/views-steps'
import { sentWith, wayOn } from './go-on'

/** Holds the whole check against its schema once more, makes the sheet and goes there; or back to what is wrong. */
export async function makeSheet(data: FormData): Promise<void> {
  const answers = answersFrom(Object.fromEntries(data))
  const context = await requestContext()
  const path = wayOn(context, { ...sentWith(data, answers), step: 'plays-into' })
  if (path) redirect(path)

  const key = data.get('key')
  let target: string
  try {
    const { code } = saveSheet(context, { answers, key: typeof key === 'string' ? key : undefined })
    target = `/sheets/${code}`
  } catch (trouble) {
    if (!(trouble instanceof Fault) || trouble.code !== 'bad_input') throw trouble
    // Only what the server alone can know is left: a preamp or a board that is no longer in the catalogue.
    const wrong = ANSWER_KEYS.find((name) => name in trouble.fields) ?? 'preamp'
    target = `${STEP_PATHS[stepOf({ key: wrong })]}?${toQuery(answers)}&show=all`
  }
  redirect(target)
}
