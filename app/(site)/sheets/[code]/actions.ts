'use server'

import { notFound, redirect } from 'next/navigation'
import type { SheetFormState } from '@/components/setups/sheet-actions'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { countFormPress } from '@/lib/server/form-press'
import { requestContext } from '@/lib/server/request-context'
import { answerNumber } from '@/lib/setups/answer-number'
import { computeAnew } from '@/lib/setups/compute-anew'
import { markMoved } from '@/lib/setups/mark-moved'
import { makeNewCode } from '@/lib/setups/new-code'
import { FoundNumberInput } from '@/lib/setups/schema-found'
import { faultOfIssues } from '@/lib/server/answer-fault'

const textOf = (form: FormData, name: string) => {
  const value = form.get(name)
  return typeof value === 'string' ? value : ''
}

/** Runs a verb and shows the sheet it left; what was foreseen comes back to the form with what stood in it. */
async function thenShow(form: FormData, run: (context: Context) => { code: string }): Promise<SheetFormState> {
  let code: string
  try {
    const context = await requestContext()
    await countFormPress(context)
    code = run(context).code
  } catch (trouble) {
    if (!(trouble instanceof Fault)) throw trouble
    if (trouble.code === 'not_found') notFound()
    const values = Object.fromEntries([...form.entries()].flatMap(([key, value]) => (typeof value === 'string' ? [[key, value]] : [])))
    return { sentence: Object.values(trouble.fields)[0] ?? trouble.message, values }
  }
  redirect(`/sheets/${code}`)
}

export async function answerNumberAction(_before: SheetFormState, form: FormData): Promise<SheetFormState> {
  return thenShow(form, (context) => {
    const found = FoundNumberInput.safeParse(Object.fromEntries(form))
    if (!found.success) throw faultOfIssues(found.error)
    return answerNumber(context, found.data)
  })
}

export async function markMovedAction(_before: SheetFormState, form: FormData): Promise<SheetFormState> {
  return thenShow(form, (context) => markMoved(context, { code: textOf(form, 'code') }))
}

export async function computeAnewAction(_before: SheetFormState, form: FormData): Promise<SheetFormState> {
  return thenShow(form, (context) => computeAnew(context, { code: textOf(form, 'code') }))
}

export async function makeNewCodeAction(_before: SheetFormState, form: FormData): Promise<SheetFormState> {
  return thenShow(form, (context) => makeNewCode(context, { code: textOf(form, 'code') }))
}
