import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { Sheet } from '@/components/setups/sheet'
import { Fault } from '@/lib/kernel/errors'
import { env } from '@/lib/server/env'
import { requestContext } from '@/lib/server/request-context'
import { getSheet } from '@/lib/setups/queries'
import type { SheetView } from '@/lib/setups/views'
import { answerNumberAction, computeAnewAction, makeNewCodeAction, markMovedAction } from './actions'

interface Props {
  params: Promise<{ code: string }>
  searchParams: Promise<{ revision?: string | string[] }>
}

const ACTIONS = {
  answerNumber: answerNumberAction,
  markMoved: markMovedAction,
  computeAnew: computeAnewAction,
  makeNewCode: makeNewCodeAction,
}

async function sheetOf({ params, searchParams }: Props): Promise<SheetView | null> {
  const [{ code }, { revision }] = [await params, await searchParams]
  try {
    return getSheet(await requestContext(), code, Array.isArray(revision) ? revision[0] : revision)
  } catch (trouble) {
    if (trouble instanceof Fault && trouble.code === 'not_found') return null
    throw trouble
  }
}

export async function generateMetadata(props: Props): Promise<Metadata> {
  const sheet = await sheetOf(props)
  const title = sheet ? `Sheet ${sheet.number}, ${sheet.inputs.preamp.modelName}` : 'No such sheet'
  // Whoever has the address can read it: it must not turn up in a search.
  return { title, robots: { index: false, follow: false }, referrer: 'no-referrer' }
}

export default async function SheetPage(props: Props) {
  const sheet = await sheetOf(props)
  if (!sheet) notFound()
  return <Sheet sheet={sheet} origin={env().publicAddress} actions={ACTIONS} />
}
