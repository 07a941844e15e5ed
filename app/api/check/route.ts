import { z } from 'zod'
import { faultOfIssues } from '@/lib/server/answer-fault'
import { answerJson } from '@/lib/server/json-api'
import { readJson } from '@/lib/server/read-json'
import { getSheet } from '@/lib/setups/queries'
import { reckon } from '@/lib/setups/reckon'
import { keepAsSheet } from '@/lib/setups/save-sheet'
import { CheckRequest, checkRequestSchema, MAX_CHECK_BYTES } from '@/lib/setups/schema-api'
import { toCheckJson, toSheetReference } from '@/lib/setups/views'

export const dynamic = 'force-dynamic'

/** Faults name an answer by its own key, wherever it was found to be wrong. */
function withoutPrefix({ issues }: z.ZodError): z.ZodError {
  return new z.ZodError(issues.map((issue) => ({ ...issue, path: issue.path.length > 1 ? issue.path.slice(1) : issue.path })))
}

/** What a check takes, as JSON Schema. */
export function GET(request: Request) {
  return answerJson(request, checkRequestSchema)
}

/** Checks the answers. Nothing is kept unless `save` asks for it; then the sheet's number and code come along. */
export function POST(request: Request) {
  return answerJson(request, async (context) => {
    const asked = CheckRequest.safeParse(await readJson(request, MAX_CHECK_BYTES))
    if (!asked.success) throw faultOfIssues(withoutPrefix(asked.error))
    const { answers, save, key } = asked.data
    const reckoned = reckon(context, answers)
    if (!save) return toCheckJson(reckoned, null)
    const { code } = keepAsSheet(context, reckoned, { key })
    return toCheckJson(reckoned, toSheetReference(getSheet(context, code)))
  })
}
