'use server'

import { redirect } from 'next/navigation'
import { findCartridges } from '@/lib/catalogue/queries'
import type { FormState } from '@/lib/forms/terms'
import { action } from '@/lib/server/action'
import { requestContext } from '@/lib/server/request-context'
import { readAnswers } from '@/lib/setups/answers'
import { answersFrom, toQuery, type AnswersInput } from '@/lib/setups/schema'
import { answersFromCartridge } from '@/lib/setups/schema-picked'
import { addCartridge } from '@/lib/shelf/add-cartridge'
import { addHours } from '@/lib/shelf/add-hours'
import { archiveCartridge } from '@/lib/shelf/archive-cartridge'
import { changeCartridge } from '@/lib/shelf/change-cartridge'
import { restoreCartridge } from '@/lib/shelf/restore-cartridge'
import { AddCartridgeInput, AddHoursInput, CartridgeInput, ChangeCartridgeInput } from '@/lib/shelf/schema'

const toCartridge = ({ id }: { id: string }) => ({ go: `/shelf/cartridges/${id}` })
const toShelf = () => ({ go: '/shelf' })

const add = action(AddCartridgeInput, addCartridge, toShelf)
const change = action(ChangeCartridgeInput, changeCartridge, toShelf)
export const addHoursAction = action(AddHoursInput, addHours, toCartridge)
export const archiveCartridgeAction = action(CartridgeInput, archiveCartridge, toShelf)
export const restoreCartridgeAction = action(CartridgeInput, restoreCartridge, toShelf)

export async function addCartridgeAction(before: FormState, form: FormData): Promise<FormState> {
  const answers = await otherwise(form)
  if (answers) redirect(`/shelf/cartridges/new?${toQuery(answers)}${also(form, 'fromSheet')}`)
  return add(before, form)
}

export async function changeCartridgeAction(before: FormState, form: FormData): Promise<FormState> {
  const answers = await otherwise(form)
  const id = form.get('cartridgeId')
  if (answers && typeof id === 'string') redirect(`/shelf/cartridges/${encodeURIComponent(id)}?${toQuery(answers)}`)
  return change(before, form)
}

const also = (form: FormData, name: string) => {
  const value = form.get(name)
  return typeof value === 'string' && value !== '' ? `&${name}=${encodeURIComponent(value)}` : ''
}

/** Without script, looking a name up and putting a slip right are buttons of the form: the answers they lead to. */
async function otherwise(form: FormData): Promise<AnswersInput | null> {
  const go = form.get('go')
  const answers = answersFrom(Object.fromEntries(form))
  if (go === 'look-up:name') {
    const [entry] = answers.name ? findCartridges(await requestContext(), { text: answers.name, limit: 1 }).entries : []
    return entry ? answersFromCartridge(entry, answers) : answers
  }
  if (typeof go !== 'string' || !go.startsWith('fix:')) return null
  const fix = readAnswers(answers).troubles.find(({ key }) => `fix:${key}` === go)?.fix
  return { ...answers, ...fix?.set }
}
