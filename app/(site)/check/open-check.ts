import 'server-only'
import { listPreamps } from '@/lib/catalogue/queries'
import type { PreampView } from '@/lib/catalogue/views'
import { requestContext } from '@/lib/server/request-context'
import { answersFrom, toQuery, type AnswersInput } from '@/lib/setups/schema'
import { pickPreamp } from '@/lib/setups/views-preamp'
import { soFar, type SoFarView } from '@/lib/setups/views-so-far'

export type AddressParams = Promise<Record<string, string | string[] | undefined>>

interface OpenedCheck {
  answers: AnswersInput
  models: PreampView[]
  made: { query: string; view: SoFarView }
  showAll: boolean
  mustWait: boolean
}

/** Everything a step of the check is drawn from: the answers in the address and what they come to so far. */
export async function openCheck(params: AddressParams): Promise<OpenedCheck> {
  const given = await params
  const answers = answersFrom(given)
  const models = listPreamps(await requestContext())
  const { board } = pickPreamp(models, answers)
  const made = { query: toQuery(answers), view: soFar(answers, board?.preamp ?? null) }
  return { answers, models, made, showAll: given.show === 'all', mustWait: given.show === 'wait' }
}
