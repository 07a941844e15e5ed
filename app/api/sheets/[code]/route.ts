import { answerJson } from '@/lib/server/json-api'
import { getSheet } from '@/lib/setups/queries'
import { toCheckJson, toSheetReference } from '@/lib/setups/views'

export const dynamic = 'force-dynamic'

/** A sheet under its code, as it was reckoned; `?revision=A` for an earlier one. Its number opens nothing. */
export function GET(request: Request, { params }: { params: Promise<{ code: string }> }) {
  return answerJson(request, async (context) => {
    const letter = new URL(request.url).searchParams.get('revision') ?? undefined
    const sheet = getSheet(context, (await params).code, letter)
    return toCheckJson(sheet, toSheetReference(sheet))
  })
}
