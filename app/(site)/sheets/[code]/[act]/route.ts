import { Fault } from '@/lib/kernel/errors'
import type { Context } from '@/lib/kernel/context'
import { faultOfIssues } from '@/lib/server/answer-fault'
import { countFormPress } from '@/lib/server/form-press'
import { requestContext } from '@/lib/server/request-context'
import { answerNumber } from '@/lib/setups/answer-number'
import { computeAnew } from '@/lib/setups/compute-anew'
import { makeNewCode } from '@/lib/setups/new-code'
import { FoundNumberInput } from '@/lib/setups/schema-found'
import { SHEET_ACTS, type SheetAct, type SheetTrouble } from '@/lib/setups/terms-sheet'
import { takeUpPositions } from '@/lib/shelf/take-up-positions'

export const dynamic = 'force-dynamic'

type Values = Record<string, string>

const VERBS: Record<SheetAct, (context: Context, code: string, values: Values) => { code: string }> = {
  moved: (context, code) => takeUpPositions(context, { code }),
  anew: (context, code) => computeAnew(context, { code }),
  'new-code': (context, code) => makeNewCode(context, { code }),
  number: (context, code, values) => {
    const found = FoundNumberInput.safeParse({ ...values, code })
    if (!found.success) throw faultOfIssues(found.error)
    return answerNumber(context, found.data)
  },
}

const goTo = (path: string) => new Response(null, { status: 303, headers: { Location: path, 'Cache-Control': 'no-store' } })

/** Does one thing to a sheet and shows what it left; what was refused comes back with what stood in the form. */
export async function POST(request: Request, { params }: { params: Promise<{ code: string; act: string }> }) {
  const { code, act } = await params
  const known = SHEET_ACTS.find((one) => one === act)
  if (!known) return new Response(null, { status: 404 })
  const values = textsOf(await request.formData())
  try {
    const context = await requestContext()
    await countFormPress(context)
    return goTo(`/sheets/${VERBS[known](context, code, values).code}`)
  } catch (trouble) {
    if (!(trouble instanceof Fault)) throw trouble
    return goTo(`/sheets/${encodeURIComponent(code)}?${comeBack(trouble, known, values)}`)
  }
}

function textsOf(form: FormData): Values {
  const texts = [...form.entries()].filter((entry): entry is [string, string] => typeof entry[1] === 'string')
  return Object.fromEntries(texts.map(([name, text]) => [name, text.slice(0, 200)]))
}

/** The page says it in its own words: nothing that stands in an address is shown as ours. */
function comeBack({ code }: Fault, act: SheetAct, { value, velocity, meaning }: Values): string {
  const trouble: SheetTrouble = code === 'conflict' ? 'full' : code === 'too_many' ? 'wait' : act === 'number' && code === 'bad_input' ? 'number' : 'refused'
  const kept = trouble === 'number' || trouble === 'wait' ? { value, velocity, meaning } : {}
  const query = new URLSearchParams({ trouble })
  for (const [name, text] of Object.entries(kept)) if (text !== undefined) query.append(name, text)
  return query.toString()
}
