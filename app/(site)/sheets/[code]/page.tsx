import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { Sheet } from '@/components/setups/sheet'
import type { ReturnedForm } from '@/components/setups/sheet-parts'
import { Fault } from '@/lib/kernel/errors'
import { env } from '@/lib/server/env'
import { requestContext } from '@/lib/server/request-context'
import { getSheet } from '@/lib/setups/queries'
import { SHEET_TROUBLES } from '@/lib/setups/terms-sheet'
import type { SheetView } from '@/lib/setups/views'

interface Props {
  params: Promise<{ code: string }>
  searchParams: Promise<Record<string, string | string[] | undefined>>
}

const first = (value: string | string[] | undefined) => (Array.isArray(value) ? value[0] : value)

/** A form of this sheet that came back undone. */
function returnedForm(query: Awaited<Props['searchParams']>): ReturnedForm | null {
  const trouble = SHEET_TROUBLES.find((one) => one === first(query.trouble))
  return trouble ? { trouble, value: first(query.value), velocity: first(query.velocity), meaning: first(query.meaning) } : null
}

async function sheetOf({ params, searchParams }: Props): Promise<SheetView | null> {
  const [{ code }, query] = [await params, await searchParams]
  try {
    return getSheet(await requestContext(), code, first(query.revision))
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
  return <Sheet sheet={sheet} origin={env().publicAddress} returned={returnedForm(await props.searchParams)} />
}
