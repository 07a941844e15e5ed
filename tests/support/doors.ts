import { readdirSync, readFileSync } from 'node:fs'
import { join, relative } from 'node:path'
import { z } from 'zod'

/** Every way into the server besides reading a page: `file.ts name`. A new one is found by itself. */
export function doors(): string[] {
  const files = readdirSync('app', { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile() && entry.name.endsWith('.ts'))
    .map((entry) => join(relative('.', entry.parentPath), entry.name))
  return files.flatMap((file) => {
    const text = readFileSync(file, 'utf8')
    if (file.endsWith('/route.ts')) return methodsIn(text).map((method) => `${file} ${method}`)
    if (!/^\s*['"]use server['"]/.test(text)) return []
    return [...text.matchAll(/^export (?:const|async function) (\w+)/gm)].map(([, name]) => `${file} ${name}`)
  })
}

function methodsIn(text: string): string[] {
  const named = [...text.matchAll(/^export (?:const|(?:async )?function) (GET|POST|PUT|PATCH|DELETE)\b/gm)].map(([, method]) => method)
  const listed = [...text.matchAll(/^export \{([^}]*)\}/gm)].flatMap(([, list]) => list.match(/\b(?:GET|POST|PUT|PATCH|DELETE)\b/g) ?? [])
  return [...named, ...listed]
}

/** What `redirect` and `notFound` throw in the place of Next's own. */
export class WentTo extends Error {
  constructor(readonly path: string) {
    super(`went to ${path}`)
  }
}
export class FoundNothing extends Error {}

const Answer = z.object({ done: z.boolean(), words: z.string().nullable(), fields: z.record(z.string(), z.string()) })
const SheetAnswer = z.object({ sentence: z.string().nullable() })
const JsonFault = z.object({ error: z.object({ code: z.string() }) })

/** The sentences of `permit`, and what each means. */
const REFUSALS: Record<string, string> = {
  'Sign in first.': 'sign_in',
  'There is nothing here under that name.': 'not_found',
  'Your account may not do this.': 'not_allowed',
}
const meaningOf = (words: string | null | undefined) => (words ? (REFUSALS[words] ?? `refused: ${words}`) : 'refused')

/** Ids, codes and numbers, which differ from one run to the next. */
const NAMES = /\/(?:[a-z]{3}_[0-9a-z]{22}|[0-9a-z]{4}(?:-[0-9a-z]{4}){3}|\d{4,})(?=\/|$)/g

/** Where someone went. Sheets say in the address that something was refused. */
function placeOf(path: string): string {
  const { pathname, searchParams } = new URL(path, 'http://localhost')
  const trouble = searchParams.get('trouble')
  return trouble ? `refused: ${trouble}` : `to ${decodeURI(pathname).replace(NAMES, '/…')}`
}

/** In one or two words, what came of a press or a request. */
export async function outcomeOf(run: () => unknown): Promise<string> {
  try {
    const result = await run()
    if (result instanceof Response) return await outcomeOfResponse(result)
    const answer = Answer.safeParse(result)
    if (answer.success) return answer.data.done ? 'done' : meaningOf(answer.data.words ?? Object.values(answer.data.fields)[0])
    const sheet = SheetAnswer.safeParse(result)
    return sheet.success ? meaningOf(sheet.data.sentence) : 'done'
  } catch (trouble) {
    if (trouble instanceof WentTo) return placeOf(trouble.path)
    if (trouble instanceof FoundNothing) return 'not_found'
    throw trouble
  }
}

async function outcomeOfResponse(response: Response): Promise<string> {
  const location = response.headers.get('location')
  if (location) return placeOf(location)
  if (response.ok) return 'done'
  return JsonFault.parse(await response.json()).error.code
}
