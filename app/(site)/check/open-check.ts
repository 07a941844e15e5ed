import 'server-only'
import type { SoFarMade } from '@/components/check/use-so-far'
import { listPreamps } from '@/lib/catalogue/queries'
import type { PreampView } from '@/lib/catalogue/views'
import { requestContext } from '@/lib/server/request-context'
import { answersFrom, toQuery, type AnswersInput } from '@/lib/setups/schema'
import { pickPreamp } from '@/lib/setups/views-preamp'
import { meaningMatters, soFar } from '@/lib/setups/views-so-far'

export type AddressParams = Promise<Record<string, string | string[] | undefined>>

interface OpenedCheck {
  answers: AnswersInput
  models: PreampView[]
  made: SoFarMade
  showAll: boolean
  mustWait: boolean
}

/** Everything a step of the check is drawn from: the answers in the address and what they come to so far. */
export async function openCheck(params: AddressParams): Promise<OpenedCheck> {
  const given = await params
  const answers = answersFrom(given)
  const models = listPreamps(await requestContext())
  const { board } = pickPreamp(models, answers)
  const made = { query: toQuery(answers), view: soFar(answers, board?.preamp ?? null), meaningMatters: meaningMatters(answers, board?.preamp ?? null) }
  return { answers, models, made, showAll: given.show === 'all', mustWait: given.show === 'wait' }
}
